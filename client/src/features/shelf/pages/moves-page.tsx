import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { unitOf } from '../components/amount';
import { useMemo, useState, type ReactElement } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { usePerson } from '../../../api/session';
import { column, moneyColumn, quantityColumn, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { notify } from '../../../lib/notify';
import { movesQuery, useReverse, type Move } from '../api/stock';
import { adjustAddress, transferAddress } from '../components/addresses';
import { DocumentTag } from '../components/document-tag';
import { ReasonDialog } from '../components/reason-dialog';
import { reasonWords } from '../components/shelf-words';

const ownFilters: readonly GridFilter[] = [
  {
    field: 'reason',
    label: 'What',
    options: Object.entries(reasonWords).map(([value, label]) => ({ value, label })),
  },
  { field: 'from', label: 'From', kind: 'day' },
  { field: 'to', label: 'To', kind: 'day' },
];

/** A page about one thing leads here narrowed to it; the chip says to what, and lets it go. */
function useMoveFilters(): readonly GridFilter[] {
  const [search] = useSearchParams();
  const part = search.get('part');
  const lot = search.get('lot');
  return useMemo(
    () => [
      ...ownFilters,
      ...(part ? [{ field: 'part', label: `Part ${part}` }] : []),
      ...(lot ? [{ field: 'lot', label: `Lot ${lot}` }] : []),
    ],
    [part, lot],
  );
}

function moveColumns(money: boolean, undo: ((move: Move) => void) | undefined): readonly GridColDef<Move>[] {
  return [
    whenColumn('occurredAt', 'When', (move) => move.occurredAt),
    column('reason', 'What', (move) => reasonWords[move.reason] ?? move.reason, { minWidth: 160 }),
    tagColumn('part', 'Part', 'part', (move) => ({ code: move.part }), { width: 180 }),
    tagColumn('lot', 'Lot', 'lot', (move) => ({ code: move.lot }), { width: 140, sortable: false }),
    tagColumn('bin', 'Bin', 'bin', (move) => ({ code: move.bin }), { width: 120, sortable: false }),
    quantityColumn('quantity', 'Quantity', (move) => ({ value: move.quantity, unit: unitOf(move.measure) })),
    ...(money ? [moneyColumn<Move>('value', 'Value', (move) => move.value)] : []),
    column(
      'document',
      'Document',
      (move) => <DocumentTag number={move.document} kind={move.documentKind} note={move.note} />,
      { sortable: false, flex: 0, width: 130 },
    ),
    column('note', 'Note', (move) => move.note ?? '', { sortable: false, minWidth: 180 }),
    column('person', 'By', (move) => move.person ?? '', { sortable: false }),
    ...(undo
      ? [
          column<Move>(
            'undo',
            '',
            (move) =>
              move.reversible ? (
                <Button
                  size="small"
                  variant="text"
                  onClick={() => undo(move)}
                  aria-label={`Take ${move.document} back`}
                >
                  Take back
                </Button>
              ) : null,
            { sortable: false, flex: 0, width: 110 },
          ),
        ]
      : []),
  ];
}

export function Component(): ReactElement {
  const filters = useMoveFilters();
  const grid = useServerGrid({
    name: 'moves',
    query: movesQuery,
    filters,
    defaultSort: '-occurredAt',
    defaultPageSize: 50,
  });
  const role = usePerson()?.role;
  const [undoing, setUndoing] = useState<Move>();
  const columns = useMemo(() => moveColumns(role !== 'assembler', role === 'owner' ? setUndoing : undefined), [role]);
  return (
    <>
      <PageHeading
        title="Moves"
        lead="All that ever came, went or changed its bin. Nothing here is edited; a mistake is taken back by another move."
        actions={
          role === 'owner' || role === 'assembler' ? (
            <>
              <Button component={Link} to={adjustAddress({})}>
                Adjust
              </Button>
              <Button variant="contained" component={Link} to={transferAddress({})}>
                Move between bins
              </Button>
            </>
          ) : null
        }
      />
      <ServerGrid
        grid={grid}
        label="Moves"
        counted={['move', 'moves']}
        rowId={(move) => move.id}
        columns={columns}
        hiddenAtFirst={['note']}
        searchLabel="Document, note, part or lot"
        empty={<EmptyState title="Nothing has moved yet">The first move comes with the first delivery.</EmptyState>}
      />
      {undoing ? <TakeBack move={undoing} onClose={() => setUndoing(undefined)} /> : null}
    </>
  );
}

function TakeBack({ move, onClose }: { move: Move; onClose: () => void }): ReactElement {
  const reverse = useReverse(move.document);
  const { keyFor, done } = useIdempotencyKey();
  return (
    <ReasonDialog
      name={`reversal:${move.document}`}
      title={`Take ${move.document} back?`}
      submitLabel="Take it back"
      longest={200}
      onSubmit={async (reason) => {
        const body = { reason };
        const made = await reverse.mutateAsync({ body, key: keyFor(body) });
        done();
        notify(`${move.document} is taken back by ${made.number}.`);
      }}
      onClose={onClose}
    >
      All moves of this document are made in the other direction, and the books follow. Both documents stay on record.
    </ReasonDialog>
  );
}

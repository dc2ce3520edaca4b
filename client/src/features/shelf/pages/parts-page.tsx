import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { useMemo, type ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { sessionQuery, usePerson } from '../../../api/session';
import { useQuery } from '@tanstack/react-query';
import { UnitCost, Quantity } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { column, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { capital, numberWord } from '../../../lib/number-words';
import { binsQuery } from '../api/bins';
import { partsQuery, type PartItem } from '../api/parts';
import { queueQuery } from '../api/stock';
import { partAddress } from '../components/addresses';
import { Coverage } from '../components/coverage';
import { tracedChoices, tracedWords } from '../components/shelf-words';
import { Amount, costUnitOf } from '../components/amount';

const ownFilters: readonly GridFilter[] = [
  { field: 'short', label: 'Runs short' },
  { field: 'traced', label: 'Followed', options: tracedChoices.map(({ value, label }) => ({ value, label })) },
  { field: 'retired', label: 'Retired' },
];

/** The bins are few enough to choose from; beyond these, a bin's own page says what lies in it. */
function usePartFilters(): readonly GridFilter[] {
  const bins = useQuery(binsQuery(allBins)).data?.items;
  return useMemo(
    () => [
      ...ownFilters,
      { field: 'bin', label: 'Bin', options: (bins ?? []).map(({ code }) => ({ value: code, label: code })) },
    ],
    [bins],
  );
}

const allBins = { q: '', filters: {}, sort: 'code', page: 1, pageSize: 200 };

function OnShelf({ part }: { part: PartItem }): ReactElement {
  return (
    <span style={{ display: 'inline-flex', gap: 8, alignItems: 'center' }}>
      <Amount value={part.onShelf} measure={part.measure} />
      {part.held === '0' ? null : <Flag tone="tape">{part.held} held</Flag>}
    </span>
  );
}

function Free({ part }: { part: PartItem }): ReactElement {
  if (part.short !== null) return <Flag tone="hot">short {part.short}</Flag>;
  return (
    <span style={{ display: 'inline-flex', gap: 8, alignItems: 'center' }}>
      <Quantity value={part.free} />
      {part.belowReorderPoint ? <Flag tone="tape">order</Flag> : null}
    </span>
  );
}

function partColumns(currency: string | undefined): readonly GridColDef<PartItem>[] {
  const money: GridColDef<PartItem>[] = currency
    ? [
        {
          ...column<PartItem>(
            'averageCost',
            'Average cost',
            (part) =>
              part.averageCost ? (
                <UnitCost cost={part.averageCost} currency={currency} unit={costUnitOf(part.measure)} />
              ) : null,
            { flex: 0, width: 170 },
          ),
          align: 'right',
          headerAlign: 'right',
        },
      ]
    : [];
  return [
    tagColumn('code', 'Part', 'part', (part) => ({ code: part.code, story: part.name }), { width: 190 }),
    column('name', 'What it is', (part) => part.name, { minWidth: 220 }),
    {
      ...column<PartItem>('onShelf', 'On the shelf', (part) => <OnShelf part={part} />, { flex: 0, width: 200 }),
      align: 'right',
      headerAlign: 'right',
    },
    quantityColumn('claimed', 'Claimed', (part) => ({ value: part.claimed })),
    {
      ...column<PartItem>('free', 'Free', (part) => <Free part={part} />, { flex: 0, width: 150, sortable: false }),
      align: 'right',
      headerAlign: 'right',
    },
    column('lasts', 'Lasts', (part) => <Coverage days={part.lastsDays} />, { sortable: false, minWidth: 190 }),
    column('bins', 'Bins', (part) => part.bins.join(', '), { sortable: false }),
    column('traced', 'Followed', (part) => tracedWords[part.traced] ?? part.traced, { sortable: false }),
    quantityColumn('reorderPoint', 'Order below', (part) =>
      part.reorderPoint ? { value: part.reorderPoint } : undefined,
    ),
    ...money,
  ];
}

export function Component(): ReactElement {
  const filters = usePartFilters();
  const grid = useServerGrid({ name: 'parts', query: partsQuery, filters, defaultSort: 'code', defaultPageSize: 50 });
  const person = usePerson();
  const currency = useQuery(sessionQuery).data?.shop?.currency;
  const seesMoney = person?.role !== 'assembler';
  const short = useQuery(queueQuery).data?.shortPartCount;
  const columns = useMemo(() => partColumns(seesMoney ? currency : undefined), [seesMoney, currency]);
  return (
    <>
      <PageHeading
        title="Parts"
        lead={short ? `${capital(numberWord(short))} ${short === 1 ? 'runs' : 'run'} short.` : undefined}
        actions={
          person?.role === 'owner' ? (
            <Button variant="contained" component={Link} to="/shelf/parts/new">
              Add a part
            </Button>
          ) : null
        }
      />
      <ServerGrid
        grid={grid}
        label="Parts"
        counted={['part', 'parts']}
        rowId={(part) => part.code}
        rowHref={(part) => partAddress(part.code)}
        columns={columns}
        hiddenAtFirst={['bins', 'traced', 'reorderPoint']}
        searchLabel="Code, name or parameter"
        empty={
          <EmptyState
            title="No parts yet"
            action={
              person?.role === 'owner' ? (
                <>
                  <Button variant="contained" component={Link} to="/shelf/parts/new">
                    Add a part
                  </Button>
                  <Button component={Link} to="/shelf/imports/parts">
                    Take them in from a CSV file
                  </Button>
                </>
              ) : null
            }
          >
            A part is anything that can lie on the shelf: bought, made, a kit or a finished tool.
          </EmptyState>
        }
      />
    </>
  );
}

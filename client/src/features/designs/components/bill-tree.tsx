import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState, type ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { VisuallyHidden } from '../../../components/visually-hidden';
import { treeQuery, type BillTree, type RevisionPlace } from '../api/bills';
import { DenseTable, type DenseColumn } from './dense-table';
import { unitOf } from './design-words';

const columns: readonly DenseColumn[] = [
  { key: 'part', title: 'Part' },
  { key: 'what', title: 'What it is' },
  { key: 'per', title: 'For one of what holds it', figure: true },
  { key: 'quantity', title: 'For one in all', figure: true },
  { key: 'marks', title: 'Marks' },
];

const totalColumns: readonly DenseColumn[] = [
  { key: 'part', title: 'Part' },
  { key: 'what', title: 'What it is' },
  { key: 'how', title: 'Comes by' },
  { key: 'quantity', title: 'For one in all', figure: true },
];

type Row = BillTree['rows'][number];

const keyOf = (path: readonly number[]): string => path.join('.');

/** A bill over all levels: every place beneath what holds it, and each part summed. */
export function BillTreeView({ place }: { place: RevisionPlace }): ReactElement {
  const tree = useQuery(treeQuery(place));
  if (tree.isError) return <ErrorState error={tree.error} onRetry={() => void tree.refetch()} what="The tree" />;
  if (tree.isPending) return <LoadingState label="Loading the tree" />;
  return (
    <>
      <Places rows={tree.data.rows} />
      <div style={{ marginTop: 28 }}>
        <Sheet title="Each part summed" bare level={3}>
          <Totals totals={tree.data.totals} />
        </Sheet>
      </div>
    </>
  );
}

function Places({ rows }: { rows: readonly Row[] }): ReactElement {
  const [closed, setClosed] = useState<ReadonlySet<string>>(new Set());
  const holders = useMemo(() => new Set(rows.map(({ path }) => keyOf(path.slice(0, -1)))), [rows]);
  const shown = rows.filter(
    ({ path }) => !path.slice(0, -1).some((_, depth) => closed.has(keyOf(path.slice(0, depth + 1)))),
  );
  const turn = (key: string): void => {
    const next = new Set(closed);
    if (!next.delete(key)) next.add(key);
    setClosed(next);
  };
  return (
    <DenseTable label="Every place, over all levels" columns={columns}>
      {shown.map((row) => {
        const key = keyOf(row.path);
        return (
          <tr key={key}>
            <td>
              <span style={{ display: 'inline-flex', alignItems: 'center', paddingLeft: (row.level - 1) * 26 }}>
                {holders.has(key) ? (
                  <Button
                    size="small"
                    variant="text"
                    sx={{ minWidth: 0, padding: '0 6px' }}
                    aria-expanded={!closed.has(key)}
                    aria-label={`What ${row.part.code} is made of, at ${key}`}
                    onClick={() => turn(key)}
                  >
                    {closed.has(key) ? '▸' : '▾'}
                  </Button>
                ) : (
                  <span aria-hidden="true" style={{ display: 'inline-block', width: 22 }} />
                )}
                <VisuallyHidden>level {row.level}, </VisuallyHidden>
                <Tag kind="part" code={row.part.code} story={row.part.name} />
              </span>
            </td>
            <td className="what">
              {row.part.name}
              {row.alternates.length > 0 ? <span className="quiet"> or {row.alternates.join(', ')}</span> : null}
            </td>
            <td className="figure quiet">
              <Quantity value={row.quantityPer} unit={unitOf(row.part.measure)} />
            </td>
            <td className="figure">
              <Quantity value={row.quantity} unit={unitOf(row.part.measure)} />
            </td>
            <td>{row.marks}</td>
          </tr>
        );
      })}
    </DenseTable>
  );
}

function Totals({ totals }: { totals: BillTree['totals'] }): ReactElement {
  return (
    <DenseTable label="Each part summed" columns={totalColumns}>
      {totals.map(({ part, quantity, made }) => (
        <tr key={part.code}>
          <td>
            <Tag kind="part" code={part.code} story={part.name} />
          </td>
          <td className="what">{part.name}</td>
          <td className="quiet">{made ? 'being made' : 'being bought'}</td>
          <td className="figure">
            <Quantity value={quantity} unit={unitOf(part.measure)} />
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}

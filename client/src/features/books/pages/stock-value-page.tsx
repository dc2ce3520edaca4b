import type { ReactElement } from 'react';
import { column, moneyColumn, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { Money } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { stockValueQuery, type StockValueRow } from '../api/books';

const columns = [
  tagColumn<StockValueRow>('part', 'Part', 'part', ({ part, name }) => ({ code: part, story: name })),
  column<StockValueRow>('name', 'Name', ({ name }) => name, { minWidth: 200, sortable: false }),
  column<StockValueRow>('account', 'Account', ({ account }) => account, { flex: 0, width: 100, sortable: false }),
  quantityColumn<StockValueRow>(
    'quantity',
    'On the shelf',
    ({ quantity, measure }) => ({ value: quantity, unit: measure }),
    { sortable: false },
  ),
  moneyColumn<StockValueRow>('value', 'Value', ({ value }) => value, { sortable: false }),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'stock-value', query: stockValueQuery });
  const { answer } = grid;
  const same = answer?.shelfValue.amount === answer?.accountsBalance.amount;
  return (
    <>
      <PageHeading
        title="Stock value today"
        lead={
          answer ? (
            <>
              The shelf is worth <Money value={answer.shelfValue} />; the stock accounts carry{' '}
              <Money value={answer.accountsBalance} />. {same ? 'They agree.' : 'They differ: run the doctor.'}
            </>
          ) : undefined
        }
      />
      <ServerGrid
        grid={grid}
        label="Stock value by part"
        counted={['part', 'parts']}
        rowId={({ part }) => part}
        columns={columns}
        empty={<EmptyState title="Nothing lies on the shelf">The first delivery brings the first value.</EmptyState>}
      />
    </>
  );
}

import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { column, dayColumn, moneyColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { formatMoney } from '../../../lib/format-money';
import { journalQuery, type EntryRow } from '../api/books';

const accounts = [
  ['1200', 'Trade receivables'],
  ['1250', 'Card processor clearing'],
  ['1310', 'Parts and materials'],
  ['1320', 'Work in progress'],
  ['1330', 'Finished units'],
  ['2100', 'Goods received, not invoiced'],
  ['2200', 'VAT on sales'],
  ['2300', 'Customer prepayments'],
  ['3100', 'Opening balances'],
  ['4000', 'Sales'],
  ['4050', 'Delivery charged'],
  ['5000', 'Cost of sales'],
  ['5100', 'Bench labour absorbed'],
  ['5200', 'Stock differences'],
  ['5300', 'Scrap and abnormal loss'],
  ['6100', 'Payment processing fees'],
] as const;

const filters: readonly GridFilter[] = [
  {
    field: 'account',
    label: 'Account',
    options: accounts.map(([value, name]) => ({ value, label: `${value} ${name}` })),
  },
  { field: 'from', label: 'From', kind: 'day' },
  { field: 'to', label: 'To', kind: 'day' },
];

const Lines = styled('ul')(({ theme }) => ({
  listStyle: 'none',
  margin: '6px 0',
  padding: 0,
  lineHeight: 1.5,
  fontVariantNumeric: 'tabular-nums',
  whiteSpace: 'normal',
  '& .side': { color: theme.vars.palette.tone.inkSoft },
}));

function EntryLines({ entry }: { entry: EntryRow }): ReactElement {
  return (
    <Lines>
      {entry.lines.map(({ account, accountName, debit, credit }) => (
        <li key={`${account} ${debit ? 'debit' : 'credit'}`}>
          <span className="side">{debit ? 'debit' : 'credit'}</span> {account} {accountName}{' '}
          {formatMoney(debit ?? credit ?? entry.total)}
        </li>
      ))}
    </Lines>
  );
}

const columns = [
  dayColumn<EntryRow>('day', 'Day', ({ day }) => day),
  column<EntryRow>('document', 'Document', ({ document }) => document, { flex: 0, width: 150 }),
  column<EntryRow>('narrative', 'What happened', ({ narrative }) => narrative, { sortable: false, minWidth: 200 }),
  column<EntryRow>('lines', 'Accounts', (entry) => <EntryLines entry={entry} />, { sortable: false, minWidth: 360 }),
  moneyColumn<EntryRow>('total', 'Amount', ({ total }) => total, { sortable: false }),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'journal', query: journalQuery, filters, defaultSort: '-day' });
  return (
    <>
      <PageHeading
        title="Journal"
        lead="One balanced entry for each event with a value. Nothing here can be changed."
      />
      <ServerGrid
        grid={grid}
        label="Journal entries"
        counted={['entry', 'entries']}
        rowId={({ id }) => id}
        columns={columns}
        empty={<EmptyState title="No entries yet">The first delivery or payment posts the first one.</EmptyState>}
      />
    </>
  );
}

import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { column, quantityColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { billsQuery, type BillListItem } from '../api/bills';
import { billAddress } from '../components/addresses';

const filters: readonly GridFilter[] = [
  {
    field: 'state',
    label: 'State',
    options: [
      { value: 'released', label: 'in force' },
      { value: 'draft', label: 'with a draft' },
      { value: 'unreleased', label: 'never released' },
    ],
  },
];

const columns = [
  column<BillListItem>(
    'code',
    'Part',
    ({ code, name }) => <Tag kind="part" code={code} story={name} to={billAddress(code)} />,
    { width: 190, flex: 0, hideable: false },
  ),
  column<BillListItem>(
    'name',
    'What it is',
    ({ name, retired }) => (
      <>
        {name} {retired ? <Flag tone="hot">retired</Flag> : null}
      </>
    ),
    { minWidth: 200 },
  ),
  column<BillListItem>(
    'released',
    'In force',
    ({ released }) => (released === null ? <Flag tone="cool">not yet</Flag> : `revision ${released}`),
    { flex: 0, width: 120 },
  ),
  column<BillListItem>('releasedAt', 'Since', ({ releasedAt }) => (releasedAt ? <When instant={releasedAt} /> : null), {
    flex: 0,
    width: 140,
  }),
  column<BillListItem>(
    'draft',
    'Draft',
    ({ draft }) => (draft === null ? null : <Flag tone="tape">revision {draft}</Flag>),
    { flex: 0, width: 140 },
  ),
  quantityColumn<BillListItem>('lines', 'Lines', ({ lines }) => ({ value: String(lines) }), { width: 90 }),
  quantityColumn<BillListItem>('minutes', 'Work', ({ minutes }) => ({ value: minutes, unit: 'min' }), { width: 110 }),
  quantityColumn<BillListItem>('usedIn', 'Used in', ({ usedIn }) => ({ value: String(usedIn) }), { width: 100 }),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'bills', query: billsQuery, filters, defaultSort: 'code', defaultPageSize: 50 });
  const owner = usePerson()?.role === 'owner';
  const start = owner ? (
    <Button variant="contained" component={Link} to="/designs/bills/new">
      Start a bill
    </Button>
  ) : undefined;
  return (
    <>
      <PageHeading title="Bills" lead="What is made, of what, how, and what it is tested for." actions={start} />
      <ServerGrid
        grid={grid}
        label="Bills"
        counted={['bill', 'bills']}
        columns={columns}
        rowId={({ code }) => code}
        rowHref={({ code }) => billAddress(code)}
        empty={
          <EmptyState title="No bills yet" action={start}>
            A bill says what one part is made of. Start with the part that goes into the others.
          </EmptyState>
        }
      />
    </>
  );
}

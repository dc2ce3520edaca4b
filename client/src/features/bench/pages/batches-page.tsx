import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Flag } from '../../../components/flag';
import { column, dayColumn, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Strip } from '../../../components/strip/strip';
import { batchesQuery, type BatchItem } from '../api/bench';
import { batchAddress } from '../components/addresses';
import { batchStatusWords } from '../components/bench-words';

const filters: readonly GridFilter[] = [
  {
    field: 'status',
    label: 'State',
    options: Object.entries(batchStatusWords).map(([value, label]) => ({ value, label })),
  },
];

const columns = [
  tagColumn<BatchItem>('number', 'Batch', 'batch', ({ number, quantity, part }) => ({
    code: number,
    story: `${quantity} ${part.name}`,
  })),
  column<BatchItem>('part', 'What', ({ part }) => part.name, { minWidth: 180 }),
  quantityColumn<BatchItem>('quantity', 'Pieces', ({ quantity }) => ({ value: String(quantity) }), { width: 90 }),
  quantityColumn<BatchItem>('finished', 'Finished', ({ finished }) => ({ value: String(finished) }), {
    width: 100,
    sortable: false,
  }),
  column<BatchItem>('status', 'State', ({ status }) => batchStatusWords[status], {
    flex: 0,
    width: 110,
    sortable: false,
  }),
  dayColumn<BatchItem>('dueOn', 'Due', ({ dueOn }) => dueOn),
  column<BatchItem>('late', '', ({ late }) => (late ? <Flag tone="hot">late</Flag> : null), {
    flex: 0,
    width: 90,
    sortable: false,
  }),
  column<BatchItem>(
    'units',
    'How far',
    ({ number, units }) => (units.length > 0 ? <Strip label={`Batch ${number}`} units={units} /> : null),
    { minWidth: 240, sortable: false },
  ),
];

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'batches',
    query: batchesQuery,
    filters,
    defaultSort: '-number',
    defaultPageSize: 25,
  });
  const owner = usePerson()?.role === 'owner';
  const plan = owner ? (
    <Button variant="contained" component={Link} to="/bench/batches/new">
      Plan a batch
    </Button>
  ) : undefined;
  return (
    <>
      <PageHeading title="Batches" lead="Everything that was, is or will be built together." actions={plan} />
      <ServerGrid
        grid={grid}
        label="Batches"
        counted={['batch', 'batches']}
        columns={columns}
        rowId={({ number }) => number}
        rowHref={({ number }) => batchAddress(number)}
        empty={
          <EmptyState title="No batches yet" action={plan}>
            A batch builds a number of pieces of one part. Its bill must be released first.
          </EmptyState>
        }
      />
    </>
  );
}

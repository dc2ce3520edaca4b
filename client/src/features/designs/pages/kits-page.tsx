import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Flag } from '../../../components/flag';
import { column, quantityColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { kitsQuery, type KitListItem } from '../api/kits';
import { kitAddress } from '../components/addresses';

const columns = [
  column<KitListItem>(
    'code',
    'Kit',
    ({ code, name }) => <Tag kind="part" code={code} story={name} to={kitAddress(code)} />,
    { width: 190, flex: 0, hideable: false },
  ),
  column<KitListItem>('name', 'What it is', ({ name }) => name, { minWidth: 200 }),
  quantityColumn<KitListItem>('lines', 'Lines', ({ lines }) => ({ value: String(lines) }), { width: 90 }),
  quantityColumn<KitListItem>('bags', 'Bags', ({ bags }) => ({ value: String(bags) }), { width: 90 }),
  quantityColumn<KitListItem>('weight', 'Should weigh', ({ weightG }) => ({ value: weightG, unit: 'g' }), {
    width: 140,
    sortable: false,
  }),
  column<KitListItem>(
    'unweighed',
    'Weights',
    ({ unweighed }) =>
      unweighed === 0 ? <Flag tone="sound">all known</Flag> : <Flag tone="tape">{unweighed} not known</Flag>,
    { flex: 0, width: 150, sortable: false },
  ),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'kits', query: kitsQuery, defaultSort: 'code', defaultPageSize: 50 });
  const owner = usePerson()?.role === 'owner';
  const start = owner ? (
    <Button variant="contained" component={Link} to="/designs/bills/new?as=kit">
      Start a contents list
    </Button>
  ) : undefined;
  return (
    <>
      <PageHeading title="Kits" lead="What goes into which bag, and what it should weigh." actions={start} />
      <ServerGrid
        grid={grid}
        label="Kits"
        counted={['kit', 'kits']}
        columns={columns}
        rowId={({ code }) => code}
        rowHref={({ code }) => kitAddress(code)}
        empty={
          <EmptyState title="No kits yet" action={start}>
            A part becomes a kit by its contents list.
          </EmptyState>
        }
      />
    </>
  );
}

import type { ReactElement } from 'react';
import { Flag } from '../../../components/flag';
import { column, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { unitsQuery, type UnitItem } from '../api/bench';
import { unitAddress } from '../components/addresses';
import { unitStateWords } from '../components/bench-words';

const filters: readonly GridFilter[] = [
  {
    field: 'state',
    label: 'Where',
    options: Object.entries(unitStateWords).map(([value, label]) => ({ value, label })),
  },
];

const columns = [
  tagColumn<UnitItem>('serial', 'Unit', 'unit', ({ serial, partName }) => ({ code: serial, story: partName }), {
    width: 210,
  }),
  column<UnitItem>('part', 'What', ({ partName }) => partName, { minWidth: 180 }),
  tagColumn<UnitItem>('batch', 'Batch', 'batch', ({ batch }) => ({ code: batch }), { width: 130, sortable: false }),
  column<UnitItem>(
    'sound',
    'Measured',
    ({ sound, state }) =>
      sound ? <Flag tone="sound">sound</Flag> : state === 'scrapped' ? null : <Flag tone="cool">no pass</Flag>,
    { flex: 0, width: 110, sortable: false },
  ),
  column<UnitItem>('state', 'Where', ({ state, bin }) => (bin ? `on the shelf, ${bin}` : unitStateWords[state]), {
    minWidth: 160,
    sortable: false,
  }),
  whenColumn<UnitItem>('issuedAt', 'Begun', ({ issuedAt }) => issuedAt),
];

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'units',
    query: unitsQuery,
    filters,
    defaultSort: '-issuedAt',
    defaultPageSize: 50,
  });
  return (
    <>
      <PageHeading title="Units" lead="Every serial number that was issued, and what became of it." />
      <ServerGrid
        grid={grid}
        label="Units"
        counted={['unit', 'units']}
        columns={columns}
        rowId={({ id }) => id}
        rowHref={({ serial }) => unitAddress(serial)}
        empty={
          <EmptyState title="No units yet">
            Serial numbers are issued when building of a batch starts. Plan a batch and pick its parts first.
          </EmptyState>
        }
      />
    </>
  );
}

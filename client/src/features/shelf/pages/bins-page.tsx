import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Flag } from '../../../components/flag';
import { column, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { binsQuery, type BinItem } from '../api/bins';

const filters: readonly GridFilter[] = [
  { field: 'quarantine', label: 'Quarantine' },
  { field: 'retired', label: 'Out of use too' },
];

const columns: readonly GridColDef<BinItem>[] = [
  tagColumn('code', 'Bin', 'bin', (bin) => ({ code: bin.code, story: bin.name || undefined }), { width: 170 }),
  column('name', 'Where it is', (bin) => bin.name, { minWidth: 220 }),
  column(
    'kind',
    'What for',
    (bin) =>
      bin.retired ? <Flag tone="cool">out of use</Flag> : bin.quarantine ? <Flag tone="tape">quarantine</Flag> : null,
    { sortable: false, flex: 0, width: 140 },
  ),
  quantityColumn('partCount', 'Parts', (bin) => ({ value: String(bin.partCount) })),
  quantityColumn('lotCount', 'Lots', (bin) => ({ value: String(bin.lotCount) })),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'bins', query: binsQuery, filters, defaultSort: 'code', defaultPageSize: 50 });
  const owner = usePerson()?.role === 'owner';
  const add = (
    <Button variant="contained" component={Link} to="/shelf/bins/new">
      Add a bin
    </Button>
  );
  return (
    <>
      <PageHeading
        title="Bins"
        lead="The places on the shelf. Scan a bin’s code to see what lies in it."
        actions={owner ? add : null}
      />
      <ServerGrid
        grid={grid}
        label="Bins"
        counted={['bin', 'bins']}
        rowId={(bin) => bin.code}
        rowHref={(bin) => `/shelf/bins/${encodeURIComponent(bin.code)}`}
        columns={columns}
        searchLabel="Code or place"
        empty={
          <EmptyState title="No bins yet" action={owner ? add : null}>
            Name the drawers and boxes of the shelf first; everything lies in one of them.
          </EmptyState>
        }
      />
    </>
  );
}

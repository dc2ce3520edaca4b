import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { column, dayColumn, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { suppliersQuery, type SupplierItem } from '../api/suppliers';

const columns: readonly GridColDef<SupplierItem>[] = [
  tagColumn('code', 'Supplier', 'supplier', (row) => ({ code: row.code, story: row.name }), { width: 190 }),
  column('name', 'Name', (row) => row.name, { minWidth: 220 }),
  column('countryCode', 'Country', (row) => row.countryCode ?? '', { sortable: false, flex: 0, width: 110 }),
  quantityColumn(
    'leadTimeDays',
    'Lead time',
    (row) => (row.leadTimeDays === null ? undefined : { value: String(row.leadTimeDays), unit: 'days' }),
    { sortable: false },
  ),
  quantityColumn('partCount', 'Parts', (row) => ({ value: String(row.partCount) })),
  dayColumn('lastReceivedOn', 'Last delivery', (row) => row.lastReceivedOn),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'suppliers', query: suppliersQuery, defaultSort: 'code', defaultPageSize: 50 });
  const owner = usePerson()?.role === 'owner';
  const add = (
    <Button variant="contained" component={Link} to="/shelf/suppliers/new">
      Add a supplier
    </Button>
  );
  return (
    <>
      <PageHeading title="Suppliers" actions={owner ? add : null} />
      <ServerGrid
        grid={grid}
        label="Suppliers"
        counted={['supplier', 'suppliers']}
        rowId={(row) => row.code}
        rowHref={(row) => `/shelf/suppliers/${encodeURIComponent(row.code)}`}
        columns={columns}
        searchLabel="Code or name"
        empty={
          <EmptyState title="No suppliers yet" action={owner ? add : null}>
            Deliveries come from somebody: add them here, or take them in with the parts.
          </EmptyState>
        }
      />
    </>
  );
}

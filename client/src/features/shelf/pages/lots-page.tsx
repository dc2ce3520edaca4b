import type { GridColDef } from '@mui/x-data-grid';
import type { ReactElement } from 'react';
import { unitOf } from '../components/amount';
import { column, dayColumn, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { lotsQuery, type LotItem } from '../api/lots';
import { lotAddress } from '../components/addresses';
import { LotStatusFlag } from '../components/lot-status-flag';
import { lotStatusWords } from '../components/shelf-words';

const filters: readonly GridFilter[] = [
  {
    field: 'status',
    label: 'Status',
    options: Object.entries(lotStatusWords).map(([value, label]) => ({ value, label })),
  },
  { field: 'expiring', label: 'Expires soon' },
  { field: 'used', label: 'Used up too' },
];

const columns: readonly GridColDef<LotItem>[] = [
  tagColumn('code', 'Lot', 'lot', (lot) => ({ code: lot.code, story: lot.name }), { width: 150 }),
  tagColumn('part', 'Part', 'part', (lot) => ({ code: lot.part, story: lot.name }), { width: 190 }),
  column('name', 'What it is', (lot) => lot.name, { minWidth: 200, sortable: false }),
  column('status', 'May be used', (lot) => <LotStatusFlag status={lot.status} expired={lot.expired} />, {
    flex: 0,
    width: 140,
    sortable: false,
  }),
  quantityColumn('quantity', 'On the shelf', (lot) => ({ value: lot.quantity, unit: unitOf(lot.measure) })),
  column('bins', 'Bins', (lot) => lot.bins.join(', '), { sortable: false }),
  column('supplier', 'From', (lot) => lot.supplier ?? '', { sortable: false }),
  column('supplierLot', 'Supplier’s lot', (lot) => lot.supplierLot ?? '', { sortable: false }),
  dayColumn('receivedOn', 'Received', (lot) => lot.receivedOn),
  dayColumn('expiresOn', 'Expires', (lot) => lot.expiresOn),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'lots', query: lotsQuery, filters, defaultSort: '-code', defaultPageSize: 50 });
  return (
    <>
      <PageHeading title="Lots" lead="Each delivery of a part, with where it came from and where it went." />
      <ServerGrid
        grid={grid}
        label="Lots"
        counted={['lot', 'lots']}
        rowId={(lot) => lot.code}
        rowHref={(lot) => lotAddress(lot.code)}
        columns={columns}
        hiddenAtFirst={['supplierLot']}
        searchLabel="Lot, supplier’s lot or part"
        empty={
          <EmptyState title="No lots on the shelf">
            A lot comes with a delivery, with opening stock, or when something is finished.
          </EmptyState>
        }
      />
    </>
  );
}

import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { useMemo, type ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Flag } from '../../../components/flag';
import { column, dayColumn, moneyColumn, quantityColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { deliveriesQuery, type DeliveryItem } from '../api/stock';
import { receiveAddress } from '../components/addresses';
import { DocumentTag } from '../components/document-tag';

function deliveryColumns(money: boolean): readonly GridColDef<DeliveryItem>[] {
  return [
    column('number', 'Delivery', (row) => <DocumentTag number={row.number} kind="receipt" note={row.deliveryNote} />, {
      flex: 0,
      width: 130,
      hideable: false,
    }),
    dayColumn('receivedOn', 'Received', (row) => row.receivedOn),
    tagColumn('supplier', 'From', 'supplier', (row) => ({ code: row.supplier, story: row.supplierName }), {
      width: 180,
    }),
    column('supplierName', 'Name', (row) => row.supplierName, { sortable: false, minWidth: 180 }),
    column('deliveryNote', 'Delivery note', (row) => row.deliveryNote ?? '', { sortable: false }),
    quantityColumn('lineCount', 'Lines', (row) => ({ value: String(row.lineCount) })),
    ...(money ? [moneyColumn<DeliveryItem>('value', 'Value', (row) => row.value)] : []),
    column('reversedBy', 'State', (row) => (row.reversedBy ? <Flag tone="tape">taken back</Flag> : null), {
      sortable: false,
      flex: 0,
      width: 130,
    }),
  ];
}

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'deliveries',
    query: deliveriesQuery,
    defaultSort: '-receivedOn',
    defaultPageSize: 50,
  });
  const role = usePerson()?.role;
  const columns = useMemo(() => deliveryColumns(role !== 'assembler'), [role]);
  const receive = (
    <Button variant="contained" component={Link} to={receiveAddress({})}>
      Receive a delivery
    </Button>
  );
  return (
    <>
      <PageHeading title="Deliveries" actions={role === 'owner' ? receive : null} />
      <ServerGrid
        grid={grid}
        label="Deliveries"
        counted={['delivery', 'deliveries']}
        rowId={(row) => row.number}
        rowHref={(row) => `/shelf/deliveries/${encodeURIComponent(row.number)}`}
        columns={columns}
        searchLabel="Number, delivery note or supplier"
        empty={
          <EmptyState title="No deliveries yet" action={role === 'owner' ? receive : null}>
            What suppliers bring is received here, line by line, into lots and bins.
          </EmptyState>
        }
      />
    </>
  );
}

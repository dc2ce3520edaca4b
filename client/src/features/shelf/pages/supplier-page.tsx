import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { DenseTable } from '../../../components/dense-table';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { formatCount } from '../../../lib/format-quantity';
import { formatDay } from '../../../lib/format-time';
import { supplierQuery, type Supplier } from '../api/suppliers';
import { receiveAddress } from '../components/addresses';
import { DocumentTag } from '../components/document-tag';
import { Columns, Loaded } from '../components/page-body';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  return (
    <Loaded query={useQuery(supplierQuery(code))} what="The supplier">
      {(supplier) => <SupplierStory supplier={supplier} />}
    </Loaded>
  );
}

function SupplierStory({ supplier }: { supplier: Supplier }): ReactElement {
  const owner = usePerson()?.role === 'owner';
  return (
    <>
      <PageHeading
        title={supplier.name}
        tags={<Tag kind="supplier" code={supplier.code} size="big" to={null} />}
        lead={`${formatCount(supplier.parts.length, 'part')} can be bought here.`}
        actions={
          owner ? (
            <>
              <Button component={Link} to={`/shelf/suppliers/${encodeURIComponent(supplier.code)}/edit`}>
                Edit
              </Button>
              <Button variant="contained" component={Link} to={receiveAddress({ supplier: supplier.code })}>
                Receive a delivery
              </Button>
            </>
          ) : null
        }
      />
      <Columns>
        <div>
          <Sheet title="What can be bought here">
            <Parts supplier={supplier} />
          </Sheet>
          <Sheet title="Deliveries">
            <Deliveries supplier={supplier} />
          </Sheet>
        </div>
        <div>
          <Sheet title="How to reach them">
            <DefinitionList
              items={[
                {
                  term: 'E-mail address',
                  value: supplier.email ? <a href={`mailto:${supplier.email}`}>{supplier.email}</a> : undefined,
                },
                { term: 'Telephone', value: supplier.phone ?? undefined },
                { term: 'Country', value: supplier.countryCode ?? undefined },
                { term: 'Bills in', value: supplier.currency },
                {
                  term: 'Lead time',
                  value:
                    typeof supplier.leadTimeDays === 'number' ? formatCount(supplier.leadTimeDays, 'day') : undefined,
                },
                { term: 'Note', value: supplier.note ?? undefined },
              ]}
            />
          </Sheet>
        </div>
      </Columns>
    </>
  );
}

function Parts({ supplier }: { supplier: Supplier }): ReactElement {
  if (supplier.parts.length === 0) return <p>No part names them yet.</p>;
  return (
    <DenseTable
      label="Parts"
      columns={[
        { key: 'part', title: 'Part' },
        { key: 'name', title: 'What it is' },
        { key: 'code', title: 'Their code' },
        { key: 'lead', title: 'Lead time', figure: true },
        { key: 'first', title: '' },
      ]}
    >
      {supplier.parts.map((part) => (
        <tr key={part.code}>
          <td>
            <Tag kind="part" code={part.code} story={part.name} />
          </td>
          <td className="what">{part.name}</td>
          <td>{part.supplierPartCode ?? ''}</td>
          <td className="figure">{part.leadTimeDays === null ? '' : formatCount(part.leadTimeDays, 'day')}</td>
          <td>{part.preferred ? <Flag tone="sound">order here first</Flag> : null}</td>
        </tr>
      ))}
    </DenseTable>
  );
}

function Deliveries({ supplier }: { supplier: Supplier }): ReactElement {
  if (supplier.deliveries.length === 0) return <p>Nothing has come from them yet.</p>;
  return (
    <DenseTable
      label="Deliveries"
      columns={[
        { key: 'number', title: 'Delivery' },
        { key: 'day', title: 'Received' },
        { key: 'note', title: 'Delivery note' },
        { key: 'lots', title: 'Lots', figure: true },
      ]}
    >
      {supplier.deliveries.map((delivery) => (
        <tr key={delivery.number}>
          <td>
            <DocumentTag number={delivery.number} kind="receipt" />
          </td>
          <td>{formatDay(delivery.receivedOn)}</td>
          <td>{delivery.deliveryNote ?? ''}</td>
          <td className="figure">{delivery.lotCount}</td>
        </tr>
      ))}
    </DenseTable>
  );
}

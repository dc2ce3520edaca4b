import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { DefinitionList } from '../../../components/definition-list';
import { DenseTable } from '../../../components/dense-table';
import { Money, Quantity, UnitCost } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { Tag } from '../../../components/tag/tag';
import { formatCount } from '../../../lib/format-quantity';
import { formatDay, formatDayShort } from '../../../lib/format-time';
import type { Part, PartStory } from '../api/parts';
import { transferAddress } from './addresses';
import { Coverage } from './coverage';
import { LotStatusFlag } from './lot-status-flag';
import { tracedWords } from './shelf-words';
import { Amount, costUnitOf } from './amount';

type Places = PartStory['places'];
type Claims = PartStory['claims'];
type Uses = PartStory['uses'];

interface PlacesTableProps {
  places: Places;
  measure: string;
  part: string;
  mayMove: boolean;
}

export function PlacesTable({ places, measure, part, mayMove }: PlacesTableProps): ReactElement {
  if (places.length === 0) return <p>Nothing of it lies on the shelf.</p>;
  const columns = [
    { key: 'bin', title: 'Bin' },
    { key: 'lot', title: 'Lot' },
    { key: 'status', title: 'May be used' },
    { key: 'from', title: 'From' },
    { key: 'expires', title: 'Expires' },
    { key: 'quantity', title: 'Quantity', figure: true },
    ...(mayMove ? [{ key: 'act', title: '' }] : []),
  ];
  return (
    <DenseTable label="Where it lies" columns={columns}>
      {places.map((place) => (
        <tr key={`${place.lot} ${place.bin}`}>
          <td>
            <Tag kind="bin" code={place.bin} /> {place.quarantine ? <Flag tone="tape">quarantine</Flag> : null}
          </td>
          <td>
            <Tag
              kind="lot"
              code={place.lot}
              story={place.supplierLot ? `Supplier’s lot ${place.supplierLot}` : undefined}
            />
          </td>
          <td>
            <LotStatusFlag status={place.status} expired={place.expired} />
          </td>
          <td>
            {place.supplier ?? ''}{' '}
            {place.receivedOn ? <span className="quiet">{formatDayShort(place.receivedOn)}</span> : null}
          </td>
          <td>{place.expiresOn ? formatDayShort(place.expiresOn) : ''}</td>
          <td className="figure">
            <Amount value={place.quantity} measure={measure} />
          </td>
          {mayMove ? (
            <td>
              <Button
                size="small"
                variant="text"
                component={Link}
                to={transferAddress({ part, lot: place.lot, bin: place.bin, quantity: place.quantity })}
                aria-label={`Move ${place.lot} out of ${place.bin}`}
              >
                Move
              </Button>
            </td>
          ) : null}
        </tr>
      ))}
    </DenseTable>
  );
}

export function ClaimsTable({ claims, measure }: { claims: Claims; measure: string }): ReactElement {
  if (claims.length === 0) return <p>Nobody waits for it.</p>;
  const columns = [
    { key: 'for', title: 'For' },
    { key: 'day', title: 'Needed' },
    { key: 'needed', title: 'Needs', figure: true },
    { key: 'claimed', title: 'Claims here', figure: true },
    { key: 'awaited', title: 'Awaits from a batch', figure: true },
    { key: 'missing', title: 'Missing', figure: true },
  ];
  return (
    <DenseTable label="Who claims it" columns={columns}>
      {claims.map((claim) => (
        <tr key={`${claim.reference} ${claim.needed} ${claim.claimed}`}>
          <td>
            <Tag kind={claim.kind === 'order_line' ? 'order' : 'batch'} code={claim.reference} />
          </td>
          <td>{claim.neededOn ? formatDayShort(claim.neededOn) : ''}</td>
          <td className="figure">
            <Amount value={claim.needed} measure={measure} />
          </td>
          <td className="figure">
            <Quantity value={claim.claimed} />
          </td>
          <td className="figure">{claim.awaited === '0' ? '' : <Quantity value={claim.awaited} />}</td>
          <td className="figure">{claim.missing === '0' ? '' : <Flag tone="hot">short {claim.missing}</Flag>}</td>
        </tr>
      ))}
    </DenseTable>
  );
}

const roleWords: Readonly<Record<string, string>> = {
  component: 'built into',
  alternate: 'may stand in',
  contents: 'packed in the kit',
};

export function UsesTable({ uses, measure }: { uses: Uses; measure: string }): ReactElement {
  if (uses.length === 0) return <p>No bill and no kit asks for it.</p>;
  return (
    <DenseTable
      label="Where it is used"
      columns={[
        { key: 'part', title: 'In' },
        { key: 'role', title: 'As' },
        { key: 'quantity', title: 'Each', figure: true },
      ]}
    >
      {uses.map((use) => (
        <tr key={`${use.part} ${use.revision ?? ''} ${use.role} ${use.quantity}`}>
          <td>
            <Tag kind="part" code={use.part} story={use.name} />{' '}
            {use.revision === null ? null : (
              <span className="quiet">
                revision {use.revision}, {use.status}
              </span>
            )}
          </td>
          <td>{roleWords[use.role] ?? use.role}</td>
          <td className="figure">
            <Amount value={use.quantity} measure={measure} />
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}

interface PartFiguresProps {
  figures: PartStory['figures'];
  part: Part;
  currency: string | undefined;
}

export function PartFigures({ figures, part, currency }: PartFiguresProps): ReactElement {
  const { measure } = part;
  const seesMoney = currency !== undefined && figures.averageCost !== undefined;
  return (
    <DefinitionList
      items={[
        { term: 'On the shelf', value: <Amount value={figures.onShelf} measure={measure} /> },
        { term: 'May be used', value: <Amount value={figures.usable} measure={measure} /> },
        {
          term: 'Held back',
          value: figures.held === '0' ? undefined : <Amount value={figures.held} measure={measure} />,
        },
        { term: 'Claimed', value: <Amount value={figures.claimed} measure={measure} /> },
        { term: 'Free', value: <Amount value={figures.free} measure={measure} /> },
        {
          term: 'Order below',
          value: part.reorderPoint ? <Amount value={part.reorderPoint} measure={measure} /> : undefined,
        },
        { term: 'Lasts', value: <Coverage days={figures.lastsDays} /> },
        {
          term: 'Average cost',
          value:
            seesMoney && figures.averageCost ? (
              <UnitCost cost={figures.averageCost} currency={currency} unit={costUnitOf(measure)} />
            ) : undefined,
        },
        { term: 'Worth', value: figures.value ? <Money value={figures.value} /> : undefined },
      ]}
    />
  );
}

export function PartFacts({ part }: { part: Part }): ReactElement {
  const { battery } = part;
  return (
    <>
      {part.description ? <p style={{ margin: '0 0 8px', whiteSpace: 'pre-line' }}>{part.description}</p> : null}
      <DefinitionList
        items={[
          { term: 'Followed', value: tracedWords[part.traced] ?? part.traced },
          { term: 'Serial numbers begin with', value: part.serialLetters ?? undefined },
          ...part.parameters.map(({ name, value, unit }) => ({ term: name, value: unit ? `${value} ${unit}` : value })),
          {
            term: 'Weight of one',
            value: part.unitWeightG ? <Quantity value={part.unitWeightG} unit="g" /> : undefined,
          },
          { term: 'Keeps for', value: part.shelfLifeDays ? formatCount(part.shelfLifeDays, 'day') : undefined },
          { term: 'Country of origin', value: part.originCountryCode ?? undefined },
          { term: 'Commodity code', value: part.commodityCode ?? undefined },
          ...part.suppliers.map((supplier) => ({
            term: supplier.preferred ? 'Order first from' : `Also from ${supplier.supplier}`,
            value: (
              <>
                <Tag kind="supplier" code={supplier.supplier} story={supplier.name} />{' '}
                {[supplier.supplierPartCode, supplier.leadTimeDays ? formatCount(supplier.leadTimeDays, 'day') : '']
                  .filter(Boolean)
                  .join(', ')}
              </>
            ),
          })),
          { term: 'Lithium', value: battery ? lithiumWords(battery) : undefined },
          {
            term: 'Transport test',
            value: battery ? (battery.transportTestReference ?? <Flag tone="tape">no test summary</Flag>) : undefined,
          },
          {
            term: 'Test passed on',
            value: battery?.transportTestPassedOn ? formatDay(battery.transportTestPassedOn) : undefined,
          },
        ]}
      />
    </>
  );
}

function lithiumWords(battery: NonNullable<Part['battery']>): string {
  const chemistry = battery.chemistry === 'lithium_ion' ? 'lithium-ion' : 'lithium metal';
  const size = battery.wattHours ? `${battery.wattHours} Wh` : `${battery.lithiumGrams ?? ''} g of lithium`;
  const cells = battery.cellCount ? `, ${formatCount(battery.cellCount, 'cell')}` : '';
  return `${chemistry} ${battery.kind}, ${size}${cells}`;
}

import { Decimal } from '@emberlot/shared/measure/decimal';
import { paperCaution, paperFacts, paperTable, type Paper, type PaperPart } from '../platform/pdf/paper.js';
import type { ParcelDto, ParcelNeedDto } from './parcel.dto.js';

/** What goes into the box: the contents by bag, with serial numbers, and the papers' words about lithium. No prices. */
export function packingSlip(
  parcel: ParcelDto,
  shop: { readonly name: string; readonly email: string },
  at: Date,
): Paper {
  return {
    title: `Packing slip ${parcel.number}`,
    from: shop.name,
    madeAt: at,
    foot: `${shop.name} · ${shop.email}`,
    parts: [
      paperFacts([
        ['Order', parcel.order],
        ['To', parcel.address.join(', ')],
        ['Carrier', parcel.carrier ?? ''],
        ['Weight', parcel.weightG === null ? '' : `${parcel.weightG} g`],
      ]),
      ...bagsOf(parcel.needs).flatMap(([bag, needs]) => bagPart(bag, needs, parcel)),
      ...lithiumParts(parcel),
      ...parcel.cautions.map(paperCaution),
    ],
  };
}

function bagsOf(needs: readonly ParcelNeedDto[]): readonly (readonly [string, readonly ParcelNeedDto[]])[] {
  const bags = new Map<string, ParcelNeedDto[]>();
  for (const need of needs) {
    const head = need.bag === null ? need.title : `${need.title}, bag ${need.bag}`;
    bags.set(head, [...(bags.get(head) ?? []), need]);
  }
  return [...bags];
}

function bagPart(head: string, needs: readonly ParcelNeedDto[], parcel: ParcelDto): readonly PaperPart[] {
  const serialsOf = (need: ParcelNeedDto) =>
    parcel.items.flatMap(({ needId, serial }) => (needId === need.id && serial !== null ? [serial] : [])).join(', ');
  return [
    { text: head, bold: true, margin: [0, 10, 0, 0] },
    paperTable(
      [
        { head: 'Part', width: 90 },
        { head: 'What', width: '*' },
        { head: 'Serial number', width: 120 },
        { head: 'Quantity', width: 60, right: true },
      ],
      needs.map((need) => [
        need.part,
        need.partName,
        serialsOf(need),
        `${new Decimal(need.quantity).toFixed()} ${need.measure}`,
      ]),
    ),
  ];
}

function lithiumParts({ lithium }: ParcelDto): readonly PaperPart[] {
  if (lithium.answer === 'no_lithium') return [];
  const lines = [
    lithium.sentence,
    ...lithium.rules.map(({ unNumber, properName, instruction }) => `${unNumber}, ${properName}: ${instruction}`),
    ...(lithium.mark === null ? [] : [lithium.mark]),
    ...lithium.papers,
    ...(lithium.carrierAnswer === null ? [] : [`The carrier answered. ${lithium.carrierAnswer}`]),
  ];
  return [
    { text: 'Lithium', bold: true, margin: [0, 10, 0, 2] },
    ...lines.map((text) => ({ text })),
    ...(lithium.edition === null ? [] : [{ text: `By ${lithium.edition}.`, color: '#55625c' }]),
    paperCaution(lithium.caution),
  ];
}

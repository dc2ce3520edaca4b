import type { DemoBoughtPart } from './scenario.types.js';

type Extra = Partial<DemoBoughtPart>;

const piece = (
  code: string,
  name: string,
  price: string,
  weight: string,
  supplier: string,
  bin: string,
  extra: Extra = {},
): DemoBoughtPart => ({
  code,
  name,
  measure: 'piece',
  traced: 'count',
  weight,
  price,
  supplier,
  bin,
  pack: 100,
  reorder: '40',
  ...extra,
});

const screw = (code: string, name: string, weight: string): DemoBoughtPart =>
  piece(code, name, '0.0190', weight, 'GRANTFIX', 'D3', { pack: 1000, reorder: '200' });

const metres = (
  code: string,
  name: string,
  price: string,
  weight: string,
  supplier: string,
  bin: string,
  pack = 100,
): DemoBoughtPart =>
  piece(code, name, price, weight, supplier, bin, { measure: 'm', traced: 'delivery', pack, reorder: '30' });

const print = (code: string, name: string, price: string, weight: string): DemoBoughtPart =>
  piece(code, name, price, weight, 'JUNIPRINT', 'F2', { pack: 250, reorder: '60' });

const cell = (
  code: string,
  name: string,
  price: string,
  weight: string,
  wattHours: string,
  amperes: string,
): DemoBoughtPart =>
  piece(code, name, price, weight, 'ALDERCELL', 'A1', {
    traced: 'delivery',
    pack: 120,
    reorder: '48',
    parameters: [['continuous current', amperes, 'A']],
    battery: { kind: 'cell', wattHours, cells: 1, testReference: `FH-CELL-${code.slice(5)}` },
  });

/** Cells, copper, mouldings, fasteners, consumables, packaging. */
export const mechanicalParts: readonly DemoBoughtPart[] = [
  cell('CELL-18-25', 'Cell 18650, 2.5 Ah, 20 A', '3.1200', '45', '9.00', '20'),
  cell('CELL-18-28', 'Cell 18650, 2.8 Ah, 20 A', '3.4600', '46', '10.08', '20'),
  cell('CELL-21-40', 'Cell 21700, 4.0 Ah, 30 A', '4.6500', '68', '14.40', '30'),
  piece('GUARD-3S', 'Protection board, three cells, 25 A', '2.4500', '4.8', 'ROWANPACK', 'A2', { traced: 'delivery' }),
  piece('GUARD-4S', 'Protection board, four cells, 40 A', '3.6200', '6.9', 'ROWANPACK', 'A2', { traced: 'delivery' }),
  metres('NICKEL-8', 'Nickel strip, 8 × 0.15 mm', '0.5800', '10.6', 'ROWANPACK', 'A2'),
  piece('RING-18', 'Insulating ring, 18 mm', '0.0160', '0.1', 'ROWANPACK', 'A2', { pack: 1000, reorder: '200' }),
  piece('RING-21', 'Insulating ring, 21 mm', '0.0180', '0.1', 'ROWANPACK', 'A2', { pack: 1000, reorder: '200' }),
  metres('SLEEVE-PACK-70', 'Pack sleeve, 70 mm flat', '0.7400', '5.2', 'HOLMTAPE', 'C3'),
  metres('SLEEVE-3', 'Heat-shrink sleeve, 3 mm', '0.1500', '2.1', 'HOLMTAPE', 'C3'),
  metres('SLEEVE-6', 'Heat-shrink sleeve, 6 mm', '0.2100', '4.4', 'HOLMTAPE', 'C3'),
  metres('TAPE-POLYIMIDE', 'Polyimide tape, 10 mm', '0.1300', '0.9', 'HOLMTAPE', 'C3'),
  metres('TAPE-PAPER', 'Insulating paper, self-adhesive, 20 mm', '0.2600', '3.3', 'HOLMTAPE', 'C3'),
  metres('WIRE-SIL-RED', 'Silicone wire, 2.5 mm², red', '1.2400', '31', 'BRACKWIRE', 'C2'),
  metres('WIRE-SIL-BLACK', 'Silicone wire, 2.5 mm², black', '1.2400', '31', 'BRACKWIRE', 'C2'),
  metres('WIRE-SIGNAL', 'Signal wire, 0.14 mm²', '0.0900', '2.6', 'BRACKWIRE', 'C2'),
  metres('WIRE-ENAMEL-05', 'Enamelled copper wire, 0.5 mm', '0.0420', '1.76', 'BRACKWIRE', 'C2', 500),
  metres('WIRE-BARE-15', 'Copper wire, bare, 1.5 mm', '0.1714', '15.8', 'BRACKWIRE', 'C2'),
  metres('WIRE-BARE-20', 'Copper wire, bare, 2.0 mm', '0.3020', '28.1', 'BRACKWIRE', 'C2'),
  piece('TURN-W', 'Secondary turn, formed copper, Wren', '2.2800', '31', 'SLATECOPPER', 'C2', { traced: 'delivery' }),
  piece('TURN-H', 'Secondary turn, formed copper, Heron', '3.4100', '52', 'SLATECOPPER', 'C2', { traced: 'delivery' }),
  piece('BUSBAR-H', 'Bus bar pair blank, Heron', '1.7700', '24', 'SLATECOPPER', 'C2', { traced: 'delivery' }),
  piece('FERRITE-25', 'Ferrite half, 25 mm', '0.6800', '16', 'CORRIEFER', 'C1', { traced: 'delivery', pack: 200 }),
  piece('FERRITE-32', 'Ferrite half, 32 mm', '1.1200', '32', 'CORRIEFER', 'C1', { traced: 'delivery', pack: 200 }),
  piece('BOBBIN-25', 'Bobbin, 25 mm', '0.3300', '2.4', 'CORRIEFER', 'C1'),
  piece('BOBBIN-32', 'Bobbin, 32 mm', '0.4400', '3.9', 'CORRIEFER', 'C1'),
  piece('CLIP-FERRITE', 'Core clip, spring steel', '0.1400', '1.6', 'CORRIEFER', 'C1', { pack: 400, reorder: '80' }),
  piece('CLAMP-N2', 'Clamp pair, nickel on brass, small', '0.4380', '7.2', 'PINETURN', 'D2', {
    measure: 'pair',
    traced: 'delivery',
  }),
  piece('CLAMP-N3', 'Clamp pair, nickel on brass, large', '0.6150', '11.8', 'PINETURN', 'D2', {
    measure: 'pair',
    traced: 'delivery',
  }),
  piece('SINK-W', 'Heat sink, Wren', '1.4300', '18', 'LARKSINK', 'D2'),
  piece('SINK-H', 'Heat sink, Heron', '2.0600', '34', 'LARKSINK', 'D2'),
  piece('PAD-SIL', 'Insulating pad, silicone, for transistor', '0.1100', '0.3', 'LARKSINK', 'D2', {
    traced: 'delivery',
    pack: 400,
    reorder: '80',
  }),
  piece('BUSH-M3', 'Insulating bush, M3', '0.0600', '0.1', 'LARKSINK', 'D2', { pack: 400, reorder: '80' }),
  piece('SHELL-W-LEFT', 'Half shell, left, Wren', '1.9600', '27', 'FELLMOULD', 'D1'),
  piece('SHELL-W-RIGHT', 'Half shell, right, Wren', '1.9600', '27', 'FELLMOULD', 'D1'),
  piece('SHELL-H-LEFT', 'Half shell, left, Heron', '2.5400', '41', 'FELLMOULD', 'D1'),
  piece('SHELL-H-RIGHT', 'Half shell, right, Heron', '2.5400', '41', 'FELLMOULD', 'D1'),
  piece('CAP-END-W', 'End cap, Wren', '0.7700', '6.2', 'FELLMOULD', 'D1'),
  piece('CAP-END-H', 'End cap, Heron', '0.9200', '8.8', 'FELLMOULD', 'D1'),
  piece('KNOB-POWER', 'Knob, power', '0.3600', '1.7', 'FELLMOULD', 'D1'),
  piece('NOSE-W', 'Nose piece, glass-filled, Wren', '0.8100', '5.1', 'FELLMOULD', 'D1'),
  piece('NOSE-H', 'Nose piece, glass-filled, Heron', '0.9700', '7.3', 'FELLMOULD', 'D1'),
  screw('SCREW-M2-6', 'Screw M2 × 6, pan head', '0.22'),
  screw('SCREW-M25-8', 'Screw M2.5 × 8, pan head', '0.41'),
  screw('SCREW-M3-6', 'Screw M3 × 6, pan head', '0.55'),
  screw('SCREW-M3-10', 'Screw M3 × 10, pan head', '0.74'),
  screw('NUT-M3', 'Nut M3', '0.38'),
  screw('WASHER-M3', 'Spring washer M3', '0.12'),
  screw('INSERT-M2', 'Threaded insert M2, brass', '0.19'),
  screw('INSERT-M25', 'Threaded insert M2.5, brass', '0.30'),
  piece('SOLDER-08', 'Solder wire, lead-free, 0.8 mm', '0.0810', '1', 'MOSSCHEM', 'E1', {
    measure: 'g',
    traced: 'delivery',
    pack: 500,
    reorder: '200',
  }),
  piece('FLUX-GEL', 'Flux gel', '0.2600', '1', 'MOSSCHEM', 'E1', {
    measure: 'ml',
    traced: 'delivery',
    pack: 100,
    reorder: '30',
  }),
  piece('PASTE-THERMAL', 'Thermal paste', '0.3400', '1', 'MOSSCHEM', 'E1', {
    measure: 'g',
    traced: 'delivery',
    pack: 100,
    reorder: '20',
  }),
  piece('VARNISH', 'Impregnating varnish', '0.0520', '1', 'MOSSCHEM', 'E1', {
    measure: 'ml',
    traced: 'delivery',
    pack: 1000,
    reorder: '200',
  }),
  piece('BOX-W', 'Carton, Wren', '0.8200', '61', 'INVERBOX', 'F1'),
  piece('BOX-H', 'Carton, Heron', '0.9600', '78', 'INVERBOX', 'F1'),
  piece('BOX-KIT', 'Carton, kit', '1.0400', '92', 'INVERBOX', 'F1'),
  piece('FOAM-W', 'Foam insert, Wren', '0.6300', '12', 'INVERBOX', 'F1'),
  piece('FOAM-H', 'Foam insert, Heron', '0.7100', '16', 'INVERBOX', 'F1'),
  piece('BAG-SMALL', 'Bag, resealable, 80 × 120 mm', '0.0300', '1.1', 'INVERBOX', 'F1', { pack: 1000, reorder: '200' }),
  piece('BAG-LARGE', 'Bag, resealable, 160 × 220 mm', '0.0600', '3.2', 'INVERBOX', 'F1', { pack: 500, reorder: '100' }),
  piece('STAND-WIRE', 'Rest, bent wire', '1.1200', '38', 'PINETURN', 'D2'),
  print('LEAFLET-SAFETY', 'Safety leaflet', '0.1400', '6'),
  print('BOOK-KIT-W', 'Building instructions, Wren', '1.2600', '48'),
  print('BOOK-KIT-H', 'Building instructions, Heron', '1.4100', '56'),
  print('LABEL-UNIT', 'Label, unit, blank', '0.0350', '0.2'),
  print('LABEL-HOT', 'Label, hot surface', '0.0480', '0.2'),
  print('CARD-CERT', 'Card for the test certificate', '0.1900', '4'),
];

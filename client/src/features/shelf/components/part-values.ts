import type { Part, PartInput } from '../api/parts';

/** A part as its form holds it: every field a text, empty for none. */
export interface PartValues {
  code: string;
  name: string;
  description: string;
  measure: string;
  traced: string;
  serialLetters: string;
  reorderPoint: string;
  unitWeightG: string;
  shelfLifeDays: string;
  originCountryCode: string;
  commodityCode: string;
  parameters: { name: string; value: string; unit: string }[];
  suppliers: { supplier: string; supplierPartCode: string; leadTimeDays: string; preferred: boolean }[];
  hasBattery: boolean;
  battery: {
    kind: string;
    chemistry: string;
    wattHours: string;
    lithiumGrams: string;
    cellCount: string;
    transportTestReference: string;
    transportTestPassedOn: string;
  };
}

const noBattery: PartValues['battery'] = {
  kind: 'cell',
  chemistry: 'lithium_ion',
  wattHours: '',
  lithiumGrams: '',
  cellCount: '',
  transportTestReference: '',
  transportTestPassedOn: '',
};

export const emptyPart: PartValues = {
  code: '',
  name: '',
  description: '',
  measure: 'piece',
  traced: 'count',
  serialLetters: '',
  reorderPoint: '',
  unitWeightG: '',
  shelfLifeDays: '',
  originCountryCode: '',
  commodityCode: '',
  parameters: [],
  suppliers: [],
  hasBattery: false,
  battery: noBattery,
};

const text = (value: string | number | null | undefined): string =>
  value === null || value === undefined ? '' : String(value);
const orNone = (value: string): string | null => (value.trim() === '' ? null : value.trim());
const wholeOrNone = (value: string): number | null => (value.trim() === '' ? null : Number(value));

export function partValues(part: Part): PartValues {
  const { battery } = part;
  return {
    code: part.code,
    name: part.name,
    description: text(part.description),
    measure: part.measure,
    traced: part.traced,
    serialLetters: text(part.serialLetters),
    reorderPoint: text(part.reorderPoint),
    unitWeightG: text(part.unitWeightG),
    shelfLifeDays: text(part.shelfLifeDays),
    originCountryCode: text(part.originCountryCode),
    commodityCode: text(part.commodityCode),
    parameters: part.parameters.map(({ name, value, unit }) => ({ name, value, unit: text(unit) })),
    suppliers: part.suppliers.map(({ supplier, supplierPartCode, leadTimeDays, preferred }) => ({
      supplier,
      supplierPartCode: text(supplierPartCode),
      leadTimeDays: text(leadTimeDays),
      preferred,
    })),
    hasBattery: Boolean(battery),
    battery: battery
      ? {
          kind: battery.kind,
          chemistry: battery.chemistry,
          wattHours: text(battery.wattHours),
          lithiumGrams: text(battery.lithiumGrams),
          cellCount: text(battery.cellCount),
          transportTestReference: text(battery.transportTestReference),
          transportTestPassedOn: text(battery.transportTestPassedOn),
        }
      : noBattery,
  };
}

/** What is sent for what was typed. */
export function partInput(values: PartValues): PartInput {
  const { battery } = values;
  return {
    code: values.code.trim(),
    name: values.name,
    description: orNone(values.description),
    measure: values.measure as PartInput['measure'],
    traced: values.traced as PartInput['traced'],
    serialLetters: values.traced === 'single' ? orNone(values.serialLetters.toUpperCase()) : null,
    reorderPoint: orNone(values.reorderPoint),
    unitWeightG: orNone(values.unitWeightG),
    shelfLifeDays: wholeOrNone(values.shelfLifeDays),
    originCountryCode: orNone(values.originCountryCode),
    commodityCode: orNone(values.commodityCode),
    parameters: values.parameters.map(({ name, value, unit }) => ({ name, value, unit: orNone(unit) })),
    suppliers: values.suppliers.map(({ supplier, supplierPartCode, leadTimeDays, preferred }) => ({
      supplier,
      supplierPartCode: orNone(supplierPartCode),
      leadTimeDays: wholeOrNone(leadTimeDays),
      preferred,
    })),
    battery: values.hasBattery
      ? {
          kind: battery.kind as 'cell' | 'battery',
          chemistry: battery.chemistry as 'lithium_ion' | 'lithium_metal',
          wattHours: orNone(battery.wattHours),
          lithiumGrams: orNone(battery.lithiumGrams),
          cellCount: wholeOrNone(battery.cellCount),
          transportTestReference: orNone(battery.transportTestReference),
          transportTestPassedOn: orNone(battery.transportTestPassedOn),
        }
      : null,
  };
}

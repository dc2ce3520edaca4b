import { decimal } from '@emberlot/shared/measure/decimal';
import type { NewPart, RegisteredPart } from '../parts/part-register.service.js';
import type { RowFault } from './import-kind.js';
import type { ImportRow } from './import-row.js';
import { parameterKey, partColumns, unitIn } from './parts-import-columns.js';

/** The part that a line describes. */
export function partIn(row: ImportRow): NewPart {
  const supplier = row.text('supplier');
  return {
    code: row.required('code'),
    name: row.required('name'),
    description: row.text('description'),
    measure: row.required('measure'),
    traced: row.required('traced'),
    serialLetters: row.text('serialLetters'),
    reorderPoint: row.text('reorderPoint'),
    unitWeightG: row.text('unitWeightG'),
    shelfLifeDays: row.whole('shelfLifeDays'),
    originCountryCode: row.text('originCountryCode'),
    commodityCode: row.text('commodityCode'),
    parameters: parametersIn(row),
    supplier:
      supplier === null
        ? null
        : {
            code: supplier,
            supplierPartCode: row.text('supplierPartCode'),
            leadTimeDays: row.whole('leadTimeDays'),
          },
    battery: batteryIn(row),
  };
}

const plainNumber = /^-?(?:0|[1-9]\d{0,19})(?:\.\d{1,15})?$/;

function parametersIn(row: ImportRow): NewPart['parameters'] {
  return row.filled().flatMap((key) => {
    if (!key.startsWith(parameterKey)) return [];
    const title = key.slice(parameterKey.length);
    const value = row.text(key) ?? '';
    const number = plainNumber.test(value);
    const name = title.replace(/\s*[[(][^[\]()]+[\])]$/u, '');
    return [{ name, valueNumber: number ? value : null, valueText: number ? null : value, unit: unitIn(title) }];
  });
}

function batteryIn(row: ImportRow): NewPart['battery'] {
  const kind = row.text('batteryKind');
  const chemistry = row.text('chemistry');
  if (kind === null || chemistry === null) return null;
  return {
    kind: kind as 'cell' | 'battery',
    chemistry: chemistry as 'lithium_ion' | 'lithium_metal',
    wattHours: row.text('wattHours'),
    lithiumGrams: row.text('lithiumGrams'),
    cellCount: row.whole('cellCount'),
    transportTestReference: row.text('transportTestReference'),
    transportTestPassedOn: row.text('transportTestPassedOn'),
  };
}

/** Faults that lie between the cells of one line. */
export function faultsOfPart(row: ImportRow, countries: ReadonlySet<string>): RowFault[] {
  const faults: RowFault[] = [];
  const at = (key: string, sentence: string) => faults.push({ line: row.line, column: titleOf(key), sentence });
  const single = row.required('traced') === 'single';
  const letters = row.text('serialLetters');
  if (single && letters === null)
    at('serialLetters', 'A part followed one by one needs letters for its serial numbers.');
  if (!single && letters !== null) at('serialLetters', 'Only a part followed one by one has letters.');
  if (single && row.required('measure') !== 'piece') at('measure', 'A part followed one by one is kept in pieces.');
  const country = row.text('originCountryCode');
  if (country !== null && !countries.has(country)) at('originCountryCode', `There is no country ${country}.`);
  if (row.text('supplier') === null) {
    if (row.text('supplierPartCode') !== null) at('supplier', 'Say whose part code this is.');
    if (row.whole('leadTimeDays') !== null) at('supplier', 'Say who delivers in this time.');
  }
  faultsOfBattery(row, at);
  const names = parametersIn(row).map(({ name }) => name.toLowerCase());
  const twice = names.find((name, index) => names.indexOf(name) < index);
  if (twice !== undefined) at(twice, `The parameter ${twice} stands in two columns.`);
  return faults;
}

const batteryKeys = ['wattHours', 'lithiumGrams', 'cellCount', 'transportTestReference', 'transportTestPassedOn'];

function faultsOfBattery(row: ImportRow, at: (key: string, sentence: string) => void): void {
  const kind = row.text('batteryKind');
  const chemistry = row.text('chemistry');
  if (kind === null && chemistry === null) {
    const stray = batteryKeys.find((key) => row.text(key) !== null);
    if (stray) at(stray, 'Say whether it is a cell or a battery, and of which chemistry.');
    return;
  }
  if (kind === null) at('batteryKind', 'Say whether it is a cell or a battery.');
  if (chemistry === null) at('chemistry', 'Say whether it is lithium-ion or lithium metal.');
  const size = chemistry === 'lithium_ion' ? 'wattHours' : 'lithiumGrams';
  if (chemistry !== null && row.text(size) === null) at(size, 'Transport papers go by this: fill it in.');
}

function titleOf(key: string): string {
  return partColumns.find((column) => column.key === key)?.title ?? key;
}

/** What a line says otherwise than the record. An empty cell says nothing. */
export function differences(row: ImportRow, known: RegisteredPart): string[] {
  const asked = partIn(row);
  const differs = (key: string): boolean => {
    if (row.text(key) === null) return false;
    return !same(row.text(key), recordedValue(known, asked, key));
  };
  const columns = partColumns
    .filter(({ key }) => key !== 'code' && differs(key))
    .map(({ title }) => title.toLowerCase());
  const parameters = asked.parameters.filter((parameter) => {
    const own = known.parameters.find(({ name }) => name === parameter.name);
    const value = parameter.valueNumber ?? parameter.valueText;
    return !own || !same(value, own.valueNumber ?? own.valueText) || own.unit !== parameter.unit;
  });
  return [...columns, ...parameters.map(({ name }) => `parameter ${name}`)];
}

function recordedValue(known: RegisteredPart, asked: NewPart, key: string): string | null {
  const supplier = known.suppliers.find(({ code }) => code === asked.supplier?.code);
  const recorded: Readonly<Record<string, unknown>> = {
    ...known,
    ...known.battery,
    batteryKind: known.battery?.kind,
    supplier: supplier?.code,
    supplierPartCode: supplier?.supplierPartCode,
    leadTimeDays: supplier?.leadTimeDays,
  };
  const value = recorded[key];
  return typeof value === 'string' || typeof value === 'number' ? String(value) : null;
}

/** Numbers are the same however many zeros they are written with. */
function same(left: string | null, right: string | null): boolean {
  if (left === right) return true;
  if (left === null || right === null || !plainNumber.test(left) || !plainNumber.test(right)) return false;
  return decimal(left).equals(decimal(right));
}

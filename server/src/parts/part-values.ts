import { decimalText } from '@emberlot/shared/measure/decimal';
import type { StockMeasure } from '@emberlot/shared/measure/stock-measures';
import type { FieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import type { BatteryRow, NamedPartSupplierRow, ParameterRow } from './part-details.repository.js';
import type { PartBatteryDto, PartDto, PartInputDto, PartParameterDto, Traced } from './part.dto.js';
import type { KnownPartRow, PartRow } from './parts.repository.js';

/** What begins with idle zeros is a name written in digits, such as a case style. */
const plainNumber = /^-?(?:0|[1-9]\d{0,19})(?:\.\d{1,15})?$/;

/** @throws AppError `invalid_input` for what no single field shows: a fault that lies between two of them */
export function checkPart(input: PartInputDto): void {
  const faults = [...faultsOfTracing(input), ...faultsOfParameters(input), ...faultsOfSuppliers(input)];
  if (input.battery) faults.push(...faultsOfBattery(input.battery));
  if (faults.length > 0) throw inputRefused(faults);
}

function faultsOfTracing(input: PartInputDto): FieldFault[] {
  const letters = input.serialLetters ?? null;
  if (input.traced !== 'single') {
    return letters === null
      ? []
      : [fault('/serialLetters', 'Only a part followed one by one has letters for its serial numbers.')];
  }
  const missing = fault('/serialLetters', 'Give the two or three letters that begin its serial numbers.');
  const pieces = fault('/measure', 'A part followed one by one is kept in pieces.');
  return [...(letters === null ? [missing] : []), ...(input.measure === 'piece' ? [] : [pieces])];
}

function faultsOfParameters(input: PartInputDto): FieldFault[] {
  const names = input.parameters.map(({ name }) => name.toLowerCase());
  return input.parameters.flatMap(({ value, unit }, index) => {
    const twice = names.indexOf(names[index] ?? '') < index;
    const wordWithUnit = !plainNumber.test(value) && unit !== undefined && unit !== null;
    return [
      ...(twice ? [fault(`/parameters/${index}/name`, 'This parameter stands twice.')] : []),
      ...(wordWithUnit ? [fault(`/parameters/${index}/unit`, 'Only a number has a unit.')] : []),
    ];
  });
}

function faultsOfSuppliers(input: PartInputDto): FieldFault[] {
  const codes = input.suppliers.map(({ supplier }) => supplier);
  const preferred = input.suppliers.filter((entry) => entry.preferred).length;
  const twice = codes.flatMap((code, index) =>
    codes.indexOf(code) < index ? [fault(`/suppliers/${index}/supplier`, 'This supplier stands twice.')] : [],
  );
  return preferred > 1 ? [...twice, fault('/suppliers', 'Only one supplier can be the preferred one.')] : twice;
}

function faultsOfBattery(battery: PartBatteryDto): FieldFault[] {
  const ion = battery.chemistry === 'lithium_ion';
  const size = ion ? battery.wattHours : battery.lithiumGrams;
  if (size !== undefined && size !== null) return [];
  return ion
    ? [fault('/battery/wattHours', 'Transport of lithium-ion cells goes by watt-hours: give them.')]
    : [fault('/battery/lithiumGrams', 'Transport of lithium metal cells goes by grams of lithium: give them.')];
}

function fault(pointer: string, detail: string): FieldFault {
  return { pointer, code: 'does_not_fit', detail };
}

export function partRow(input: PartInputDto): PartRow {
  return {
    code: input.code,
    name: input.name,
    description: input.description ?? null,
    measure: input.measure,
    traced: input.traced,
    serialLetters: input.serialLetters ?? null,
    reorderPoint: input.reorderPoint ?? null,
    unitWeightG: input.unitWeightG ?? null,
    shelfLifeDays: input.shelfLifeDays ?? null,
    originCountryCode: input.originCountryCode ?? null,
    commodityCode: input.commodityCode ?? null,
  };
}

export function parameterRows(parameters: readonly PartParameterDto[]): ParameterRow[] {
  return parameters.map(({ name, value, unit }) => {
    const number = plainNumber.test(value);
    return { name, valueNumber: number ? value : null, valueText: number ? null : value, unit: unit ?? null };
  });
}

export function batteryRow(battery: PartBatteryDto | null | undefined): BatteryRow | null {
  if (!battery) return null;
  return {
    kind: battery.kind,
    chemistry: battery.chemistry,
    wattHours: battery.wattHours ?? null,
    lithiumGrams: battery.lithiumGrams ?? null,
    cellCount: battery.cellCount ?? null,
    transportTestReference: battery.transportTestReference ?? null,
    transportTestPassedOn: battery.transportTestPassedOn ?? null,
  };
}

export interface PartDetails {
  readonly moved: boolean;
  readonly parameters: readonly ParameterRow[];
  readonly suppliers: readonly NamedPartSupplierRow[];
  readonly battery: BatteryRow | undefined;
}

export function partDto(row: KnownPartRow, details: PartDetails): PartDto {
  return {
    id: row.id,
    version: row.version,
    code: row.code,
    name: row.name,
    description: row.description,
    measure: row.measure as StockMeasure,
    traced: row.traced as Traced,
    serialLetters: row.serialLetters,
    reorderPoint: plain(row.reorderPoint),
    unitWeightG: plain(row.unitWeightG),
    shelfLifeDays: row.shelfLifeDays,
    originCountryCode: row.originCountryCode,
    commodityCode: row.commodityCode,
    retiredOn: row.retiredOn,
    moved: details.moved,
    parameters: details.parameters.map(({ name, valueNumber, valueText, unit }) => ({
      name,
      value: valueNumber === null ? (valueText ?? '') : decimalText(valueNumber),
      unit,
    })),
    suppliers: details.suppliers.map(({ supplier, name, supplierPartCode, leadTimeDays, preferred }) => ({
      supplier,
      name,
      supplierPartCode,
      leadTimeDays,
      preferred,
    })),
    battery: details.battery
      ? {
          ...details.battery,
          wattHours: plain(details.battery.wattHours),
          lithiumGrams: plain(details.battery.lithiumGrams),
        }
      : null,
  };
}

/** The database fills decimals with zeros; what travels is the bare number. */
function plain(value: string | null): string | null {
  return value === null ? null : decimalText(value);
}

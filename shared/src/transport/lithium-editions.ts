import type { AirEditionOptions } from './air-rules.js';
import { airRules } from './air-rules.js';
import { landAndSeaRules } from './land-and-sea-rules.js';
import type { ChargeLimit, LithiumEdition, MarkExemption } from './lithium-rules.js';
import { smallLimits } from './lithium-rules.js';
import type { TransportMode } from './lithium-parcel.js';

/** Shown beside every answer. */
export const lithiumCaution = 'Check the current edition and local rules; ask your carrier.';

const recordedOn = '2026-12-01';

const exemption = (rule: string): MarkExemption => ({ cells: 4, batteries: 2, parcels: 2, rule });

function surfaceEdition(code: 'ADR' | 'IMDG', id: string, title: string, from: string, until: string): LithiumEdition {
  return {
    id,
    title,
    modes: [code === 'ADR' ? 'road' : 'sea'],
    from,
    until,
    recordedOn,
    limits: smallLimits,
    markExemption: exemption(`${code} special provision 188 (f)`),
    damaged: { answer: 'ask', rule: `${code} special provision 376` },
    untested: { rule: `${code} special provisions 188 (a) and 310` },
    forDisposal: { answer: 'ask', rule: `${code} special provision 377` },
    rules: landAndSeaRules(code),
  };
}

function airEdition(number: number, year: number, options: AirEditionOptions): LithiumEdition {
  return {
    id: `iata-dgr-${number}`,
    title: `IATA Dangerous Goods Regulations, ${number}th edition (${year}), after the ICAO Technical Instructions`,
    modes: ['passenger_aircraft', 'cargo_aircraft'],
    from: `${year}-01-01`,
    until: `${year}-12-31`,
    recordedOn,
    limits: smallLimits,
    markExemption: exemption('PI 967 and PI 970 Section II'),
    damaged: { answer: 'forbidden', rule: 'ICAO special provision A154' },
    untested: { rule: 'IATA DGR 3.9.2.6; special provision A88' },
    forDisposal: { answer: 'forbidden', rule: 'ICAO special provision A183' },
    rules: airRules(options),
  };
}

const advice: ChargeLimit = { percent: 30, force: 'should', aboveWattHours: 0 };
const mandatory: ChargeLimit = { percent: 30, force: 'must', aboveWattHours: 2.7 };

/**
 * Editions on record, newest first within a mode. A day outside all of them is answered with "ask".
 *
 * ADR lets the edition before be used for six months (ADR 1.6.1.1); the IMDG Code's amendments overlap by a year.
 */
export const lithiumEditions: readonly LithiumEdition[] = [
  surfaceEdition('ADR', 'adr-2025', 'ADR, edition applicable from 1 January 2025', '2025-01-01', '2027-06-30'),
  surfaceEdition('ADR', 'adr-2023', 'ADR, edition applicable from 1 January 2023', '2023-01-01', '2025-06-30'),
  surfaceEdition('IMDG', 'imdg-42-24', 'IMDG Code, Amendment 42-24', '2025-01-01', '2027-12-31'),
  surfaceEdition('IMDG', 'imdg-41-22', 'IMDG Code, Amendment 41-22', '2023-01-01', '2025-12-31'),
  airEdition(67, 2026, {
    packedWithCharge: [mandatory, advice],
    containedCharge: [advice],
    stackTest: true,
  }),
  airEdition(66, 2025, { packedWithCharge: [advice], containedCharge: [advice], stackTest: true }),
  airEdition(65, 2024, { packedWithCharge: [], containedCharge: [], stackTest: false }),
];

/**
 * The newest edition in force for a mode on a day.
 *
 * @param mode how the parcel travels
 * @param day `YYYY-MM-DD`
 * @returns the edition, or undefined where none is on record
 */
export function editionFor(mode: TransportMode, day: string): LithiumEdition | undefined {
  return lithiumEditions
    .filter((edition) => edition.modes.some((each) => each === mode) && edition.from <= day && day <= edition.until)
    .reduce<LithiumEdition | undefined>(
      (newest, edition) => (newest === undefined || edition.from > newest.from ? edition : newest),
      undefined,
    );
}

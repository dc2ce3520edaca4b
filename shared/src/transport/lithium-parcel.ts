/** How the parcel travels. Letter post is its own: the postal operator's rules come on top. */
export type TransportMode = 'road' | 'sea' | 'passenger_aircraft' | 'cargo_aircraft' | 'letter_post' | 'unknown';

export type LithiumChemistry = 'lithium_ion' | 'lithium_metal' | 'unknown';

/** A battery is two or more cells joined; a case with one cell in it counts as a cell. */
export type LithiumForm = 'cell' | 'button_cell' | 'battery' | 'unknown';

/** Where it lies: in the tool, beside the tool it runs, by itself, or as loose cells that the buyer of a kit joins. */
export type LithiumPlacement =
  'contained_in_equipment' | 'packed_with_equipment' | 'alone' | 'loose_in_kit' | 'unknown';

/** Faulty: came back and the fault is not known. Recalled: by its maker, for safety. */
export type LithiumCondition = 'sound' | 'damaged' | 'faulty' | 'recalled' | 'for_disposal' | 'unknown';

/** Whether this very design of cell or battery passed the UN 38.3 tests; a pack does not inherit its cells' test. */
export type DesignTest = 'passed' | 'not_passed' | 'unknown';

/** One kind of cell or battery in a parcel. What is not known is left undefined or 'unknown', never guessed. */
export interface LithiumContent {
  readonly chemistry: LithiumChemistry;
  readonly form: LithiumForm;
  readonly placement: LithiumPlacement;
  readonly condition: LithiumCondition;
  readonly designTest: DesignTest;
  /** Cells, or batteries, of this kind in the parcel. */
  readonly count: number | undefined;
  /** Watt-hours of one cell, or of one battery; for lithium ion. */
  readonly wattHours?: number | undefined;
  /** Grams of lithium in one cell, or in one battery; for lithium metal. */
  readonly lithiumGrams?: number | undefined;
  /** Whether the watt-hours stand on the outside of the battery's case; for lithium ion batteries. */
  readonly wattHoursOnCase?: boolean | undefined;
  /** Charge in percent of rated capacity; asked for where the parcel flies. */
  readonly chargePercent?: number | undefined;
  /** Cells, or batteries, that the equipment in this parcel needs to run; asked for where they fly packed with it. */
  readonly neededByEquipment?: number | undefined;
  /** Net mass in kilograms of all cells or batteries of this kind in the parcel; asked for where the parcel flies. */
  readonly netKilograms?: number | undefined;
}

export interface LithiumParcel {
  readonly mode: TransportMode;
  /** The day it leaves, `YYYY-MM-DD` in the shop's zone: it decides the edition. */
  readonly day: string;
  /** Inbound: a parcel that somebody is to send to the shop. */
  readonly direction: 'outbound' | 'inbound';
  /** Everything with lithium in the parcel; empty if there is certainly none; undefined if nobody knows. */
  readonly contents: readonly LithiumContent[] | undefined;
  /** Parcels with lithium in the whole consignment, this one included. */
  readonly parcelsInConsignment: number | undefined;
  /** Gross mass of the parcel in kilograms; asked for where cells or batteries travel by themselves. */
  readonly grossKilograms?: number | undefined;
}

/** A supplier of the demo shop. Addresses end in `.example`, so that no mail can reach anybody. */
export interface DemoSupplier {
  readonly code: string;
  readonly name: string;
  readonly country: string;
  readonly leadTimeDays: number;
}

export interface DemoBin {
  readonly code: string;
  readonly name: string;
  readonly quarantine?: true;
}

export type DemoParameter = readonly [name: string, value: string, unit?: string];

/** A part that is bought. Prices are euros per stock unit, as decimal text. */
export interface DemoBoughtPart {
  readonly code: string;
  readonly name: string;
  readonly measure: 'piece' | 'pair' | 'set' | 'm' | 'g' | 'ml';
  readonly traced: 'count' | 'delivery';
  readonly weight: string;
  readonly price: string;
  readonly supplier: string;
  readonly bin: string;
  /** How much one delivery brings. */
  readonly pack: number;
  readonly reorder?: string;
  readonly parameters?: readonly DemoParameter[];
  readonly battery?: DemoBattery;
}

export interface DemoBattery {
  readonly kind: 'cell' | 'battery';
  readonly wattHours: string;
  readonly cells: number;
  readonly testReference?: string;
}

export interface DemoBillLine {
  readonly part: string;
  readonly quantity: string;
  readonly scrap?: string;
  readonly marks?: string;
  readonly alternates?: readonly string[];
}

export interface DemoStep {
  readonly title: string;
  readonly instruction: string;
  readonly minutes: string;
  readonly caution?: string;
}

export interface DemoCharacteristic {
  readonly name: string;
  readonly unit?: string;
  readonly lower?: string;
  readonly target?: string;
  readonly upper?: string;
  readonly digits?: number;
  readonly condition?: string;
  readonly caution?: string;
}

/** A part that is made, with the first revision of its bill. */
export interface DemoMadePart {
  readonly code: string;
  readonly name: string;
  readonly traced: 'delivery' | 'single';
  readonly serialLetters?: string;
  readonly weight: string;
  readonly bin: string;
  readonly battery?: DemoBattery;
  readonly lines: readonly DemoBillLine[];
  readonly steps: readonly DemoStep[];
  readonly plan: readonly DemoCharacteristic[];
}

export interface DemoContentsLine {
  readonly part: string;
  readonly quantity: string;
  readonly bag: string;
}

/** A kit: sold as a box of parts, packed from its contents list. */
export interface DemoKit {
  readonly code: string;
  readonly name: string;
  readonly contents: readonly DemoContentsLine[];
}

export interface DemoListing {
  readonly part: string;
  readonly slug: string;
  readonly form: 'tool' | 'kit' | 'spare';
  readonly family: string;
  readonly title: string;
  readonly summary: string;
  readonly description: string;
  readonly skills?: string;
  readonly drawing?: string;
  /** Euro cents, net of VAT. */
  readonly netMinor: number;
}

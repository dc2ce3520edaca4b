export const revisionStatuses = ['draft', 'released', 'superseded'] as const;

export type RevisionStatus = (typeof revisionStatuses)[number];

export const characteristicKinds = ['numeric', 'yes_no'] as const;

export type CharacteristicKind = (typeof characteristicKinds)[number];

/** What a bill needs to know of a part. */
export interface BillPart {
  readonly id: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly retired: boolean;
}

export interface RevisionLine {
  readonly id: number;
  readonly position: number;
  readonly part: BillPart;
  /** In the component's stock unit, per stock unit made. */
  readonly quantityPer: string;
  /** Share of what is taken that is normally lost, in percent. */
  readonly scrapPercent: string;
  readonly marks: string | null;
  readonly note: string | null;
  /** Parts approved to stand in, the preferred one first; one for one. */
  readonly alternates: readonly BillPart[];
}

export interface RevisionStep {
  readonly id: number;
  readonly position: number;
  readonly title: string;
  readonly instruction: string;
  /** Per stock unit made. */
  readonly minutes: string;
  readonly caution: string | null;
}

export interface RevisionCharacteristic {
  readonly id: number;
  readonly position: number;
  readonly name: string;
  readonly kind: CharacteristicKind;
  readonly unit: string | null;
  readonly lowerLimit: string | null;
  readonly target: string | null;
  readonly upperLimit: string | null;
  readonly digits: number | null;
  readonly condition: string | null;
  readonly caution: string | null;
}

/** One numbered state of a part's bill, whole: its lines, steps and test plan in the order of their positions. */
export interface BillRevision {
  readonly id: number;
  readonly part: BillPart;
  readonly number: number;
  readonly status: RevisionStatus;
  readonly version: number;
  readonly note: string | null;
  readonly createdAt: Date;
  readonly createdBy: string | null;
  readonly releasedAt: Date | null;
  readonly releasedBy: string | null;
  readonly supersededAt: Date | null;
  readonly lines: readonly RevisionLine[];
  readonly steps: readonly RevisionStep[];
  readonly testPlan: readonly RevisionCharacteristic[];
}

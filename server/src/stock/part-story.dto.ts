import { PartDto } from '../parts/part.dto.js';
import { MoveDto } from './move.dto.js';
import { PartFiguresDto } from './part-list.dto.js';

export class PartPlaceDto {
  bin: string;
  quarantine: boolean;
  lot: string;
  kind: string;
  status: string;
  supplier: string | null;
  supplierLot: string | null;
  receivedOn: string | null;
  expiresOn: string | null;
  expired: boolean;
  quantity: string;
}

export class PartClaimDto {
  /** The number of the order or batch. */
  reference: string;
  kind: string;
  neededOn: string | null;
  /** What it still needs. */
  needed: string;
  /** What of that it holds on the shelf. */
  claimed: string;
  /** What of that is to come out of a batch. */
  awaited: string;
  /** What of that it holds nowhere. */
  missing: string;
}

export class PartUseDto {
  part: string;
  name: string;
  revision: number | null;
  status: string | null;
  quantity: string;
  /** component: a line of the bill; alternate: may stand in; contents: lies in a kit. */
  role: string;
}

export class PartStoryDto {
  part: PartDto;
  figures: PartFiguresDto;
  places: PartPlaceDto[];
  claims: PartClaimDto[];
  uses: PartUseDto[];
  /** The latest, newest first. */
  moves: MoveDto[];
  /** Of the average cost; not shown to assemblers. */
  currency?: string;
}

import type { Decimal } from '@emberlot/shared/measure/decimal';
import type { MinorAmount } from '@emberlot/shared/money/minor-units';

export type MoveReason =
  | 'opening'
  | 'receipt'
  | 'transfer'
  | 'found'
  | 'lost'
  | 'damaged'
  | 'counted'
  | 'issue'
  | 'issue_return'
  | 'completion'
  | 'scrap'
  | 'dispatch'
  | 'return'
  | 'reversal';

/** A change of one lot in one bin, as a use case asks for it. */
interface Move {
  readonly partId: number;
  readonly lotId: number;
  readonly binId: number;
  /** Above zero, in the part's stock unit. The direction is the move's own. */
  readonly quantity: Decimal;
  readonly reason: MoveReason;
  /** The move that this one takes back; of a change of bin, the one that came and the one that left. */
  readonly reverses?: readonly number[];
}

/** Comes onto the shelf with a value of its own. */
export interface MoveIn extends Move {
  readonly direction: 'in';
  readonly value: MinorAmount;
}

/** Leaves the shelf at what its cost pool says. */
export interface MoveOut extends Move {
  readonly direction: 'out';
  /** What it once came with, to be taken back at that as far as the pool can bear it. */
  readonly broughtValue?: MinorAmount;
}

/** Changes its bin and nothing else. */
export interface MoveWithin extends Move {
  readonly direction: 'within';
  readonly toBinId: number;
}

export type NewMove = MoveIn | MoveOut | MoveWithin;

/** The stock account a move's value belongs to, as a component of the posting rules. */
export type StockComponent = 'materials' | 'units';

export interface PostedMove {
  readonly partId: number;
  readonly lotId: number;
  readonly binId: number;
  /** Signed: above zero in, below zero out. */
  readonly quantity: Decimal;
  /** Signed like the quantity; zero for a change of bin. */
  readonly value: MinorAmount;
  readonly component: StockComponent;
  readonly reverses?: number;
}

import { Injectable } from '@nestjs/common';
import type { ErrorCode } from '@emberlot/shared/errors/codes';

/** What a broken constraint of the database means to the person who sent the request. */
export interface ConstraintSentence {
  readonly code: ErrorCode;
  readonly sentence: string;
  /** The field it belongs to, as a JSON pointer. */
  readonly pointer?: string;
}

export type ConstraintTable = Readonly<Record<string, ConstraintSentence>>;

/**
 * Sentences by constraint name. Each module adds its own table in its constructor; a constraint that no table names
 * gets a general sentence by the kind of violation.
 */
@Injectable()
export class ConstraintSentences {
  readonly #byName = new Map<string, ConstraintSentence>();

  /** @throws Error when two modules claim one constraint with different sentences */
  add(table: ConstraintTable): void {
    for (const [name, entry] of Object.entries(table)) {
      const known = this.#byName.get(name);
      if (known && known !== entry) throw new Error(`The constraint ${name} has two sentences.`);
      this.#byName.set(name, entry);
    }
  }

  find(name: string): ConstraintSentence | undefined {
    return this.#byName.get(name);
  }
}

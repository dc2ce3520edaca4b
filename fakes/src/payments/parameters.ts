import { badParameter, missingParameter } from './api-error.js';
import type { FormTree, FormValue } from './form-body.js';

type TextRule = { readonly longest?: number; readonly oneOf?: readonly string[] };
type IntegerRule = { readonly least?: number; readonly most?: number };

/** Reads a request's parameters with the processor's checks and refuses those that nobody read. */
export class Parameters {
  readonly #read = new Set<string>();

  constructor(
    private readonly tree: FormTree,
    private readonly prefix = '',
  ) {}

  name(key: string): string {
    return this.prefix === '' ? key : `${this.prefix}[${key}]`;
  }

  has(key: string): boolean {
    return this.tree[key] !== undefined;
  }

  text(key: string, { longest = 5000, oneOf }: TextRule = {}): string | undefined {
    const value = this.take(key);
    if (value === undefined) return undefined;
    if (typeof value !== 'string') throw badParameter(this.name(key), `Invalid string: ${this.name(key)}`);
    if (value === '') throw this.empty(key);
    if (value.length > longest) {
      throw badParameter(this.name(key), `Invalid string: ${this.name(key)} must be at most ${longest} characters`);
    }
    if (oneOf && !oneOf.includes(value)) {
      throw badParameter(this.name(key), `Invalid ${this.name(key)}: must be one of ${oneOf.join(', ')}`);
    }
    return value;
  }

  requiredText(key: string, rule: TextRule = {}): string {
    const value = this.text(key, rule);
    if (value === undefined) throw missingParameter(this.name(key));
    return value;
  }

  integer(key: string, { least, most }: IntegerRule = {}): number | undefined {
    const value = this.take(key);
    if (value === undefined) return undefined;
    const number = typeof value === 'string' && /^-?\d+$/.test(value) ? Number(value) : Number.NaN;
    if (!Number.isSafeInteger(number)) {
      throw badParameter(this.name(key), `Invalid integer: ${this.name(key)}`, 'parameter_invalid_integer');
    }
    if (least !== undefined && number < least) {
      throw badParameter(this.name(key), `${this.name(key)} must be at least ${least}`, 'parameter_invalid_integer');
    }
    if (most !== undefined && number > most) {
      throw badParameter(this.name(key), `${this.name(key)} must be at most ${most}`, 'parameter_invalid_integer');
    }
    return number;
  }

  requiredInteger(key: string, rule: IntegerRule = {}): number {
    const value = this.integer(key, rule);
    if (value === undefined) throw missingParameter(this.name(key));
    return value;
  }

  boolean(key: string): boolean | undefined {
    const value = this.take(key);
    if (value === undefined) return undefined;
    if (value !== 'true' && value !== 'false') throw badParameter(this.name(key), `Invalid boolean: ${this.name(key)}`);
    return value === 'true';
  }

  child(key: string): Parameters | undefined {
    const value = this.take(key);
    if (value === undefined) return undefined;
    if (typeof value === 'string') throw badParameter(this.name(key), `Invalid object: ${this.name(key)}`);
    return new Parameters(value, this.name(key));
  }

  children(key: string): Parameters[] {
    const list = this.child(key);
    if (!list) return [];
    return Object.keys(list.tree).flatMap((position) => list.child(position) ?? []);
  }

  texts(key: string): string[] {
    const list = this.child(key);
    if (!list) return [];
    return Object.keys(list.tree).flatMap((position) => list.text(position) ?? []);
  }

  rangeOrInteger(key: string): { gt?: number; gte?: number; lt?: number; lte?: number } {
    if (typeof this.tree[key] === 'string') {
      const exact = this.requiredInteger(key);
      return { gte: exact, lte: exact };
    }
    const range = this.child(key);
    const read: { gt?: number; gte?: number; lt?: number; lte?: number } = {};
    for (const bound of ['gt', 'gte', 'lt', 'lte'] as const) {
      const value = range?.integer(bound);
      if (value !== undefined) read[bound] = value;
    }
    range?.refuseUnknown();
    return read;
  }

  /** At most 50 keys of 40 characters with values of 500 (docs.stripe.com/api/metadata). */
  metadata(key: string): Record<string, string> {
    const given = this.child(key);
    if (!given) return {};
    const entries = Object.entries(given.tree).filter(([, value]) => value !== '');
    if (entries.length > 50) throw badParameter(this.name(key), 'Metadata can have up to 50 keys');
    return Object.fromEntries(
      entries.map(([name, value]) => {
        if (typeof value !== 'string') throw badParameter(given.name(name), 'Metadata values must be strings');
        if (name.length > 40) throw badParameter(given.name(name), 'Metadata keys can be up to 40 characters long');
        if (value.length > 500)
          throw badParameter(given.name(name), 'Metadata values can be up to 500 characters long');
        return [name, value];
      }),
    );
  }

  /** Call when all that is known has been read. */
  refuseUnknown(): void {
    const unknown = Object.keys(this.tree).find((key) => !this.#read.has(key));
    if (unknown === undefined) return;
    throw badParameter(this.name(unknown), `Received unknown parameter: ${this.name(unknown)}`, 'parameter_unknown');
  }

  private take(key: string): FormValue | undefined {
    this.#read.add(key);
    return this.tree[key];
  }

  private empty(key: string) {
    return badParameter(
      this.name(key),
      `You passed an empty string for '${this.name(key)}'.`,
      'parameter_invalid_empty',
    );
  }
}

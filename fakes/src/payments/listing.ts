import type { Collection } from './collection.js';
import { badParameter, noSuch } from './api-error.js';
import type { Parameters } from './parameters.js';

export type List<T> = {
  readonly object: 'list';
  readonly data: T[];
  readonly has_more: boolean;
  readonly url: string;
};

type Dated = { readonly id: string; readonly created: number };

/**
 * A page of things, newest first, by the processor's cursors (docs.stripe.com/api/pagination).
 *
 * @param kind the word for one of them, for the error about a cursor that names none
 */
export function listOf<T extends { readonly id: string }>(
  things: readonly T[],
  all: Collection<T>,
  given: Parameters,
  url: string,
  kind: string,
): List<T> {
  const limit = given.integer('limit', { least: 1, most: 100 }) ?? 10;
  const after = given.text('starting_after');
  const before = given.text('ending_before');
  given.refuseUnknown();
  if (after !== undefined && before !== undefined) {
    throw badParameter('starting_after', 'Give starting_after or ending_before, not both');
  }
  for (const [param, id] of [
    ['starting_after', after],
    ['ending_before', before],
  ] as const) {
    if (id !== undefined && !all.find(id)) throw noSuch(kind, id, param, 400);
  }
  const newest = all.newestFirst();
  const place = new Map(newest.map((thing, index) => [thing.id, index]));
  const at = (id: string) => place.get(id) ?? -1;
  if (before !== undefined) {
    const newer = things.filter((thing) => at(thing.id) < at(before));
    return { object: 'list', data: newer.slice(-limit), has_more: newer.length > limit, url };
  }
  const older = after === undefined ? things : things.filter((thing) => at(thing.id) > at(after));
  return { object: 'list', data: older.slice(0, limit), has_more: older.length > limit, url };
}

/** The `created` filter: an instant, or a range of them. */
export function createdWithin(given: Parameters): (thing: Dated) => boolean {
  if (!given.has('created')) return () => true;
  const range = given.rangeOrInteger('created');
  return ({ created }) =>
    created > (range.gt ?? -Infinity) &&
    created >= (range.gte ?? -Infinity) &&
    created < (range.lt ?? Infinity) &&
    created <= (range.lte ?? Infinity);
}

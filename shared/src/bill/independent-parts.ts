import type { IntegerProgram } from './integer-program.js';

/** A program that shares no variable with the others. */
export interface ProgramPart extends IntegerProgram {
  /** Its variables and rows as numbered in the whole. */
  readonly originalVariables: readonly number[];
  readonly originalRows: readonly number[];
}

/**
 * Takes a program apart into those that can be solved one by one, since no row joins them.
 *
 * @returns the parts in order of their first variable; undefined when a row without variables already fails
 */
export function independentParts({ variables, rows }: IntegerProgram): ProgramPart[] | undefined {
  const leader = variables.map((_, index) => index);
  const find = (index: number): number => {
    let at = index;
    while (leader[at] !== at) {
      leader[at] = leader[leader[at] ?? at] ?? at;
      at = leader[at] ?? at;
    }
    return at;
  };
  for (const { terms, limit } of rows) {
    const first = terms[0];
    if (first === undefined && limit < 0n) return undefined;
    for (const { variable } of terms) leader[find(variable)] = find(first?.variable ?? variable);
  }
  const members = groupBy(variables.keys(), find);
  const rowsOf = groupBy(rows.keys(), (row) => find(rows[row]?.terms[0]?.variable ?? -1));
  return [...members].map(([key, original]) => {
    const place = new Map(original.map((variable, index) => [variable, index]));
    const originalRows = rowsOf.get(key) ?? [];
    return {
      originalVariables: original,
      originalRows,
      variables: original.flatMap((index) => variables[index] ?? []),
      rows: originalRows.map((row) => ({
        limit: rows[row]?.limit ?? 0n,
        terms: (rows[row]?.terms ?? []).map((term) => ({ ...term, variable: place.get(term.variable) ?? 0 })),
      })),
    };
  });
}

function groupBy<T>(items: Iterable<T>, keyOf: (item: T) => number): Map<number, T[]> {
  const groups = new Map<number, T[]>();
  for (const item of items) {
    const group = groups.get(keyOf(item));
    if (group === undefined) groups.set(keyOf(item), [item]);
    else group.push(item);
  }
  return groups;
}

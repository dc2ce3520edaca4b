import { fieldFault } from '../platform/errors/app-error.js';
import type { ColumnChoice } from './find-columns.js';
import type { ImportKind } from './import-kind.js';

/**
 * Reads a person's corrections of the columns: a JSON object from places in the file to column keys or null.
 *
 * @throws AppError `invalid_input` for anything else
 */
export function chosenColumns(mapping: string | undefined, kind: ImportKind): ColumnChoice {
  if (mapping === undefined) return new Map();
  const entries = Object.entries(parsed(mapping));
  const known = new Set(kind.columns.map(({ key }) => key));
  return new Map(
    entries.map(([place, key]) => {
      const index = /^\d{1,3}$/.test(place) ? Number(place) : undefined;
      const column = key === null || (typeof key === 'string' && known.has(key)) ? key : undefined;
      if (index === undefined || column === undefined) throw unreadableChoice();
      return [index, column] as const;
    }),
  );
}

function parsed(mapping: string): object {
  try {
    const value: unknown = JSON.parse(mapping);
    if (typeof value === 'object' && value !== null && !Array.isArray(value)) return value;
  } catch {
    // Not JSON at all: refused below, like any other form.
  }
  throw unreadableChoice();
}

function unreadableChoice() {
  return fieldFault('/mapping', 'mapping', 'The choice of columns cannot be read. Choose the columns again.');
}

import { listQuery, type ListState } from '../lib/list-state';
import { request } from './request';
import type { paths } from './schema';

interface Listing {
  get: { responses: { 200: { content: { 'application/json': { items: readonly unknown[]; total: number } } } } };
}

/** The routes that answer a page of a list. */
export type ListPath = { [Path in keyof paths]: paths[Path] extends Listing ? Path : never }[keyof paths];

export type ListOf<Path extends ListPath> = paths[Path] extends Listing
  ? paths[Path]['get']['responses'][200]['content']['application/json']
  : never;

/** One row of a list. */
export type RowOf<Path extends ListPath> = ListOf<Path>['items'][number];

/**
 * Fetches the page of a list that the address bar asks for.
 * @param path as the server writes it, such as `/api/parts/{id}/lots`
 * @param within values for the names in braces
 * @throws ApiProblem
 */
export function list<Path extends ListPath>(
  path: Path,
  state: ListState,
  signal?: AbortSignal,
  within: Readonly<Record<string, string | number>> = {},
): Promise<ListOf<Path>> {
  const address = path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(String(within[name] ?? '')));
  return request<ListOf<Path>>('GET', address, { query: listQuery(state), signal });
}

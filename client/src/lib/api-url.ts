export type Query = Record<string, string | number | boolean | undefined | null>;

/** An address under `/api` with its query; empty values are left out. */
export function apiUrl(path: string, query: Query = {}): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value));
  }
  const text = search.toString();
  return text ? `${path}?${text}` : path;
}

/** What a list shows, as the address bar holds it: `?q=clamp&bin=A-12&sort=-code&page=2`. */
export interface ListState {
  q: string;
  filters: Readonly<Record<string, string>>;
  /** A column's field, with `-` before it for falling order. */
  sort: string | undefined;
  /** Begins with 1. */
  page: number;
  pageSize: number;
}

export interface ListAddressSettings {
  filterFields: readonly string[];
  defaultSort?: string;
  defaultPageSize: number;
}

export const pageSizes = [25, 50, 100] as const;

function wholeAtLeastOne(text: string | null): number | undefined {
  if (text === null || !/^\d{1,6}$/.test(text)) return undefined;
  const value = Number(text);
  return value >= 1 ? value : undefined;
}

/** Reads the address; what it does not understand it leaves at its usual value. */
export function readListState(search: URLSearchParams, settings: ListAddressSettings): ListState {
  const filters: Record<string, string> = {};
  for (const field of settings.filterFields) {
    const value = search.get(field);
    if (value) filters[field] = value;
  }
  const size = wholeAtLeastOne(search.get('rows'));
  return {
    q: search.get('q') ?? '',
    filters,
    sort: search.get('sort') ?? settings.defaultSort,
    page: wholeAtLeastOne(search.get('page')) ?? 1,
    pageSize: pageSizes.find((known) => known === size) ?? settings.defaultPageSize,
  };
}

/** Writes the state into an address, leaving out what is usual and keeping what belongs to others. */
export function writeListState(
  search: URLSearchParams,
  state: ListState,
  settings: ListAddressSettings,
): URLSearchParams {
  const next = new URLSearchParams(search);
  const put = (name: string, value: string | undefined): void => {
    if (value) next.set(name, value);
    else next.delete(name);
  };
  put('q', state.q);
  for (const field of settings.filterFields) put(field, state.filters[field]);
  put('sort', state.sort === settings.defaultSort ? undefined : state.sort);
  put('page', state.page > 1 ? String(state.page) : undefined);
  put('rows', state.pageSize === settings.defaultPageSize ? undefined : String(state.pageSize));
  return next;
}

/** What the server is asked, in the words of every list of the API. */
export function listQuery(state: ListState): Record<string, string | number | undefined> {
  return { ...state.filters, q: state.q || undefined, sort: state.sort, page: state.page, pageSize: state.pageSize };
}

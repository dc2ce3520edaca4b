import { keepPreviousData, useQuery, type QueryKey, type UseQueryOptions } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { pageSizes, readGridState, writeGridState, type GridState } from './grid-address';

/** What every list of the API answers. */
export interface ListAnswer<Row> {
  items: readonly Row[];
  total: number;
}

export interface GridFilter {
  /** The name the API and the address bar know it by. */
  field: string;
  label: string;
  /** A choice of values; without them the filter is on or off, or a day. */
  options?: readonly { value: string; label: string }[];
  kind?: 'day';
}

export interface ServerGridSettings<Row, Key extends QueryKey> {
  /** Under which the column choice is remembered. */
  name: string;
  query: (state: GridState) => UseQueryOptions<ListAnswer<Row>, Error, ListAnswer<Row>, Key>;
  filters?: readonly GridFilter[];
  defaultSort?: string;
  defaultPageSize?: number;
}

const noFilters: readonly GridFilter[] = [];

export interface ServerGridModel<Row> {
  name: string;
  state: GridState;
  filters: readonly GridFilter[];
  rows: readonly Row[];
  /** Kept from the last answer while the next is loading. */
  total: number | undefined;
  loading: boolean;
  error: Error | null;
  /** Whether anything narrows the list, so that an empty one says the right thing. */
  narrowed: boolean;
  change: (part: Partial<GridState>) => void;
  setFilter: (field: string, value: string | undefined) => void;
  clearFilters: () => void;
  retry: () => void;
}

/** A list whose page, sort and filters live in the address bar and whose rows come from the server. */
export function useServerGrid<Row, Key extends QueryKey>(settings: ServerGridSettings<Row, Key>): ServerGridModel<Row> {
  const { name, query, filters = noFilters, defaultSort, defaultPageSize = pageSizes[0] } = settings;
  const [search, setSearch] = useSearchParams();
  const address = useMemo(
    () => ({ filterFields: filters.map(({ field }) => field), defaultSort, defaultPageSize }),
    [filters, defaultSort, defaultPageSize],
  );
  const state = useMemo(() => readGridState(search, address), [search, address]);
  const answer = useQuery({ ...query(state), placeholderData: keepPreviousData });
  const change = useCallback(
    (part: Partial<GridState>): void => {
      setSearch((now) => writeGridState(now, { ...readGridState(now, address), page: 1, ...part }, address), {
        replace: true,
        preventScrollReset: true,
      });
    },
    [setSearch, address],
  );
  return {
    name,
    state,
    filters,
    rows: answer.data?.items ?? [],
    total: answer.data?.total,
    loading: answer.isPending || answer.isPlaceholderData,
    error: answer.isError ? answer.error : null,
    narrowed: state.q !== '' || Object.keys(state.filters).length > 0,
    change,
    setFilter: (field, value) => {
      const { [field]: _, ...others } = state.filters;
      change({ filters: value ? { ...others, [field]: value } : others });
    },
    clearFilters: () => change({ q: '', filters: {} }),
    retry: () => void answer.refetch(),
  };
}

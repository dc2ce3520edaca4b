import { keepPreviousData, useQuery, type QueryKey, type UseQueryOptions } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { pageSizes, readListState, writeListState, type ListState } from '../../lib/list-state';

/** What every list of the API answers. */
export interface ListAnswer<Row = unknown> {
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

export interface ServerGridSettings<Answer extends ListAnswer, Key extends QueryKey> {
  /** Under which the column choice is remembered. */
  name: string;
  query: (state: ListState) => UseQueryOptions<Answer, Error, Answer, Key>;
  filters?: readonly GridFilter[];
  defaultSort?: string;
  defaultPageSize?: number;
}

const noFilters: readonly GridFilter[] = [];

export interface ServerGridModel<Row, Answer extends ListAnswer<Row> = ListAnswer<Row>> {
  name: string;
  state: ListState;
  filters: readonly GridFilter[];
  rows: readonly Row[];
  /** The whole of the last answer, for a list that says more than its rows. */
  answer: Answer | undefined;
  /** Kept from the last answer while the next is loading. */
  total: number | undefined;
  loading: boolean;
  error: Error | null;
  /** Whether anything narrows the list, so that an empty one says the right thing. */
  narrowed: boolean;
  change: (part: Partial<ListState>) => void;
  setFilter: (field: string, value: string | undefined) => void;
  clearFilters: () => void;
  retry: () => void;
}

/** A list whose page, sort and filters live in the address bar and whose rows come from the server. */
export function useServerGrid<Answer extends ListAnswer, Key extends QueryKey>(
  settings: ServerGridSettings<Answer, Key>,
): ServerGridModel<Answer['items'][number], Answer> {
  const { name, query, filters = noFilters, defaultSort, defaultPageSize = pageSizes[0] } = settings;
  const [search, setSearch] = useSearchParams();
  const address = useMemo(
    () => ({ filterFields: filters.map(({ field }) => field), defaultSort, defaultPageSize }),
    [filters, defaultSort, defaultPageSize],
  );
  const state = useMemo(() => readListState(search, address), [search, address]);
  const answer = useQuery({ ...query(state), placeholderData: keepPreviousData });
  const change = useCallback(
    (part: Partial<ListState>): void => {
      setSearch((now) => writeListState(now, { ...readListState(now, address), page: 1, ...part }, address), {
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
    answer: answer.data,
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

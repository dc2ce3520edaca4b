import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../api/request';
import type { StripUnit } from '../../../components/strip/strip-words';
import type { MoneyAmount } from '../../../lib/format-money';

/** One thing that needs a hand. Sentences name things in braces, as `Sentence` reads them. */
export interface TodayItem {
  key: string;
  /** The day it is promised or due, `YYYY-MM-DD`. */
  due: string | null;
  late: boolean;
  /** A signal warns without anything being wrong yet. */
  signal: boolean;
  sentence: string;
  because: string | null;
  action: { label: string; to: string } | null;
}

export interface TodayBatch {
  code: string;
  note: string;
  units: readonly StripUnit[];
  current: string | null;
}

export interface TodayFigure {
  label: string;
  count: string | null;
  money: MoneyAmount | null;
}

export interface Today {
  day: string;
  /** Null where the role has no business with promises. */
  promises: { thisWeek: number; safe: number } | null;
  queue: readonly TodayItem[];
  batches: readonly TodayBatch[];
  figures: readonly TodayFigure[];
}

export const todayQuery = queryOptions({
  queryKey: ['today'],
  queryFn: ({ signal }) => request<Today>('GET', '/api/today', { signal }),
  refetchInterval: 60_000,
});

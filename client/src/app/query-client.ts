import { MutationCache, QueryClient, type QueryKey } from '@tanstack/react-query';
import { ApiProblem, sentenceOf } from '../lib/problem';
import { notify } from '../lib/notify';

declare module '@tanstack/react-query' {
  interface Register {
    mutationMeta: {
      /** Query keys that this change touches; they are fetched again before the mutation counts as done. */
      touches?: readonly QueryKey[];
      /** Set where the screen itself shows a refusal: forms and confirmations. */
      showsRefusal?: boolean;
    };
  }
}

/** A refusal does not get better by asking again; only silence and faults on the server's side may. */
function worthRetrying(failures: number, error: Error): boolean {
  if (failures >= 2) return false;
  return !(error instanceof ApiProblem) || error.status === 0 || error.status >= 502;
}

export const queryClient: QueryClient = new QueryClient({
  defaultOptions: {
    queries: { staleTime: 10_000, retry: worthRetrying },
    mutations: { retry: false },
  },
  mutationCache: new MutationCache({
    onError: (error, _variables, _result, { meta }) => {
      if (!meta?.showsRefusal) notify(sentenceOf(error).sentence, { tone: 'hot' });
    },
    onSettled: async (_data, error, _variables, _result, { meta }) => {
      // A refusal has changed nothing. Where nothing answered, the change may have been made all the same.
      if (error instanceof ApiProblem && error.status >= 400 && error.status < 500) return;
      const touched = meta?.touches ?? [];
      // A page opened next would first show what it was before, and send on a version that is no longer there.
      for (const queryKey of touched) queryClient.removeQueries({ queryKey, type: 'inactive' });
      await Promise.all(touched.map((queryKey) => queryClient.invalidateQueries({ queryKey })));
    },
  }),
});

import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { batchQuery, runsQuery, type Batch } from '../api/bench';
import { BuildBench } from '../components/build/build-bench';
import { Frame } from '../components/build/frame';
import { useTypedReadings } from '../components/build/use-typed-readings';

/** One unit in front: the address names it, so that a reload or a scan comes back to it. */
export function Component(): ReactElement {
  const { number = '' } = useParams();
  const batch = useQuery(batchQuery(number));
  const person = usePerson();
  return (
    <Frame data-scheme="dark">
      {batch.isError && !batch.data ? (
        <ErrorState error={batch.error} onRetry={() => void batch.refetch()} what={`Batch ${number}`} />
      ) : null}
      {batch.data && person ? <WithUnit batch={batch.data} personId={person.id} /> : null}
      {!batch.data && !batch.isError ? <LoadingState lines={8} label={`Loading batch ${number}`} /> : null}
    </Frame>
  );
}

function WithUnit({ batch, personId }: { batch: Batch; personId: number }): ReactElement {
  const [search, setSearch] = useSearchParams();
  const readings = useTypedReadings(personId);
  const asked = search.get('unit');
  const unit =
    batch.units.find(({ serial }) => serial === asked) ??
    batch.units.find(({ finished, verdict }) => !finished && verdict !== 'scrapped') ??
    batch.units[0];
  const runs = useQuery({ ...runsQuery(unit?.serial ?? ''), enabled: unit !== undefined });
  if (!unit) {
    return (
      <EmptyState title="Nothing is being built yet">
        Pick the parts of {batch.number} and start building; its units then get their serial numbers.
      </EmptyState>
    );
  }
  if (!runs.data) {
    if (runs.isError) return <ErrorState error={runs.error} onRetry={() => void runs.refetch()} what={unit.serial} />;
    return <LoadingState lines={8} label={`Loading unit ${unit.serial}`} />;
  }
  return (
    <BuildBench
      key={unit.serial}
      batch={batch}
      serial={unit.serial}
      runs={runs.data}
      readings={readings}
      onUnit={(serial) => setSearch({ unit: serial }, { replace: true })}
    />
  );
}

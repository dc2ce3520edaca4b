import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Flag } from '../../../components/flag';
import { column, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { faultsQuery, firstPassesQuery, type Fault } from '../api/bench';
import { faultAddress } from '../components/addresses';

const filters: readonly GridFilter[] = [
  {
    field: 'open',
    label: 'State',
    options: [
      { value: 'true', label: 'open' },
      { value: 'false', label: 'closed' },
    ],
  },
];

const outcomeWords = { reworked: 'reworked', scrapped: 'scrapped', no_fault: 'no fault found' } as const;

const columns = [
  column<Fault>('number', 'Fault', ({ number }) => <code>{number}</code>, { flex: 0, width: 110, hideable: false }),
  tagColumn<Fault>('serial', 'Unit', 'unit', ({ serial, partName }) => ({ code: serial, story: partName }), {
    width: 210,
  }),
  column<Fault>('what', 'What was wrong', ({ what }) => what, { minWidth: 260, sortable: false }),
  column<Fault>('step', 'Found at', ({ run, step }) => (run === null ? (step ?? 'the bench') : `run ${run}`), {
    flex: 0,
    width: 120,
    sortable: false,
  }),
  whenColumn<Fault>('foundAt', 'When', ({ foundAt }) => foundAt),
  column<Fault>(
    'outcome',
    'What came of it',
    ({ outcome }) => (outcome === null ? <Flag tone="tape">open</Flag> : outcomeWords[outcome]),
    { flex: 0, width: 150, sortable: false },
  ),
];

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'faults',
    query: faultsQuery,
    filters,
    defaultSort: '-foundAt',
    defaultPageSize: 25,
  });
  return (
    <>
      <PageHeading title="Faults" lead={<FirstPasses />} />
      <ServerGrid
        grid={grid}
        label="Faults"
        counted={['fault', 'faults']}
        columns={columns}
        rowId={({ id }) => id}
        rowHref={({ number }) => faultAddress(number)}
        empty={
          <EmptyState title="No faults on record">
            A unit that fails its measurements, or at which somebody sees something wrong, stands here.
          </EmptyState>
        }
      />
    </>
  );
}

/** Counts beside the share: nine of ten says more than ninety percent. */
function FirstPasses(): ReactElement {
  const { data } = useQuery(firstPassesQuery);
  if (!data || data.items.length === 0) return <>No unit has been measured yet.</>;
  return (
    <>
      Passed the first time they were measured:{' '}
      {data.items
        .map(
          ({ name, passed, measured }) =>
            `${passed} of ${measured} ${name} (${Math.round((100 * passed) / measured)} %)`,
        )
        .join('; ')}
      .
    </>
  );
}

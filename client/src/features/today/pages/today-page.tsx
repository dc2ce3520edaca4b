import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { sessionQuery } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { Money } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { QueueList, type QueueItem } from '../../../components/queue-list';
import { Sentence } from '../../../components/sentence';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Strip } from '../../../components/strip/strip';
import { Tag } from '../../../components/tag/tag';
import { formatDayShort } from '../../../lib/format-time';
import { todayQuery, type Today, type TodayBatch, type TodayFigure, type TodayItem } from '../api/today';
import { headline, standing } from '../components/today-words';

const Page = styled('div')(({ theme }) => ({
  maxWidth: 1132,
  margin: '8px auto 0',
  '& .two': { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr) minmax(0, 1fr)', gap: 40, marginTop: 44 },
  '& .batch': {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '8px 16px',
    padding: '12px 0',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& .batch > p': { flex: '1 1 110px', margin: 0, textAlign: 'right', color: theme.vars.palette.tone.inkSoft },
  [theme.breakpoints.down('md')]: { '& .two': { gridTemplateColumns: 'minmax(0, 1fr)', gap: 28, marginTop: 32 } },
}));

/** Nothing of the shop can begin before it has a name, an address and a currency. */
function FirstStep(): ReactElement {
  return (
    <>
      <PageHeading title="The shop is not set up yet" documentTitle="Today" />
      <EmptyState
        title="Begin with its name, address and currency"
        action={
          <Button variant="contained" component={Link} to="/setup/shop">
            Set up the shop
          </Button>
        }
      >
        Then enter days on which you are closed, VAT, and where you send to; then parts and what lies on the shelf.
      </EmptyState>
    </>
  );
}

export function Component(): ReactElement {
  const session = useQuery(sessionQuery).data;
  if (session?.shop === null && session.person?.role === 'owner') {
    return (
      <Page>
        <FirstStep />
      </Page>
    );
  }
  return <TodayQueue />;
}

function TodayQueue(): ReactElement {
  const today = useQuery(todayQuery);
  return (
    <Page>
      {today.isError && !today.data ? (
        <ErrorState error={today.error} onRetry={() => void today.refetch()} what="Today" />
      ) : null}
      {today.isPending ? <LoadingState lines={9} /> : null}
      {today.data ? <TodayContent today={today.data} /> : null}
    </Page>
  );
}

function TodayContent({ today }: { today: Today }): ReactElement {
  return (
    <>
      <PageHeading title={headline(today)} documentTitle="Today" lead={standing(today)} />
      {today.queue.length > 0 ? <QueueList label="What needs you" items={today.queue.map(queueItem)} /> : null}
      <div className="two">
        {today.batches.length > 0 ? (
          <Sheet title="On the bench" bare>
            {today.batches.map((batch) => (
              <BatchLine key={batch.code} batch={batch} />
            ))}
          </Sheet>
        ) : null}
        {today.figures.length > 0 ? (
          <Sheet title="Since yesterday" bare>
            <DefinitionList
              items={today.figures.map((figure) => ({ term: figure.label, value: <Figures figure={figure} /> }))}
            />
          </Sheet>
        ) : null}
      </div>
    </>
  );
}

function queueItem({ key, due, late, signal, sentence, because, action }: TodayItem, place: number): QueueItem {
  return {
    key,
    when: due ? formatDayShort(due) : undefined,
    late,
    sentence: (
      <>
        {signal ? (
          <>
            <Flag tone="tape">signal</Flag>{' '}
          </>
        ) : null}
        <Sentence text={sentence} />
      </>
    ),
    because: because ? <Sentence text={because} /> : undefined,
    // The oldest promise is the one to begin with; one filled button a page.
    action: action ? (
      <Button component={Link} to={action.to} variant={place === 0 ? 'contained' : 'outlined'}>
        {action.label}
      </Button>
    ) : undefined,
  };
}

function BatchLine({ batch }: { batch: TodayBatch }): ReactElement {
  const navigate = useNavigate();
  return (
    <div className="batch">
      <Tag kind="batch" code={batch.code} story={batch.note} />
      <Strip
        label={`Batch ${batch.code}`}
        units={batch.units}
        current={batch.current ?? undefined}
        onOpen={(serial) => void navigate(`/bench/units/${encodeURIComponent(serial)}`)}
      />
      <p>{batch.note}</p>
    </div>
  );
}

function Figures({ figure }: { figure: TodayFigure }): ReactElement {
  return (
    <>
      {figure.count}
      {figure.count && figure.money ? '\u2003' : null}
      {figure.money ? <Money value={figure.money} /> : null}
    </>
  );
}

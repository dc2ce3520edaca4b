import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement, ReactNode } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatCount, formatQuantity } from '../../../lib/format-quantity';
import { billQuery, revisionQuery, type Bill, type BillRevision } from '../api/bills';
import { BillActs, BeginDraft } from '../components/bill-acts';
import { BillTreeView } from '../components/bill-tree';
import { BuildableSheet } from '../components/buildable-sheet';
import { ContentsSheet } from '../components/contents-sheet';
import { CostSheet } from '../components/cost-sheet';
import { billStanding, revisionStanding } from '../components/design-words';
import { LinesTable } from '../components/lines-table';
import { RevisionsSheet } from '../components/revisions-sheet';
import { StepsList } from '../components/steps-list';
import { TestPlanTable } from '../components/test-plan-table';

const Layout = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) 340px',
  gap: 32,
  alignItems: 'start',
  '& .main, & .side': { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: 32, minWidth: 0 },
  '& .side': { gap: 18 },
  [theme.breakpoints.down('lg')]: {
    gridTemplateColumns: 'minmax(0, 1fr)',
    // How many now and what one costs come before the long tables.
    '& .side': {
      order: -1,
      gridTemplateColumns: 'repeat(auto-fit, minmax(min(280px, 100%), 1fr))',
      alignItems: 'start',
    },
  },
}));

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const bill = useQuery(billQuery(code));
  const [search] = useSearchParams();
  if (bill.isError) return <ErrorState error={bill.error} onRetry={() => void bill.refetch()} what="The design" />;
  if (!bill.data) return <LoadingState lines={9} label="Loading the design" />;
  const asked = Number(search.get('revision'));
  const numbers = bill.data.revisions.map(({ number }) => number);
  const shown = numbers.includes(asked) ? asked : (bill.data.released ?? bill.data.draft);
  return <Design bill={bill.data} shown={shown} />;
}

function Design({ bill, shown }: { bill: Bill; shown: number | null }): ReactElement {
  const { part } = bill;
  const owner = usePerson()?.role === 'owner';
  return (
    <>
      <PageHeading
        title={part.name}
        lead={billStanding(bill)}
        tags={<Tag kind="part" code={part.code} story={part.name} size="big" />}
        actions={owner ? <BillActs bill={bill} shown={shown} /> : undefined}
      />
      {shown === null ? (
        <Layout>
          <div className="main">
            <EmptyState title="No bill yet" action={owner ? <BeginDraft bill={bill} /> : undefined}>
              A bill says what {part.code} is made of, how it is built and what it is tested for.
            </EmptyState>
            <ContentsSheet code={part.code} editable={owner} />
          </div>
        </Layout>
      ) : (
        <Revision bill={bill} number={shown} owner={owner} />
      )}
    </>
  );
}

function Revision({ bill, number, owner }: { bill: Bill; number: number; owner: boolean }): ReactElement {
  const place = { code: bill.part.code, number };
  const revision = useQuery(revisionQuery(place));
  if (revision.isError) {
    return <ErrorState error={revision.error} onRetry={() => void revision.refetch()} what="The revision" />;
  }
  if (!revision.data) return <LoadingState lines={9} label="Loading the revision" />;
  const hasLines = revision.data.lines.length > 0;
  return (
    <Layout>
      <div className="main">
        <Lines revision={revision.data} />
        <Part title="Build steps" count={revision.data.steps.length} none="No steps are written down.">
          <StepsList steps={revision.data.steps} />
        </Part>
        <Part title="Test plan" count={revision.data.testPlan.length} none="Nothing is measured on it.">
          <TestPlanTable plan={revision.data.testPlan} />
        </Part>
        <ContentsSheet code={place.code} editable={owner} />
      </div>
      <div className="side">
        {hasLines ? <BuildableSheet place={place} /> : null}
        {hasLines && owner ? <CostSheet place={place} /> : null}
        <RevisionsSheet bill={bill} shown={number} />
      </div>
    </Layout>
  );
}

function Part({
  title,
  count,
  none,
  children,
}: {
  title: string;
  count: number;
  none: string;
  children: ReactNode;
}): ReactElement {
  return (
    <Sheet title={title} bare>
      {count > 0 ? children : <p style={{ margin: 0 }}>{none}</p>}
    </Sheet>
  );
}

function Lines({ revision }: { revision: BillRevision }): ReactElement {
  const [search, setSearch] = useSearchParams();
  const asTree = search.get('view') === 'tree';
  const choose = (view: string | null): void => {
    if (view === null) return;
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        if (view === 'tree') next.set('view', 'tree');
        else next.delete('view');
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  };
  const choice = (
    <ToggleButtonGroup
      exclusive
      size="small"
      value={asTree ? 'tree' : 'table'}
      onChange={(_, view: string | null) => choose(view)}
      aria-label="Show the bill as"
    >
      <ToggleButton value="table">table</ToggleButton>
      <ToggleButton value="tree">tree</ToggleButton>
    </ToggleButtonGroup>
  );
  const { lines, minutes } = revision;
  return (
    <Sheet title={revisionStanding(revision)} bare aside={lines.length > 0 ? choice : null}>
      <p style={{ margin: '0 0 10px' }}>
        {formatCount(lines.length, 'line')}, {formatQuantity(minutes, 'min')} of work for one
        {revision.note ? `. ${revision.note}` : '.'}
      </p>
      {lines.length === 0 ? null : asTree ? (
        <BillTreeView place={{ code: revision.part.code, number: revision.number }} />
      ) : (
        <LinesTable lines={lines} />
      )}
    </Sheet>
  );
}

import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { DefinitionList } from '../../../components/definition-list';
import { When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { faultQuery, useNoFault, type Fault } from '../api/bench';
import { buildAddress } from '../components/addresses';
import { ReasonDialog } from '../components/reason-dialog';
import { ReworkForm } from '../components/rework-form';

const outcomeWords = { reworked: 'reworked', scrapped: 'scrapped', no_fault: 'no fault found' } as const;

export function Component(): ReactElement {
  const { number = '' } = useParams();
  const fault = useQuery(faultQuery(number));
  if (fault.isError && !fault.data) {
    return <ErrorState error={fault.error} onRetry={() => void fault.refetch()} what={`Fault ${number}`} />;
  }
  if (!fault.data) return <LoadingState lines={6} label={`Loading fault ${number}`} />;
  return <FaultView fault={fault.data} />;
}

function FaultView({ fault }: { fault: Fault }): ReactElement {
  const noFault = useNoFault(fault.number);
  const [dismissing, setDismissing] = useState(false);
  const open = fault.outcome === null;
  return (
    <>
      <PageHeading
        tags={<Tag kind="unit" code={fault.serial} story={fault.partName} size="big" />}
        title={fault.number}
        documentTitle={`Fault ${fault.number}`}
        lead={
          <>
            {fault.what}{' '}
            {open ? (
              <Flag tone="tape">open</Flag>
            ) : (
              <Flag tone="sound">{outcomeWords[fault.outcome ?? 'no_fault']}</Flag>
            )}
          </>
        }
        actions={
          <>
            {open ? <Button onClick={() => setDismissing(true)}>There is no fault</Button> : null}
            <Button component={Link} to={buildAddress(fault.batch, fault.serial)}>
              Bring to the bench
            </Button>
          </>
        }
      />
      <DefinitionList
        items={[
          { term: 'Found', value: <When instant={fault.foundAt} /> },
          { term: 'By', value: fault.foundBy ?? undefined },
          { term: 'At', value: fault.run === null ? (fault.step ?? undefined) : `measuring, run ${fault.run}` },
          { term: 'Batch', value: <Tag kind="batch" code={fault.batch} /> },
          { term: 'Cause', value: fault.cause ?? undefined },
          { term: 'What was done', value: fault.action ?? undefined },
        ]}
      />
      {open ? (
        <Sheet title="Rework">
          <ReworkForm fault={fault} />
        </Sheet>
      ) : null}
      {dismissing ? (
        <ReasonDialog
          title={`Is there no fault in ${fault.serial}?`}
          consequence="The fault is closed. A run that failed still stands; the unit is measured again."
          question="Why is it none?"
          confirmLabel="Close it"
          onConfirm={(reason) => noFault.mutateAsync({ reason, version: fault.version })}
          onClose={() => setDismissing(false)}
        />
      ) : null}
    </>
  );
}

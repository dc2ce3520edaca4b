import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { useMemo, type ReactElement } from 'react';
import { Flag } from '../../../components/flag';
import { actColumn, column, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { notify } from '../../../lib/notify';
import { outboxQuery, useRetryMail, type OutboxMail } from '../api/shop';

const states: Record<OutboxMail['state'], { label: string; tone: 'cool' | 'sound' | 'hot' | 'tape' }> = {
  waiting: { label: 'waiting', tone: 'cool' },
  sent: { label: 'sent', tone: 'sound' },
  given_up: { label: 'given up', tone: 'hot' },
  uncertain: { label: 'perhaps sent', tone: 'tape' },
};

const filters: readonly GridFilter[] = [
  { field: 'state', label: 'State', options: Object.entries(states).map(([value, { label }]) => ({ value, label })) },
];

function StateFlag({ state }: Pick<OutboxMail, 'state'>): ReactElement {
  const { label, tone } = states[state];
  return <Flag tone={tone}>{label}</Flag>;
}

function mailColumns(retry: (mail: OutboxMail) => void): readonly GridColDef<OutboxMail>[] {
  return [
    whenColumn('createdAt', 'Written', (mail) => mail.createdAt, { hideable: false }),
    column('to', 'To', (mail) => mail.to, { sortable: false, minWidth: 220 }),
    column('subject', 'Subject', (mail) => mail.subject, { sortable: false, minWidth: 240 }),
    column('state', 'State', (mail) => <StateFlag state={mail.state} />, { sortable: false, flex: 0, width: 150 }),
    column('lastError', 'What the mail server said', (mail) => mail.lastError ?? '', {
      sortable: false,
      minWidth: 200,
    }),
    actColumn(
      'Send again',
      (mail) =>
        mail.state === 'given_up' || mail.state === 'uncertain' ? (
          <Button size="small" onClick={() => retry(mail)} aria-label={`Send ${mail.subject} again`}>
            Send again
          </Button>
        ) : null,
      140,
    ),
  ];
}

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'mails',
    query: outboxQuery,
    filters,
    defaultSort: '-createdAt',
    defaultPageSize: 50,
  });
  const { mutate } = useRetryMail();
  const columns = useMemo(
    () =>
      mailColumns((mail) =>
        mutate(mail.id, { onSuccess: () => notify(`The mail to ${mail.to} is on its way again.`) }),
      ),
    [mutate],
  );
  return (
    <>
      <PageHeading title="Mails" lead="What the shop has written to people, and whether it left." />
      <ServerGrid
        grid={grid}
        label="Mails"
        counted={['mail', 'mails']}
        rowId={(mail) => mail.id}
        columns={columns}
        empty={
          <EmptyState title="No mails yet">
            The first one leaves when you invite somebody or a buyer signs up.
          </EmptyState>
        }
      />
    </>
  );
}

import type { GridColDef } from '@mui/x-data-grid';
import { useMemo, useState, type ReactElement } from 'react';
import Button from '@mui/material/Button';
import { column, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { isTagKind } from '../../../components/tag/tag-kinds';
import { auditQuery, type AuditEntry } from '../api/audit';
import { AuditEntryDialog } from '../components/audit-entry-dialog';
import { actionWords, subjectWords } from '../components/audit-words';
import { roleChoices, roleLabel } from '../components/role-choices';

const filters: readonly GridFilter[] = [
  {
    field: 'actorRole',
    label: 'By',
    options: [...roleChoices.map(({ value, label }) => ({ value, label })), { value: 'customer', label: 'Customer' }],
  },
  { field: 'from', label: 'From', kind: 'day' },
  { field: 'to', label: 'To', kind: 'day' },
];

function Who({ entry }: { entry: AuditEntry }): ReactElement {
  if (entry.actorName === null) return <span>the product itself</span>;
  return (
    <span>
      {entry.actorName}
      {entry.actorRole ? `, ${roleLabel(entry.actorRole).toLowerCase()}` : ''}
    </span>
  );
}

function auditColumns(show: (entry: AuditEntry) => void): readonly GridColDef<AuditEntry>[] {
  return [
    whenColumn('recordedAt', 'When', (entry) => entry.recordedAt, { hideable: false }),
    column('actorName', 'Who', (entry) => <Who entry={entry} />, { sortable: false, minWidth: 200 }),
    column('action', 'Did what', (entry) => actionWords(entry.action), { sortable: false, minWidth: 200 }),
    column('subject', 'To what', (entry) => <Subject entry={entry} />, { sortable: false, minWidth: 200 }),
    column(
      'values',
      'Values',
      (entry) =>
        entry.before || entry.after ? (
          <Button size="small" variant="text" onClick={() => show(entry)} aria-label={`Values of entry ${entry.id}`}>
            Before and after
          </Button>
        ) : null,
      { sortable: false, flex: 0, width: 170 },
    ),
  ];
}

function Subject({ entry }: { entry: AuditEntry }): ReactElement {
  const { subjectKind, subjectCode } = entry;
  if (subjectCode && subjectKind !== 'document' && isTagKind(subjectKind))
    return <Tag kind={subjectKind} code={subjectCode} />;
  return <span>{subjectWords(entry)}</span>;
}

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'audit',
    query: auditQuery,
    filters,
    defaultSort: '-recordedAt',
    defaultPageSize: 50,
  });
  const [shown, setShown] = useState<AuditEntry>();
  const columns = useMemo(() => auditColumns(setShown), []);
  return (
    <>
      <PageHeading
        title="Audit"
        lead="Who did what, when, and from which value to which. Nothing here can be changed."
      />
      <ServerGrid
        grid={grid}
        label="Audit entries"
        counted={['entry', 'entries']}
        rowId={(entry) => entry.id}
        columns={columns}
        empty={
          <EmptyState title="Nothing is on record yet">
            The first entry comes with the first change somebody makes.
          </EmptyState>
        }
      />
      {shown ? <AuditEntryDialog entry={shown} onClose={() => setShown(undefined)} /> : null}
    </>
  );
}

import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { useMemo, useState, type ReactElement } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { Flag } from '../../../components/flag';
import { actColumn, column } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { staffQuery, type StaffMember } from '../api/staff';
import { roleLabel } from '../components/role-choices';
import { StaffMemberDialog } from '../components/staff-member-dialog';

const noFilters: readonly GridFilter[] = [];

function StatusFlag({ status }: Pick<StaffMember, 'status'>): ReactElement {
  if (status === 'active') return <Flag tone="sound">may sign in</Flag>;
  if (status === 'disabled') return <Flag tone="hot">shut out</Flag>;
  return <Flag tone="cool">invited, not yet here</Flag>;
}

function staffColumns(change: (member: StaffMember) => void): readonly GridColDef<StaffMember>[] {
  return [
    column('name', 'Name', (member) => member.name, { hideable: false }),
    column('email', 'E-mail address', (member) => member.email, { minWidth: 220 }),
    column('role', 'Role', (member) => roleLabel(member.role)),
    column('status', 'Here', (member) => <StatusFlag status={member.status} />, { minWidth: 180 }),
    actColumn(
      'Change',
      (member) => (
        <Button size="small" onClick={() => change(member)} aria-label={`Change ${member.name}`}>
          Change
        </Button>
      ),
      110,
    ),
  ];
}

export function Component(): ReactElement {
  const grid = useServerGrid({
    name: 'people',
    query: staffQuery,
    filters: noFilters,
    defaultSort: 'name',
    defaultPageSize: 50,
  });
  const [chosen, setChosen] = useState<StaffMember>();
  const columns = useMemo(() => staffColumns(setChosen), []);
  const [search] = useSearchParams();
  const invite = (
    <Button variant="contained" component={Link} to={{ pathname: '/setup/people/invite', search: search.toString() }}>
      Invite somebody
    </Button>
  );
  return (
    <>
      <PageHeading title="People" lead="Who works in the shop, and what each may do." actions={invite} />
      <ServerGrid
        grid={grid}
        label="People"
        counted={['person', 'people']}
        rowId={(member) => member.id}
        columns={columns}
        empty={<EmptyState title="Nobody works here yet" action={invite} />}
      />
      {chosen ? <StaffMemberDialog key={chosen.id} member={chosen} onClose={() => setChosen(undefined)} /> : null}
    </>
  );
}

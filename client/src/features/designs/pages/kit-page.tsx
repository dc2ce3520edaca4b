import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState, type ReactElement } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Link, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { notify } from '../../../lib/notify';
import { parseDecimal } from '../../../lib/parse-number';
import { ApiProblem } from '../../../lib/problem';
import type { BillPart } from '../api/bills';
import { contentsQuery, useSaveContents, type Contents, type ContentsEdit } from '../api/kits';
import { billAddress, editKitAddress, kitAddress } from '../components/addresses';
import { ContentsByBag } from '../components/contents-sheet';
import { PartCell, TextCell } from '../components/editor/cells';
import { CollisionPanel } from '../components/editor/collision-panel';
import type { Difference } from '../components/editor/differences';
import { EditableRows, RowActs, type RowColumn } from '../components/editor/rows';

interface ContentsValues {
  version: number;
  lines: { part: string; quantity: string; bag: string }[];
}

const columns: readonly RowColumn[] = [
  { key: 'bag', title: 'Bag', width: 110 },
  { key: 'part', title: 'Part' },
  { key: 'quantity', title: 'How many', width: 120 },
  { key: 'acts', title: '', width: 110 },
];

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const owner = usePerson()?.role === 'owner';
  const [search] = useSearchParams();
  const contents = useQuery({ ...contentsQuery(code), staleTime: Infinity, refetchOnMount: 'always' });
  if (contents.isError) {
    return <ErrorState error={contents.error} onRetry={() => void contents.refetch()} what="The contents" />;
  }
  if (!contents.isFetchedAfterMount || !contents.data) return <LoadingState label="Loading the contents" />;
  const { part, lines } = contents.data;
  const editing = owner && (search.get('edit') === 'yes' || lines.length === 0);
  return (
    <>
      <PageHeading
        title={`${part.name}, contents`}
        lead={
          <>
            What is packed into which bag. <Link to={billAddress(part.code)}>Its design</Link>
          </>
        }
        tags={<Tag kind="part" code={part.code} story={part.name} size="big" />}
        actions={
          owner && !editing ? (
            <Button variant="contained" component={Link} to={editKitAddress(code)}>
              Edit the contents
            </Button>
          ) : undefined
        }
      />
      {editing ? <ContentsEditor key={code} contents={contents.data} /> : null}
      {!editing && lines.length > 0 ? <ContentsByBag contents={contents.data} /> : null}
      {!editing && lines.length === 0 ? (
        <EmptyState title="No contents list">This part is not packed as a kit.</EmptyState>
      ) : null}
    </>
  );
}

function ContentsEditor({ contents }: { contents: Contents }): ReactElement {
  const { code } = contents.part;
  const save = useSaveContents(code);
  const navigate = useNavigate();
  const [theirs, setTheirs] = useState<Contents>();
  const form = useDraftForm<ContentsValues>({ name: `kit:${code}`, defaultValues: valuesOf(contents) });
  const send = async (values: ContentsValues): Promise<void> => {
    setTheirs(undefined);
    try {
      const saved = await save.mutateAsync(editOf(values));
      form.discardDraft();
      form.reset(valuesOf(saved));
    } catch (error) {
      if (error instanceof ApiProblem && error.code === 'changed_meanwhile') setTheirs(error.current as Contents);
      throw error;
    }
    notify(`The contents of ${code} are saved.`);
    await navigate(kitAddress(code));
  };
  const takeTheirs = (): void => {
    if (theirs) form.reset(valuesOf(theirs));
    form.discardDraft();
    setTheirs(undefined);
  };
  return (
    <Form
      form={form}
      onSubmit={send}
      submitLabel="Save the contents"
      onCancel={() => void navigate(kitAddress(code))}
      wide
      label="Contents"
    >
      {theirs ? (
        <CollisionPanel
          what="this list"
          differences={differencesOf(form.getValues(), valuesOf(theirs))}
          onKeepYours={() => form.setValue('version', theirs.version, { shouldDirty: true })}
          onTakeTheirs={takeTheirs}
        />
      ) : null}
      <ContentsRows contents={contents} />
    </Form>
  );
}

function ContentsRows({ contents }: { contents: Contents }): ReactElement {
  const { control, getValues } = useFormContext<ContentsValues>();
  const { fields, append, remove, move } = useFieldArray({ control, name: 'lines' });
  const known = useMemo(
    () => new Map<string, BillPart>(contents.lines.map(({ part }) => [part.code, part])),
    [contents],
  );
  const add = (): void => {
    const bag = getValues('lines').at(-1)?.bag ?? '1';
    append({ part: '', quantity: '1', bag }, { focusName: `lines.${fields.length}.part` });
  };
  return (
    <EditableRows
      title="Contents"
      hint="In the order in which they are packed. Enter goes down, and begins a line after the last."
      columns={columns}
      count={fields.length}
      addLabel="Add a line"
      onAdd={add}
      onRemove={remove}
      onMove={move}
    >
      {fields.map(({ id }, row) => {
        const cell = (column: string, title: string) => ({
          name: `lines.${row}.${column}`,
          label: `${title}, line ${row + 1}`,
          row,
          column,
        });
        return (
          <tr key={id}>
            <td>
              <TextCell {...cell('bag', 'Bag')} />
            </td>
            <td>
              <PartCell {...cell('part', 'Part')} known={known} />
            </td>
            <td>
              <TextCell {...cell('quantity', 'How many')} figure />
            </td>
            <RowActs what={`line ${row + 1}`} row={row} count={fields.length} onRemove={remove} onMove={move} />
          </tr>
        );
      })}
    </EditableRows>
  );
}

function valuesOf(contents: Contents): ContentsValues {
  const lines = contents.lines.map(({ part, quantity, bag }) => ({ part: part.code, quantity, bag }));
  return { version: contents.version, lines };
}

function editOf({ version, lines }: ContentsValues): ContentsEdit {
  return {
    version,
    lines: lines.map(({ part, quantity, bag }) => ({
      part: part.trim(),
      quantity: parseDecimal(quantity) ?? quantity,
      bag: bag.trim(),
    })),
  };
}

function differencesOf(yours: ContentsValues, theirs: ContentsValues): Difference[] {
  const quantities = ({ lines }: ContentsValues): Map<string, string> =>
    new Map(lines.map(({ part, bag, quantity }) => [`${part.toUpperCase()} in bag ${bag}`, quantity]));
  const [own, others] = [quantities(yours), quantities(theirs)];
  return [...new Set([...own.keys(), ...others.keys()])].flatMap((what) => {
    const [mine, their] = [own.get(what) ?? '–', others.get(what) ?? '–'];
    return mine === their ? [] : [{ what, field: '', yours: mine, theirs: their }];
  });
}

import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState, type ReactElement } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { notify } from '../../../lib/notify';
import { ApiProblem } from '../../../lib/problem';
import { revisionQuery, useSaveDraft, type BillPart, type BillRevision } from '../api/bills';
import { billAddress } from '../components/addresses';
import { editOf, valuesOf, type BillValues } from '../components/editor/bill-values';
import { CollisionPanel } from '../components/editor/collision-panel';
import { differencesOf } from '../components/editor/differences';
import { LinesEditor } from '../components/editor/lines-editor';
import { PlanEditor } from '../components/editor/plan-editor';
import { StepsEditor } from '../components/editor/steps-editor';

export function Component(): ReactElement {
  const { code = '', number = '' } = useParams();
  const place = { code, number: Number(number) };
  // What is being edited stays as it was opened; saving tells whether it changed meanwhile.
  const revision = useQuery({ ...revisionQuery(place), staleTime: Infinity, refetchOnMount: 'always' });
  if (revision.isError)
    return <ErrorState error={revision.error} onRetry={() => void revision.refetch()} what="The draft" />;
  if (!revision.isFetchedAfterMount || !revision.data) return <LoadingState lines={9} label="Loading the draft" />;
  if (revision.data.status !== 'draft') {
    return (
      <EmptyState title={`Revision ${number} of ${code} is released`}>
        It cannot change any more. Make a draft from it on its page.
      </EmptyState>
    );
  }
  return <Editor key={`${code} ${number}`} revision={revision.data} />;
}

function Editor({ revision }: { revision: BillRevision }): ReactElement {
  const { part, number } = revision;
  const place = { code: part.code, number };
  const navigate = useNavigate();
  const save = useSaveDraft(place);
  const [theirs, setTheirs] = useState<BillRevision>();
  const form = useDraftForm<BillValues>({ name: `bill:${part.code}:${number}`, defaultValues: valuesOf(revision) });
  const known = useMemo(() => partsIn(theirs ? [revision, theirs] : [revision]), [revision, theirs]);
  const back = billAddress(part.code, number);
  const send = async (values: BillValues): Promise<void> => {
    setTheirs(undefined);
    try {
      await save.mutateAsync(editOf(values));
    } catch (error) {
      if (error instanceof ApiProblem && error.code === 'changed_meanwhile') setTheirs(error.current as BillRevision);
      throw error;
    }
    notify(`Revision ${number} of ${part.code} is saved.`);
    form.discardDraft();
    await navigate(back);
  };
  // The button that calls this submits the form; what stands in it is sent over the newer version.
  const keepYours = (): void => {
    if (theirs) form.setValue('version', theirs.version, { shouldDirty: true });
  };
  const takeTheirs = (): void => {
    if (!theirs) return;
    form.discardDraft();
    form.reset(valuesOf(theirs));
    setTheirs(undefined);
  };
  return (
    <>
      <PageHeading
        title={`${part.name}, revision ${number}`}
        lead="A draft: what it is made of, how it is built, and what it is tested for."
        tags={<Tag kind="part" code={part.code} story={part.name} />}
      />
      <Form
        form={form}
        onSubmit={send}
        onCancel={() => void navigate(back)}
        submitLabel="Save the draft"
        wide
        label="Draft"
      >
        {theirs ? (
          <CollisionPanel
            what="this draft"
            differences={differencesOf(form.getValues(), valuesOf(theirs))}
            onKeepYours={keepYours}
            onTakeTheirs={takeTheirs}
          />
        ) : null}
        <TextInput name="note" label="What is new in this revision" longest={textLimit.note} width="min(640px, 100%)" />
        <LinesEditor known={known} />
        <StepsEditor />
        <PlanEditor />
      </Form>
    </>
  );
}

function partsIn(revisions: readonly BillRevision[]): ReadonlyMap<string, BillPart> {
  const parts = revisions.flatMap(({ lines }) => lines.flatMap((line) => [line.part, ...line.alternates]));
  return new Map(parts.map((part) => [part.code, part]));
}

import { csvLimit } from '@emberlot/shared/limits/imports';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { FileDrop } from '../../../components/file-drop';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { formatCount } from '../../../lib/format-quantity';
import { notify } from '../../../lib/notify';
import {
  importKindsQuery,
  useApplyImport,
  useDryRun,
  type ChosenFile,
  type ImportCheck,
  type ImportKind,
} from '../api/imports';
import { ColumnsTable, FaultsTable, WhatIsTaken } from '../components/import-sheets';
import { Loaded } from '../components/page-body';

export function Component(): ReactElement {
  const { kind: key = '' } = useParams();
  return (
    <Loaded query={useQuery(importKindsQuery)} what="The import">
      {({ items }) => {
        const kind = items.find((candidate) => candidate.kind === key);
        return kind ? <Import key={key} kind={kind} /> : <ErrorState error={undefined} what="This kind of import" />;
      }}
    </Loaded>
  );
}

function Import({ kind }: { kind: ImportKind }): ReactElement {
  const [chosen, setChosen] = useState<ChosenFile>();
  const dryRun = useDryRun(kind.kind);
  const look = (next: ChosenFile): void => {
    setChosen(next);
    dryRun.mutate(next);
  };
  const check = dryRun.data;
  return (
    <>
      <PageHeading
        title={`Take in ${kind.title.toLowerCase()}`}
        lead={kind.sentence}
        actions={
          <Button component="a" href={`/api/imports/${kind.kind}/template`} download>
            Get the template
          </Button>
        }
      />
      <div style={{ display: 'grid', gap: 20 }}>
        <FileDrop
          label="Choose a CSV file"
          accept=".csv,.txt,.tsv,text/csv"
          largest={csvLimit.bytes}
          chosen={chosen?.file}
          hint="In UTF-8, with a header line; commas, semicolons or tabs between the cells. Nothing is written before you say so."
          onFile={(file) => look({ file, mapping: {}, decimalSign: undefined })}
        />
        {dryRun.isPending ? <LoadingState label="Reading the file" /> : null}
        {dryRun.isError ? <ErrorState error={dryRun.error} what="The file" /> : null}
        {check && chosen && !dryRun.isPending ? (
          <Looked kind={kind} chosen={chosen} check={check} onChange={look} />
        ) : (
          <Sheet title="What the columns hold">
            <WhatIsTaken kind={kind} />
          </Sheet>
        )}
      </div>
    </>
  );
}

interface LookedProps {
  kind: ImportKind;
  chosen: ChosenFile;
  check: ImportCheck;
  onChange: (chosen: ChosenFile) => void;
}

/** What the dry run found, and the one act that takes the file in. */
function Looked({ kind, chosen, check, onChange }: LookedProps): ReactElement {
  const apply = useApplyImport(kind.kind);
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const takeIn = async (): Promise<void> => {
    const { file, mapping, decimalSign } = chosen;
    const key = keyFor([file.name, file.size, file.lastModified, mapping, decimalSign ?? '']);
    const run = await apply.mutateAsync({ chosen, key });
    done();
    notify(`${run.fileName} is taken in: ${formatCount(run.rowCount, 'line')}.`);
    await navigate('/shelf/imports');
  };
  return (
    <>
      <Sheet title={headline(check)}>
        <ul style={{ margin: '0 0 14px', paddingLeft: 20 }}>
          {check.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
        {apply.isError ? <ErrorState error={apply.error} what="The file" /> : null}
        <Button
          variant="contained"
          disabled={!check.ready || apply.isPending}
          onClick={() => void takeIn().catch(() => undefined)}
        >
          {apply.isPending ? 'Taking it in' : 'Take it in'}
        </Button>
      </Sheet>
      {check.faultCount > 0 ? (
        <Sheet title="What is wrong, line by line">
          <FaultsTable check={check} />
        </Sheet>
      ) : null}
      <Sheet title="Which column is what">
        <ColumnsTable
          check={check}
          kind={kind}
          onChoose={(index, key) => onChange({ ...chosen, mapping: { ...chosen.mapping, [index]: key } })}
          onDecimalSign={(decimalSign) => onChange({ ...chosen, decimalSign })}
        />
      </Sheet>
    </>
  );
}

function headline({ faultCount, additions, rowCount, fileName }: ImportCheck): string {
  if (faultCount > 0)
    return `${formatCount(faultCount, 'fault')} in ${fileName}: put them right in the file and choose it again`;
  if (additions === 0) return 'All that this file holds is there already';
  return `${formatCount(rowCount, 'line')} in ${fileName}, and no fault`;
}

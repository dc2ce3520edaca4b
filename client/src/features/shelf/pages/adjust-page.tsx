import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { sessionQuery, usePerson } from '../../../api/session';
import { Caution } from '../../../components/caution';
import { RadioInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { MoneyInput, QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useAdjust } from '../api/stock';
import { backTo } from '../components/addresses';
import { CodeInput } from '../components/code-input';
import { adjustmentInput, type AdjustmentLineValues, type AdjustmentValues } from '../components/line-values';
import { LotInput, useLinePart } from '../components/lot-input';
import { RowList } from '../components/row-list';
import { adjustmentChoices } from '../components/shelf-words';

const emptyLine: AdjustmentLineValues = { part: '', lot: '', bin: '', quantity: '', unitCost: '' };

export function Component(): ReactElement {
  const adjust = useAdjust();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const first = {
    ...emptyLine,
    part: search.get('part') ?? '',
    lot: search.get('lot') ?? '',
    bin: search.get('bin') ?? '',
  };
  const back = backTo(first);
  const form = useDraftForm<AdjustmentValues>({
    name: `adjustment:${first.part}:${first.lot}:${first.bin}`,
    defaultValues: { reason: search.get('reason') ?? 'counted', note: '', lines: [first] },
  });
  const send = async (values: AdjustmentValues): Promise<void> => {
    const body = adjustmentInput(values);
    const made = await adjust.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`The record follows the shelf by ${made.number}.`);
    await navigate(back);
  };
  return (
    <>
      <PageHeading
        title="Adjust the record"
        lead="The shelf is right and the record is wrong: say what you see there, and why."
      />
      <Form wide form={form} onSubmit={send} onCancel={() => void navigate(back)} submitLabel="Adjust the record">
        <RadioInput name="reason" label="Why" choices={adjustmentChoices} required />
        <DamagedCells />
        <Lines />
        <TextInput
          name="note"
          label="What happened"
          longest={textLimit.line}
          required
          hint="For whoever reads it later."
        />
      </Form>
    </>
  );
}

function DamagedCells(): ReactElement | null {
  const reason: unknown = useWatch({ name: 'reason' });
  if (reason !== 'damaged') return null;
  return (
    <Caution>
      <p>
        A damaged lithium cell can catch fire hours later. Keep it outside or in a fireproof box, away from other cells,
        and ask your carrier before you send it anywhere.
      </p>
    </Caution>
  );
}

function Lines(): ReactElement {
  const rows = useFieldArray({ name: 'lines' });
  const reason: unknown = useWatch({ name: 'reason' });
  return (
    <RowList
      legend={reason === 'counted' ? 'What lies there' : 'What it is'}
      rows={rows.fields.map(({ id }, index) => ({
        key: id,
        fields: <Line line={`lines.${index}`} reason={String(reason)} />,
      }))}
      fewest={1}
      addLabel="Add a line"
      rowName={(index) => `line ${index + 1}`}
      onAdd={() => rows.append(emptyLine)}
      onRemove={(index) => rows.remove(index)}
    />
  );
}

const quantityLabels: Readonly<Record<string, string>> = {
  counted: 'Lies there',
  found: 'Found',
  lost: 'Lost',
  damaged: 'Damaged',
};

function Line({ line, reason }: { line: string; reason: string }): ReactElement {
  const story = useLinePart(`${line}.part`);
  const owner = usePerson()?.role === 'owner';
  const currency = useQuery(sessionQuery).data?.shop?.currency ?? 'EUR';
  const mayCost = owner && (reason === 'found' || reason === 'counted');
  return (
    <>
      <CodeInput kind="part" name={`${line}.part`} label="Part" required width={200} />
      <CodeInput kind="bin" name={`${line}.bin`} label="Bin" required width={140} />
      <LotInput line={line} />
      <QuantityInput
        name={`${line}.quantity`}
        label={quantityLabels[reason] ?? 'Quantity'}
        unit={story?.part.measure}
        places={6}
        allow={reason === 'counted' ? 'zero' : 'positive'}
        required
        width={150}
      />
      {mayCost ? (
        <MoneyInput
          name={`${line}.unitCost`}
          label="Cost of one found"
          currency={currency}
          places={6}
          hint="Left empty, the average counts."
          width={190}
        />
      ) : null}
    </>
  );
}

import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useFieldArray } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useTransfer } from '../api/stock';
import { backTo } from '../components/addresses';
import { CodeInput } from '../components/code-input';
import { transferInput, type TransferLineValues } from '../components/line-values';
import { LotInput, useLinePart } from '../components/lot-input';
import { RowList } from '../components/row-list';

interface TransferValues {
  note: string;
  lines: TransferLineValues[];
}

const emptyLine: TransferLineValues = { part: '', lot: '', bin: '', toBin: '', quantity: '' };

export function Component(): ReactElement {
  const transfer = useTransfer();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const first = {
    ...emptyLine,
    part: search.get('part') ?? '',
    lot: search.get('lot') ?? '',
    bin: search.get('bin') ?? '',
    quantity: search.get('quantity') ?? '',
  };
  const back = backTo(first);
  const form = useDraftForm<TransferValues>({
    name: `transfer:${first.part}:${first.lot}:${first.bin}`,
    defaultValues: { note: '', lines: [first] },
  });
  const send = async (values: TransferValues): Promise<void> => {
    const body = transferInput(values);
    const made = await transfer.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`Moved by ${made.number}.`);
    await navigate(back);
  };
  return (
    <>
      <PageHeading title="Move between bins" lead="Nothing but the place changes." />
      <Form wide form={form} onSubmit={send} onCancel={() => void navigate(back)} submitLabel="Move it">
        <Lines />
        <TextInput name="note" label="Note" longest={textLimit.note} rows={2} />
      </Form>
    </>
  );
}

function Lines(): ReactElement {
  const rows = useFieldArray({ name: 'lines' });
  return (
    <RowList
      legend="What moves"
      rows={rows.fields.map(({ id }, index) => ({ key: id, fields: <Line line={`lines.${index}`} /> }))}
      fewest={1}
      addLabel="Add a line"
      rowName={(index) => `line ${index + 1}`}
      onAdd={() => rows.append(emptyLine)}
      onRemove={(index) => rows.remove(index)}
    />
  );
}

function Line({ line }: { line: string }): ReactElement {
  const part = useLinePart(`${line}.part`)?.part;
  return (
    <>
      <CodeInput kind="part" name={`${line}.part`} label="Part" required width={200} />
      <CodeInput kind="bin" name={`${line}.bin`} label="From bin" required width={140} />
      <LotInput line={line} />
      <QuantityInput name={`${line}.quantity`} label="Quantity" unit={part?.measure} places={6} required width={150} />
      <CodeInput kind="bin" name={`${line}.toBin`} label="To bin" required width={140} />
    </>
  );
}

import type { ReactElement } from 'react';
import { styled } from '@mui/material/styles';
import { Caution } from '../../../components/caution';
import { ChoiceInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { Flag } from '../../../components/flag';
import { Sheet } from '../../../components/sheet';
import { notify } from '../../../lib/notify';
import { useCarrierAnswer, useSayLithium, type Parcel } from '../api/counter';

const Said = styled('div')({
  '& ul': { margin: '6px 0', paddingLeft: 20 },
  '& h3': { margin: '12px 0 0', fontSize: '1rem' },
});

const modes = [
  { value: 'road', label: 'by road' },
  { value: 'sea', label: 'by sea' },
  { value: 'passenger_aircraft', label: 'by passenger aircraft' },
  { value: 'cargo_aircraft', label: 'by cargo aircraft' },
  { value: 'letter_post', label: 'by letter post' },
];

/** What the rules for lithium say of this parcel, and what has to be said so that they can. */
export function LithiumSheet({
  parcel,
  packs,
  owner,
}: {
  parcel: Parcel;
  packs: boolean;
  owner: boolean;
}): ReactElement {
  const { lithium } = parcel;
  const asks = lithium.answer === 'ask' && lithium.mode !== null && parcel.state === 'packed';
  return (
    <Sheet title="Lithium and weight" aside={<Flag tone={lithium.mayLeave ? 'sound' : 'tape'}>{flagOf(parcel)}</Flag>}>
      <Said>
        <p>{lithium.sentence}</p>
        <Lines title="Why" lines={lithium.reasons} />
        <Lines
          title="The rule"
          lines={lithium.rules.map(
            ({ unNumber, properName, instruction }) => `${unNumber}, ${properName}: ${instruction}`,
          )}
        />
        <Lines title="On the parcel" lines={[...(lithium.mark ? [lithium.mark] : []), ...lithium.labels]} />
        <Lines title="On the papers" lines={lithium.papers} />
        <Lines title="Make sure" lines={lithium.conditions} />
        <Lines title="Still to be said" lines={lithium.missing} />
        {lithium.carrierAnswer ? <Lines title="The carrier answered" lines={[lithium.carrierAnswer]} /> : null}
        {lithium.edition ? <p>By {lithium.edition}.</p> : null}
      </Said>
      <Caution>{lithium.caution}</Caution>
      {parcel.state === 'packed' && packs ? <FactsForm parcel={parcel} /> : null}
      {asks && owner ? <AnswerForm parcel={parcel} /> : null}
    </Sheet>
  );
}

function flagOf({ lithium }: Parcel): string {
  if (lithium.answer === 'no_lithium') return 'no lithium';
  if (lithium.mayLeave) return 'may leave';
  return lithium.answer === 'ask' ? 'to be asked' : 'must not leave';
}

function Lines({ title, lines }: { title: string; lines: readonly string[] }): ReactElement | null {
  if (lines.length === 0) return null;
  return (
    <>
      <h3>{title}</h3>
      <ul>
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    </>
  );
}

interface Facts {
  mode: string;
  weightG: string;
  wattHoursOnCase: string;
  chargePercent: string;
}

function FactsForm({ parcel }: { parcel: Parcel }): ReactElement {
  const say = useSayLithium(parcel.number);
  const { lithium } = parcel;
  const form = useDraftForm<Facts>({
    name: `parcel ${parcel.number} facts`,
    defaultValues: {
      mode: lithium.mode ?? 'road',
      weightG: parcel.weightG === null ? '' : String(parcel.weightG),
      wattHoursOnCase: lithium.wattHoursOnCase === null ? 'unknown' : lithium.wattHoursOnCase ? 'yes' : 'no',
      chargePercent: lithium.chargePercent === null ? '' : String(lithium.chargePercent),
    },
  });
  const send = async ({ mode, weightG, wattHoursOnCase, chargePercent }: Facts): Promise<void> => {
    await say.mutateAsync({
      mode: mode as NonNullable<Parcel['lithium']['mode']>,
      weightG: Number(weightG),
      wattHoursOnCase: wattHoursOnCase === 'unknown' ? null : wattHoursOnCase === 'yes',
      chargePercent: chargePercent === '' ? null : Number(chargePercent),
      version: parcel.version,
    });
    notify('The weight and the way are kept.');
  };
  const lithiumAsked = lithium.answer !== 'no_lithium';
  return (
    <Form form={form} onSubmit={send} submitLabel="Keep weight and way">
      <ChoiceInput name="mode" label="It travels" choices={modes} required />
      <QuantityInput name="weightG" label="Weight of the whole parcel" unit="g" places={0} required />
      {lithiumAsked ? (
        <ChoiceInput
          name="wattHoursOnCase"
          label="Watt-hours stand on each battery"
          choices={[
            { value: 'unknown', label: 'nobody has looked' },
            { value: 'yes', label: 'yes' },
            { value: 'no', label: 'no' },
          ]}
        />
      ) : null}
      {lithiumAsked ? (
        <QuantityInput name="chargePercent" label="Charge of the batteries" unit="%" places={0} allow="zero" />
      ) : null}
    </Form>
  );
}

function AnswerForm({ parcel }: { parcel: Parcel }): ReactElement {
  const answer = useCarrierAnswer(parcel.number);
  const form = useDraftForm<{ note: string }>({
    name: `parcel ${parcel.number} carrier`,
    defaultValues: { note: '' },
  });
  return (
    <Form
      form={form}
      onSubmit={async ({ note }) => {
        await answer.mutateAsync({ note, version: parcel.version });
        notify('The answer of the carrier is kept.');
      }}
      submitLabel="Keep the carrier's answer"
    >
      <TextInput name="note" label="Whom you asked at the carrier, and what they said" longest={200} required />
    </Form>
  );
}

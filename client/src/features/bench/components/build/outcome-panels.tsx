import Button from '@mui/material/Button';
import OutlinedInput from '@mui/material/OutlinedInput';
import { useQuery } from '@tanstack/react-query';
import { useState, type FormEvent, type ReactElement } from 'react';
import { useIdempotencyKey } from '../../../../api/idempotency';
import { ErrorState, LoadingState } from '../../../../components/states';
import { Tag } from '../../../../components/tag/tag';
import { sentenceOf } from '../../../../lib/problem';
import { readStored, writeStored } from '../../../../lib/stored';
import { unitQuery, useFinishUnit } from '../../api/bench';
import { ReworkForm } from '../rework-form';
import { ScrapDialog } from '../scrap-dialog';

const binKey = 'bench-bin';

function rememberedBin(): string {
  const kept = readStored('local', binKey);
  return typeof kept === 'string' ? kept : '';
}

/** The unit passed: where it is put. */
export function FinishPanel({ serial }: { serial: string }): ReactElement {
  const finish = useFinishUnit(serial);
  const { keyFor, done } = useIdempotencyKey();
  const [bin, setBin] = useState(rememberedBin);
  const [fault, setFault] = useState<string>();
  const send = async (event: FormEvent): Promise<void> => {
    event.preventDefault();
    setFault(undefined);
    try {
      const body = { bin: bin.trim() };
      await finish.mutateAsync({ body, key: keyFor(body) });
      done();
      writeStored('local', binKey, bin.trim());
    } catch (error) {
      setFault(sentenceOf(error).sentence);
    }
  };
  return (
    <form onSubmit={(event) => void send(event)} aria-label={`Finish ${serial}`}>
      <p className="place">Every step is done and every reading is within</p>
      <h1 tabIndex={-1} data-verdict="within">
        ✓ passed
      </h1>
      <p>
        <label htmlFor="finish-bin">Into bin</label>
      </p>
      <p className="acts">
        <OutlinedInput id="finish-bin" value={bin} onChange={({ target }) => setBin(target.value)} autoComplete="off" />
        <Button type="submit" variant="contained" disabled={finish.isPending || bin.trim() === ''}>
          Put it on the shelf
        </Button>
      </p>
      {fault ? (
        <p role="alert" className="remark">
          ✕ {fault}
        </p>
      ) : null}
    </form>
  );
}

/** The unit failed, or somebody saw something wrong with it: what is done about it. */
export function FaultPanel({ serial }: { serial: string }): ReactElement {
  const unit = useQuery(unitQuery(serial));
  const [scrapping, setScrapping] = useState(false);
  const fault = unit.data?.faults.find(({ closedAt }) => closedAt === null);
  if (unit.isError && !unit.data) {
    return <ErrorState error={unit.error} onRetry={() => void unit.refetch()} what="The fault" />;
  }
  if (!unit.data) return <LoadingState lines={4} label="Loading the fault" />;
  if (!fault) return <p className="place">Its fault is closed. Go on with the next reading.</p>;
  return (
    <>
      <p className="place">
        {fault.number}: {fault.what}
      </p>
      <h1 tabIndex={-1} data-verdict="outside">
        ✕ failed
      </h1>
      <ReworkForm key={fault.number} fault={fault} />
      <p className="acts">
        <Button color="error" onClick={() => setScrapping(true)}>
          Scrap the unit
        </Button>
      </p>
      {scrapping ? <ScrapDialog serial={serial} onClose={() => setScrapping(false)} /> : null}
    </>
  );
}

const settled = {
  finished: { verdict: 'within', title: '✓ finished', text: 'It lies on the shelf. Go on with another unit.' },
  scrapped: { verdict: 'outside', title: '– scrapped', text: 'Nothing more is done to it.' },
  waiting: {
    verdict: undefined,
    title: 'All readings are in',
    text: 'The verdict comes as soon as the server has them.',
  },
} as const;

export function SettledPanel({ serial, kind }: { serial: string; kind: keyof typeof settled }): ReactElement {
  const { verdict, title, text } = settled[kind];
  return (
    <>
      <p className="place">
        <Tag kind="unit" code={serial} />
      </p>
      <h1 tabIndex={-1} data-verdict={verdict}>
        {title}
      </h1>
      <p>{text}</p>
    </>
  );
}

import { useState, type ReactElement, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Strip } from '../../../../components/strip/strip';
import { Tag } from '../../../../components/tag/tag';
import { notify } from '../../../../lib/notify';
import { useScan } from '../../../../lib/use-scan';
import { useTick, type Batch, type UnitRuns } from '../../api/bench';
import { batchAddress } from '../addresses';
import {
  frontOf,
  readingFault,
  readingsInHand,
  readingsToShow,
  suggestionFor,
  verdictOf,
  type Front,
  type Item,
  type TypedReading,
} from './in-hand';
import { Keypad } from './keypad';
import { FaultPanel, FinishPanel, SettledPanel } from './outcome-panels';
import { ReadingPanel } from './reading-panel';
import { ReportDialog } from './report-dialog';
import { Sent } from './sent';
import { SideList } from './side-list';
import { StepPanel } from './step-panel';
import { useKeys } from './use-keys';
import type { useTypedReadings } from './use-typed-readings';

interface BuildBenchProps {
  batch: Batch;
  serial: string;
  runs: UnitRuns;
  readings: ReturnType<typeof useTypedReadings>;
  onUnit: (serial: string) => void;
}

/** One unit in front: what is next, the keys, and everything else that is done to it. */
export function BuildBench({ batch, serial, runs, readings, onUnit }: BuildBenchProps): ReactElement {
  const tick = useTick(batch.number);
  const [chosen, setChosen] = useState<Item>();
  const [typed, setTyped] = useState('');
  const [remark, setRemark] = useState<string>();
  /** A doubtful reading that was asked about: the next press of Enter lets it stand. */
  const [askedAbout, setAskedAbout] = useState<string>();
  const [reporting, setReporting] = useState(false);
  const shown = readingsInHand(batch.testPlan, runs, readings.of(serial));
  const next = frontOf(batch, serial, shown);
  const all = readingsToShow(runs, shown, next.kind !== 'reading' && next.kind !== 'step');
  const settled = next.kind === 'fault' || next.kind === 'finished' || next.kind === 'scrapped';
  const front: Front = settled ? next : (chosen ?? next);
  const step = front.kind === 'step' ? batch.steps.find(({ position }) => position === front.position) : undefined;
  const plan =
    front.kind === 'reading' ? batch.testPlan.find(({ position }) => position === front.position) : undefined;

  const begin = (item: Item | undefined): void => {
    setChosen(item);
    setTyped('');
    setRemark(undefined);
    setAskedAbout(undefined);
  };
  const keep = async (reading: Pick<TypedReading, 'reading' | 'answer' | 'confirmed'>): Promise<void> => {
    if (!plan) return;
    const measuredAt = new Date().toISOString();
    const whole = {
      run: runs.nextRun,
      position: plan.position,
      measuredAt,
      clientKey: crypto.randomUUID(),
      ...reading,
    };
    try {
      await readings.keep(serial, whole);
      begin(undefined);
    } catch {
      setRemark('This browser cannot keep the reading. Write it down, and use another device.');
    }
  };
  const takeNumber = (): void => {
    if (!plan || typed === '') return;
    const fault = readingFault(plan, typed);
    if (fault) return setRemark(fault);
    const meant = askedAbout === typed ? undefined : suggestionFor(plan, typed);
    if (meant === undefined) return void keep({ reading: typed, confirmed: askedAbout === typed });
    setAskedAbout(typed);
    setRemark(`Did you mean ${meant} ${plan.unit ?? ''}? Type it again, or press once more if ${typed} stands.`);
  };
  const answer = (yes: boolean): void => void keep({ answer: yes });
  const tickStep = (): void => {
    if (!step) return;
    const done = !step.doneOn.includes(serial);
    tick.mutate({ position: step.position, units: [serial], done }, { onSuccess: () => begin(undefined) });
  };
  const press = (key: string): boolean => {
    if (!plan) return false;
    if (plan.kind === 'yes_no') {
      if (key === '1' || key === 'y') answer(true);
      else if (key === '0' || key === 'n') answer(false);
      else return false;
      return true;
    }
    setRemark(undefined);
    if (key === 'Backspace') setTyped((text) => text.slice(0, -1));
    else if (/^[\d]$/.test(key)) setTyped((text) => (text + key).slice(0, 14));
    else if (key === '.' || key === ',') setTyped((text) => (text.includes('.') ? text : `${text || '0'}.`));
    else if (key === '-') setTyped((text) => (text.startsWith('-') ? text.slice(1) : `-${text}`));
    else return false;
    return true;
  };
  const beside = (places: number): boolean => {
    const at = batch.units.findIndex((unit) => unit.serial === serial);
    const other = batch.units[at + places];
    if (other) onUnit(other.serial);
    return other !== undefined;
  };
  const walk = (places: number): boolean => {
    const items: Item[] = [
      ...batch.steps.map(({ position }) => ({ kind: 'step' as const, position })),
      ...batch.testPlan.map(({ position }) => ({ kind: 'reading' as const, position })),
    ];
    const at = items.findIndex(
      (item) => 'position' in front && item.kind === front.kind && item.position === front.position,
    );
    const other = items[at < 0 ? (places > 0 ? 0 : items.length - 1) : at + places];
    if (other && !settled) begin(other);
    return true;
  };
  useKeys((key) => {
    if (key === 'ArrowLeft') return beside(-1);
    if (key === 'ArrowRight') return beside(1);
    if (key === 'ArrowUp') return walk(-1);
    if (key === 'ArrowDown') return walk(1);
    if (key !== 'Enter') return press(key);
    if (step) tickStep();
    else takeNumber();
    return true;
  });
  useScan((scanned) => {
    setTyped('');
    const code = scanned.trim().toUpperCase();
    const found = batch.units.find((unit) => unit.serial === code);
    if (found) onUnit(found.serial);
    else notify(`${code} is no unit of ${batch.number}.`, { tone: 'hot' });
    return true;
  });
  const place = batch.testPlan.findIndex(({ position }) => position === plan?.position) + 1;
  return (
    <>
      <header>
        <Tag kind="unit" code={serial} size="huge" />
        <Link to={batchAddress(batch.number)}>Leave {batch.number}</Link>
        <div className="strip">
          <Strip label={`Batch ${batch.number}`} units={batch.units} current={serial} size="bench" onOpen={onUnit} />
        </div>
      </header>
      <div className="halves">
        <section className="front" aria-label="In front">
          {step ? <StepPanel step={step} serial={serial} /> : null}
          {plan ? (
            <ReadingPanel
              characteristic={plan}
              place={`Reading ${place} of ${batch.testPlan.length}`}
              typed={typed || (shown.get(plan.position)?.text ?? '')}
              verdict={typed ? verdictOf(plan, typed) : shown.get(plan.position)?.verdict}
              remark={remark}
            />
          ) : null}
          {front.kind === 'fault' ? <FaultPanel serial={serial} /> : null}
          {front.kind === 'finish' ? <FinishPanel serial={serial} /> : null}
          {front.kind === 'finished' || front.kind === 'scrapped' || front.kind === 'waiting' ? (
            <SettledPanel serial={serial} kind={front.kind} />
          ) : null}
          {step || plan ? (
            <Keypad
              idle={plan?.kind !== 'numeric'}
              onKey={press}
              beside={[
                wide('no', plan?.kind === 'yes_no' ? { label: 'No', onPress: () => answer(false) } : undefined),
                wide('wrong', { label: 'Something is wrong', look: 'warn', onPress: () => setReporting(true) }),
                mainAct(),
              ]}
            />
          ) : null}
        </section>
        <aside className="aside" aria-label="All of this unit">
          <SideList batch={batch} serial={serial} shown={all} front={front} onChoose={begin} />
          <Sent state={readings.state} queue={readings.queue} />
        </aside>
      </div>
      {reporting ? (
        <ReportDialog serial={serial} step={step?.position ?? null} onClose={() => setReporting(false)} />
      ) : null}
    </>
  );

  function mainAct(): ReactNode {
    if (step) {
      const undo = step.doneOn.includes(serial);
      return wide('act', {
        label: undo ? 'Not done after all' : 'Done  ↵',
        look: undo ? undefined : 'act',
        onPress: tickStep,
      });
    }
    if (plan?.kind === 'yes_no') return wide('act', { label: 'Yes', look: 'act', onPress: () => answer(true) });
    return wide('act', { label: 'Next reading  ↵', look: 'act', onPress: takeNumber, disabled: typed === '' });
  }
}

interface Wide {
  label: string;
  onPress: () => void;
  look?: 'act' | 'warn';
  disabled?: boolean;
}

function wide(key: string, act: Wide | undefined): ReactNode {
  if (!act) return undefined;
  return (
    <button
      key={key}
      type="button"
      className={['wide', act.look ?? ''].join(' ').trim()}
      disabled={act.disabled}
      onMouseDown={(event) => event.preventDefault()}
      onClick={act.onPress}
    >
      {act.label}
    </button>
  );
}

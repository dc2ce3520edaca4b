import type { ReactElement } from 'react';
import { Caution } from '../../../../components/caution';
import type { BatchStep } from '../../api/bench';

/** One step in front: what to do, with its caution before it is done. */
export function StepPanel({ step, serial }: { step: BatchStep; serial: string }): ReactElement {
  const done = step.doneOn.includes(serial);
  return (
    <>
      <p className="place">
        Step {step.position} · {step.part} · {step.minutes} min
      </p>
      <h1 tabIndex={-1}>{step.title}</h1>
      {step.instruction ? <p>{step.instruction}</p> : null}
      {step.caution ? <Caution>{step.caution}</Caution> : null}
      {done ? <p className="place">✓ This step is done on {serial}.</p> : null}
    </>
  );
}

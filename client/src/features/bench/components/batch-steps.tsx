import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Caution } from '../../../components/caution';
import { Flag } from '../../../components/flag';
import { useTick, type Batch, type BatchStep } from '../api/bench';
import { DenseTable } from './dense-table';

/** The steps in order, with how many units have them, to be ticked for all units at once. */
export function BatchSteps({ batch }: { batch: Batch }): ReactElement {
  const tick = useTick(batch.number);
  const open = batch.units.filter(({ finished, verdict }) => !finished && verdict !== 'scrapped');
  const left = ({ doneOn }: BatchStep): string[] =>
    open.map(({ serial }) => serial).filter((serial) => !doneOn.includes(serial));
  const building = batch.status === 'in_build' && batch.units.length > 0;
  if (batch.steps.length === 0) return <p>The bill names no steps.</p>;
  return (
    <DenseTable aria-label="Steps">
      <thead>
        <tr>
          <th scope="col">No.</th>
          <th scope="col">What to do</th>
          <th scope="col">For</th>
          <th scope="col" className="figure">
            Minutes a unit
          </th>
          <th scope="col">Done on</th>
        </tr>
      </thead>
      <tbody>
        {batch.steps.map((step) => (
          <tr key={step.position}>
            <td className="quiet">{step.position}</td>
            <td>
              {step.title}
              {step.instruction ? <div className="quiet">{step.instruction}</div> : null}
              {step.caution ? <Caution>{step.caution}</Caution> : null}
            </td>
            <td className="quiet">{step.part}</td>
            <td className="figure" data-label="Minutes a unit">
              {step.minutes}
            </td>
            <td>
              {building ? (
                <>
                  {step.doneOn.length} of {batch.units.length}{' '}
                  {left(step).length > 0 ? (
                    <Button
                      size="small"
                      disabled={tick.isPending}
                      aria-label={`Tick ${step.title} for all units`}
                      onClick={() => tick.mutate({ position: step.position, units: left(step), done: true })}
                    >
                      Tick for all
                    </Button>
                  ) : (
                    <Flag tone="sound">done</Flag>
                  )}
                </>
              ) : (
                `${step.doneOn.length} of ${batch.quantity}`
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </DenseTable>
  );
}

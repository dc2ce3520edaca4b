import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Caution } from '../../../components/caution';
import { Quantity } from '../../../components/figures';
import type { BuildStep } from '../api/bills';

const List = styled('ol')(({ theme }) => ({
  listStyle: 'none',
  margin: 0,
  padding: 0,
  counterReset: 'step',
  border: `1px solid ${theme.vars.palette.tone.line}`,
  background: theme.vars.palette.tone.sheet,
  '& > li': {
    display: 'grid',
    gridTemplateColumns: '2.4rem minmax(0, 1fr) auto',
    gap: '4px 12px',
    padding: '12px 16px',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& > li:last-of-type': { borderBottom: 0 },
  '& .number': { ...theme.typography.h3, color: theme.vars.palette.tone.inkSoft },
  '& h3': { ...theme.typography.h3, margin: 0 },
  '& p': { margin: '2px 0 0', whiteSpace: 'pre-line', color: theme.vars.palette.tone.inkSoft },
  '& .beside': { gridColumn: '2 / -1', marginTop: 4 },
}));

/** What is done when building, in order, with the cautions where they apply. */
export function StepsList({ steps }: { steps: readonly BuildStep[] }): ReactElement {
  return (
    <List aria-label="Build steps">
      {steps.map((step) => (
        <li key={step.position}>
          <span className="number" aria-hidden="true">
            {step.position}
          </span>
          <div>
            <h3>{step.title}</h3>
            {step.instruction ? <p>{step.instruction}</p> : null}
          </div>
          <Quantity value={step.minutes} unit="min" />
          {step.caution ? (
            <div className="beside">
              <Caution>{step.caution}</Caution>
            </div>
          ) : null}
        </li>
      ))}
    </List>
  );
}

import { styled } from '@mui/material/styles';
import { use, useEffect, useRef, type ReactElement } from 'react';
import { useFormState } from 'react-hook-form';
import { capital, numberWord } from '../../lib/number-words';
import { fieldId, FormFieldsContext } from './field-names';
import { faultsOf } from './server-faults';

const Box = styled('div')(({ theme }) => ({
  padding: '12px 16px',
  border: `1px solid ${theme.vars.palette.tone.hot}`,
  borderLeftWidth: 4,
  background: theme.vars.palette.tone.hotSoft,
  color: theme.vars.palette.tone.ink,
  '& p': { margin: 0, fontWeight: 500 },
  '& ul': { margin: '4px 0 0', paddingLeft: 18 },
  '& a': { color: theme.vars.palette.tone.hot },
  '&:focus': { outline: `2px solid ${theme.vars.palette.tone.hot}`, outlineOffset: 2 },
}));

interface ErrorSummaryProps {
  /** Counts the tries to send; the summary takes the focus after each that failed. */
  attempt: number;
  /** What the server said that belongs to no field. */
  refusal: readonly string[];
}

/** All that keeps a form from being sent, in one place, with a way to each field. */
export function ErrorSummary({ attempt, refusal }: ErrorSummaryProps): ReactElement | null {
  const { errors, submitCount } = useFormState();
  const { prefix } = use(FormFieldsContext);
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (attempt > 0) box.current?.focus();
  }, [attempt]);
  const faults = submitCount > 0 ? faultsOf(errors) : [];
  if (faults.length + refusal.length === 0) return null;
  return (
    <Box ref={box} role="alert" tabIndex={-1}>
      <p>✕ {headline(faults.length + refusal.length)}</p>
      <ul>
        {refusal.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
        {faults.map(({ field, message }) => (
          <li key={field}>
            <a
              href={`#${fieldId(prefix, field)}`}
              onClick={(event) => {
                event.preventDefault();
                document.getElementById(fieldId(prefix, field))?.focus();
              }}
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </Box>
  );
}

function headline(count: number): string {
  return count === 1 ? 'One thing to put right' : `${capital(numberWord(count))} things to put right`;
}

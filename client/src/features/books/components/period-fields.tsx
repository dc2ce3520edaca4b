import { styled } from '@mui/material/styles';
import TextField from '@mui/material/TextField';
import type { ReactElement } from 'react';
import { useSearchParams } from 'react-router-dom';

const Row = styled('div')({ display: 'flex', flexWrap: 'wrap', gap: 16, margin: '0 0 20px' });

/** First and last day, kept in the address bar. */
export function PeriodFields(): ReactElement {
  const [search, setSearch] = useSearchParams();
  const change = (field: string, value: string): void => {
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        if (value === '') next.delete(field);
        else next.set(field, value);
        return next;
      },
      { replace: true },
    );
  };
  return (
    <Row>
      {(['from', 'to'] as const).map((field) => (
        <TextField
          key={field}
          type="date"
          label={field === 'from' ? 'First day' : 'Last day'}
          value={search.get(field) ?? ''}
          onChange={(event) => change(field, event.target.value)}
          slotProps={{ inputLabel: { shrink: true } }}
        />
      ))}
    </Row>
  );
}

import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useId, useState, type ReactElement } from 'react';
import FormControl from '@mui/material/FormControl';
import FormHelperText from '@mui/material/FormHelperText';
import FormLabel from '@mui/material/FormLabel';
import OutlinedInput from '@mui/material/OutlinedInput';
import { fontMono } from '../../../lib/fonts';
import { componentsQuery } from '../api/bills';

interface PartChooserProps {
  label: string;
  hint: string;
  submitLabel: string;
  initially?: string;
  onChoose: (code: string) => void;
}

/** Goes to one part: its code typed, scanned, or chosen from what the letters find. */
export function PartChooser({ label, hint, submitLabel, initially = '', onChoose }: PartChooserProps): ReactElement {
  const id = useId();
  const [typed, setTyped] = useState(initially);
  const code = typed.trim().toUpperCase();
  const asked = useDeferredValue(code);
  const found = useQuery({ ...componentsQuery(asked), enabled: asked.length > 0 }).data?.items ?? [];
  const name = found.find((part) => part.code === code)?.name;
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        if (code !== '') onChoose(code);
      }}
      style={{ display: 'flex', flexWrap: 'wrap', alignItems: 'flex-start', gap: 12, marginBottom: 24 }}
    >
      <FormControl sx={{ width: 'min(420px, 100%)' }}>
        <FormLabel htmlFor={id} sx={{ mb: 0.5 }}>
          {label}
        </FormLabel>
        <OutlinedInput
          id={id}
          value={typed}
          onChange={({ target }) => setTyped(target.value)}
          slotProps={{
            input: {
              list: `${id}-parts`,
              autoComplete: 'off',
              spellCheck: false,
              'aria-describedby': `${id}-hint`,
              style: { fontFamily: fontMono },
            },
          }}
        />
        <datalist id={`${id}-parts`}>
          {found.map((part) => (
            <option key={part.code} value={part.code}>
              {part.name}
            </option>
          ))}
        </datalist>
        <FormHelperText id={`${id}-hint`}>{name ?? hint}</FormHelperText>
      </FormControl>
      <Button type="submit" variant="contained" sx={{ mt: '26px' }}>
        {submitLabel}
      </Button>
    </form>
  );
}

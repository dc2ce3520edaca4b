import FormControlLabel from '@mui/material/FormControlLabel';
import Radio from '@mui/material/Radio';
import RadioGroup from '@mui/material/RadioGroup';
import { useColorScheme } from '@mui/material/styles';
import type { ReactElement } from 'react';

const schemes = [
  { value: 'system', label: 'As this device' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
] as const;

/** Light or dark, remembered on this device. */
export function SchemeChoice(): ReactElement {
  const { mode = 'system', setMode } = useColorScheme();
  return (
    <RadioGroup
      aria-label="Colours"
      value={mode}
      onChange={(_, value) => setMode(schemes.find((scheme) => scheme.value === value)?.value ?? 'system')}
    >
      {schemes.map(({ value, label }) => (
        <FormControlLabel key={value} value={value} label={label} control={<Radio size="small" />} />
      ))}
    </RadioGroup>
  );
}

import Button from '@mui/material/Button';
import InputAdornment from '@mui/material/InputAdornment';
import OutlinedInput from '@mui/material/OutlinedInput';
import { useState, type ReactElement } from 'react';
import { fontMono } from '../../lib/fonts';
import { Field, type FieldProps } from './field';

interface TextFieldProps extends FieldProps {
  longest?: number;
  /** Codes and serials are set in the fixed-width face. */
  code?: boolean;
  rows?: number;
  autoComplete?: string;
  type?: 'text' | 'email' | 'tel' | 'url';
  width?: number | string;
}

export function TextInput({
  longest,
  code,
  rows,
  autoComplete,
  type = 'text',
  rules,
  ...field
}: TextFieldProps): ReactElement {
  const maxLength = longest
    ? { value: longest, message: `${field.label} may have at most ${longest} characters.` }
    : undefined;
  return (
    <Field
      {...field}
      rules={{ maxLength, ...rules }}
      render={({ ref, value, ...handlers }, control) => (
        <OutlinedInput
          {...handlers}
          value={value ?? ''}
          inputRef={ref}
          type={type}
          multiline={rows !== undefined}
          minRows={rows}
          id={control.id}
          slotProps={{
            input: {
              ...control,
              autoComplete,
              spellCheck: code ? false : undefined,
              style: code ? { fontFamily: fontMono } : undefined,
            },
          }}
        />
      )}
    />
  );
}

type PasswordProps = Omit<TextFieldProps, 'type' | 'rows' | 'code' | 'longest'> & {
  autoComplete: 'current-password' | 'new-password';
};

/** A password can be looked at while it is typed, and pasted. */
export function PasswordInput({ autoComplete, ...field }: PasswordProps): ReactElement {
  const [shown, setShown] = useState(false);
  return (
    <Field
      {...field}
      render={({ ref, value, ...handlers }, control) => (
        <OutlinedInput
          {...handlers}
          value={value ?? ''}
          inputRef={ref}
          type={shown ? 'text' : 'password'}
          id={control.id}
          slotProps={{ input: { ...control, autoComplete, spellCheck: false, autoCapitalize: 'none' } }}
          endAdornment={
            <InputAdornment position="end">
              <Button
                size="small"
                variant="text"
                onClick={() => setShown(!shown)}
                aria-label={`${shown ? 'Hide' : 'Show'} ${field.label.toLowerCase()}`}
              >
                {shown ? 'Hide' : 'Show'}
              </Button>
            </InputAdornment>
          }
        />
      )}
    />
  );
}

/** A plain day, `YYYY-MM-DD`. */
export function DayInput({
  earliest,
  latest,
  ...field
}: FieldProps & { earliest?: string; latest?: string; width?: number }): ReactElement {
  return (
    <Field
      width={220}
      {...field}
      render={({ ref, value, ...handlers }, control) => (
        <OutlinedInput
          {...handlers}
          value={value ?? ''}
          inputRef={ref}
          type="date"
          id={control.id}
          slotProps={{ input: { ...control, min: earliest, max: latest } }}
        />
      )}
    />
  );
}

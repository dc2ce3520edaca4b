import OutlinedInput from '@mui/material/OutlinedInput';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, type ReactElement } from 'react';
import { useWatch } from 'react-hook-form';
import { Field, type FieldProps } from '../../../components/form/field';
import { fontMono } from '../../../lib/fonts';
import { suggestionsQuery, type Suggested } from '../api/suggestions';

interface CodeInputProps extends FieldProps {
  kind: Suggested;
  width?: number | string;
}

/** The code of a part, bin or supplier: typed, scanned, or chosen from what the letters find; its name stands below. */
export function CodeInput({ kind, hint, ...field }: CodeInputProps): ReactElement {
  const value: unknown = useWatch({ name: field.name });
  const code = typeof value === 'string' ? value.trim() : '';
  const found = useQuery(suggestionsQuery(kind, useDeferredValue(code))).data ?? [];
  const name = found.find((candidate) => candidate.code === code)?.name;
  return (
    <Field
      {...field}
      hint={name || hint}
      render={({ ref, value: typed, onChange, ...handlers }, control) => (
        <>
          <OutlinedInput
            {...handlers}
            value={typed ?? ''}
            // Codes are capitals; a hand types what it likes.
            onChange={({ target }) => onChange(target.value.toUpperCase())}
            inputRef={ref}
            id={control.id}
            slotProps={{
              input: {
                ...control,
                list: `${control.id}-list`,
                autoComplete: 'off',
                spellCheck: false,
                style: { fontFamily: fontMono },
              },
            }}
          />
          <datalist id={`${control.id}-list`}>
            {found.map((suggestion) => (
              <option key={suggestion.code} value={suggestion.code}>
                {suggestion.name}
              </option>
            ))}
          </datalist>
        </>
      )}
    />
  );
}

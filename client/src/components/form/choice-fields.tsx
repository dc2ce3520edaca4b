import Checkbox from '@mui/material/Checkbox';
import FormControl from '@mui/material/FormControl';
import FormControlLabel from '@mui/material/FormControlLabel';
import FormHelperText from '@mui/material/FormHelperText';
import OutlinedInput from '@mui/material/OutlinedInput';
import Radio from '@mui/material/Radio';
import RadioGroup from '@mui/material/RadioGroup';
import Select from '@mui/material/Select';
import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { Field, type FieldProps } from './field';
import { useFieldId } from './field-names';

const Group = styled('fieldset')({ display: 'flex', flexWrap: 'wrap', margin: 0, padding: 0, border: 0 });

export interface Choice {
  value: string;
  label: string;
  hint?: string;
}

interface ChoiceProps extends FieldProps {
  choices: readonly Choice[];
  /** What an unmade choice says. */
  none?: string;
  width?: number | string;
}

/** One of many, as the browser's own list. */
export function ChoiceInput({ choices, none, ...field }: ChoiceProps): ReactElement {
  return (
    <Field
      {...field}
      render={({ ref, value, ...handlers }, control) => (
        <Select native {...handlers} value={value ?? ''} inputRef={ref} input={<OutlinedInput />} inputProps={control}>
          {none === undefined && value ? null : <option value="">{none ?? 'Choose'}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </Select>
      )}
    />
  );
}

/** One of a few, all in sight. */
export function RadioInput({ choices, ...field }: Omit<ChoiceProps, 'none'>): ReactElement {
  return (
    <Field
      {...field}
      render={({ ref, value, ...handlers }, { id, ...described }) => (
        <RadioGroup {...handlers} value={value ?? ''} aria-label={field.label} {...described}>
          {choices.map((choice, place) => (
            <FormControlLabel
              key={choice.value}
              value={choice.value}
              control={<Radio size="small" slotProps={{ input: place === 0 ? { id, ref } : {} }} />}
              label={
                <>
                  {choice.label}
                  {choice.hint ? <span style={{ display: 'block', fontSize: '0.8125rem' }}>{choice.hint}</span> : null}
                </>
              }
            />
          ))}
        </RadioGroup>
      )}
    />
  );
}

/** Any number of a few; the value is a list of the chosen ones. */
export function ManyInput({ choices, ...field }: Omit<ChoiceProps, 'none'>): ReactElement {
  return (
    <Field
      {...field}
      render={({ value, onChange, onBlur, ref }, { id, ...described }) => {
        const chosen: readonly string[] = Array.isArray(value) ? value : [];
        const toggle = (choice: string, on: boolean): void => {
          onChange(choices.map((each) => each.value).filter((each) => (each === choice ? on : chosen.includes(each))));
        };
        return (
          <Group aria-label={field.label} aria-describedby={described['aria-describedby']} onBlur={onBlur}>
            {choices.map((choice, place) => (
              <FormControlLabel
                key={choice.value}
                label={choice.label}
                control={
                  <Checkbox
                    size="small"
                    checked={chosen.includes(choice.value)}
                    onChange={(_, on) => toggle(choice.value, on)}
                    slotProps={{ input: place === 0 ? { id, ref } : {} }}
                  />
                }
              />
            ))}
          </Group>
        );
      }}
    />
  );
}

interface CheckProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  /** What to say if it must be ticked and is not. */
  mustBeTicked?: string;
}

export function CheckInput({ name, label, hint, mustBeTicked }: CheckProps): ReactElement {
  const id = useFieldId(name, typeof label === 'string' ? label : name);
  const validate = (value: unknown): string | true => (mustBeTicked && value !== true ? mustBeTicked : true);
  const { field, fieldState } = useController({ name, rules: { validate } });
  const fault = fieldState.error?.message;
  return (
    <FormControl error={Boolean(fault)}>
      <FormControlLabel
        label={label}
        control={
          <Checkbox
            id={id}
            checked={field.value === true}
            onChange={(_, ticked) => field.onChange(ticked)}
            onBlur={field.onBlur}
            slotProps={{
              input: {
                ref: field.ref,
                'aria-describedby': fault || hint ? `${id}-note` : undefined,
                'aria-invalid': Boolean(fault),
              },
            }}
          />
        }
      />
      {fault || hint ? (
        <FormHelperText id={`${id}-note`}>
          {fault ? <span aria-hidden="true">✕ </span> : null}
          {fault ?? hint}
        </FormHelperText>
      ) : null}
    </FormControl>
  );
}

import FormControl from '@mui/material/FormControl';
import FormHelperText from '@mui/material/FormHelperText';
import FormLabel from '@mui/material/FormLabel';
import type { ReactElement, ReactNode } from 'react';
import { useController, type ControllerRenderProps, type RegisterOptions } from 'react-hook-form';
import { useFieldId } from './field-names';

export interface FieldProps {
  /** The name in the form's values, and in the JSON that is sent. */
  name: string;
  label: string;
  hint?: ReactNode;
  required?: boolean | string;
  rules?: Omit<RegisterOptions, 'valueAsNumber' | 'valueAsDate' | 'setValueAs' | 'disabled'>;
  disabled?: boolean;
}

export interface ControlProps {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': boolean;
  'aria-required': boolean | undefined;
}

interface FieldFrameProps extends FieldProps {
  render: (field: ControllerRenderProps, control: ControlProps) => ReactElement;
  /** The whole width of a form by default. */
  width?: number | string;
}

/** Label above, control, then the error or the hint; every field of the product is drawn by this. */
export function Field({ name, label, hint, required, rules, disabled, render, width }: FieldFrameProps): ReactElement {
  const id = useFieldId(name, label);
  const needed = typeof required === 'string' ? required : `${label} is needed.`;
  const { field, fieldState } = useController({ name, rules: { ...rules, required: required ? needed : undefined } });
  const fault = fieldState.error?.message;
  const noteId = `${id}-note`;
  return (
    <FormControl error={Boolean(fault)} disabled={disabled} fullWidth>
      <FormLabel htmlFor={id} sx={{ mb: 0.5 }}>
        {label}
        {required ? null : <span style={{ fontWeight: 400 }}> (if any)</span>}
      </FormLabel>
      <div style={{ width, maxWidth: '100%', display: 'grid' }}>
        {render(field, {
          id,
          'aria-describedby': fault || hint ? noteId : undefined,
          'aria-invalid': Boolean(fault),
          'aria-required': required ? true : undefined,
        })}
      </div>
      {fault || hint ? (
        <FormHelperText id={noteId}>
          {fault ? <span aria-hidden="true">✕ </span> : null}
          {fault ?? hint}
        </FormHelperText>
      ) : null}
    </FormControl>
  );
}

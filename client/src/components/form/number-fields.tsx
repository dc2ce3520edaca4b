import InputAdornment from '@mui/material/InputAdornment';
import OutlinedInput from '@mui/material/OutlinedInput';
import { useState, type ReactElement } from 'react';
import { currencyDecimals, currencySign, groupDigits } from '../../lib/format-money';
import { fontMono } from '../../lib/fonts';
import { parseDecimal } from '../../lib/parse-number';
import { Field, type FieldProps } from './field';

interface NumberFieldProps extends FieldProps {
  /** Stands inside the field. */
  unit?: string;
  /** Most decimal places. */
  places: number;
  /** Zero and below are refused unless this says otherwise. */
  allow?: 'positive' | 'zero' | 'any';
  width?: number | string;
}

function fault(label: string, typed: unknown, places: number, allow: 'positive' | 'zero' | 'any'): string | true {
  if (typed === '' || typed === undefined || typed === null) return true;
  const value = parseDecimal(textOf(typed));
  if (value === undefined) return `${label} must be a number, such as 1.5 or 1,5.`;
  if ((value.split('.')[1] ?? '').replace(/0+$/, '').length > places) {
    return places === 0 ? `${label} must be a whole number.` : `${label} may have at most ${places} decimal places.`;
  }
  if (allow !== 'any' && value.startsWith('-')) return `${label} must not be below zero.`;
  if (allow === 'positive' && /^0(\.0*)?$/.test(value)) return `${label} must be more than zero.`;
  return true;
}

/**
 * A number as a plain decimal string. While it is typed it stays as it is; when the field is left it is read, with a
 * point or a comma as decimal sign, and shown grouped. What can't be read stays as typed, with a fault.
 */
export function QuantityInput({ unit, places, allow = 'positive', rules, ...field }: NumberFieldProps): ReactElement {
  const [typing, setTyping] = useState<string>();
  const validate = (typed: unknown): string | true => fault(field.label, typed, places, allow);
  return (
    <Field
      width={240}
      {...field}
      rules={{ validate, ...rules }}
      render={({ ref, value, onChange, onBlur, ...rest }, control) => (
        <OutlinedInput
          {...rest}
          value={typing ?? shown(value)}
          inputRef={ref}
          id={control.id}
          onFocus={() => setTyping(textOf(value))}
          onChange={({ target }) => {
            setTyping(target.value);
            onChange(parseDecimal(target.value) ?? target.value);
          }}
          onBlur={() => {
            setTyping(undefined);
            onBlur();
          }}
          slotProps={{
            input: {
              ...control,
              inputMode: 'decimal',
              autoComplete: 'off',
              style: { textAlign: 'right', fontFamily: fontMono },
            },
          }}
          endAdornment={unit ? <InputAdornment position="end">{unit}</InputAdornment> : undefined}
        />
      )}
    />
  );
}

/** A form's value is text, a number it began with, or nothing. */
function textOf(value: unknown): string {
  if (typeof value === 'number') return String(value);
  return typeof value === 'string' ? value : '';
}

function shown(value: unknown): string {
  const text = textOf(value);
  return parseDecimal(text) === text ? groupDigits(text).replace('\u2212', '-') : text;
}

type MoneyInputProps = Omit<NumberFieldProps, 'unit' | 'places'> & {
  currency: string;
  /** Six for a unit cost; the currency's own otherwise. */
  places?: number;
};

/** An amount in major units, as a decimal string; `parseMinor` turns it into what is sent. */
export function MoneyInput({ currency, places, allow = 'zero', ...field }: MoneyInputProps): ReactElement {
  return (
    <QuantityInput
      {...field}
      allow={allow}
      unit={currencySign(currency)}
      places={places ?? currencyDecimals(currency)}
    />
  );
}

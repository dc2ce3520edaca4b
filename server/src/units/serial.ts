import { applyDecorators, Param } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { Matches } from 'class-validator';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { readSerialNumber } from '@emberlot/shared/serial/serial-number';
import { fieldFault } from '../platform/errors/app-error.js';

/** The form in which serial numbers are written. */
const serialPattern = /^[A-Z]{2,3}-\d{4}-\d{4,7}-\d{2}$/;

/** A serial number in a path; a mistyped one is refused by its check digits before anything is looked up. */
export function SerialParam(name = 'serial'): ParameterDecorator {
  return Param(name, { transform: (value: unknown) => serialOf(value, `/${name}`) });
}

/** A serial number in a body, as typed or scanned. */
export function Serial(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => {
      const read = typeof value === 'string' ? attempt(() => readSerialNumber(value)) : undefined;
      return read?.ok ? read.value.text : value;
    }),
    Matches(serialPattern, { message: 'This serial number has a wrong or missing digit. Scan or type it again.' }),
    ApiProperty({ pattern: serialPattern.source }),
  );
}

/** @throws AppError `invalid_input` with the sentence of what is wrong with it */
export function serialOf(value: unknown, pointer: string): string {
  const read = attempt(() => readSerialNumber(typeof value === 'string' ? value : ''));
  if (!read.ok) throw fieldFault(pointer, 'serial', read.fault.message);
  return read.value.text;
}

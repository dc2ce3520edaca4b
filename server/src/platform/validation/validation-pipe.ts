import { ValidationPipe } from '@nestjs/common';
import type { ValidationError } from 'class-validator';
import { AppError, type FieldFault } from '../errors/app-error.js';

/**
 * The one pipe over every body, query and path. What a DTO does not name is refused, nothing is converted behind the
 * DTO's back, and every fault comes back at once with a pointer to its field.
 */
export function createValidationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    transform: true,
    transformOptions: { enableImplicitConversion: false, exposeDefaultValues: true },
    stopAtFirstError: false,
    validationError: { target: false, value: false },
    exceptionFactory: (errors: ValidationError[]) => inputRefused(faultsOf(errors)),
  });
}

export function inputRefused(faults: readonly FieldFault[]): AppError {
  const sentence = faults.length === 1 ? faults[0]?.detail : undefined;
  return new AppError('invalid_input', sentence ?? `${faults.length} fields need another look.`, { faults });
}

/** Flattens class-validator's tree; the pointer follows RFC 6901. */
export function faultsOf(errors: readonly ValidationError[], parent = ''): readonly FieldFault[] {
  return errors.flatMap((error) => {
    const pointer = `${parent}/${error.property.replaceAll('~', '~0').replaceAll('/', '~1')}`;
    const own = Object.entries(error.constraints ?? {}).map(([kind, message]) => ({
      pointer,
      code: codeOf(kind),
      detail: sentenceOf(kind, error.property, message),
    }));
    return [...onlyTheTelling(own), ...faultsOf(error.children ?? [], pointer)];
  });
}

/** When a value is missing or of the wrong type, its further faults (too short, no match) say nothing more. */
function onlyTheTelling(faults: readonly FieldFault[]): readonly FieldFault[] {
  const telling = faults.find((fault) => fault.code === 'unknown_field' || fault.code === 'wrong_type');
  return telling ? [telling] : faults;
}

const wrongType = new Set(['isString', 'isInt', 'isNumber', 'isBoolean', 'isArray', 'isObject', 'nestedValidation']);

function codeOf(kind: string): string {
  if (kind === 'whitelistValidation') return 'unknown_field';
  if (kind === 'unknownValue') return 'wrong_type';
  if (wrongType.has(kind)) return 'wrong_type';
  return kind.replaceAll(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
}

/** Our own decorators speak in sentences; class-validator's begin with the property's name. */
function sentenceOf(kind: string, property: string, message: string): string {
  if (kind === 'whitelistValidation') return 'This field is not known here.';
  if (!message.startsWith(`${property} `)) return message;
  const rest = message.slice(property.length + 1);
  return `${rest.charAt(0).toUpperCase()}${rest.slice(1)}.`;
}

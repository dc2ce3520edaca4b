import { applyDecorators } from '@nestjs/common';
import { ApiProperty, type ApiPropertyOptions } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import {
  IsInt,
  Matches,
  Max,
  Min,
  ValidateIf,
  type ValidationOptions,
  buildMessage,
  ValidateBy,
} from 'class-validator';
import { dayPattern, largestId, largestMinorAmount, quantityPattern } from '@emberlot/shared/limits/numbers';
import { textLimit } from '@emberlot/shared/limits/text';

/** A field that may be left out; unlike class-validator's own, it refuses an explicit null. */
export function Optional(): PropertyDecorator {
  return applyDecorators(
    ValidateIf((_object, value: unknown) => value !== undefined),
    describe({ required: false }),
  );
}

/** A field that may be null to say "none"; left out it is a fault, unless `@Optional()` stands with it. */
export function Nullable(): PropertyDecorator {
  return applyDecorators(
    ValidateIf((_object, value: unknown) => value !== null),
    describe({ nullable: true }),
  );
}

export interface TextOptions {
  readonly max: number;
  /** Characters at least, after trimming; 1 when nothing is said. */
  readonly min?: number;
  /** Whether line breaks and tabs may stand in it. */
  readonly lines?: boolean;
}

/** A text of a person: trimmed, in Unicode's composed form (NFC), without control characters. */
export function Text(options: TextOptions): PropertyDecorator {
  const min = options.min ?? 1;
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => cleanText(value)),
    valid('text', (value) => textFault(value, min, options)),
    describe({ minLength: min, maxLength: options.max }),
  );
}

/** An address for mail: one, without display name. Kept as typed; compared without regard to case. */
export function Email(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => cleanText(value)),
    valid('email', (value) => (isEmail(value) ? undefined : 'Give one e-mail address, such as name@shop.example.')),
    describe({ format: 'email', maxLength: textLimit.email }),
  );
}

/** A quantity as a decimal string, so that it is never rounded on its way. */
export function Quantity(options: { readonly negative?: boolean; readonly zero?: boolean } = {}): PropertyDecorator {
  return applyDecorators(
    valid('quantity', (value) => quantityFault(value, options)),
    describe({ format: 'decimal', pattern: quantityPattern.source, example: '12.5' }),
  );
}

/** An amount of money in whole minor units (cents). */
export function MinorAmount(options: { readonly negative?: boolean } = {}): PropertyDecorator {
  const least = options.negative ? -largestMinorAmount : 0;
  return applyDecorators(
    IsInt({ message: 'Give the amount in whole minor units.' }),
    Min(least, { message: 'The amount is too small.' }),
    Max(largestMinorAmount, { message: 'The amount is too large.' }),
    describe({ type: 'integer', minimum: least, maximum: largestMinorAmount }),
  );
}

/** A whole number within bounds that the field's meaning gives. */
export function Whole(bounds: { readonly min: number; readonly max: number }): PropertyDecorator {
  const message = `Give a whole number from ${bounds.min} to ${bounds.max}.`;
  return applyDecorators(
    IsInt({ message }),
    Min(bounds.min, { message }),
    Max(bounds.max, { message }),
    describe({ type: 'integer', minimum: bounds.min, maximum: bounds.max }),
  );
}

/** The identifier of another thing, in a body. */
export function Id(): PropertyDecorator {
  return Whole({ min: 1, max: largestId });
}

/** The version of a thing that an edit was made from. */
export function Version(): PropertyDecorator {
  return Whole({ min: 1, max: largestId });
}

/** A calendar day that exists, `YYYY-MM-DD`. */
export function Day(): PropertyDecorator {
  return applyDecorators(
    valid('day', (value) => (isDay(value) ? undefined : 'Give a day as year, month and day, such as 2027-02-28.')),
    describe({ format: 'date', example: '2027-02-28' }),
  );
}

/** A code of capital letters, digits and `-`, as printed on a tag. */
export function Code(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => cleanText(value)),
    Matches(/^[A-Z0-9][A-Z0-9-]{0,39}$/, {
      message: `Use capital letters, digits and hyphens, at most ${textLimit.code} of them.`,
    }),
    describe({ pattern: '^[A-Z0-9][A-Z0-9-]{0,39}$' }),
  );
}

export function cleanText(value: unknown): unknown {
  return typeof value === 'string' ? value.normalize('NFC').trim() : value;
}

const controlCharacters = /[\p{Cc}\p{Cs}\u2028\u2029]/u;
const controlCharactersExceptLines = /(?![\n\r\t])[\p{Cc}\p{Cs}]/u;

function textFault(value: unknown, min: number, options: TextOptions): string | undefined {
  if (typeof value !== 'string') return min > 0 ? 'Fill this in.' : 'Give a text.';
  const length = Array.from(value).length;
  if (length < min) return min === 1 ? 'Fill this in.' : `Use at least ${min} characters.`;
  if (length > options.max) return `Use at most ${options.max} characters; these are ${length}.`;
  const forbidden = options.lines ? controlCharactersExceptLines : controlCharacters;
  return forbidden.test(value) ? 'There is a character in it that cannot be shown.' : undefined;
}

/** One mailbox of the dot-atom form (RFC 5321, 4.1.2): what the form of mail addresses allows and people have. */
const emailPattern =
  /^[A-Za-z0-9!#$%&'*+/=?^_`{|}~-]+(?:\.[A-Za-z0-9!#$%&'*+/=?^_`{|}~-]+)*@(?:[A-Za-z0-9](?:[A-Za-z0-9-]{0,61}[A-Za-z0-9])?\.)+[A-Za-z][A-Za-z0-9-]{0,61}[A-Za-z0-9]$/;

export function isEmail(value: unknown): value is string {
  return (
    typeof value === 'string' &&
    value.length <= textLimit.email &&
    value.lastIndexOf('@') <= 64 &&
    emailPattern.test(value)
  );
}

function quantityFault(value: unknown, options: { negative?: boolean; zero?: boolean }): string | undefined {
  if (typeof value !== 'string' || !quantityPattern.test(value)) {
    return 'Give a quantity with at most six decimals, such as 12.5.';
  }
  const zero = /^-?0(\.0+)?$/.test(value);
  if (zero && !options.zero) return 'Give a quantity other than zero.';
  if (!zero && value.startsWith('-') && !options.negative) return 'Give a quantity above zero.';
  return undefined;
}

function isDay(value: unknown): boolean {
  if (typeof value !== 'string' || !dayPattern.test(value)) return false;
  const date = new Date(`${value}T00:00:00Z`);
  return date.toISOString().startsWith(value) && value >= '1900-01-01';
}

function valid(name: string, faultOf: (value: unknown) => string | undefined): PropertyDecorator {
  const options: ValidationOptions = {};
  return ValidateBy(
    {
      name,
      validator: {
        validate: (value: unknown) => faultOf(value) === undefined,
        defaultMessage: buildMessage((_each, more) => faultOf(more?.value) ?? 'This cannot be used.', options),
      },
    },
    options,
  );
}

/** Adds to what the OpenAPI document says of a field, and leaves its type and whether it is required to the plugin. */
function describe(options: ApiPropertyOptions): PropertyDecorator {
  return ApiProperty(options);
}

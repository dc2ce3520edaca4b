import { applyDecorators, Param } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { Matches } from 'class-validator';
import { codePattern } from '@emberlot/shared/limits/codes';
import { notFound } from '../errors/app-error.js';
import { cleanText } from './fields.js';

export type CodedThing = keyof typeof codePattern;

const sentences: Record<CodedThing, string> = {
  part: 'Use up to 32 letters, digits and the signs - . /, beginning with a letter or digit.',
  supplier: 'Use up to 24 letters, digits and hyphens, beginning with a letter or digit.',
  bin: 'Use up to 24 letters, digits and the signs - and ., beginning with a letter or digit.',
  lot: 'Use up to 40 letters, digits and the signs - . /, beginning with a letter or digit.',
  document: 'Give the number as it stands on the document.',
};

export function codeSentence(thing: CodedThing): string {
  return sentences[thing];
}

/** The code printed on a thing's tag; small letters are taken as capitals, since a hand types either. */
export function CodeOf(thing: CodedThing): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => upper(cleanText(value))),
    Matches(codePattern[thing], { message: sentences[thing] }),
    ApiProperty({ pattern: codePattern[thing].source }),
  );
}

/** The code of a thing in a route's path. What cannot be such a code names nothing, so it is not found. */
export function CodeParam(thing: CodedThing, name = 'code'): ParameterDecorator {
  return Param(name, {
    transform: (value: unknown) => {
      const code = upper(cleanText(value));
      if (typeof code !== 'string' || !codePattern[thing].test(code)) throw notFound(thing);
      return code;
    },
  });
}

function upper(value: unknown): unknown {
  return typeof value === 'string' ? value.toUpperCase() : value;
}

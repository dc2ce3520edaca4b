import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ValidateBy } from 'class-validator';
import { passwordLimit } from '@emberlot/shared/limits/password';

/** A password as it was typed: never trimmed, cut or changed in case. The rules for a new one are `PasswordRules`. */
export function Password(): PropertyDecorator {
  return applyDecorators(
    ValidateBy({
      name: 'password',
      validator: {
        validate: (value: unknown) =>
          typeof value === 'string' && value !== '' && Buffer.byteLength(value) <= passwordLimit.mostBytes,
        defaultMessage: () => `Give the password; it may have at most ${passwordLimit.mostBytes} bytes.`,
      },
    }),
    ApiProperty({ format: 'password', maxLength: passwordLimit.mostBytes }),
  );
}

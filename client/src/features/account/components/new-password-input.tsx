import type { ReactElement } from 'react';
import { passwordLimit } from '@emberlot/shared/limits/password';
import { PasswordInput } from '../../../components/form/text-fields';

function tooShortOrLong(value: unknown): string | true {
  const password = typeof value === 'string' ? value : '';
  // Characters as a person counts them; bytes as the server keeps them.
  if (Array.from(password).length < passwordLimit.fewestCharacters)
    return `A password needs at least ${passwordLimit.fewestCharacters} characters.`;
  if (new TextEncoder().encode(password).length > passwordLimit.mostBytes)
    return 'This password is longer than can be kept.';
  return true;
}

export function NewPasswordInput({ name, label = 'Password' }: { name: string; label?: string }): ReactElement {
  return (
    <PasswordInput
      name={name}
      label={label}
      autoComplete="new-password"
      required
      rules={{ validate: tooShortOrLong }}
      hint={`At least ${passwordLimit.fewestCharacters} characters; ${passwordLimit.advisedCharacters} or more are better. A short sentence is best.`}
    />
  );
}

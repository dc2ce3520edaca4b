import { codePattern } from '@emberlot/shared/limits/codes';
import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { CheckInput } from '../../../components/form/choice-fields';
import { TextInput } from '../../../components/form/text-fields';

export function BinFields(): ReactElement {
  return (
    <>
      <TextInput
        name="code"
        label="Code"
        longest={24}
        code
        required
        width={240}
        rules={{
          validate: (typed: unknown) =>
            codePattern.bin.test(String(typed).trim().toUpperCase()) ||
            'Use letters, digits and the signs - and ., beginning with a letter or digit.',
        }}
      />
      <TextInput name="name" label="Where it is" longest={textLimit.name} />
      <CheckInput
        name="quarantine"
        label="Quarantine"
        hint="What lies in it can be neither picked nor sold: damaged cells, things to look at."
      />
    </>
  );
}

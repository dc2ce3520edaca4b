import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useWatch } from 'react-hook-form';
import { ChoiceInput } from '../../../components/form/choice-fields';
import { TextInput } from '../../../components/form/text-fields';
import { formatQuantity } from '../../../lib/format-quantity';
import { partQuery } from '../api/parts';
import { codePattern } from '@emberlot/shared/limits/codes';

/** The part that a line names, once its code is whole. */
export function useLinePart(name: string) {
  const typed: unknown = useWatch({ name });
  const code = typeof typed === 'string' ? typed.trim() : '';
  const query = useQuery({ ...partQuery(code), enabled: codePattern.part.test(code), retry: false });
  return query.data?.part.code === code ? query.data : undefined;
}

interface LotInputProps {
  /** The line's own name: `lines.0`. */
  line: string;
}

/** Which lot of the line's part: one of those that lie on the shelf. A part followed by count has none to choose. */
export function LotInput({ line }: LotInputProps): ReactElement | null {
  const story = useLinePart(`${line}.part`);
  const bin: unknown = useWatch({ name: `${line}.bin` });
  if (story?.part.traced === 'count') return null;
  if (!story) return <TextInput name={`${line}.lot`} label="Lot" code width={200} />;
  const lots = new Map<string, string>();
  for (const place of story.places) {
    if (typeof bin === 'string' && bin !== '' && place.bin !== bin) continue;
    const amount = formatQuantity(place.quantity, story.part.measure);
    lots.set(place.lot, `${lots.get(place.lot) ?? place.lot}, ${amount} in ${place.bin}`);
  }
  return (
    <ChoiceInput
      name={`${line}.lot`}
      label="Lot"
      choices={[...lots].map(([value, label]) => ({ value, label }))}
      none="Choose the lot"
      required
      width={280}
    />
  );
}

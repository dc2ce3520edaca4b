import type { ReactElement } from 'react';
import { Flag, type Tone } from '../../../components/flag';
import { lotStatusWords } from './shelf-words';

const tones: Readonly<Record<string, Tone>> = { held: 'tape', rejected: 'hot', released: 'sound' };

/** Whether a lot may be used. A released one that is out of date may not. */
export function LotStatusFlag({ status, expired = false }: { status: string; expired?: boolean }): ReactElement {
  if (expired && status === 'released') return <Flag tone="hot">expired</Flag>;
  return <Flag tone={tones[status] ?? 'cool'}>{lotStatusWords[status] ?? status}</Flag>;
}

import type { ReactElement } from 'react';
import { Tag } from '../../../components/tag/tag';

interface DocumentTagProps {
  number: string;
  kind: string;
  note?: string | null;
}

/** A stock document: a delivery has its own page, every other is met among the moves. */
export function DocumentTag({ number, kind, note }: DocumentTagProps): ReactElement {
  const code = encodeURIComponent(number);
  const to = kind === 'receipt' ? `/shelf/deliveries/${code}` : `/shelf/moves?q=${code}`;
  return <Tag kind="document" code={number} to={to} story={note ?? undefined} />;
}

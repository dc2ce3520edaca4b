import type { TagKind } from '../../components/tag/tag-kinds';
import { recentPrefix } from '../../lib/drafts';
import { readStored, writeStored } from '../../lib/stored';

/** One thing or page that the find field can go to. */
export interface Found {
  kind: TagKind | 'page';
  /** A code, or a page's name. */
  code: string;
  story?: string;
  to: string;
}

const key = `${recentPrefix}found`;
const kept = 8;

/** What was found before in this tab, the latest first. */
export function recentFinds(): readonly Found[] {
  const stored = readStored('session', key);
  return Array.isArray(stored) ? (stored as Found[]) : [];
}

export function rememberFind(found: Found): void {
  const others = recentFinds().filter(({ to }) => to !== found.to);
  writeStored('session', key, [found, ...others].slice(0, kept));
}

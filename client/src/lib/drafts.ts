import { dropStored, storedKeys } from './stored';

/** What a person left unfinished or looked at in this tab, by the beginning of its key. */
export const draftPrefix = 'draft:';
export const recentPrefix = 'recent:';

/** Forgets all of it, when somebody signs out. */
export function discardDrafts(): void {
  for (const prefix of [draftPrefix, recentPrefix]) {
    for (const key of storedKeys('session', prefix)) dropStored('session', key);
  }
}

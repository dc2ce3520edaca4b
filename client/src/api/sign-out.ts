import { discardDrafts } from '../lib/drafts';
import { notify } from '../lib/notify';
import { sentenceOf } from '../lib/problem';
import { answer, api } from './client';

/** Ends the session and leaves nothing of the person in this browser: the page is loaded afresh. */
export async function signOut(): Promise<void> {
  try {
    await answer(api.DELETE('/api/session'));
  } catch (error) {
    notify(sentenceOf(error).sentence, { tone: 'hot' });
    return;
  }
  discardDrafts();
  location.assign('/');
}

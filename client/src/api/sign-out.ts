import { discardDrafts } from '../lib/drafts';
import { notify } from '../lib/notify';
import { sentenceOf } from '../lib/problem';
import { request } from './request';

/** Ends the session and leaves nothing of the person in this browser: the page is loaded afresh. */
export async function signOut(): Promise<void> {
  try {
    await request('DELETE', '/api/session');
  } catch (error) {
    notify(sentenceOf(error).sentence, { tone: 'hot' });
    return;
  }
  discardDrafts();
  location.assign('/');
}

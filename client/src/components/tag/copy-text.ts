import { notify } from '../../lib/notify';

/** Puts a code on the clipboard and says so; says what to do instead where the browser does not allow it. */
export function copyText(text: string): void {
  const refused = (): void =>
    notify(`This browser does not let the page copy. Select ${text} and copy it yourself.`, { tone: 'hot' });
  if (!navigator.clipboard) {
    refused();
    return;
  }
  navigator.clipboard.writeText(text).then(() => notify(`${text} is copied.`), refused);
}

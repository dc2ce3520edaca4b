import type { Mail } from '@emberlot/fakes/mail/mailbox';
import type { Product } from './product.js';

export interface MailWanted {
  /** The address it was sent to. */
  readonly to: string;
  /** Text that its subject contains. */
  readonly subject?: string;
}

/** The newest caught mail of that kind, waiting for it if need be. */
export async function waitForMail(product: Product, wanted: MailWanted): Promise<Mail> {
  const query = new URLSearchParams({ ...wanted, timeout: '20000' });
  const answer = await fetch(`${product.mailUrl}/api/mails/wait?${query}`);
  if (!answer.ok)
    throw new Error(`No mail to ${wanted.to} (${wanted.subject ?? 'any subject'}): ${await answer.text()}`);
  const mails = (await answer.json()) as readonly Mail[];
  const newest = mails.toSorted((one, other) => one.receivedAt.localeCompare(other.receivedAt)).at(-1);
  if (!newest) throw new Error(`The catcher answered no mail to ${wanted.to}`);
  return newest;
}

/** The bytes of one attachment, by the end of its name. */
export async function readAttachment(product: Product, mail: Mail, ending: string): Promise<Buffer> {
  const found = mail.attachments.find((attachment) => attachment.name.endsWith(ending));
  if (!found) throw new Error(`“${mail.subject}” has no attachment that ends in ${ending}`);
  const answer = await fetch(`${product.mailUrl}/api/mails/${mail.id}/attachments/${found.index}`);
  if (!answer.ok) throw new Error(`The attachment ${found.name} could not be read: ${answer.status}`);
  return Buffer.from(await answer.arrayBuffer());
}

/** The link of the product in a mail's text, from its path on: `/confirm?token=…`. */
export function linkIn(product: Product, mail: Mail): string {
  const found = [...(mail.text ?? '').matchAll(/https?:\/\/\S+/g)].find(([link]) => link.startsWith(product.url));
  if (!found) throw new Error(`“${mail.subject}” has no link to the product:\n${mail.text}`);
  return found[0].slice(product.url.length).replace(/[).,>]+$/, '');
}

/** What stands behind `#` in the link of a mail. */
export function tokenIn(mail: Mail): string {
  const token = /#([\w-]{20,})/.exec(mail.text ?? '')?.[1];
  if (token === undefined) throw new Error(`“${mail.subject}” has no link with a token:\n${mail.text}`);
  return token;
}

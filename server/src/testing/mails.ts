import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

export interface MailRow {
  readonly id: number;
  readonly recipient: string;
  readonly subject: string;
  readonly body_text: string;
  readonly body_html: string;
  readonly sent_at: Date | null;
}

/** The mails written for an address, oldest first. */
export async function mailsTo(handle: Kysely<DB>, recipient: string): Promise<readonly MailRow[]> {
  return handle
    .selectFrom('outbox_mail')
    .select(['id', 'recipient', 'subject', 'body_text', 'body_html', 'sent_at'])
    .where('recipient', '=', recipient)
    .orderBy('id')
    .execute();
}

/** What stands behind `#` in the link of a mail. */
export function tokenIn(mail: MailRow | undefined): string {
  const token = /#([\w-]{20,})/.exec(mail?.body_text ?? '')?.[1];
  if (token === undefined) throw new Error('There is no link with a token in this mail.');
  return token;
}

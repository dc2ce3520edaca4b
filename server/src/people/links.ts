import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { AppError } from '../platform/errors/app-error.js';

export type LinkPurpose = 'sign_up' | 'invitation' | 'password_reset' | 'email_change';

const minute = 60_000;
const hour = 60 * minute;

/**
 * How long a link works, and the page of the client it opens. All are longer than ten minutes because mail can be held
 * up on its way, and because people are not always at their desk; a token of 256 random bits cannot be guessed in any of
 * these spans, works once, and dies when a newer one is asked for.
 */
const links: Readonly<Record<LinkPurpose, { readonly page: string; readonly milliseconds: number }>> = {
  sign_up: { page: '/welcome', milliseconds: 24 * hour },
  invitation: { page: '/join', milliseconds: 7 * 24 * hour },
  password_reset: { page: '/new-password', milliseconds: 30 * minute },
  email_change: { page: '/new-address', milliseconds: 2 * hour },
};

export interface UsedLink {
  readonly userId: number;
  readonly newEmail: string | null;
}

/** Links sent by mail that let somebody in, once. Only a digest of what they carry is kept. */
@Injectable()
export class Links {
  constructor(
    private readonly clock: Clock,
    private readonly config: Config,
  ) {}

  /**
   * Makes a link; older ones of the same purpose stop working. What it carries stands behind `#`, which browsers send to
   * no server, so that no log on the way holds it.
   */
  async issue(trx: Transaction<DB>, userId: number, purpose: LinkPurpose, newEmail?: string): Promise<string> {
    await this.void(trx, userId, [purpose]);
    const token = randomBytes(32).toString('base64url');
    const now = this.clock.now();
    await trx
      .insertInto('user_token')
      .values({
        user_id: userId,
        purpose,
        token_hash: digestOf(token),
        new_email: newEmail ?? null,
        created_at: now,
        expires_at: new Date(now.getTime() + links[purpose].milliseconds),
      })
      .execute();
    return `${this.config.baseUrl}${links[purpose].page}#${token}`;
  }

  /**
   * Uses a link up. One statement, so that of two uses at once one wins.
   *
   * @throws AppError `link_expired` when it was used, is out of date, was replaced, or is none of this purpose
   */
  async use(trx: Transaction<DB>, token: string, purpose: LinkPurpose): Promise<UsedLink> {
    const now = this.clock.now();
    const row = await trx
      .updateTable('user_token')
      .set({ used_at: now })
      .where('token_hash', '=', digestOf(token))
      .where('purpose', '=', purpose)
      .where('used_at', 'is', null)
      .where('voided_at', 'is', null)
      .where('expires_at', '>', now)
      .returning(['user_id', 'new_email'])
      .executeTakeFirst();
    if (!row) throw new AppError('link_expired', 'This link was used already, or is out of date. Ask for a new one.');
    return { userId: row.user_id, newEmail: row.new_email };
  }

  /** Makes links of these purposes stop working. */
  async void(trx: Transaction<DB>, userId: number, purposes: readonly LinkPurpose[]): Promise<void> {
    await trx
      .updateTable('user_token')
      .set({ voided_at: this.clock.now() })
      .where('user_id', '=', userId)
      .where('purpose', 'in', purposes)
      .where('used_at', 'is', null)
      .where('voided_at', 'is', null)
      .execute();
  }
}

function digestOf(token: string): Buffer {
  return createHash('sha256').update(token).digest();
}

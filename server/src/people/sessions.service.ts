import { Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { Audit } from '../platform/audit/audit.js';
import { formTokenOf } from '../platform/auth/form-token.js';
import { sessionDigest } from '../platform/auth/session.store.js';
import { isSessionOver } from '../platform/auth/session-times.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { notFound } from '../platform/errors/app-error.js';
import { FirstOwnerService } from './first-owner.service.js';
import type { OwnSessionDto, SessionDto, SessionShopDto } from './people.dto.js';
import { SessionsRepository, type StoredSession } from './sessions.repository.js';

@Injectable()
export class SessionsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly sessions: SessionsRepository,
    private readonly firstOwner: FirstOwnerService,
    private readonly audit: Audit,
    private readonly clock: Clock,
  ) {}

  /** What the client starts from: who is signed in, and the token for its changes. */
  async describe(request: Request, user: SignedInUser | null): Promise<SessionDto> {
    const person = user && { id: user.id, name: user.name, email: user.email, role: user.role };
    const needsOwner = user === null && (await this.firstOwner.isNeeded());
    return { csrfToken: formTokenOf(request), person, shop: await this.#shop(), needsOwner };
  }

  async listOwn(user: SignedInUser, currentSessionId: string): Promise<OwnSessionDto[]> {
    const current = sessionDigest(currentSessionId);
    const now = this.clock.now().getTime();
    const stored = await this.sessions.findByUser(this.database.handle, user.id);
    return stored
      .filter((session) => !isSessionOver(session.data, now))
      .map((session) => toDto(session, current))
      .toSorted((one, other) => other.lastSeenAt.localeCompare(one.lastSeenAt));
  }

  async endOwn(user: SignedInUser, key: string): Promise<void> {
    await this.transactions.run(async (trx) => {
      if (!(await this.sessions.end(trx, user.id, key))) throw notFound('session');
      await this.#record(trx, user);
    });
  }

  async endOwnOthers(user: SignedInUser, currentSessionId: string): Promise<void> {
    await this.transactions.run(async (trx) => {
      await this.sessions.endAll(trx, user.id, sessionDigest(currentSessionId));
      await this.#record(trx, user);
    });
  }

  async #record(trx: Parameters<Audit['record']>[0], user: SignedInUser): Promise<void> {
    await this.audit.record(trx, {
      actor: user,
      action: 'session.ended_elsewhere',
      subjectKind: 'app_user',
      subjectId: user.id,
      subjectCode: user.name,
    });
  }

  async #shop(): Promise<SessionShopDto | null> {
    const row = await this.database.handle.selectFrom('shop').select(['name', 'zone', 'currency']).executeTakeFirst();
    return row ? { name: row.name, timeZone: row.zone, currency: row.currency } : null;
  }
}

function toDto({ sid, data }: StoredSession, current: string): OwnSessionDto {
  const startedAt = data.createdAt ?? 0;
  return {
    key: sid,
    current: sid === current,
    device: data.device ?? '',
    address: data.address ?? '',
    startedAt: new Date(startedAt).toISOString(),
    lastSeenAt: new Date(data.lastSeenAt ?? startedAt).toISOString(),
  };
}

import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, notFound } from '../platform/errors/app-error.js';
import { Outbox } from '../platform/mail/outbox.js';
import type { PageQuery } from '../platform/paging/page-query.dto.js';
import { Links } from './links.js';
import type { InvitationDto, StaffEditDto, StaffMemberDto, StaffPageDto, StaffRole, UserStatus } from './people.dto.js';
import { invitationLetter } from './people-mails.js';
import { SessionsRepository } from './sessions.repository.js';
import { UsersRepository, type User } from './users.repository.js';

/** The people of the shop, as the owner sees and changes them. */
@Injectable()
export class StaffService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly sessions: SessionsRepository,
    private readonly links: Links,
    private readonly outbox: Outbox,
    private readonly audit: Audit,
    private readonly clock: Clock,
  ) {}

  async list(query: PageQuery): Promise<StaffPageDto> {
    const page = await this.users.findStaffPage(this.database.handle, query);
    return { items: page.items.map(toDto), total: page.total };
  }

  /** @throws AppError `already_exists` when the address has an account, as a customer or otherwise */
  async invite(actor: SignedInUser, { name, email, role }: InvitationDto): Promise<StaffMemberDto> {
    return this.transactions.run(async (trx) => {
      const createdAt = this.clock.now();
      const user = await this.users.insert(trx, { name, email, role, status: 'invited', createdAt });
      await this.#sendInvitation(trx, actor, user);
      return toDto(user);
    });
  }

  /** Sends a new link; the one before stops working. */
  async inviteAgain(actor: SignedInUser, id: number): Promise<void> {
    await this.transactions.run(async (trx) => {
      const user = await this.#getStaff(trx, id);
      if (user.status !== 'invited') throw new AppError('wrong_state', `${user.name} has joined already.`);
      await this.#sendInvitation(trx, actor, user);
    });
  }

  /**
   * Changes role or access; both take effect with the person's next request.
   *
   * @throws AppError `rule_broken` when no owner would be left who can sign in
   */
  async edit(actor: SignedInUser, id: number, edit: StaffEditDto): Promise<StaffMemberDto> {
    return this.transactions.run(async (trx) => {
      const owners = await this.users.lockActiveOwners(trx);
      const before = await this.#getStaff(trx, id);
      const role = edit.role ?? (before.role as StaffRole);
      const status = nextStatus(before, edit.status);
      refuseLastOwner(owners, id, role, status);
      const saved = await this.users.update(trx, id, edit.version, { role, status });
      const after = toDto(await this.users.get(trx, id));
      if (!saved) throw changedMeanwhile(after);
      if (status === 'disabled') await this.#shutOut(trx, id);
      await this.audit.record(trx, {
        actor,
        action: before.role === role ? 'user.status_changed' : 'user.role_changed',
        subjectKind: 'app_user',
        subjectId: id,
        subjectCode: before.name,
        before: { role: before.role, status: before.status },
        after: { role, status },
      });
      return after;
    });
  }

  async endSessions(actor: SignedInUser, id: number): Promise<void> {
    await this.transactions.run(async (trx) => {
      const user = await this.#getStaff(trx, id);
      await this.sessions.endAll(trx, id);
      await this.audit.record(trx, {
        actor,
        action: 'user.sessions_ended',
        subjectKind: 'app_user',
        subjectId: id,
        subjectCode: user.name,
      });
    });
  }

  async #getStaff(trx: Transaction<DB>, id: number): Promise<User> {
    const user = await this.users.get(trx, id);
    if (user.role === 'customer') throw notFound('person');
    return user;
  }

  async #shutOut(trx: Transaction<DB>, id: number): Promise<void> {
    await this.sessions.endAll(trx, id);
    await this.links.void(trx, id, ['invitation', 'password_reset', 'email_change']);
  }

  async #sendInvitation(trx: Transaction<DB>, actor: SignedInUser, user: User): Promise<void> {
    const url = await this.links.issue(trx, user.id, 'invitation');
    await this.outbox.enqueue(trx, {
      dedupeKey: `invitation ${user.id} ${randomUUID()}`,
      to: user.email,
      confidential: true,
      ...invitationLetter(user.name, actor.name, url),
    });
    await this.audit.record(trx, {
      actor,
      action: 'user.invited',
      subjectKind: 'app_user',
      subjectId: user.id,
      subjectCode: user.name,
      after: { email: user.email, role: user.role },
    });
  }
}

/** Opened again, somebody who never chose a password is still invited. */
function nextStatus(user: User, asked: 'active' | 'disabled' | undefined): UserStatus {
  if (asked === undefined) return user.status;
  if (asked === 'disabled') return 'disabled';
  return user.passwordHash === null ? 'invited' : 'active';
}

function refuseLastOwner(owners: readonly number[], id: number, role: StaffRole, status: UserStatus): void {
  const staysOwner = role === 'owner' && status === 'active';
  if (staysOwner || !owners.includes(id) || owners.length > 1) return;
  throw new AppError('rule_broken', 'This is the last owner who can sign in. Make somebody else an owner first.');
}

function toDto({ id, name, email, role, status, version }: User): StaffMemberDto {
  return { id, name, email, role: role as StaffRole, status, version };
}

import { Controller, Get, Query } from '@nestjs/common';
import { Roles } from '../auth/access.js';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import type { Role } from '../auth/signed-in-user.js';
import { AuditPageDto, AuditQuery, type AuditEntryDto } from './audit.dto.js';
import { AuditRepository, type AuditRow } from './audit.repository.js';

@Controller('audit-entries')
export class AuditController {
  constructor(
    private readonly database: Database,
    private readonly entries: AuditRepository,
    private readonly clock: Clock,
  ) {}

  /** Who did what, newest first. */
  @Get()
  @Roles('owner', 'accountant')
  async list(@Query() query: AuditQuery): Promise<AuditPageDto> {
    const span = {
      since: query.from === undefined ? undefined : this.clock.startOf(query.from),
      before: query.to === undefined ? undefined : this.clock.endOf(query.to),
    };
    const page = await this.entries.findPage(this.database.handle, query, span);
    return { items: page.items.map(toDto), total: page.total };
  }
}

function toDto(row: AuditRow): AuditEntryDto {
  return {
    id: row.id,
    recordedAt: row.recorded_at.toISOString(),
    actorId: row.actor_id,
    actorName: row.actor_name,
    actorRole: row.actor_role as Role | null,
    action: row.action,
    subjectKind: row.subject_kind,
    subjectId: row.subject_id,
    subjectCode: row.subject_code,
    before: row.before as Record<string, unknown> | null,
    after: row.after as Record<string, unknown> | null,
  };
}

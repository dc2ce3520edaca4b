import { ApiProperty } from '@nestjs/swagger';
import { IsIn, Matches } from 'class-validator';
import { roles, type Role } from '../auth/signed-in-user.js';
import { FromDigits, PageQuery } from '../paging/page-query.dto.js';
import { Day, Id, Optional } from '../validation/fields.js';

export class AuditQuery extends PageQuery {
  /** The start of an action's name: `user` finds all that was done to people's accounts. */
  @Optional()
  @Matches(/^[a-z][a-z_.]{0,60}$/, { message: 'Give the start of an action’s name.' })
  action?: string;

  @Optional()
  @Matches(/^[a-z][a-z_]{0,40}$/, { message: 'Give the kind of thing by its name.' })
  subjectKind?: string;

  @Optional()
  @FromDigits()
  @Id()
  subjectId?: number;

  @Optional()
  @FromDigits()
  @Id()
  actorId?: number;

  @Optional()
  @IsIn(roles)
  actorRole?: Role;

  /** First day, in the shop's zone. */
  @Optional()
  @Day()
  from?: string;

  /** Last day, in the shop's zone. */
  @Optional()
  @Day()
  to?: string;
}

export class AuditEntryDto {
  id: number;
  recordedAt: string;
  actorId: number | null;
  /** The name at that time; null for what the product did by itself. */
  actorName: string | null;
  @ApiProperty({ enum: roles, nullable: true, type: String })
  actorRole: Role | null;
  action: string;
  subjectKind: string;
  subjectId: number | null;
  subjectCode: string | null;
  @ApiProperty({ type: 'object', additionalProperties: true, nullable: true })
  before: Record<string, unknown> | null;
  @ApiProperty({ type: 'object', additionalProperties: true, nullable: true })
  after: Record<string, unknown> | null;
}

export class AuditPageDto {
  items: AuditEntryDto[];
  total: number;
}

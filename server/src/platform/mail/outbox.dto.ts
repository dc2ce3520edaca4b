import { ApiProperty } from '@nestjs/swagger';
import { IsIn } from 'class-validator';
import { PageQuery } from '../paging/page-query.dto.js';
import { Optional } from '../validation/fields.js';

/** Derived from what is recorded of a mail; nothing is stored under these names. */
export const mailStates = ['waiting', 'sent', 'given_up', 'uncertain'] as const;

export type MailState = (typeof mailStates)[number];

export class OutboxQuery extends PageQuery {
  @Optional()
  @IsIn(mailStates)
  state?: MailState;
}

export class OutboxMailDto {
  id: number;
  to: string;
  subject: string;
  createdAt: string;
  attempts: number;
  @ApiProperty({ enum: mailStates, enumName: 'MailState' })
  state: MailState;
  sentAt: string | null;
  /** What the mail server, or the line to it, said last. */
  lastError: string | null;
}

export class OutboxPageDto {
  items: OutboxMailDto[];
  total: number;
}

import { ApiProperty } from '@nestjs/swagger';
import { IsIn } from 'class-validator';
import { passwordLimit } from '@emberlot/shared/limits/password';
import { textLimit } from '@emberlot/shared/limits/text';
import { type Role, roles, staffRoles } from '../platform/auth/signed-in-user.js';
import { Email, Optional, Text, Version } from '../platform/validation/fields.js';
import { Password } from './password.decorator.js';

export const userStatuses = ['invited', 'unconfirmed', 'active', 'disabled'] as const;

export type UserStatus = (typeof userStatuses)[number];

export type StaffRole = (typeof staffRoles)[number];

export class PersonDto {
  id: number;
  name: string;
  email: string;
  @ApiProperty({ enum: roles, enumName: 'Role' })
  role: Role;
}

export class SessionShopDto {
  name: string;
  timeZone: string;
  currency: string;
}

export class SessionDto {
  /** To be sent back in `x-csrf-token` with every change; a new one comes with signing in and out. */
  csrfToken: string;
  /** Null for a visitor. */
  @ApiProperty({ type: PersonDto, nullable: true })
  person: PersonDto | null;
  /** Null until the shop is set up. */
  @ApiProperty({ type: SessionShopDto, nullable: true })
  shop: SessionShopDto | null;
  /** True until the first owner is made. */
  needsOwner: boolean;
}

export class SignInDto {
  @Email()
  email: string;

  @Password()
  password: string;
}

export class OwnSessionDto {
  /** Names the session to end it; does not let anybody in. */
  key: string;
  current: boolean;
  /** What the browser calls itself. */
  device: string;
  address: string;
  startedAt: string;
  lastSeenAt: string;
}

export class OwnSessionsDto {
  items: OwnSessionDto[];
}

export class SignUpDto {
  @Text({ max: textLimit.name })
  name: string;

  @Email()
  email: string;
}

export class EmailOnlyDto {
  @Email()
  email: string;
}

/** What came in the link behind `#`, and the password to sign in with from now on. */
export class LinkWithPasswordDto {
  @Text({ max: textLimit.line })
  token: string;

  /** At least 8 characters; a short sentence is best. */
  @Password()
  @ApiProperty({ minLength: passwordLimit.fewestCharacters })
  password: string;
}

export class LinkDto {
  @Text({ max: textLimit.line })
  token: string;
}

export class PasswordChangeDto {
  @Password()
  currentPassword: string;

  @Password()
  @ApiProperty({ minLength: passwordLimit.fewestCharacters })
  newPassword: string;
}

export class EmailChangeDto {
  @Password()
  currentPassword: string;

  @Email()
  email: string;
}

export class ProfileDto extends PersonDto {
  memberSince: string;
  version: number;
}

export class ProfileEditDto {
  @Text({ max: textLimit.name })
  name: string;

  @Version()
  version: number;
}

export class InvitationDto {
  @Text({ max: textLimit.name })
  name: string;

  @Email()
  email: string;

  @IsIn(staffRoles, { message: 'Choose owner, assembler or accountant.' })
  role: StaffRole;
}

export class StaffMemberDto {
  id: number;
  name: string;
  email: string;
  @ApiProperty({ enum: staffRoles, enumName: 'StaffRole' })
  role: StaffRole;
  @ApiProperty({ enum: userStatuses, enumName: 'UserStatus' })
  status: UserStatus;
  version: number;
}

export class StaffPageDto {
  items: StaffMemberDto[];
  total: number;
}

export class StaffEditDto {
  @Optional()
  @IsIn(staffRoles, { message: 'Choose owner, assembler or accountant.' })
  role?: StaffRole;

  /** Whether they may sign in. */
  @Optional()
  @IsIn(['active', 'disabled'], { message: 'Choose active or disabled.' })
  status?: 'active' | 'disabled';

  @Version()
  version: number;
}

export class FirstOwnerDto {
  /** Printed when the server starts, while nobody can sign in yet. */
  @Text({ max: textLimit.line })
  setupCode: string;

  @Text({ max: textLimit.name })
  name: string;

  @Email()
  email: string;

  @Password()
  @ApiProperty({ minLength: passwordLimit.fewestCharacters })
  password: string;
}

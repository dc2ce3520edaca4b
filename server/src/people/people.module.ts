import { Module } from '@nestjs/common';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { AccountRequestsService } from './account-requests.service.js';
import { AccountsController } from './accounts.controller.js';
import { AccountsService } from './accounts.service.js';
import { FirstOwnerService } from './first-owner.service.js';
import { KnownAddressesRepository } from './known-addresses.repository.js';
import { LinkCompletionsService } from './link-completions.service.js';
import { Links } from './links.js';
import { PasswordHasher } from './password-hasher.js';
import { PasswordResetRequestedTask } from './password-reset-requested.task.js';
import { peopleConstraints } from './people.constraints.js';
import { ProfileController } from './profile.controller.js';
import { ProfileService } from './profile.service.js';
import { SessionsController } from './sessions.controller.js';
import { SessionsRepository } from './sessions.repository.js';
import { SessionsService } from './sessions.service.js';
import { SignInService } from './sign-in.service.js';
import { SignUpRequestedTask } from './sign-up-requested.task.js';
import { StaffController } from './staff.controller.js';
import { StaffService } from './staff.service.js';
import { UsersRepository } from './users.repository.js';

@Module({
  controllers: [AccountsController, ProfileController, SessionsController, StaffController],
  providers: [
    AccountRequestsService,
    AccountsService,
    FirstOwnerService,
    KnownAddressesRepository,
    LinkCompletionsService,
    Links,
    PasswordHasher,
    PasswordResetRequestedTask,
    ProfileService,
    SessionsRepository,
    SessionsService,
    SignInService,
    SignUpRequestedTask,
    StaffService,
    UsersRepository,
  ],
  exports: [AccountsService, FirstOwnerService, PasswordHasher],
})
export class PeopleModule {
  constructor(constraints: ConstraintSentences) {
    constraints.add(peopleConstraints);
  }
}

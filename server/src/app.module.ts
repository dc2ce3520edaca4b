import { Module } from '@nestjs/common';
import { PeopleModule } from './people/people.module.js';
import { PlatformModule } from './platform/platform.module.js';

/** Everything the server is made of; a new module is added to its row. */
@Module({
  imports: [
    PlatformModule,
    // Master data
    PeopleModule,
    // The ledgers and documents that others post to
    // Making
    // Selling and after
    // For the accountant
  ],
})
export class AppModule {}

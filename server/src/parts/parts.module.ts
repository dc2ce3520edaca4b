import { Module } from '@nestjs/common';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { PartDetailsRepository } from './part-details.repository.js';
import { PartRegisterRepository } from './part-register.repository.js';
import { PartRegister } from './part-register.service.js';
import { PartsController } from './parts.controller.js';
import { PartsRepository } from './parts.repository.js';
import { PartsService } from './parts.service.js';

@Module({
  controllers: [PartsController],
  providers: [PartDetailsRepository, PartRegister, PartRegisterRepository, PartsRepository, PartsService],
  exports: [PartRegister, PartsService],
})
export class PartsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add({
      part_code_unique: {
        code: 'already_exists',
        sentence: 'Another part has this code already. Choose another, or open that part.',
        pointer: '/code',
      },
      part_serial_letters_unique: {
        code: 'already_exists',
        sentence: 'Another part’s serial numbers begin with these letters already.',
        pointer: '/serialLetters',
      },
      part_stays_as_moved: {
        code: 'rule_broken',
        sentence: 'This part has moved already: its measure and the way it is followed stay as they are.',
        pointer: '/measure',
      },
      part_origin_country_code_fkey: {
        code: 'invalid_input',
        sentence: 'There is no country of these letters.',
        pointer: '/originCountryCode',
      },
    });
  }
}

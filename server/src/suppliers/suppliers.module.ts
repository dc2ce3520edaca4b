import { Module } from '@nestjs/common';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SupplierRegister } from './supplier-register.service.js';
import { SuppliersController } from './suppliers.controller.js';
import { SuppliersRepository } from './suppliers.repository.js';
import { SuppliersService } from './suppliers.service.js';

@Module({
  controllers: [SuppliersController],
  providers: [SupplierRegister, SuppliersService, SuppliersRepository],
  exports: [SupplierRegister, SuppliersService],
})
export class SuppliersModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add({
      supplier_code_unique: {
        code: 'already_exists',
        sentence: 'Another supplier has this code already. Choose another, or open that supplier.',
        pointer: '/code',
      },
      supplier_country_code_fkey: {
        code: 'invalid_input',
        sentence: 'There is no country of these letters.',
        pointer: '/countryCode',
      },
    });
  }
}

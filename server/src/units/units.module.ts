import { Module } from '@nestjs/common';
import { UnitRegisterRepository } from './unit-register.repository.js';
import { UnitRegister } from './unit-register.service.js';

@Module({
  providers: [UnitRegister, UnitRegisterRepository],
  exports: [UnitRegister],
})
export class UnitsModule {}

import { Module } from '@nestjs/common';
import { FindController } from './find.controller.js';
import { FindRepository } from './find.repository.js';
import { FindService } from './find.service.js';

@Module({ controllers: [FindController], providers: [FindRepository, FindService] })
export class FindModule {}

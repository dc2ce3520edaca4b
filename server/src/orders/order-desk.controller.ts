import { Controller, Get, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { CodeParam } from '../platform/validation/codes.js';
import { OrderDeskDto, OrderDeskPageDto, OrderDeskQuery } from './order-desk.dto.js';
import { OrderDeskService } from './order-desk.service.js';

/** Orders for the staff; buyers have their own routes. */
@Controller('desk-orders')
@Roles('owner', 'assembler', 'accountant')
export class OrderDeskController {
  constructor(private readonly desk: OrderDeskService) {}

  @Get()
  async list(@Query() query: OrderDeskQuery, @CurrentUser() person: SignedInUser): Promise<OrderDeskPageDto> {
    return this.desk.list(query, person);
  }

  @Get(':code')
  async get(@CodeParam('document') number: string, @CurrentUser() person: SignedInUser): Promise<OrderDeskDto> {
    return this.desk.get(number, person);
  }
}

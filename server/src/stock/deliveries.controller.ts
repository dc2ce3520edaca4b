import { Body, Controller, Get, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { DeliveriesService } from './deliveries.service.js';
import { DeliveriesQuery, DeliveryDto, DeliveryInputDto, DeliveryPageDto } from './delivery.dto.js';
import { ReceiveDeliveryService } from './receive-delivery.service.js';

@Controller('deliveries')
export class DeliveriesController {
  constructor(
    private readonly deliveries: DeliveriesService,
    private readonly receiving: ReceiveDeliveryService,
  ) {}

  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: DeliveriesQuery, @CurrentUser() person: SignedInUser): Promise<DeliveryPageDto> {
    return this.deliveries.list(query, person);
  }

  @Get(':number')
  @Roles('owner', 'assembler', 'accountant')
  async get(
    @CodeParam('document', 'number') number: string,
    @CurrentUser() person: SignedInUser,
  ): Promise<DeliveryDto> {
    return this.deliveries.get(number, person);
  }

  @Post()
  @Roles('owner')
  @Creates()
  async receive(@Body() input: DeliveryInputDto, @CurrentUser() person: SignedInUser): Promise<DeliveryDto> {
    return this.deliveries.get(await this.receiving.receive(input, person), person);
  }
}

import { Body, Controller, Post } from '@nestjs/common';
import { OrdersService } from '../orders/orders.service.js';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CancelOrderService } from './cancel-order.service.js';
import { CancellationDto, CancelOrderInput } from './cancellation.dto.js';

/** Orders that will not leave after all. */
@Controller('order-cancellations')
@Roles('owner')
export class CancellationsController {
  constructor(
    private readonly cancelling: CancelOrderService,
    private readonly orders: OrdersService,
  ) {}

  /** Cancels an order that has not left: what was paid goes back with a credit note, what was claimed is free. */
  @Post()
  @Creates()
  async cancel(@Body() input: CancelOrderInput, @CurrentUser() person: SignedInUser): Promise<CancellationDto> {
    const orderId = await this.orders.idOf(input.order);
    return this.cancelling.cancel(orderId, input.reason, person);
  }
}

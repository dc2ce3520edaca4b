import { Controller, Get, Headers, Param } from '@nestjs/common';
import { CurrentUser, MaybeUser, Public, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { BuyerOrderDto, BuyerOrdersDto } from './buyer-orders.dto.js';
import { BuyerOrdersService } from './buyer-orders.service.js';

@Controller()
export class BuyerOrdersController {
  constructor(private readonly orders: BuyerOrdersService) {}

  /** The orders of the customer who is signed in. */
  @Get('own-orders')
  @Roles('customer')
  async list(@CurrentUser() user: SignedInUser): Promise<BuyerOrdersDto> {
    return this.orders.list(user);
  }

  /** One order, for its buyer: signed in, or by the token of the link. */
  @Get('shop/orders/:number')
  @Public()
  async open(
    @Param('number') number: string,
    @Headers('x-order-token') token: string | undefined,
    @MaybeUser() user: SignedInUser | null,
  ): Promise<BuyerOrderDto> {
    return this.orders.open(number, { user, token });
  }
}

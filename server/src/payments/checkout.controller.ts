import { Body, Controller, Headers, HttpCode, Param, Post } from '@nestjs/common';
import { PaymentPageDto } from '../orders/buyer-orders.dto.js';
import { BuyerOrdersService } from '../orders/buyer-orders.service.js';
import { MaybeUser, Public } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { AppError } from '../platform/errors/app-error.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CheckedOutDto, CheckoutDto } from './checkout.dto.js';
import { CheckoutService } from './checkout.service.js';

@Controller('shop/orders')
@Public()
export class CheckoutController {
  constructor(
    private readonly checkout: CheckoutService,
    private readonly orders: BuyerOrdersService,
  ) {}

  /** Orders what is in the basket, with obligation to pay. */
  @Post()
  @Creates()
  async order(@Body() body: CheckoutDto, @MaybeUser() user: SignedInUser | null): Promise<CheckedOutDto> {
    if (user && user.role !== 'customer') {
      throw new AppError('rule_broken', 'You are signed in as staff. Sign out to order like a buyer.');
    }
    return this.checkout.order(
      { userId: user?.id ?? null, customerId: user?.customerId ?? null },
      {
        lines: body.lines,
        email: body.email,
        expectedGross: body.expectedGross,
        expectedDay: body.expectedDay,
        address: {
          recipient: body.recipient,
          company: body.company ?? null,
          addressLine: body.addressLine,
          addressLine2: body.addressLine2 ?? null,
          city: body.city,
          postcode: body.postcode,
          country: body.country,
        },
      },
    );
  }

  /** Opens the payment page of an order that is not paid yet. */
  @Post(':number/payment-pages')
  @HttpCode(200)
  async payAgain(
    @Param('number') number: string,
    @Headers('x-order-token') token: string | undefined,
    @MaybeUser() user: SignedInUser | null,
  ): Promise<PaymentPageDto> {
    const { id } = await this.orders.find(number, { user, token });
    return { paymentPage: await this.checkout.payAgain(id) };
  }
}

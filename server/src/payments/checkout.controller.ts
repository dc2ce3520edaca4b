import { Body, Controller, Post } from '@nestjs/common';
import { MaybeUser, Public } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { AppError } from '../platform/errors/app-error.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CheckedOutDto, CheckoutDto } from './checkout.dto.js';
import { CheckoutService } from './checkout.service.js';

@Controller('shop/orders')
@Public()
export class CheckoutController {
  constructor(private readonly checkout: CheckoutService) {}

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
}

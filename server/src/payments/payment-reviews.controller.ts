import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { IdParam } from '../platform/validation/id-param.js';
import { SettleReviewInput } from './payment-review.dto.js';
import { PaymentReviewsService } from './payment-reviews.service.js';

/** Payments that do not fit their order. */
@Controller('payment-reviews')
@Roles('owner')
export class PaymentReviewsController {
  constructor(private readonly reviews: PaymentReviewsService) {}

  @Post(':id/settled')
  @HttpCode(204)
  async settle(
    @IdParam() id: number,
    @Body() input: SettleReviewInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.reviews.settle(id, input.resolution, person);
  }
}

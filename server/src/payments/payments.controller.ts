import { Controller, Headers, HttpCode, Post, Req } from '@nestjs/common';
import type { RawBodyRequest } from '@nestjs/common';
import type { Request } from 'express';
import { Webhook } from '../platform/auth/access.js';
import { AppError } from '../platform/errors/app-error.js';
import { PaymentEventsService } from './payment-events.service.js';
import { PaymentServiceClient } from './payment-service.client.js';

@Controller('payment-events')
export class PaymentsController {
  constructor(
    private readonly client: PaymentServiceClient,
    private readonly events: PaymentEventsService,
  ) {}

  /** Called by the payments service; its signature over the raw bytes is what lets it in. */
  @Post()
  @HttpCode(200)
  @Webhook()
  async receive(
    @Req() request: RawBodyRequest<Request>,
    @Headers('stripe-signature') signature: string | undefined,
  ): Promise<void> {
    if (!request.rawBody) throw new AppError('invalid_input', 'An event has a body.');
    await this.events.receive(this.client.readEvent(request.rawBody, signature));
  }
}

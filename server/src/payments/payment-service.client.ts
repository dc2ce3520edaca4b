import { Injectable } from '@nestjs/common';
import Stripe from 'stripe';
import { Config } from '../platform/config/config.js';
import { AppError } from '../platform/errors/app-error.js';

/** How long one call may take. The library's own patience is 80 seconds; a buyer has less. */
const callMilliseconds = 8_000;

/** The payments service. Nothing here runs inside a transaction. */
@Injectable()
export class PaymentServiceClient {
  readonly stripe: Stripe;

  constructor(private readonly config: Config) {
    const { secretKey, host, port, protocol } = config.payments;
    this.stripe = new Stripe(secretKey, {
      timeout: callMilliseconds,
      maxNetworkRetries: 2,
      telemetry: false,
      ...(host === undefined ? {} : { host }),
      ...(port === undefined ? {} : { port }),
      ...(protocol === undefined ? {} : { protocol }),
    });
  }

  /**
   * Reads a webhook, whose signature and age are checked by the library.
   *
   * @throws AppError `invalid_input` for anything that the payments service has not signed just now
   */
  readEvent(body: Buffer, signature: string | undefined): Stripe.Event {
    try {
      return this.stripe.webhooks.constructEvent(body, signature ?? '', this.config.payments.webhookSecret);
    } catch (error) {
      if (error instanceof Stripe.errors.StripeSignatureVerificationError || error instanceof SyntaxError) {
        throw new AppError('invalid_input', 'The signature of this event is not that of the payments service.');
      }
      throw error;
    }
  }
}

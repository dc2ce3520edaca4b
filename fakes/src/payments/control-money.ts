import type Stripe from 'stripe';
import {
  flag,
  oneOf,
  optionalText,
  requireFound,
  wholeNumber,
  type ControlCall,
  type ControlRoute,
} from '../http/control.js';
import { Refusal } from '../http/exchange.js';
import { expireSession } from './checkout-sessions.js';
import { answerDispute, closeDispute, openDispute } from './disputes.js';
import { payByCard, payByDebit, settleDebit, type PaymentResult } from './payment-flow.js';
import { createPayout, failPayout } from './payouts.js';
import { failRefund, succeedRefund } from './refunds.js';
import type { Surprise, World } from './world.js';

export type MoneySwitches = {
  surprise(surprise: Surprise): void;
  nextRefundsPending(count: number): void;
  turnClock(seconds: number): void;
};

/** Controls of what happens to money: sessions, refunds, disputes, payouts. */
export function moneyControls(world: World, switches: MoneySwitches): readonly ControlRoute[] {
  return [
    ...sessionControls(world, switches),
    ...refundControls(world, switches),
    ...disputeControls(world),
    ...payoutControls(world),
  ];
}

function sessionControls(world: World, switches: MoneySwitches): readonly ControlRoute[] {
  const session = ({ parameters }: ControlCall) =>
    requireFound(world.state.sessions.find(parameters[0] ?? ''), 'No such session.');
  return [
    {
      method: 'POST',
      path: '/control/clock',
      does: 'Turns the clock of everything but the signatures: offset (seconds from the real instant).',
      run: ({ body }) => switches.turnClock(wholeNumber(body, 'offset', 0)),
    },
    {
      method: 'POST',
      path: '/control/next-payment',
      does: 'Lets the next payment differ: amount, currency, livemode, client_reference_id, metadata.',
      run: ({ body }) => switches.surprise(readSurprise(body)),
    },
    {
      method: 'POST',
      path: '/control/sessions/:id/pay',
      does: 'Pays as the page would: number, holder, email; late: true pays a session that has expired.',
      run: (call) => payNow(world, session(call), call.body),
    },
    {
      method: 'POST',
      path: '/control/sessions/:id/pay-later',
      does: 'Completes a session unpaid, as a bank debit does.',
      run: (call) => payLater(world, session(call), call.body),
    },
    {
      method: 'POST',
      path: '/control/sessions/:id/settle',
      does: 'Ends a payment that is awaited: outcome succeeded or failed.',
      run: (call) => settle(world, session(call), oneOf(call.body, 'outcome', ['succeeded', 'failed'], 'succeeded')),
    },
    {
      method: 'POST',
      path: '/control/sessions/:id/expire',
      does: 'Lets an open session expire now.',
      run: (call) => {
        if (session(call).status !== 'open') throw new Refusal(409, `The session is ${session(call).status}.`);
        return expireSession(world, session(call).id);
      },
    },
  ];
}

function refundControls(world: World, switches: MoneySwitches): readonly ControlRoute[] {
  const refund = ({ parameters }: ControlCall) =>
    requireFound(world.state.refunds.find(parameters[0] ?? ''), 'No such refund.');
  return [
    {
      method: 'POST',
      path: '/control/refunds/next-pending',
      does: 'Lets the next refunds (count) start as pending.',
      run: ({ body }) => switches.nextRefundsPending(wholeNumber(body, 'count', 1)),
    },
    {
      method: 'POST',
      path: '/control/refunds/:id/succeed',
      does: 'Completes a pending refund.',
      run: (call) => {
        if (refund(call).status !== 'pending') throw new Refusal(409, 'The refund is not pending.');
        return succeedRefund(world, refund(call));
      },
    },
    {
      method: 'POST',
      path: '/control/refunds/:id/fail',
      does: "Lets the buyer's bank send a refund back: reason.",
      run: (call) => {
        if (refund(call).status === 'failed') throw new Refusal(409, 'The refund has failed already.');
        return failRefund(world, refund(call), optionalText(call.body, 'reason') ?? 'lost_or_stolen_card');
      },
    },
  ];
}

function disputeControls(world: World): readonly ControlRoute[] {
  const charge = ({ parameters }: ControlCall) => chargeBehind(world, parameters[0] ?? '');
  const dispute = ({ parameters }: ControlCall) =>
    requireFound(world.state.disputes.find(parameters[0] ?? ''), 'No such dispute.');
  return [
    {
      method: 'POST',
      path: '/control/charges/:id/dispute',
      does: 'Opens a dispute of a charge (or of a payment intent or session): amount, reason.',
      run: (call) => {
        const { body } = call;
        const amount = wholeNumber(body, 'amount', charge(call).amount - charge(call).amount_refunded);
        return openDispute(world, charge(call), amount, optionalText(body, 'reason') ?? 'fraudulent');
      },
    },
    {
      method: 'POST',
      path: '/control/disputes/:id/answer',
      does: "Puts the shop's answer to a dispute before the bank.",
      run: (call) => answerDispute(world, dispute(call)),
    },
    {
      method: 'POST',
      path: '/control/disputes/:id/close',
      does: 'Closes a dispute: outcome won (the amount comes back) or lost.',
      run: (call) => {
        if (['won', 'lost'].includes(dispute(call).status)) throw new Refusal(409, 'The dispute is closed.');
        return closeDispute(world, dispute(call), oneOf(call.body, 'outcome', ['won', 'lost'], 'lost') === 'won');
      },
    },
  ];
}

function payoutControls(world: World): readonly ControlRoute[] {
  const payout = ({ parameters }: ControlCall) =>
    requireFound(world.state.payouts.find(parameters[0] ?? ''), 'No such payout.');
  return [
    {
      method: 'POST',
      path: '/control/payouts',
      does: 'Pays out what no payout has carried yet: currency (eur).',
      run: ({ body }) =>
        createPayout(world, optionalText(body, 'currency') ?? 'eur', wholeNumber(body, 'arrival_date', world.now())),
    },
    {
      method: 'POST',
      path: '/control/payouts/:id/fail',
      does: 'Lets the bank send a payout back: code.',
      run: (call) => {
        if (payout(call).status === 'failed') throw new Refusal(409, 'The payout has failed already.');
        return failPayout(world, payout(call), optionalText(call.body, 'code') ?? 'account_closed');
      },
    },
  ];
}

function chargeBehind(world: World, id: string): Stripe.Charge {
  const { charges, intents, sessions } = world.state;
  const intentId = id.startsWith('cs_') ? sessions.find(id)?.payment_intent : id;
  const intent = typeof intentId === 'string' && intentId.startsWith('pi_') ? intents.find(intentId) : undefined;
  const chargeId = intent ? intent.latest_charge : id;
  const charge = requireFound(charges.find(typeof chargeId === 'string' ? chargeId : ''), 'No such charge.');
  if (charge.status !== 'succeeded') throw new Refusal(409, 'The charge did not succeed.');
  return charge;
}

function readSurprise(body: ControlCall['body']): Surprise {
  const currency = optionalText(body, 'currency')?.toLowerCase();
  const reference = optionalText(body, 'client_reference_id');
  const { metadata } = body;
  if (metadata !== undefined && (typeof metadata !== 'object' || metadata === null)) {
    throw new Refusal(400, '"metadata" must be an object.');
  }
  return {
    ...(body['amount'] === undefined ? {} : { amount: wholeNumber(body, 'amount', 0) }),
    ...(currency === undefined ? {} : { currency }),
    ...(body['livemode'] === undefined ? {} : { livemode: flag(body, 'livemode', false) }),
    ...(reference === undefined ? {} : { client_reference_id: reference }),
    ...(metadata === undefined ? {} : { metadata: metadata as Record<string, string> }),
  };
}

function payNow(world: World, session: Stripe.Checkout.Session, body: ControlCall['body']): PaymentResult {
  const late = flag(body, 'late', false);
  if (session.status !== 'open' && !(late && session.status === 'expired')) {
    throw new Refusal(409, `The session is ${session.status}.`);
  }
  return payByCard(world, session.id, {
    number: optionalText(body, 'number') ?? '4242424242424242',
    expMonth: 12,
    expYear: new Date(world.now() * 1000).getUTCFullYear() + 2,
    holder: optionalText(body, 'holder') ?? 'Test Buyer',
    email: session.customer_email ?? optionalText(body, 'email') ?? 'buyer@fernhollow.example',
  });
}

function payLater(world: World, session: Stripe.Checkout.Session, body: ControlCall['body']): PaymentResult {
  if (session.status !== 'open') throw new Refusal(409, `The session is ${session.status}.`);
  const email = session.customer_email ?? optionalText(body, 'email') ?? 'buyer@fernhollow.example';
  return payByDebit(world, session.id, { holder: optionalText(body, 'holder') ?? 'Test Buyer', email });
}

function settle(world: World, session: Stripe.Checkout.Session, outcome: string): Stripe.Checkout.Session {
  const intent =
    typeof session.payment_intent === 'string' ? world.state.intents.find(session.payment_intent) : undefined;
  if (intent?.status !== 'processing') throw new Refusal(409, 'No payment of this session is awaited.');
  return settleDebit(world, session, outcome === 'succeeded');
}

import type { IncomingMessage, ServerResponse } from 'node:http';
import type Stripe from 'stripe';
import { addressOf, answerPage, readBody, redirect } from '../http/exchange.js';
import { checkCard, isEmail, type CardFault, type CardForm } from './card-form.js';
import { confirmPage, EMPTY_FORM, endedPage, homePage, payPage, unknownPage } from './pay-page.js';
import { answerConfirmation, payByCard, payByDebit, type PaymentResult } from './payment-flow.js';
import type { World } from './world.js';

const SHOWN_AT_HOME = 50;

/** The pages: `/` lists, `/pay/<session>` takes a card, `/pay/<session>/confirm` asks for confirmation. */
export async function answerPages(world: World, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const { pathname } = addressOf(request);
  const posted = request.method === 'POST';
  const body = new URLSearchParams(posted ? await readBody(request) : '');
  if (pathname === '/' && !posted) {
    answerPage(response, 200, homePage(world.shopName, world.state.sessions.newestFirst().slice(0, SHOWN_AT_HOME)));
    return;
  }
  const [, id, step] = /^\/pay\/([^/]+)(\/confirm)?$/.exec(pathname) ?? [];
  const session = id === undefined ? undefined : world.state.sessions.find(id);
  if (!session) {
    answerPage(response, 404, unknownPage());
    return;
  }
  if (session.status !== 'open') {
    answerPage(response, session.status === 'expired' ? 410 : 200, endedPage(session));
    return;
  }
  if (step === undefined) {
    if (posted) pay(world, session, body, response);
    else show(world, session, response);
    return;
  }
  if (posted) follow(world, session, answerConfirmation(world, session.id, body.get('answer') === 'yes'), response);
  else answerPage(response, 200, confirmPage(session));
}

function show(
  world: World,
  session: Stripe.Checkout.Session,
  response: ServerResponse,
  { form = EMPTY_FORM, faults = [], declined = null }: Partial<Shown> = {},
): void {
  const { lines } = world.state.sessionPrivates.get(session.id);
  const status = declined === null && faults.length === 0 ? 200 : 422;
  answerPage(response, status, payPage({ session, lines, form, faults, declined }));
}

type Shown = {
  readonly form: CardForm;
  readonly faults: readonly CardFault[];
  readonly declined: string | null;
};

function pay(world: World, session: Stripe.Checkout.Session, body: URLSearchParams, response: ServerResponse): void {
  const read = (name: string) => body.get(name) ?? '';
  const form: CardForm = {
    number: read('number'),
    expiry: read('expiry'),
    code: read('code'),
    holder: read('holder'),
    email: read('email'),
  };
  if (body.get('means') === 'debit' && session.payment_method_types.includes('sepa_debit')) {
    payDebit(world, session, form, response);
    return;
  }
  const checked = checkCard(form, session.customer_email, world.now());
  if ('faults' in checked) show(world, session, response, { form, faults: checked.faults });
  else follow(world, session, payByCard(world, session.id, checked.card), response, { ...form, code: '' });
}

function payDebit(world: World, session: Stripe.Checkout.Session, form: CardForm, response: ServerResponse): void {
  const holder = form.holder.trim();
  const email = session.customer_email ?? form.email.trim();
  const faults: CardFault[] = [];
  if (holder === '') faults.push({ field: 'holder', sentence: 'Write the name of the account holder.' });
  if (!isEmail(email)) faults.push({ field: 'email', sentence: 'Write an e-mail address for the receipt.' });
  if (faults.length > 0) show(world, session, response, { form, faults });
  else follow(world, session, payByDebit(world, session.id, { holder, email }), response);
}

function follow(
  world: World,
  session: Stripe.Checkout.Session,
  result: PaymentResult,
  response: ServerResponse,
  form: CardForm = EMPTY_FORM,
): void {
  if (result.kind === 'confirm') redirect(response, `/pay/${session.id}/confirm`);
  else if (result.kind === 'declined') show(world, session, response, { form, declined: result.decline.sentence });
  else redirect(response, (session.success_url ?? '/').replaceAll('{CHECKOUT_SESSION_ID}', session.id));
}

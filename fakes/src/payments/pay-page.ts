import type Stripe from 'stripe';
import { Markup, markup, page } from '../http/page.js';
import type { CardFault, CardForm } from './card-form.js';
import { moneyText } from './currency.js';
import type { WireLineItem } from './wire.js';

export const EMPTY_FORM: CardForm = { number: '', expiry: '', code: '', holder: '', email: '' };

const BAR = 'This page stands in for a payment service. No money moves. Type test card numbers only.';

export type PayView = {
  readonly session: Stripe.Checkout.Session;
  readonly lines: readonly WireLineItem[];
  readonly form: CardForm;
  readonly faults: readonly CardFault[];
  readonly declined: string | null;
};

function total(session: Stripe.Checkout.Session): string {
  return moneyText(session.amount_total ?? 0, session.currency ?? 'eur');
}

function nameOf(session: Stripe.Checkout.Session): string {
  return session.branding_settings?.display_name ?? 'the shop';
}

function lineTable(session: Stripe.Checkout.Session, lines: readonly WireLineItem[]): Markup {
  const rows = lines.map(
    (line) => markup`<tr><td>${line.description}</td><td class="number">${line.quantity}</td>
<td class="number">${moneyText(line.amount_total, line.currency)}</td></tr>`,
  );
  return markup`<table>
<caption class="hint">What is paid for</caption>
<thead><tr><th scope="col">What</th><th scope="col" class="number">How many</th><th scope="col" class="number">Amount</th></tr></thead>
<tbody>${rows}</tbody>
<tfoot><tr><th scope="row" colspan="2">To pay</th><td class="number"><strong>${total(session)}</strong></td></tr></tfoot>
</table>`;
}

type Field = {
  readonly name: keyof CardForm;
  readonly label: string;
  readonly hint?: string;
  readonly complete: string;
  readonly digits?: boolean;
};

const FIELDS = {
  number: { name: 'number', label: 'Card number', complete: 'cc-number', digits: true },
  expiry: { name: 'expiry', label: 'Expiry', hint: 'Month and year, such as 07/30', complete: 'cc-exp' },
  code: { name: 'code', label: 'Security code (CVC)', hint: '3 digits', complete: 'cc-csc', digits: true },
  holder: { name: 'holder', label: 'Name on the card', complete: 'cc-name' },
  email: { name: 'email', label: 'E-mail', complete: 'email' },
} satisfies Readonly<Record<string, Field>>;

function field(view: PayView, { name, label, hint, complete, digits }: Field): Markup {
  const fault = view.faults.find((one) => one.field === name);
  const described = [hint && `${name}-hint`, fault && `${name}-fault`].filter(Boolean).join(' ');
  const describedBy = described === '' ? '' : markup` aria-describedby="${described}"`;
  const invalid = fault ? new Markup(' aria-invalid="true"') : '';
  const mode = digits ? new Markup(' inputmode="numeric"') : '';
  return markup`<div><label for="${name}">${label}</label>
<input id="${name}" name="${name}" value="${view.form[name]}" autocomplete="${complete}"${mode}${describedBy}${invalid}>
${hint && markup`<p class="hint" id="${name}-hint">${hint}</p>`}
${fault && markup`<p class="fault" id="${name}-fault">${fault.sentence}</p>`}</div>`;
}

/** The page where the card is typed. */
export function payPage(view: PayView): string {
  const { session } = view;
  const shopName = nameOf(session);
  const alert =
    view.declined ?? (view.faults.length > 0 ? 'The card was not charged yet. See the fields below.' : null);
  const content = markup`<h1>Pay ${total(session)} to ${shopName}</h1>
${lineTable(session, view.lines)}
${alert !== null && markup`<p class="fault" role="alert">${alert}</p>`}
<form method="post" action="/pay/${session.id}" novalidate>
<h2>Card</h2>
${field(view, FIELDS.number)}
<div class="pair">${field(view, FIELDS.expiry)}${field(view, FIELDS.code)}</div>
${field(view, FIELDS.holder)}
${session.customer_email === null && field(view, FIELDS.email)}
<button name="means" value="card">Pay ${total(session)}</button>
${session.payment_method_types.includes('sepa_debit') && DEBIT}
</form>
${cancelLink(session, 'Cancel and go back to the shop')}`;
  return page(`Pay ${shopName}`, BAR, content);
}

const DEBIT = markup`<button name="means" value="debit">Order a bank debit instead</button>
<p class="hint">The debit needs the name and the e-mail above, and settles later.</p>`;

function cancelLink(session: Stripe.Checkout.Session, text: string): Markup | false {
  return session.cancel_url !== null && markup`<p><a href="${session.cancel_url}">${text}</a></p>`;
}

/** The step that some cards ask for. */
export function confirmPage(session: Stripe.Checkout.Session): string {
  const content = markup`<h1>Confirm the payment</h1>
<p>The bank of the card asks whether it is you who pays ${total(session)} to ${nameOf(session)}.</p>
<form method="post" action="/pay/${session.id}/confirm">
<button name="answer" value="yes">Yes, pay</button>
<button name="answer" value="no">No, do not pay</button>
</form>`;
  return page('Confirm the payment', BAR, content);
}

/** A session that can no longer be paid here. */
export function endedPage(session: Stripe.Checkout.Session): string {
  const shopName = nameOf(session);
  if (session.status === 'expired') {
    const content = markup`<h1>This payment page has expired</h1>
<p>Nothing was charged. To pay, start again from the order at ${shopName}.</p>
${cancelLink(session, 'Back to the shop')}`;
    return page('Expired', BAR, content);
  }
  const back = session.success_url?.replaceAll('{CHECKOUT_SESSION_ID}', session.id);
  const content = markup`<h1>This payment is done</h1>
<p>${total(session)} to ${shopName}: nothing more is to be paid here.</p>
${back !== undefined && markup`<p><a href="${back}">On to the order</a></p>`}`;
  return page('Done', BAR, content);
}

export function unknownPage(): string {
  return page(
    'Not found',
    BAR,
    markup`<h1>There is no such payment</h1><p>Start again from the order in the shop.</p>`,
  );
}

/** What stands at the root: what this is, and what is open. */
export function homePage(shopName: string, sessions: readonly Stripe.Checkout.Session[]): string {
  const rows = sessions.map(
    (session) => markup`<tr><td><a href="/pay/${session.id}">${session.id.slice(0, 20)}…</a></td>
<td>${session.status}, ${session.payment_status}</td><td class="number">${total(session)}</td></tr>`,
  );
  const table = markup`<table><caption class="hint">The newest first</caption>
<thead><tr><th scope="col">Payment page</th><th scope="col">State</th><th scope="col" class="number">Amount</th></tr></thead>
<tbody>${rows}</tbody></table>`;
  const content = markup`<h1>Payments of ${shopName}</h1>
<p>This program stands in for the payment service. <a href="/control">Its controls</a> make it misbehave.</p>
${sessions.length === 0 ? markup`<p>No payment was asked for yet.</p>` : table}`;
  return page('Payments', BAR, content);
}

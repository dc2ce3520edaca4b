import { startMail, type MailFake } from '@emberlot/fakes/mail';
import { startPayments, type PaymentsFake } from '@emberlot/fakes/payments';
import { expect, test, type Page } from '@playwright/test';
import { createTransport } from 'nodemailer';
import Stripe from 'stripe';
import { expectAccessible } from './support/accessibility.js';

const WIDTHS = [360, 1440];

let payments: PaymentsFake;
let mail: MailFake;

test.beforeAll(async () => {
  payments = await startPayments({ shopName: 'Fernhollow Tools' });
  mail = await startMail();
});
test.afterAll(async () => {
  await payments.close();
  await mail.close();
});

async function expectFits(page: Page): Promise<void> {
  for (const width of WIDTHS) {
    await page.setViewportSize({ width, height: 800 });
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow, `nothing sticks out at ${width} px`).toBeLessThanOrEqual(0);
  }
}

async function expectGood(page: Page): Promise<void> {
  await expectFits(page);
  await expectAccessible(page);
}

function newSession(): Promise<Stripe.Checkout.Session> {
  const client = new Stripe('sk_test_browser', { host: '127.0.0.1', port: payments.port, protocol: 'http' });
  const product_data = { name: 'Wren 60, portable soldering iron, kit with all parts and the long lead' };
  return client.checkout.sessions.create({
    mode: 'payment',
    line_items: [{ price_data: { currency: 'eur', unit_amount: 18_900, product_data }, quantity: 2 }],
    // The mail catcher serves as the shop to come back to.
    success_url: `${mail.address}/?to={CHECKOUT_SESSION_ID}`,
    cancel_url: `${mail.address}/`,
  });
}

async function fill(page: Page, number: string, expiry = '12/40'): Promise<void> {
  await page.getByLabel('Card number').fill(number);
  await page.getByLabel('Expiry').fill(expiry);
  await page.getByLabel('Security code').fill('123');
  await page.getByLabel('Name on the card').fill('A Buyer');
  await page.getByLabel('E-mail').fill('customer@fernhollow.example');
  await page.getByRole('button', { name: 'Pay €378.00' }).click();
}

test('a buyer mistypes, is declined, confirms and pays on the test payment page', async ({ page }) => {
  const session = await newSession();
  await page.goto(session.url ?? '');
  await expect(page.getByRole('heading', { name: 'Pay €378.00 to Fernhollow Tools' })).toBeVisible();
  await expectGood(page);

  await fill(page, '4242 4242 4242 4241', '12/20');
  await expect(page.getByText('This is no card number')).toBeVisible();
  await expect(page.getByText('The card has expired')).toBeVisible();
  await expectGood(page);

  await fill(page, '4000 0000 0000 9995');
  await expect(page.getByRole('alert')).toContainText('not enough money');

  await fill(page, '4000 0025 0000 3155');
  await expect(page.getByRole('heading', { name: 'Confirm the payment' })).toBeVisible();
  await expectGood(page);
  await page.getByRole('button', { name: 'Yes, pay' }).click();
  await expect(page).toHaveURL(`${mail.address}/?to=${session.id}`);

  await page.goto(`${payments.address}/pay/${session.id}`);
  await expect(page.getByRole('heading', { name: 'This payment is done' })).toBeVisible();
  await expectGood(page);
});

test('an expired payment page says so and leads back to the shop', async ({ page }) => {
  const session = await newSession();
  await payments.control('POST', `/control/sessions/${session.id}/expire`);
  await page.goto(`${payments.address}/pay/${session.id}`);
  await expectGood(page);
  await page.getByRole('link', { name: 'Back to the shop' }).click();
  await expect(page).toHaveURL(`${mail.address}/`);
  await page.goto(payments.address);
  await expectGood(page);
});

test('a caught mail is read in the browser, its scripts asleep, its links and attachments at hand', async ({
  page,
}) => {
  const transport = createTransport({ host: '127.0.0.1', port: mail.smtpPort });
  await transport.sendMail({
    from: 'shop@fernhollow.example',
    to: 'customer@fernhollow.example',
    subject: 'Confirm your address',
    text: 'Open the address below.',
    html: `<h1 id="h">Confirm</h1><a href="${mail.address}/?to=confirmed">Confirm your address</a><script>h.remove()</script>`,
    attachments: [{ filename: 'terms.txt', content: 'The terms' }],
  });
  await page.goto(mail.address);
  await expectGood(page);
  await page.getByRole('link', { name: 'Confirm your address' }).click();
  const frame = page.frameLocator('iframe');
  await expect(frame.getByRole('heading', { name: 'Confirm' })).toBeVisible();
  await expect(page.getByText('Open the address below.')).toBeVisible();
  await expect(page.locator('iframe')).toHaveAttribute('title', 'The mail as a page');
  await expectFits(page);
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: 'terms.txt' }).click();
  expect((await download).suggestedFilename()).toBe('terms.txt');
  const opened = page.waitForEvent('popup');
  await frame.getByRole('link', { name: 'Confirm your address' }).click();
  await expect(await opened).toHaveURL(`${mail.address}/?to=confirmed`);
});

test('a mail without a page of its own passes axe', async ({ page }) => {
  // Axe cannot run inside the frame of a mail, where scripts are asleep: so the page around it is judged without one.
  const transport = createTransport({ host: '127.0.0.1', port: mail.smtpPort });
  await transport.sendMail({
    from: 'shop@fernhollow.example',
    to: 'owner@fernhollow.example',
    cc: 'accountant@fernhollow.example',
    subject: 'A plain mail',
    text: 'x'.repeat(500),
    attachments: [{ filename: 'terms.txt', content: 'The terms' }],
  });
  await page.goto(`${mail.address}/?to=owner@fernhollow.example`);
  await page.getByRole('link', { name: 'A plain mail' }).click();
  await expect(page.getByRole('heading', { name: 'A plain mail' })).toBeVisible();
  await expectGood(page);
  await page.goto(`${mail.address}/mails/none`);
  await expectGood(page);
});

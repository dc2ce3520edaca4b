import type { Page } from '@playwright/test';
import { expectAccessible } from './support/accessibility.js';
import { expect, test } from './support/fixtures.js';
import { linkIn, waitForMail } from './support/mail.js';
import { type Person, addStaff, callerOf, makeOwner, signIn } from './support/people.js';

test.describe.configure({ mode: 'serial' });

let owner: Person;
let assembler: Person;

const words = 'a long walk along the mill race';

test.beforeAll(async ({ product }) => {
  owner = await makeOwner(product);
  assembler = await addStaff(product, owner, 'assembler');
});

async function fillIn(page: Page, email: string, password: string): Promise<void> {
  await page.getByRole('textbox', { name: 'E-mail address' }).fill(email);
  await page.getByRole('textbox', { name: 'Password' }).fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
}

/** Every width the product is made for, light and dark between them: nothing sticks out, and axe finds nothing. */
async function expectGood(page: Page): Promise<void> {
  for (const [colorScheme, width] of [
    ['light', 1440],
    ['dark', 1024],
    ['light', 360],
  ] as const) {
    await page.emulateMedia({ colorScheme });
    await page.setViewportSize({ width, height: 800 });
    // Lists change their shape a moment after the width does.
    await expect
      .poll(() => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth), {
        message: `nothing sticks out at ${width} px`,
      })
      .toBeLessThanOrEqual(0);
    await expectAccessible(page);
  }
}

test('a buyer signs up, chooses a password behind the link in the mail, and is in', async ({ page, product }) => {
  await page.goto('/sign-up');
  await expectGood(page);
  await page.getByRole('textbox', { name: 'Name' }).fill('Robin Buyer');
  await page.getByRole('textbox', { name: 'E-mail address' }).fill('robin@buyer.example');
  await page.getByRole('button', { name: 'Send me the link' }).click();
  await expect(page.getByRole('heading', { name: 'Look into your mail' })).toBeVisible();

  const link = linkIn(product, await waitForMail(product, { to: 'robin@buyer.example' }));
  await page.goto(link);
  await expect(page.getByRole('heading', { name: 'Choose a password' })).toBeVisible();
  expect(page.url(), 'the token is out of the address bar').toBe(`${product.url}/welcome`);
  await page.getByRole('textbox', { name: 'Password' }).fill('short');
  await page.getByRole('button', { name: 'Open my account' }).click();
  await expect(page.getByRole('alert')).toContainText('A password needs at least 8 characters.');
  await page.getByRole('textbox', { name: 'Password' }).fill(words);
  await page.getByRole('button', { name: 'Open my account' }).click();
  await expect(page.getByRole('link', { name: 'Profile' })).toBeVisible();

  await page.goto(link);
  await page.getByRole('textbox', { name: 'Password' }).fill(words);
  await page.getByRole('button', { name: 'Open my account' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
});

test('signing in says what is wrong, and leads back to where one wanted to go', async ({ page }) => {
  await page.goto('/setup/audit?page=1');
  await expect(page).toHaveURL(/\/sign-in\?to=/);
  await expectGood(page);
  await fillIn(page, owner.email, 'not this one');
  await expect(page.getByRole('alert')).toBeVisible();
  await expect(page.getByRole('textbox', { name: 'E-mail address' })).toHaveValue(owner.email);
  await page.getByRole('textbox', { name: 'Password' }).fill(owner.password);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: 'Audit' })).toBeVisible();
});

test('a forgotten password is replaced, and signs out everywhere else', async ({ page, product, browser }) => {
  const elsewhere = await (await browser.newContext({ baseURL: product.url })).newPage();
  await elsewhere.goto('/sign-in');
  await fillIn(elsewhere, assembler.email, assembler.password);
  await elsewhere.waitForURL('**/today');

  await page.goto('/forgotten-password');
  await page.getByRole('textbox', { name: 'E-mail address' }).fill(assembler.email);
  await page.getByRole('button', { name: 'Send me the link' }).click();
  await expect(page.getByRole('heading', { name: 'Look into your mail' })).toBeVisible();
  await page.goto(linkIn(product, await waitForMail(product, { to: assembler.email, subject: 'password' })));
  await page.getByRole('textbox', { name: 'Password' }).fill(words);
  await page.getByRole('button', { name: 'Use this password' }).click();
  await page.waitForURL('**/today');
  assembler = { ...assembler, password: words };

  await elsewhere.goto('/profile');
  await expect(elsewhere.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await elsewhere.context().close();
});

test('a session that ends while a form is filled in loses nothing', async ({ page, product }) => {
  await page.goto('/sign-in?to=/setup/people/invite');
  await fillIn(page, owner.email, owner.password);
  await page.getByRole('textbox', { name: 'Name' }).fill('The accountant');
  await page.getByRole('textbox', { name: 'E-mail address' }).fill('accountant@fernhollow.example');
  await page.getByRole('radio', { name: /Accountant/ }).check();

  const other = await callerOf(product, owner);
  expect((await other.delete('/api/sessions')).ok(), 'every other session is ended').toBe(true);
  await other.dispose();

  await page.getByRole('button', { name: 'Send the invitation' }).click();
  const dialog = page.getByRole('dialog', { name: 'Please sign in again' });
  await expectAccessible(page);
  await dialog.getByRole('textbox', { name: 'Password' }).fill(owner.password);
  await dialog.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'People' })).toBeVisible();
  await expect(page.getByText('accountant@fernhollow.example').first()).toBeVisible();
  await waitForMail(product, { to: 'accountant@fernhollow.example' });
});

test('what is half typed is there again after a reload', async ({ page }) => {
  await page.goto('/sign-in?to=/setup/people/invite');
  await fillIn(page, owner.email, owner.password);
  await page.getByRole('textbox', { name: 'Name' }).fill('Half a na');
  await page.reload();
  await expect(page.getByRole('textbox', { name: 'Name' })).toHaveValue('Half a na');
  await page.getByRole('button', { name: 'Start afresh' }).click();
  await expect(page.getByRole('textbox', { name: 'Name' })).toHaveValue('');
});

test('one’s sessions are listed and ended', async ({ page, product }) => {
  const tablet = await callerOf(product, owner);
  await page.goto('/sign-in?to=/profile');
  await fillIn(page, owner.email, owner.password);
  await expect(page.getByRole('heading', { name: 'Where you are signed in' })).toBeVisible();
  await expectGood(page);
  await page.getByRole('button', { name: 'Sign out everywhere else' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Sign out there' }).click();
  await expect(page.getByRole('dialog')).toBeHidden();
  await expect(page.getByRole('button', { name: 'Sign out everywhere else' })).toBeHidden();
  expect((await tablet.get('/api/profile')).status()).toBe(401);
  await tablet.dispose();
});

for (const [path, heading] of [
  ['/today', 'The shop is not set up yet'],
  ['/setup/shop', 'Set up the shop'],
  ['/setup/people', 'People'],
  ['/setup/calendar', 'Calendar'],
  ['/setup/vat', 'VAT'],
  ['/setup/delivery', 'Delivery'],
  ['/setup/mails', 'Mails'],
  ['/setup/audit', 'Audit'],
] as const) {
  test(`${path} is good to look at on every screen`, async ({ page }) => {
    test.slow();
    await signIn(page, owner);
    await page.goto(path);
    await expect(page.getByRole('heading', { name: heading, level: 1 })).toBeVisible();
    await page.waitForLoadState('networkidle');
    await expectGood(page);
  });
}

import { bodyOf } from './support/caller.js';
import { expect, test } from './support/fixtures.js';
import { type Person, addCustomer, addStaff, callerOf, makeOwner, signIn } from './support/people.js';

test.describe.configure({ mode: 'serial' });

let owner: Person;

test('the first owner is made once, with the code of the server', async ({ product }) => {
  owner = await makeOwner(product);
  await expect(makeOwner(product)).rejects.toThrow(/409/);
});

test('somebody asked to join follows the link in the mail and is known by role', async ({ product }) => {
  const assembler = await callerOf(product, await addStaff(product, owner, 'assembler'));
  const session = (await bodyOf(await assembler.get('/api/session'))) as { person: { role: string } };
  expect(session.person.role).toBe('assembler');
  const refused = await assembler.create('/api/invitations', {
    name: 'Nobody',
    email: 'nobody@fernhollow.example',
    role: 'owner',
  });
  expect(refused.status()).toBe(403);
});

test('a buyer signs up, and the page knows them', async ({ page, product }) => {
  const buyer = await addCustomer(product, 'Robin Buyer', 'robin@buyer.example');
  await signIn(page, buyer);
  await page.goto('/');
  const session = await page.evaluate(async () => (await fetch('/api/session')).json());
  expect(session).toMatchObject({ person: { email: 'robin@buyer.example', role: 'customer' } });
});

import type { Page } from '@playwright/test';
import { Caller, bodyOf } from './caller.js';
import { tokenIn, waitForMail } from './mail.js';
import type { Product } from './product.js';

/** Somebody who can sign in. */
export interface Person {
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

export type StaffRole = 'owner' | 'assembler' | 'accountant';

const password = 'copper kettle on a green bench';

/** Makes the first owner of an empty shop, with the code that the server was given. */
export async function makeOwner(product: Product): Promise<Person> {
  const owner = { name: 'The owner', email: 'owner@fernhollow.example', password };
  const caller = await Caller.open(product.url);
  await caller.startSession('/api/first-owner', { ...owner, setupCode: product.setUpCode });
  await caller.dispose();
  return owner;
}

/** Asks somebody to join and follows the link in the mail, as they would. */
export async function addStaff(product: Product, owner: Person, role: StaffRole): Promise<Person> {
  const person = { name: `The ${role}`, email: `${role}@fernhollow.example`, password };
  const asOwner = await callerOf(product, owner);
  await bodyOf(await asOwner.create('/api/invitations', { name: person.name, email: person.email, role }));
  await asOwner.dispose();
  return complete(product, person, '/api/invitation-completions');
}

/** Signs a buyer up and follows the link in the mail. */
export async function addCustomer(product: Product, name: string, email: string): Promise<Person> {
  const visitor = await Caller.open(product.url);
  await bodyOf(await visitor.post('/api/sign-ups', { name, email }));
  await visitor.dispose();
  return complete(product, { name, email, password }, '/api/sign-up-completions');
}

async function complete(product: Product, person: Person, path: string): Promise<Person> {
  const mail = await waitForMail(product, { to: person.email });
  const caller = await Caller.open(product.url);
  await caller.startSession(path, { token: tokenIn(mail), password: person.password });
  await caller.dispose();
  return person;
}

/** Calls the API as this person. */
export async function callerOf(product: Product, person: Person): Promise<Caller> {
  const caller = await Caller.open(product.url);
  await caller.signIn(person.email, person.password);
  return caller;
}

/** Signs the page's browser in without going through the form; call it before opening a page. */
export async function signIn(page: Page, person: Person): Promise<Caller> {
  const caller = await Caller.over(page.request);
  await caller.signIn(person.email, person.password);
  return caller;
}

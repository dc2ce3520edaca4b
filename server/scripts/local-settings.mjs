// The settings of an installation on this machine, with the stand-ins for outside services. Node alone.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { freePort } from '../../db/scripts/cluster.mjs';
import { root } from './root.mjs';

/** Where things are looked for first; the next free port is taken when another program has one of these. */
const usualPorts = { server: 4310, payments: 4311, smtp: 4312, mailPage: 4313 };

async function nextFreePort(preferred, taken) {
  for (let port = preferred; port < preferred + 200; port += 1) {
    if (!taken.has(port) && (await freePort(port)) === port) return port;
  }
  return freePort();
}

/** @param {number} [serverPort] asked for by name; taken as it is */
export async function choosePorts(serverPort) {
  const taken = new Set();
  const ports = {};
  for (const [name, usual] of Object.entries(usualPorts)) {
    ports[name] = name === 'server' && serverPort ? serverPort : await nextFreePort(usual, taken);
    taken.add(ports[name]);
  }
  return ports;
}

/** Secrets of this installation, made once. */
export function localSecrets(file = join(root, '.local/secrets.json')) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secret = (bytes) => randomBytes(bytes).toString('hex');
  const secrets = {
    session: secret(32),
    paymentsKey: `sk_test_${secret(12)}`,
    webhook: `whsec_${secret(16)}`,
    setUp: secret(5),
  };
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  return secrets;
}

/** Environment of the stand-ins for payments and mail. */
export function fakesEnvironment({ ports, secrets, state }) {
  return {
    ...process.env,
    PAYMENTS_FAKE_PORT: String(ports.payments),
    PAYMENTS_WEBHOOK_URL: `http://127.0.0.1:${ports.server}/api/payment-events`,
    PAYMENTS_WEBHOOK_SECRET: secrets.webhook,
    SMTP_PORT: String(ports.smtp),
    MAIL_PAGE_PORT: String(ports.mailPage),
    ...(state ? { FAKES_STATE_DIR: state } : {}),
  };
}

/**
 * Environment of the server. What the caller's own environment sets goes first, so that a single setting can be tried.
 * @param {{ ports: Record<string, number>, secrets: Record<string, string>, databaseUrl: string, baseUrl?: string }} options
 */
export function serverEnvironment({ ports, secrets, databaseUrl, baseUrl }) {
  return {
    STRIPE_SECRET_KEY: secrets.paymentsKey,
    STRIPE_WEBHOOK_SECRET: secrets.webhook,
    STRIPE_API_HOST: '127.0.0.1',
    STRIPE_API_PORT: String(ports.payments),
    STRIPE_API_PROTOCOL: 'http',
    SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
    MAIL_FROM: 'Emberlot <shop@emberlot.example>',
    SESSION_SECRET: secrets.session,
    SETUP_CODE: secrets.setUp,
    CLIENT_FOLDER: join(root, 'client/dist'),
    ...process.env,
    PORT: String(ports.server),
    BASE_URL: baseUrl ?? process.env.BASE_URL ?? `http://127.0.0.1:${ports.server}`,
    DATABASE_URL: databaseUrl,
  };
}

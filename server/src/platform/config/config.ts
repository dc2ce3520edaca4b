import { randomBytes } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { Environment, isLoopback } from './environment.js';

export interface PaymentsConfig {
  readonly secretKey: string;
  readonly webhookSecret: string;
  /** Set only when a stand-in answers in place of the payments service. */
  readonly host: string | undefined;
  readonly port: number | undefined;
  readonly protocol: 'http' | 'https' | undefined;
}

/** The client's build, beside this package in the repository. */
const builtClient = fileURLToPath(new URL('../../../../client/dist', import.meta.url));

/** Values that stand in the examples and in the demo's start command: never to guard a real shop. */
const sampleSecrets = ['change-me', 'development', 'sk_test_x', 'whsec_test', 'secret'];

/**
 * All settings of the server, read once at boot from environment variables; `.env.example` documents each.
 * Nothing else reads `process.env`.
 */
export class Config {
  static #ofProcess: Config | undefined;

  readonly production: boolean;
  readonly databaseUrl: string;
  readonly host: string;
  readonly port: number;
  /** Scheme, host and port under which people reach the product; links in mails start with it. */
  readonly baseUrl: string;
  /** The first one signs; all of them are accepted, so that a secret can be changed without signing everybody out. */
  readonly sessionSecrets: readonly string[];
  readonly payments: PaymentsConfig;
  readonly smtpUrl: string;
  readonly mailFrom: string;
  /** Express's `trust proxy`: false, a number of hops, or subnets. Never simply true. */
  readonly trustProxy: false | number | readonly string[];
  readonly shopZone: string;
  /** Needed to make the first owner, while nobody can sign in yet; made up for this start when none is set. */
  readonly setupCode: string;
  readonly setupCodeIsMadeUp: boolean;
  readonly fileQuotaBytes: number;
  readonly logLevel: string;
  /** Where the built client lies; without one there, the API is served alone. */
  readonly clientFolder: string;

  /**
   * The settings of this process; the same object each time, since a set-up code may have been made up for it.
   *
   * @throws ConfigFault with one sentence per fault
   */
  static read(variables: NodeJS.ProcessEnv): Config {
    Config.#ofProcess ??= new Config(variables);
    return Config.#ofProcess;
  }

  /** @throws ConfigFault with one sentence per fault */
  constructor(variables: Readonly<Record<string, string | undefined>>) {
    const env = new Environment(variables);
    this.production = env.oneOf('NODE_ENV', ['development', 'test', 'production'], 'development') === 'production';
    this.databaseUrl = env.url('DATABASE_URL', ['postgres:', 'postgresql:']);
    this.host = env.text('HOST', '127.0.0.1');
    this.port = env.integer('PORT', { fewest: 0, most: 65_535, usual: 4_310 });
    this.baseUrl = readBaseUrl(env, this.production);
    this.sessionSecrets = env.list('SESSION_SECRET');
    this.payments = readPayments(env, this.production);
    this.smtpUrl = env.url('SMTP_URL', ['smtp:', 'smtps:']);
    this.mailFrom = env.text('MAIL_FROM');
    this.trustProxy = readTrustProxy(env);
    this.shopZone = env.zone('SHOP_ZONE', 'Europe/Dublin');
    this.setupCode = env.text('SETUP_CODE', randomBytes(9).toString('base64url'));
    this.setupCodeIsMadeUp = !variables['SETUP_CODE'];
    this.fileQuotaBytes = env.integer('FILE_QUOTA_MB', { fewest: 1, most: 1_000_000, usual: 5_000 }) * 1_000_000;
    this.logLevel = env.oneOf('LOG_LEVEL', ['silent', 'error', 'warn', 'info', 'debug'], 'info');
    this.clientFolder = env.text('CLIENT_FOLDER', builtClient);
    if (this.production) this.#refuseSamples(env);
    env.refuseFaults();
  }

  /** Whether people reach the product over TLS; cookies are then marked so that they travel no other way. */
  get secure(): boolean {
    return this.baseUrl.startsWith('https:');
  }

  #refuseSamples(env: Environment): void {
    const weak = (secret: string) => secret.length < 32 || sampleSecrets.some((sample) => secret.startsWith(sample));
    if (this.sessionSecrets.some(weak)) {
      env.fault('SESSION_SECRET', 'must be at least 32 random characters in production, not the sample value');
    }
    if (sampleSecrets.includes(this.payments.secretKey)) env.fault('STRIPE_SECRET_KEY', 'is still the sample value');
    if (sampleSecrets.includes(this.payments.webhookSecret)) {
      env.fault('STRIPE_WEBHOOK_SECRET', 'is still the sample value');
    }
    const smtp = URL.canParse(this.smtpUrl) ? new URL(this.smtpUrl) : undefined;
    const open = smtp?.protocol === 'smtp:' && smtp.searchParams.get('requireTLS') !== 'true';
    if (smtp && open && !isLoopback(smtp.hostname)) {
      env.fault('SMTP_URL', 'must use smtps:// or ?requireTLS=true outside this machine');
    }
  }
}

function readBaseUrl(env: Environment, production: boolean): string {
  const text = env.url('BASE_URL', ['http:', 'https:']);
  if (!text) return '';
  const url = new URL(text);
  if (url.pathname !== '/' || url.search || url.hash || url.username) {
    env.fault('BASE_URL', 'is only scheme, host and port, such as https://shop.example');
  }
  if (production && url.protocol === 'http:' && !isLoopback(url.hostname)) {
    env.fault('BASE_URL', 'must be https:// in production, or sign-in would travel in the open');
  }
  return url.origin;
}

function readPayments(env: Environment, production: boolean): PaymentsConfig {
  const host = env.text('STRIPE_API_HOST', '') || undefined;
  const port = env.integer('STRIPE_API_PORT', { fewest: 0, most: 65_535, usual: 0 }) || undefined;
  const protocol = env.oneOf('STRIPE_API_PROTOCOL', ['', 'http', 'https'], '') || undefined;
  if (production && protocol === 'http' && host && !isLoopback(host)) {
    env.fault('STRIPE_API_PROTOCOL', 'may be http only on this machine');
  }
  return {
    secretKey: env.text('STRIPE_SECRET_KEY'),
    webhookSecret: env.text('STRIPE_WEBHOOK_SECRET'),
    host,
    port,
    protocol,
  };
}

function readTrustProxy(env: Environment): Config['trustProxy'] {
  const text = env.text('TRUST_PROXY', '');
  if (text === '' || text === '0' || text === 'false') return false;
  if (/^[1-9]$/.test(text)) return Number(text);
  const subnets = text.split(',').map((part) => part.trim());
  if (
    subnets.every((subnet) =>
      /^(loopback|linklocal|uniquelocal|[\da-fA-F]*[.:][\da-fA-F.:]+(\/\d{1,3})?)$/.test(subnet),
    )
  ) {
    return subnets;
  }
  env.fault('TRUST_PROXY', 'is the number of proxies in front of the server, or their subnets with commas between');
  return false;
}

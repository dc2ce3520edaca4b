import { Config } from '../platform/config/config.js';

/** Settings for specs: everything that leaves the process points to nowhere unless the spec says otherwise. */
export function testConfig(databaseUrl: string, more: Readonly<Record<string, string>> = {}): Config {
  return new Config({
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl,
    PORT: '0',
    BASE_URL: 'http://127.0.0.1:4310',
    SESSION_SECRET: 'a secret for specs only',
    STRIPE_SECRET_KEY: 'sk_test_specs',
    STRIPE_WEBHOOK_SECRET: 'whsec_specs',
    SMTP_URL: 'smtp://127.0.0.1:9',
    MAIL_FROM: 'Fernhollow Tools <shop@fernhollow.example>',
    SETUP_CODE: 'set-up-code-for-specs',
    CLIENT_FOLDER: '/nowhere',
    LOG_LEVEL: 'silent',
    ...more,
  });
}

import { describe, expect, it } from '@jest/globals';
import { Config } from './config.js';
import { ConfigFault } from './environment.js';

const sound = {
  DATABASE_URL: 'postgres://emberlot_server@127.0.0.1:5432/shop',
  BASE_URL: 'https://shop.fernhollow.example',
  SESSION_SECRET: 'a'.repeat(40),
  STRIPE_SECRET_KEY: 'sk_live_fernhollow',
  STRIPE_WEBHOOK_SECRET: 'whsec_fernhollow',
  SMTP_URL: 'smtps://mail.fernhollow.example',
  MAIL_FROM: 'shop@fernhollow.example',
};

function faultsOf(more: Record<string, string | undefined>): readonly string[] {
  try {
    void new Config({ ...sound, ...more });
    return [];
  } catch (error) {
    if (error instanceof ConfigFault) return error.message.split('\n');
    throw error;
  }
}

describe('the settings', () => {
  it('are taken when they are sound, in production too', () => {
    expect(faultsOf({ NODE_ENV: 'production' })).toEqual([]);
    const config = new Config({ ...sound, TRUST_PROXY: 'loopback, 10.0.0.0/8', SESSION_SECRET: 'one,two' });
    expect(config).toMatchObject({ secure: true, trustProxy: ['loopback', '10.0.0.0/8'], shopZone: 'Europe/Dublin' });
    expect(config.sessionSecrets).toEqual(['one', 'two']);
  });

  it('say every fault at once', () => {
    const faults = faultsOf({ DATABASE_URL: undefined, PORT: '70000', SHOP_ZONE: 'Middle/Earth', BASE_URL: 'shop' });
    expect(faults.map((fault) => fault.split(' ')[0])).toEqual(['DATABASE_URL', 'PORT', 'BASE_URL', 'SHOP_ZONE']);
  });

  it.each([
    [{ SESSION_SECRET: 'short' }, 'SESSION_SECRET'],
    [{ SESSION_SECRET: 'change-me-change-me-change-me-change-me' }, 'SESSION_SECRET'],
    [{ STRIPE_SECRET_KEY: 'sk_test_x' }, 'STRIPE_SECRET_KEY'],
    [{ STRIPE_WEBHOOK_SECRET: 'whsec_test' }, 'STRIPE_WEBHOOK_SECRET'],
    [{ BASE_URL: 'http://shop.fernhollow.example' }, 'BASE_URL'],
    [{ SMTP_URL: 'smtp://mail.fernhollow.example' }, 'SMTP_URL'],
    [{ STRIPE_API_HOST: 'pay.example', STRIPE_API_PROTOCOL: 'http' }, 'STRIPE_API_PROTOCOL'],
  ])('refuse %j in production only', (more, name) => {
    const faults = faultsOf({ ...more, NODE_ENV: 'production' });
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatch(new RegExp(`^${name} `));
    expect(faultsOf(more)).toEqual([]);
  });

  it.each([['true'], ['10'], ['everywhere'], ['10.0.0.0/8;evil']])('refuse to trust the proxies "%s"', (value) => {
    expect(faultsOf({ TRUST_PROXY: value })[0]).toMatch(/^TRUST_PROXY /);
  });

  it('make up a set-up code when none is set', () => {
    const [one, other] = [new Config(sound), new Config(sound)];
    expect(one.setupCode).toMatch(/^[\w-]{12}$/);
    expect(one.setupCode).not.toBe(other.setupCode);
    expect(new Config({ ...sound, SETUP_CODE: 'given' })).toMatchObject({
      setupCode: 'given',
      setupCodeIsMadeUp: false,
    });
  });
});

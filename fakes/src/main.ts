import { join } from 'node:path';
import { startMail } from './mail.js';
import { startPayments } from './payments.js';
import { startVatLookup } from './vat-lookup.js';

function portOf(name: string, otherwise: number): number {
  const text = process.env[name];
  if (text === undefined || text === '') return otherwise;
  const port = Number(text);
  if (!Number.isSafeInteger(port) || port < 0 || port > 65_535) {
    throw new Error(`${name} must be a port from 0 to 65535, not "${text}".`);
  }
  return port;
}

function textOf(name: string): string | undefined {
  const text = process.env[name];
  return text === undefined || text === '' ? undefined : text;
}

function webhooksOf() {
  const url = textOf('PAYMENTS_WEBHOOK_URL');
  const secret = textOf('PAYMENTS_WEBHOOK_SECRET');
  if (url === undefined && secret === undefined) return [];
  if (url === undefined || secret === undefined) {
    throw new Error('PAYMENTS_WEBHOOK_URL and PAYMENTS_WEBHOOK_SECRET must be given together.');
  }
  if (!URL.canParse(url)) throw new Error(`PAYMENTS_WEBHOOK_URL is no address: "${url}".`);
  return [{ url, secret }];
}

/** Starts the stand-ins that the environment asks for; the lookup of VAT numbers only where it has a port. */
async function start(): Promise<readonly { close(): Promise<void> }[]> {
  const folder = textOf('FAKES_STATE_DIR');
  const kept = (name: string) => (folder === undefined ? {} : { stateFile: join(folder, name) });
  const shopName = textOf('PAYMENTS_SHOP_NAME');
  const payments = await startPayments({
    port: portOf('PAYMENTS_FAKE_PORT', 4311),
    webhooks: webhooksOf(),
    ...(shopName === undefined ? {} : { shopName }),
    ...kept('payments.json'),
  });
  const mail = await startMail({
    smtpPort: portOf('SMTP_PORT', 4312),
    pagePort: portOf('MAIL_PAGE_PORT', 4313),
    ...kept('mail.json'),
  });
  console.log(`payments: ${payments.address}`);
  console.log(`mail: smtp://127.0.0.1:${mail.smtpPort}, to read at ${mail.address}`);
  if (textOf('VAT_LOOKUP_PORT') === undefined) return [payments, mail];
  const lookup = await startVatLookup({ port: portOf('VAT_LOOKUP_PORT', 0), othersValid: true });
  console.log(`VAT numbers: ${lookup.address}`);
  return [payments, mail, lookup];
}

async function run(): Promise<void> {
  const running = await start();
  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    Promise.all(running.map((one) => one.close())).then(
      () => process.exit(0),
      (fault: unknown) => {
        console.error(fault);
        process.exit(1);
      },
    );
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}

run().catch((fault: unknown) => {
  console.error(fault instanceof Error ? fault.message : fault);
  process.exit(1);
});

import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { createTransport } from 'nodemailer';
import { startMail, type MailFake } from './mail.js';

let fake: MailFake;

beforeAll(async () => {
  fake = await startMail({ now: () => Date.UTC(2030, 0, 2, 3, 4, 5) });
});
afterAll(() => fake.close());
beforeEach(() => fake.control('POST', '/control/reset'));

const LETTER = {
  from: '"Fernhollow Tools" <shop@fernhollow.example>',
  to: 'customer@fernhollow.example',
  subject: 'Your order 17: paid €208.00',
  text: 'Thank you. Your tools leave on 3 January.',
  html: '<p>Thank you. <a href="http://127.0.0.1:9/orders/17">Your order</a></p><script>alert(1)</script>',
};

function send(letter: object = {}, to: MailFake = fake, timeout = 2000) {
  const transport = createTransport({
    host: '127.0.0.1',
    port: to.smtpPort,
    secure: false,
    connectionTimeout: timeout,
    greetingTimeout: timeout,
    socketTimeout: timeout,
  });
  return transport.sendMail({ ...LETTER, ...letter }).finally(() => transport.close());
}

const get = async (path: string) => {
  const response = await fetch(fake.address + path);
  return { status: response.status, headers: response.headers, bytes: Buffer.from(await response.arrayBuffer()) };
};

describe('a mail', () => {
  it('is caught as it was sent', async () => {
    await send({
      cc: 'accountant@fernhollow.example',
      bcc: 'owner@fernhollow.example',
      replyTo: 'bench@fernhollow.example',
      headers: { 'X-Order': '17' },
      attachments: [{ filename: 'invoice é.pdf', content: Buffer.from('%PDF-1.7 …'), contentType: 'application/pdf' }],
    });
    const [mail] = fake.mails();
    expect(mail).toMatchObject({
      receivedAt: '2030-01-02T03:04:05.000Z',
      envelope: {
        from: 'shop@fernhollow.example',
        to: ['customer@fernhollow.example', 'accountant@fernhollow.example', 'owner@fernhollow.example'],
      },
      to: ['customer@fernhollow.example'],
      cc: ['accountant@fernhollow.example'],
      replyTo: ['bench@fernhollow.example'],
      subject: LETTER.subject,
      text: expect.stringContaining('leave on 3 January'),
      html: expect.stringContaining('orders/17'),
      attachments: [{ index: 0, name: 'invoice é.pdf', contentType: 'application/pdf' }],
    });
    expect(mail?.headers['x-order']).toBe('17');
    expect(fake.attachment(mail?.id ?? '', 0)?.toString()).toBe('%PDF-1.7 …');
  });

  it('can be listed by recipient and subject, and waited for', async () => {
    const waited = fake.waitFor({ to: 'late@fernhollow.example' }, { count: 2 });
    await send();
    await send({ to: 'late@fernhollow.example', subject: 'First' });
    await send({ to: 'Late@fernhollow.example', subject: 'Second' });
    expect((await waited).map(({ subject }) => subject)).toEqual(['Second', 'First']);
    const listed = await get('/api/mails?to=late@fernhollow.example&subject=First');
    const [first] = JSON.parse(listed.bytes.toString()) as { id: string; subject: string }[];
    expect(first?.subject).toBe('First');
    const after = await get(`/api/mails/wait?after=${first?.id}&timeout=1000`);
    expect(JSON.parse(after.bytes.toString())).toMatchObject([{ subject: 'Second' }]);
    const none = await get('/api/mails/wait?to=nobody@fernhollow.example&timeout=50');
    expect([none.status, none.bytes.toString()]).toEqual([408, expect.stringContaining('Within 50 ms')]);
    await expect(fake.waitFor({ subject: 'Third' }, { timeout: 30 })).rejects.toThrow('First');
  });

  it('can be read in the browser, where it may run nothing', async () => {
    await send({ attachments: [{ filename: 'list.csv', content: 'a;b', contentType: 'text/csv' }] });
    const [mail] = fake.mails();
    const inbox = (await get('/?to=customer@fernhollow.example')).bytes.toString();
    expect(inbox).toContain('<strong>test</strong>');
    expect(inbox).toContain(`href="/mails/${mail?.id}"`);
    const shown = (await get(`/mails/${mail?.id}`)).bytes.toString();
    expect(shown).toContain('sandbox="allow-popups allow-popups-to-escape-sandbox"');
    expect(shown).toContain('Thank you. Your tools leave');
    const html = await get(`/mails/${mail?.id}/html`);
    expect(html.headers.get('content-security-policy')).toMatch(/^sandbox allow-popups .*default-src 'none'/);
    const attachment = await get(`/api/mails/${mail?.id}/attachments/0`);
    expect(attachment.headers.get('content-disposition')).toBe("attachment; filename*=UTF-8''list.csv");
    expect(attachment.bytes.toString()).toBe('a;b');
    expect((await get(`/api/mails/${mail?.id}/raw`)).bytes.toString()).toContain('MIME-Version: 1.0');
    expect((await get('/mails/none')).status).toBe(404);
    expect((await get('/api/mails/none')).status).toBe(404);
    expect((await get(`/api/mails/${mail?.id}/attachments/9`)).status).toBe(404);
  });

  it('survives a restart', async () => {
    const folder = await mkdtemp(`${tmpdir()}/mail-`);
    const kept = { stateFile: `${folder}/mail.json` };
    const before = await startMail(kept);
    await send({}, before);
    await before.close();
    const after = await startMail(kept);
    try {
      expect(after.mails()).toMatchObject([{ id: 'mail-1', subject: LETTER.subject }]);
      await send({ subject: 'Another' }, after);
      expect(after.mails().map(({ id }) => id)).toEqual(['mail-2', 'mail-1']);
    } finally {
      await after.close();
      await rm(folder, { recursive: true });
    }
  });
});

describe('a catcher that misbehaves', () => {
  it('refuses for now or for good, at every stage, so often', async () => {
    for (const [stage, code] of [
      ['connect', 421],
      ['sender', 451],
      ['recipient', 550],
      ['message', 552],
    ] as const) {
      await fake.control('POST', '/control/refuse', { stage, code, count: 1, message: 'Not now' });
      await expect(send()).rejects.toMatchObject({ responseCode: code });
    }
    await expect(send()).resolves.toHaveProperty('messageId');
    expect(fake.mails()).toHaveLength(1);
  });

  it('refuses one recipient until told otherwise', async () => {
    await fake.control('POST', '/control/refuse', { code: 550, recipient: 'gone@fernhollow.example' });
    await expect(send({ to: 'gone@fernhollow.example' })).rejects.toMatchObject({ responseCode: 550 });
    await expect(send({ to: 'gone@fernhollow.example' })).rejects.toMatchObject({ responseCode: 550 });
    await expect(send()).resolves.toHaveProperty('messageId');
    await fake.control('POST', '/control/behave');
    await expect(send({ to: 'gone@fernhollow.example' })).resolves.toHaveProperty('messageId');
  });

  it('goes silent', async () => {
    await fake.control('POST', '/control/silence');
    await expect(send({}, fake, 200)).rejects.toMatchObject({ code: 'ETIMEDOUT' });
    await fake.control('POST', '/control/silence', { silent: false });
    await expect(send()).resolves.toHaveProperty('messageId');
    expect(fake.mails()).toHaveLength(1);
  });

  it('takes a mail and drops the line before saying so', async () => {
    await fake.control('POST', '/control/cut');
    await expect(send()).rejects.toMatchObject({ code: expect.stringMatching(/ECONNECTION|ECONNRESET|ESOCKET/) });
    expect(fake.mails()).toHaveLength(1);
    await send();
    expect(fake.mails()).toHaveLength(2);
  });

  it('is down, and up again on the same port', async () => {
    await fake.control('POST', '/control/down');
    expect(await fake.control('GET', '/control/state')).toMatchObject({ up: false });
    await expect(send()).rejects.toMatchObject({ code: expect.stringMatching(/ECONNREFUSED|ESOCKET/) });
    await fake.control('POST', '/control/up');
    await expect(send()).resolves.toHaveProperty('messageId');
  });

  it('refuses controls it does not understand', async () => {
    await expect(fake.control('POST', '/control/refuse', { code: 250 })).rejects.toThrow('400');
    await expect(fake.control('POST', '/control/refuse', { stage: 'lunch' })).rejects.toThrow('400');
  });
});

import { afterAll, afterEach, beforeAll, describe, expect, it } from '@jest/globals';
import { Mailbox } from '@emberlot/fakes/mail/mailbox';
import { SmtpCatcher } from '@emberlot/fakes/mail/smtp';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { AppError } from '../errors/app-error.js';
import { Files } from '../files/files.js';
import { renderHtml, renderText } from './layout.js';
import type { MailContent } from './mail-content.js';
import { Outbox, type OutgoingMail } from './outbox.js';
import { SendMailTask } from './send-mail.task.js';

const content: MailContent = { heading: 'Your order is on its way', paragraphs: ['It left the bench today.'] };

describe('mail', () => {
  const mailbox = new Mailbox();
  const catcher = new SmtpCatcher(async (raw, envelope) => {
    await mailbox.add(raw, envelope, new Date().toISOString());
  });
  let app: TestApp;
  let written = 0;

  beforeAll(async () => {
    await catcher.start(0);
    app = await startTestApp({ env: { SMTP_URL: `smtp://127.0.0.1:${catcher.port}` } });
  });

  afterEach(() => catcher.behave());

  afterAll(async () => {
    await app.close();
    await catcher.down();
  });

  const write = async (more: Partial<OutgoingMail> = {}) => {
    written += 1;
    const mail = {
      dedupeKey: `spec ${written}`,
      to: `buyer-${written}@buyers.example`,
      subject: 'On its way',
      content,
    };
    await app.transaction((trx) => app.get(Outbox).enqueue(trx, { ...mail, ...more }));
    return more.to ?? mail.to;
  };

  const rowOf = (recipient: string) =>
    app.database.handle
      .selectFrom('outbox_mail')
      .selectAll()
      .where('recipient', '=', recipient)
      .executeTakeFirstOrThrow();

  /** Lets the queue’s own waiting pass, which goes by the database’s clock. */
  const later = async () => {
    app.clock.set(new Date(Math.max(app.clock.now().getTime(), Date.now()) + 24 * 3_600_000));
    await app.runJobs();
  };

  it('leaves once the event is committed, once, under the id it was given', async () => {
    const to = await write();
    expect(mailbox.list({ to })).toEqual([]);
    await app.runJobs();
    await app.runJobs();
    const caught = mailbox.list({ to });
    expect(caught).toHaveLength(1);
    const row = await rowOf(to);
    expect(row.sent_at).toEqual(app.clock.now());
    expect(caught[0]).toMatchObject({ subject: 'On its way', messageId: row.message_id });
    expect(caught[0]?.from).toContain('shop@fernhollow.example');
    expect(caught[0]?.text).toContain('It left the bench today.');
    expect(caught[0]?.html).toContain('<h1');
  });

  it('is written once for an event', async () => {
    const to = await write({ dedupeKey: 'the same event' });
    await write({ dedupeKey: 'the same event', to });
    await app.runJobs();
    expect(mailbox.list({ to })).toHaveLength(1);
  });

  it('does not leave when the event is rolled back', async () => {
    const failing = app.transaction(async (trx) => {
      await app
        .get(Outbox)
        .enqueue(trx, { dedupeKey: 'rolled back', to: 'never@buyers.example', subject: 'No', content });
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    await app.runJobs();
    expect(mailbox.list({ to: 'never@buyers.example' })).toEqual([]);
  });

  it('waits while the mail server is down, and leaves later, once', async () => {
    await catcher.down();
    const to = await write();
    await app.runJobs();
    expect(await rowOf(to)).toMatchObject({ sent_at: null, attempts: 1, claimed_at: null });
    await catcher.up();
    await later();
    await later();
    expect(mailbox.list({ to })).toHaveLength(1);
    expect(await rowOf(to)).toMatchObject({ attempts: 2, last_error: null });
  });

  it('is tried again after a refusal for now', async () => {
    catcher.refuse({ stage: 'recipient', code: 451, message: 'Come back', count: 1, recipient: null });
    const to = await write();
    await app.runJobs();
    expect((await rowOf(to)).last_error).toContain('451');
    await later();
    expect(mailbox.list({ to })).toHaveLength(1);
  });

  it('is given up after a refusal for good, until the owner sends it again', async () => {
    catcher.refuse({ stage: 'recipient', code: 550, message: 'No such person', count: 1, recipient: null });
    const to = await write();
    await app.runJobs();
    await later();
    expect(mailbox.list({ to })).toEqual([]);
    const owner = await app.agentFor('owner');
    const listed = await owner.get('/api/outbox-mails').query({ state: 'given_up', q: to }).expect(200);
    expect(listed.body).toMatchObject({ total: 1, items: [{ to, state: 'given_up', attempts: 1 }] });
    const { id } = await rowOf(to);
    await owner.post(`/api/outbox-mails/${id}/retry`).expect(204);
    await app.runJobs();
    expect(mailbox.list({ to })).toHaveLength(1);
    const again = await owner.post(`/api/outbox-mails/${id}/retry`).expect(409);
    expect(again.body).toMatchObject({ code: 'wrong_state' });
  });

  it('is not sent twice when the line breaks before the answer: a person decides', async () => {
    catcher.cut(1);
    const to = await write();
    await app.runJobs();
    await later();
    expect(mailbox.list({ to })).toHaveLength(1);
    const owner = await app.agentOf(
      await import('../../testing/users.js').then((users) => users.addUser(app.database.handle, { role: 'owner' })),
    );
    const listed = await owner.get('/api/outbox-mails').query({ state: 'uncertain', q: to }).expect(200);
    expect(listed.body).toMatchObject({ total: 1, items: [{ to, state: 'uncertain' }] });
  });

  it('is not sent by two senders at once', async () => {
    const to = await write();
    const { id } = await rowOf(to);
    const task = app.get(SendMailTask);
    await Promise.all([task.run({ mailId: id }), task.run({ mailId: id }), task.run({ mailId: id })]);
    expect(mailbox.list({ to })).toHaveLength(1);
  });

  it('is not sent when the sender before died with it in hand', async () => {
    const to = await write();
    await app.database.handle
      .updateTable('outbox_mail')
      .set({ claimed_at: app.clock.now() })
      .where('recipient', '=', to)
      .execute();
    await app.runJobs();
    expect(mailbox.list({ to })).toEqual([]);
    expect((await rowOf(to)).sent_at).toBeNull();
  });

  it('carries files of the shop under their own names', async () => {
    const bytes = Buffer.from('code;quantity\nWREN-60;1\n');
    const file = await app.transaction((trx) => app.get(Files).store(trx, bytes, { fileName: 'packing.csv' }));
    const to = await write({ attachments: [{ fileId: file.id, fileName: 'packing list.csv' }] });
    await app.runJobs();
    const [caught] = mailbox.list({ to });
    expect(caught?.attachments).toMatchObject([
      { name: 'packing list.csv', contentType: 'text/csv', size: bytes.length },
    ]);
    expect(mailbox.attachment(caught?.id ?? '', 0)?.content).toEqual(bytes);
  });

  it('has one recipient, and no line of its subject becomes a header', async () => {
    const two = write({ to: 'a@buyers.example, b@buyers.example' });
    await expect(two).rejects.toThrow(AppError);
    const to = await write({ subject: 'Order\r\nBcc: thief@elsewhere.example' });
    await app.runJobs();
    const [caught] = mailbox.list({ to });
    expect(caught?.envelope.to).toEqual([to]);
    expect(caught?.subject).toBe('Order Bcc: thief@elsewhere.example');
    expect(caught?.headers['bcc']).toBeUndefined();
  });
});

describe('the layout of a mail', () => {
  const letterhead = { name: 'Fernhollow Tools', lines: ['Fernhollow Tools Ltd', 'Mill Lane, T12 Cork, IE'] };
  const whole: MailContent = {
    heading: 'Order 12',
    paragraphs: ['A rather long sentence that goes on and on until it no longer fits on one line of a mail program.'],
    facts: [['Total', '<b>129.00 EUR</b>']],
    action: { label: 'See it', url: 'https://shop.example/orders/12#a"b' },
    closing: ['Thank you.'],
    caution: 'The tip is hot.',
  };

  it('reads well as plain text, in lines of at most 76 characters', () => {
    const text = renderText(whole, letterhead);
    expect(text.split('\n').every((line) => line.length <= 76)).toBe(true);
    expect(text).toContain('Total: <b>129.00 EUR</b>');
    expect(text).toContain('See it:\nhttps://shop.example/orders/12#a"b');
    expect(text.endsWith('-- \nFernhollow Tools\nFernhollow Tools Ltd\nMill Lane, T12 Cork, IE')).toBe(true);
  });

  it('is one column of HTML without pictures, scripts or markup from the content', () => {
    const html = renderHtml(whole, letterhead);
    expect(html).toContain('&lt;b&gt;129.00 EUR&lt;/b&gt;');
    expect(html).toContain('href="https://shop.example/orders/12#a&quot;b"');
    expect(html).not.toMatch(/<img|<script|<link|url\(/);
    expect(html).toContain('Caution: The tip is hot.');
  });
});

import type { IncomingMessage, ServerResponse } from 'node:http';
import { addressOf, answerJson, answerPage } from '../http/exchange.js';
import type { Mailbox, MailFilter } from './mailbox.js';
import { inboxPage, mailPage, noMailPage } from './mail-page.js';

// What a mail brings may neither run nor fetch anything; its links open beside it.
const MAIL_POLICY =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; img-src data:; style-src 'unsafe-inline'";

const LONGEST_WAIT_MILLISECONDS = 60_000;

/** The pages and the JSON answers of the mail catcher. */
export async function answerMail(mailbox: Mailbox, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const url = addressOf(request);
  if (request.method !== 'GET') {
    answerJson(response, 405, { fault: 'Mails can only be read here. GET /control lists the controls.' });
    return;
  }
  if (url.pathname === '/') {
    const to = url.searchParams.get('to') ?? '';
    answerPage(response, 200, inboxPage(mailbox.list(to === '' ? {} : { to }), to));
    return;
  }
  if (url.pathname === '/api/mails') {
    answerJson(response, 200, mailbox.list(filterOf(url.searchParams)));
    return;
  }
  if (url.pathname === '/api/mails/wait') {
    await answerWait(mailbox, url.searchParams, response);
    return;
  }
  answerOne(mailbox, url.pathname, response);
}

function filterOf(query: URLSearchParams): MailFilter {
  const names = ['to', 'subject', 'after'] as const;
  return Object.fromEntries(names.flatMap((name) => (query.has(name) ? [[name, query.get(name) ?? '']] : [])));
}

async function answerWait(mailbox: Mailbox, query: URLSearchParams, response: ServerResponse): Promise<void> {
  const number = (name: string, otherwise: number) => Number(query.get(name) ?? otherwise);
  const count = number('count', 1);
  const timeout = Math.min(number('timeout', 5000), LONGEST_WAIT_MILLISECONDS);
  if (!Number.isSafeInteger(count) || count < 1 || !Number.isSafeInteger(timeout) || timeout < 0) {
    answerJson(response, 400, { fault: '"count" and "timeout" (milliseconds) must be whole numbers.' });
    return;
  }
  const found = await mailbox.waitFor(filterOf(query), count, timeout).catch((fault: Error) => fault);
  if (found instanceof Error) answerJson(response, 408, { fault: found.message });
  else answerJson(response, 200, found);
}

function answerOne(mailbox: Mailbox, pathname: string, response: ServerResponse): void {
  const shown = /^\/mails\/([^/]+)(\/html)?$/.exec(pathname);
  const asked = /^\/api\/mails\/([^/]+)(?:\/(raw|attachments\/(\d+)))?$/.exec(pathname);
  const mail = mailbox.find(shown?.[1] ?? asked?.[1] ?? '');
  if (!mail) {
    if (pathname.startsWith('/api/')) answerJson(response, 404, { fault: 'There is no such mail.' });
    else answerPage(response, 404, noMailPage());
    return;
  }
  if (shown) {
    if (shown[2] === undefined) answerPage(response, 200, mailPage(mail));
    else answerPage(response, 200, `<base target="_blank">${mail.html ?? ''}`, MAIL_POLICY);
    return;
  }
  if (asked?.[2] === undefined) answerJson(response, 200, mail);
  else if (asked[2] === 'raw') answerRaw(mailbox, mail.id, response);
  else answerAttachment(mailbox, mail.id, Number(asked[3]), response);
}

function answerRaw(mailbox: Mailbox, id: string, response: ServerResponse): void {
  response.writeHead(200, { 'content-type': 'text/plain; charset=utf-8', 'x-content-type-options': 'nosniff' });
  response.end(mailbox.raw(id));
}

function answerAttachment(mailbox: Mailbox, id: string, index: number, response: ServerResponse): void {
  const found = mailbox.attachment(id, index);
  if (!found) {
    answerJson(response, 404, { fault: 'There is no such attachment.' });
    return;
  }
  response.writeHead(200, {
    'content-type': found.note.contentType,
    'content-disposition': `attachment; filename*=UTF-8''${encodeURIComponent(found.note.name)}`,
    'content-length': String(found.content.length),
    'content-security-policy': 'sandbox',
    'x-content-type-options': 'nosniff',
  });
  response.end(found.content);
}

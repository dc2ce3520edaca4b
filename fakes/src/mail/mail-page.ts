import { markup, page } from '../http/page.js';
import type { Mail } from './mailbox.js';

const BAR = 'This page shows mails that were caught. None of them left this machine.';

function when(instant: string): string {
  return instant.replace('T', ' ').replace(/\.\d+Z$/, ' UTC');
}

/** The inbox; `to` narrows it to one recipient. */
export function inboxPage(mails: readonly Mail[], to: string): string {
  const rows = mails.map(
    (mail) => markup`<tr><td><a href="/mails/${mail.id}">${mail.subject === '' ? '(no subject)' : mail.subject}</a></td>
<td>${mail.envelope.to.join(', ')}</td><td>${when(mail.receivedAt)}</td></tr>`,
  );
  const table = markup`<table><caption class="hint">The newest first</caption>
<thead><tr><th scope="col">Subject</th><th scope="col">To</th><th scope="col">Received</th></tr></thead>
<tbody>${rows}</tbody></table>`;
  const none = to === '' ? 'No mail has come yet.' : `No mail to ${to} has come yet.`;
  const content = markup`<h1>Caught mails</h1>
<form method="get" action="/"><label for="to">To</label>
<input id="to" name="to" type="email" value="${to}" autocomplete="off">
<button>Show</button> <a href="/">Show all</a></form>
${mails.length === 0 ? markup`<p>${none}</p>` : table}`;
  return page('Caught mails', BAR, content, true);
}

export function mailPage(mail: Mail): string {
  const people = (name: string, addresses: readonly string[]) =>
    addresses.length > 0 && markup`<dt>${name}</dt><dd>${addresses.join(', ')}</dd>`;
  const attachments = mail.attachments.map(
    ({ index, name, contentType, size }) =>
      markup`<li><a href="/api/mails/${mail.id}/attachments/${index}" download="${name}">${name}</a> (${contentType}, ${size} bytes)</li>`,
  );
  const content = markup`<p><a href="/">All mails</a></p>
<h1>${mail.subject === '' ? '(no subject)' : mail.subject}</h1>
<dl><dt>From</dt><dd>${mail.from}</dd>${people('To', mail.to)}${people('Copy', mail.cc)}${people('Reply to', mail.replyTo)}
${people('Delivered to', mail.envelope.to)}<dt>Received</dt><dd>${when(mail.receivedAt)}</dd></dl>
${attachments.length > 0 && markup`<h2>Attachments</h2><ul>${attachments}</ul>`}
${
  mail.html !== null &&
  markup`<h2>As a page</h2>
<iframe title="The mail as a page" src="/mails/${mail.id}/html" sandbox="allow-popups allow-popups-to-escape-sandbox"></iframe>`
}
${mail.text !== null && markup`<h2>As text</h2><pre tabindex="0">${mail.text}</pre>`}
<p><a href="/api/mails/${mail.id}/raw">The mail as it came</a></p>`;
  return page(mail.subject, BAR, content, true);
}

export function noMailPage(): string {
  return page('Not found', BAR, markup`<h1>There is no such mail</h1><p><a href="/">All mails</a></p>`);
}

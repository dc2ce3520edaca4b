import { flag, oneOf, optionalText, wholeNumber, type ControlRoute } from '../http/control.js';
import { Refusal } from '../http/exchange.js';
import type { Mailbox } from './mailbox.js';
import { STAGES, type SmtpCatcher } from './smtp.js';

/** Controls of the mail catcher. */
export function mailControls(smtp: SmtpCatcher, mailbox: Mailbox): readonly ControlRoute[] {
  return [
    {
      method: 'POST',
      path: '/control/refuse',
      does:
        'Refuses: stage connect, sender, recipient or message; code (4xx or 5xx), message; count (left out: for ever); ' +
        'recipient (only this one, at the stage recipient).',
      run: ({ body }) => {
        const code = wholeNumber(body, 'code', 451);
        if (code < 400 || code > 599) throw new Refusal(400, '"code" must be from 400 to 599.');
        const recipient = optionalText(body, 'recipient') ?? null;
        smtp.refuse({
          stage: oneOf(body, 'stage', STAGES, recipient === null ? 'message' : 'recipient'),
          code,
          message: optionalText(body, 'message') ?? 'Refused by the test',
          count: body['count'] === undefined ? null : wholeNumber(body, 'count', 1),
          recipient,
        });
        return smtp.describe();
      },
    },
    {
      method: 'POST',
      path: '/control/silence',
      does: 'Leaves senders without an answer; silent: false ends it.',
      run: ({ body }) => smtp.silence(flag(body, 'silent', true)),
    },
    {
      method: 'POST',
      path: '/control/cut',
      does: 'Keeps the next mails (count) but drops the connection before saying so.',
      run: ({ body }) => smtp.cut(wholeNumber(body, 'count', 1)),
    },
    { method: 'POST', path: '/control/down', does: 'Stops listening for mail.', run: () => smtp.down() },
    { method: 'POST', path: '/control/up', does: 'Listens again, on the same port.', run: () => smtp.up() },
    { method: 'POST', path: '/control/behave', does: 'Ends refusing, silence and cuts.', run: () => smtp.behave() },
    { method: 'POST', path: '/control/clear', does: 'Forgets the mails.', run: () => mailbox.clear() },
    {
      method: 'POST',
      path: '/control/reset',
      does: 'Forgets the mails, behaves and is up again.',
      run: async () => {
        mailbox.clear();
        smtp.behave();
        await smtp.up();
      },
    },
    { method: 'GET', path: '/control/state', does: 'Shows how it behaves.', run: () => smtp.describe() },
  ];
}

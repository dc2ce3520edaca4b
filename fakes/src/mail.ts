import { answerControl, callControl } from './http/control.js';
import { addressOf } from './http/exchange.js';
import { listen } from './http/listener.js';
import { readState, stateFile } from './http/state-file.js';
import { mailControls } from './mail/mail-control.js';
import { answerMail } from './mail/mail-routes.js';
import { Mailbox, type Mail, type MailFilter, type SavedMail } from './mail/mailbox.js';
import { SmtpCatcher } from './mail/smtp.js';

export type { Mail, MailFilter } from './mail/mailbox.js';

export type MailOptions = {
  /** Where mail is taken; 0 takes a free port. */
  readonly smtpPort?: number;
  /** Where mail is read; 0 takes a free port. */
  readonly pagePort?: number;
  /** File in which the mails survive a restart. */
  readonly stateFile?: string;
  /** The instant, in milliseconds since 1970. */
  readonly now?: () => number;
};

export type MailFake = {
  readonly smtpPort: number;
  readonly pagePort: number;
  readonly address: string;
  /** Newest first. */
  mails(filter?: MailFilter): readonly Mail[];
  /** The mails that pass, once there are `count` (1); throws after `timeout` milliseconds (5000). */
  waitFor(
    filter: MailFilter,
    limits?: { readonly count?: number; readonly timeout?: number },
  ): Promise<readonly Mail[]>;
  attachment(id: string, index: number): Buffer | undefined;
  /** Calls a control: `control('POST', '/control/down')`. Throws on a refusal. */
  control(method: 'GET' | 'POST' | 'DELETE', path: string, body?: object): Promise<unknown>;
  close(): Promise<void>;
};

/** Starts a catcher that takes every mail, sends none on, and shows them in the browser. */
export async function startMail(options: MailOptions = {}): Promise<MailFake> {
  const mailbox = new Mailbox();
  const saved = (await readState(options.stateFile)) as { readonly mails: readonly SavedMail[] } | undefined;
  await mailbox.load(saved?.mails ?? []);
  const file = stateFile(options.stateFile, () => ({ mails: mailbox.save() }));
  const now = options.now ?? Date.now;
  const smtp = new SmtpCatcher(async (raw, envelope) => {
    await mailbox.add(raw, envelope, new Date(now()).toISOString());
    file.changed();
  });
  await smtp.start(options.smtpPort ?? 0);
  const controls = mailControls(smtp, mailbox);
  const listener = await listen(options.pagePort ?? 0, async (request, response) => {
    const { pathname } = addressOf(request);
    if (pathname !== '/control' && !pathname.startsWith('/control/')) return answerMail(mailbox, request, response);
    await answerControl(controls, request, response);
    file.changed();
  }).catch(async (fault: unknown) => {
    await smtp.down();
    throw fault;
  });
  return {
    smtpPort: smtp.port,
    pagePort: listener.port,
    address: listener.address,
    mails: (filter) => mailbox.list(filter),
    waitFor: (filter, { count = 1, timeout = 5000 } = {}) => mailbox.waitFor(filter, count, timeout),
    attachment: (id, index) => mailbox.attachment(id, index)?.content,
    control: (method, path, body) => callControl(listener.address, method, path, body),
    close: async () => {
      await smtp.down();
      await listener.close();
      await file.close();
    },
  };
}

import { simpleParser, type AddressObject, type ParsedMail } from 'mailparser';

export type Envelope = { readonly from: string; readonly to: readonly string[] };

export type AttachmentNote = {
  readonly index: number;
  readonly name: string;
  readonly contentType: string;
  /** In bytes. */
  readonly size: number;
};

export type Mail = {
  readonly id: string;
  /** ISO instant. */
  readonly receivedAt: string;
  readonly envelope: Envelope;
  readonly from: string;
  readonly to: readonly string[];
  readonly cc: readonly string[];
  readonly replyTo: readonly string[];
  readonly subject: string;
  readonly messageId: string | null;
  readonly text: string | null;
  readonly html: string | null;
  readonly headers: Readonly<Record<string, string>>;
  readonly attachments: readonly AttachmentNote[];
};

export type MailFilter = {
  /** An address that the mail was sent to. */
  readonly to?: string;
  /** Text that the subject contains. */
  readonly subject?: string;
  /** Only mails that came after this one. */
  readonly after?: string;
};

/** A mail as it is kept over a restart: all else is read from its raw bytes again. */
export type SavedMail = {
  readonly id: string;
  readonly receivedAt: string;
  readonly envelope: Envelope;
  readonly raw: string;
};

type Kept = { readonly mail: Mail; readonly raw: Buffer; readonly contents: readonly Buffer[] };

const MAILS_KEPT = 1000;

/** The mails that were caught, and those who wait for more. */
export class Mailbox {
  #kept: readonly Kept[] = [];
  #last = 0;
  readonly #waiting = new Set<() => void>();

  async add(raw: Buffer, envelope: Envelope, receivedAt: string): Promise<Mail> {
    this.#last += 1;
    const kept = await readMail({ id: `mail-${this.#last}`, receivedAt, envelope, raw: raw.toString('base64') });
    this.#kept = [...this.#kept, kept].slice(-MAILS_KEPT);
    for (const look of this.#waiting) look();
    return kept.mail;
  }

  /** Newest first. */
  list({ to, subject, after }: MailFilter = {}): readonly Mail[] {
    const from = after === undefined ? 0 : this.#kept.findIndex(({ mail }) => mail.id === after) + 1;
    const wanted = to?.toLowerCase();
    return this.#kept
      .slice(from)
      .map(({ mail }) => mail)
      .filter((mail) => wanted === undefined || mail.envelope.to.some((address) => address.toLowerCase() === wanted))
      .filter((mail) => subject === undefined || mail.subject.includes(subject))
      .toReversed();
  }

  find(id: string): Mail | undefined {
    return this.#find(id)?.mail;
  }

  raw(id: string): Buffer | undefined {
    return this.#find(id)?.raw;
  }

  attachment(id: string, index: number): { readonly note: AttachmentNote; readonly content: Buffer } | undefined {
    const kept = this.#find(id);
    const note = kept?.mail.attachments[index];
    const content = kept?.contents[index];
    return note && content ? { note, content } : undefined;
  }

  /** @returns the mails that pass, newest first, as soon as there are `count`; throws when the time is over */
  waitFor(filter: MailFilter, count: number, milliseconds: number): Promise<readonly Mail[]> {
    return new Promise((resolve, reject) => {
      const look = (): void => {
        const mails = this.list(filter);
        if (mails.length < count) return;
        end();
        resolve(mails);
      };
      const timer = setTimeout(() => {
        end();
        const seen = this.list().map(({ envelope, subject }) => `${envelope.to.join(' ')}: ${subject}`);
        reject(
          new Error(`Within ${milliseconds} ms there were not ${count} such mails, but ${seen.join('; ') || 'none'}.`),
        );
      }, milliseconds);
      const end = (): void => {
        clearTimeout(timer);
        this.#waiting.delete(look);
      };
      this.#waiting.add(look);
      look();
    });
  }

  clear(): void {
    this.#kept = [];
  }

  save(): readonly SavedMail[] {
    return this.#kept.map(({ mail: { id, receivedAt, envelope }, raw }) => ({
      id,
      receivedAt,
      envelope,
      raw: raw.toString('base64'),
    }));
  }

  async load(saved: readonly SavedMail[]): Promise<void> {
    const kept: Kept[] = [];
    for (const one of saved) kept.push(await readMail(one));
    this.#kept = kept;
    this.#last = Math.max(0, ...saved.map(({ id }) => Number(id.replace('mail-', ''))));
  }

  #find(id: string): Kept | undefined {
    return this.#kept.find(({ mail }) => mail.id === id);
  }
}

async function readMail({ id, receivedAt, envelope, raw }: SavedMail): Promise<Kept> {
  const bytes = Buffer.from(raw, 'base64');
  const parsed = await simpleParser(bytes);
  const mail: Mail = {
    id,
    receivedAt,
    envelope,
    from: parsed.from?.text ?? '',
    to: addresses(parsed.to),
    cc: addresses(parsed.cc),
    replyTo: addresses(parsed.replyTo),
    subject: parsed.subject ?? '',
    messageId: parsed.messageId ?? null,
    text: parsed.text ?? null,
    html: typeof parsed.html === 'string' ? parsed.html : null,
    headers: headersOf(parsed),
    attachments: parsed.attachments.map((attachment, index) => ({
      index,
      name: attachment.filename ?? `attachment-${index + 1}`,
      contentType: attachment.contentType,
      size: attachment.size,
    })),
  };
  return { mail, raw: bytes, contents: parsed.attachments.map(({ content }) => content) };
}

function addresses(field: AddressObject | AddressObject[] | undefined): string[] {
  const fields = field === undefined ? [] : Array.isArray(field) ? field : [field];
  return fields.flatMap(({ value }) => value.flatMap(({ address }) => (address === undefined ? [] : [address])));
}

function headersOf(parsed: ParsedMail): Record<string, string> {
  return Object.fromEntries(
    parsed.headerLines.map(({ key, line }) => [
      key,
      line
        .slice(line.indexOf(':') + 1)
        .replace(/\r?\n\s+/g, ' ')
        .trim(),
    ]),
  );
}

import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import nodemailer, { type Transporter } from 'nodemailer';
import { PassThrough, type Readable } from 'node:stream';
import { Config } from '../config/config.js';

export interface MailMessage {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
  readonly messageId: string;
  readonly attachments: readonly { filename: string; contentType: string; content: Readable }[];
}

/** What became of an attempt to send. */
export type MailOutcome =
  | { readonly kind: 'sent' }
  /** It certainly did not leave, and a later attempt may succeed. */
  | { readonly kind: 'later'; readonly reason: string }
  /** The mail server refuses it for good. */
  | { readonly kind: 'refused'; readonly reason: string }
  /** The connection broke after the mail was handed over and before the answer came. */
  | { readonly kind: 'uncertain'; readonly reason: string };

/** Hands one mail to the mail server. */
@Injectable()
export class MailTransport implements OnApplicationShutdown {
  readonly #transporter: Transporter;
  readonly #handedOver = new Set<string>();

  constructor(private readonly config: Config) {
    const url = new URL(config.smtpUrl);
    url.searchParams.set('connectionTimeout', '10000');
    url.searchParams.set('greetingTimeout', '10000');
    url.searchParams.set('socketTimeout', '30000');
    this.#transporter = nodemailer.createTransport(url.href);
    this.#noteWhenHandedOver();
  }

  async send(message: MailMessage): Promise<MailOutcome> {
    try {
      await this.#transporter.sendMail({
        from: this.config.mailFrom,
        to: { name: '', address: message.to },
        subject: message.subject,
        text: message.text,
        html: message.html,
        messageId: message.messageId,
        attachments: [...message.attachments],
        headers: { 'Auto-Submitted': 'auto-generated' },
        disableFileAccess: true,
        disableUrlAccess: true,
      });
      return { kind: 'sent' };
    } catch (error) {
      return outcomeOf(error, this.#handedOver.has(message.messageId));
    } finally {
      this.#handedOver.delete(message.messageId);
    }
  }

  onApplicationShutdown(): void {
    this.#transporter.close();
  }

  /** The library says of a broken line not whether the mail had gone through it; its last byte leaving us tells. */
  #noteWhenHandedOver(): void {
    this.#transporter.use('stream', (mail, done) => {
      mail.message.transform(() =>
        new PassThrough().once('finish', () => this.#handedOver.add(mail.message.messageId())),
      );
      done();
    });
  }
}

/**
 * A reply of the mail server settles it: 4xx is for now, 5xx for good (RFC 5321, 4.2.1). Without a reply, a mail whose
 * last byte had left may have arrived.
 */
export function outcomeOf(error: unknown, handedOver: boolean): MailOutcome {
  const reason = error instanceof Error ? error.message.slice(0, 500) : String(error);
  const { responseCode } = error as { responseCode?: unknown };
  if (typeof responseCode === 'number') return { kind: responseCode >= 500 ? 'refused' : 'later', reason };
  return { kind: handedOver ? 'uncertain' : 'later', reason };
}

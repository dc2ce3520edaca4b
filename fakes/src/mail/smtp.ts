import type { AddressInfo, Socket } from 'node:net';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import type { Envelope } from './mailbox.js';

export const STAGES = ['connect', 'sender', 'recipient', 'message'] as const;

export type Refusing = {
  readonly stage: (typeof STAGES)[number];
  /** The reply code: 4xx to try again later, 5xx for good. */
  readonly code: number;
  readonly message: string;
  /** How often yet; null for ever. */
  readonly count: number | null;
  /** Only this recipient is refused; null for all. */
  readonly recipient: string | null;
};

type Done = (fault?: Error | null, message?: string) => void;

const BIGGEST_BYTES = 25_000_000;

/** An SMTP server on the loopback interface that takes every mail, unless told to misbehave. */
export class SmtpCatcher {
  #server: SMTPServer | undefined;
  #port = 0;
  #refusing: readonly Refusing[] = [];
  #silent = false;
  #cuts = 0;
  readonly #sockets = new Map<number, Socket>();

  /** @param take keeps a mail; the sender is answered when it has */
  constructor(private readonly take: (raw: Buffer, envelope: Envelope) => Promise<void>) {}

  get port(): number {
    return this.#port;
  }

  describe() {
    return { up: this.#server !== undefined, silent: this.#silent, cuts: this.#cuts, refusing: this.#refusing };
  }

  async start(port: number): Promise<void> {
    this.#port = port;
    await this.up();
  }

  /** Listens again, on the same port. */
  async up(): Promise<void> {
    if (this.#server) return;
    const server = this.create();
    await new Promise<void>((resolve, reject) => {
      server.on('error', reject);
      server.listen(this.#port, '127.0.0.1', () => {
        server.off('error', reject);
        // A sender that goes away in the middle is no fault of the catcher.
        server.on('error', () => undefined);
        resolve();
      });
    });
    server.server.on('connection', (socket: Socket) => this.remember(socket));
    this.#port = (server.server.address() as AddressInfo).port;
    this.#server = server;
  }

  /** Stops listening and drops every connection. */
  async down(): Promise<void> {
    const server = this.#server;
    if (!server) return;
    this.#server = undefined;
    const closed = new Promise<void>((resolve) => server.close(resolve));
    for (const socket of this.#sockets.values()) socket.destroy();
    await closed;
  }

  refuse(refusing: Refusing): void {
    this.#refusing = [...this.#refusing, refusing];
  }

  /** Leaves senders without any answer, from now on or no longer. */
  silence(silent: boolean): void {
    this.#silent = silent;
    // Those who were left waiting would wait for ever: their turn is over.
    if (!silent) for (const socket of this.#sockets.values()) socket.destroy();
  }

  /** Keeps the next mails but drops the connection before saying so. */
  cut(count: number): void {
    this.#cuts = count;
  }

  behave(): void {
    this.#refusing = [];
    this.#cuts = 0;
    if (this.#silent) this.silence(false);
  }

  private create(): SMTPServer {
    return new SMTPServer({
      authOptional: true,
      allowInsecureAuth: true,
      disabledCommands: ['STARTTLS'],
      disableReverseLookup: true,
      banner: 'test mail catcher',
      size: BIGGEST_BYTES,
      closeTimeout: 100,
      onAuth: (_auth, _session, done) => done(null, { user: 'anyone' }),
      onConnect: (_session, done) => this.answer('connect', null, done),
      onMailFrom: (_address, _session, done) => this.answer('sender', null, done),
      onRcptTo: ({ address }, _session, done) => this.answer('recipient', address, done),
      onData: (stream, session, done) => void this.receive(stream, session, done),
    });
  }

  private remember(socket: Socket): void {
    const port = socket.remotePort ?? 0;
    this.#sockets.set(port, socket);
    socket.on('close', () => this.#sockets.delete(port));
  }

  private answer(stage: Refusing['stage'], recipient: string | null, done: Done): void {
    if (this.#silent) return;
    done(this.refusalOf(stage, recipient));
  }

  private async receive(stream: SMTPServerDataStream, session: SMTPServerSession, done: Done): Promise<void> {
    const chunks: Buffer[] = [];
    for await (const chunk of stream) chunks.push(chunk as Buffer);
    if (this.#silent) return;
    const to = session.envelope.rcptTo.map(({ address }) => address);
    const refusal = stream.sizeExceeded ? replyError(552, 'Too big') : this.refusalOf('message', null);
    if (refusal) {
      done(refusal);
      return;
    }
    const { mailFrom } = session.envelope;
    try {
      await this.take(Buffer.concat(chunks), { from: mailFrom === false ? '' : (mailFrom?.address ?? ''), to });
    } catch (fault) {
      done(replyError(451, `The catcher failed: ${String(fault)}`));
      return;
    }
    if (this.#cuts > 0) {
      this.#cuts -= 1;
      this.#sockets.get(session.remotePort)?.destroy();
      return;
    }
    done(null, 'Caught');
  }

  private refusalOf(stage: Refusing['stage'], recipient: string | null): Error | null {
    const found = this.#refusing.find(
      (one) =>
        one.stage === stage && (one.recipient === null || one.recipient.toLowerCase() === recipient?.toLowerCase()),
    );
    if (!found) return null;
    this.#refusing = this.#refusing.flatMap((one) => {
      if (one !== found || one.count === null) return [one];
      return one.count > 1 ? [{ ...one, count: one.count - 1 }] : [];
    });
    return replyError(found.code, found.message);
  }
}

function replyError(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode });
}

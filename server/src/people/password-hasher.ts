import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { AppError } from '../platform/errors/app-error.js';

/**
 * argon2id with 19 MiB, two passes, one lane: the second choice of OWASP's Password Storage Cheat Sheet (2024), which
 * fits a small server; argon2id is the library's own choice of kind. The parameters stand in each hash, so they can be raised later.
 */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

const currentPrefix = `$argon2id$v=19$m=${parameters.memoryCost},t=${parameters.timeCost},p=${parameters.parallelism}$`;

/** Hashes at once; more wait, so that a rush of sign-ins leaves the processor to everybody else. */
const hashesAtOnce = 1;

/** As many as can be hashed while somebody still waits for the answer. */
const mostWaiting = 200;

@Injectable()
export class PasswordHasher {
  readonly #waiting: (() => void)[] = [];
  #running = 0;
  #dummy: Promise<string> | undefined;

  async hash(password: string): Promise<string> {
    return this.#inTurn(() => hash(password, parameters));
  }

  /** False for a wrong password; without a hash it takes as long, so that nobody learns who has an account. */
  async verify(stored: string | null | undefined, password: string): Promise<boolean> {
    const against = stored ?? (await this.#dummyHash());
    const right = await this.#inTurn(() => verify(against, password));
    return right && stored !== null && stored !== undefined;
  }

  /** Whether a hash was made with older parameters and should be made anew while the password is at hand. */
  isOutdated(stored: string): boolean {
    return !stored.startsWith(currentPrefix);
  }

  #dummyHash(): Promise<string> {
    this.#dummy ??= this.hash(randomBytes(32).toString('base64'));
    return this.#dummy;
  }

  async #inTurn<Result>(work: () => Promise<Result>): Promise<Result> {
    if (this.#waiting.length >= mostWaiting) {
      throw new AppError('service_unavailable', 'Too many people are signing in just now. Try again in a moment.');
    }
    if (this.#running >= hashesAtOnce) {
      await new Promise<void>((resolve) => {
        this.#waiting.push(resolve);
      });
    } else {
      this.#running += 1;
    }
    try {
      return await work();
    } finally {
      // The turn passes straight to the next in line, so that nobody new can slip in between.
      const next = this.#waiting.shift();
      if (next) next();
      else this.#running -= 1;
    }
  }
}

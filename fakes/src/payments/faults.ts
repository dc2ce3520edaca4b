export type Fault = {
  readonly kind: 'fail' | 'hang' | 'reset' | 'delay' | 'garbage';
  /** How many requests it strikes yet. */
  readonly count: number;
  readonly method: string | null;
  /** The start of the paths it strikes, such as /v1/refunds. */
  readonly path: string;
  /** Whether the request takes effect although its answer is spoiled. */
  readonly processed: boolean;
  readonly status: number;
  readonly code: string | null;
  readonly message: string;
  /** Whether the failure is kept under the idempotency key and replayed. */
  readonly stored: boolean;
  /** What the answer tells the SDK about trying again; null says nothing. */
  readonly retry: boolean | null;
  readonly milliseconds: number;
};

/** The faults that were ordered, struck in the order they were given. */
export class Faults {
  #faults: readonly Fault[] = [];

  add(fault: Fault): void {
    this.#faults = [...this.#faults, fault];
  }

  take(method: string, path: string): Fault | undefined {
    const found = this.#faults.find(
      (fault) => (fault.method === null || fault.method === method) && path.startsWith(fault.path),
    );
    if (!found) return undefined;
    this.#faults = this.#faults.flatMap((fault) => {
      if (fault !== found) return [fault];
      return fault.count > 1 ? [{ ...fault, count: fault.count - 1 }] : [];
    });
    return found;
  }

  list(): readonly Fault[] {
    return this.#faults;
  }

  reset(): void {
    this.#faults = [];
  }
}

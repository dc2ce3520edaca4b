import { IANAZone } from 'luxon';

/** The settings cannot be used; the message lists every fault, one a line. */
export class ConfigFault extends Error {
  override readonly name = 'ConfigFault';
}

/**
 * Reads environment variables and collects what is wrong with them, so that one start shows all faults.
 * A reader that met a fault returns a harmless value; `refuseFaults` ends the start.
 */
export class Environment {
  readonly #faults: string[] = [];

  constructor(private readonly variables: Readonly<Record<string, string | undefined>>) {}

  fault(name: string, sentence: string): void {
    this.#faults.push(`${name} ${sentence}.`);
  }

  /** @throws ConfigFault when any reader met a fault */
  refuseFaults(): void {
    if (this.#faults.length > 0) throw new ConfigFault(this.#faults.join('\n'));
  }

  text(name: string, usual?: string): string {
    const value = this.variables[name]?.trim();
    if (value) return value;
    if (usual === undefined) this.fault(name, 'is not set');
    return usual ?? '';
  }

  list(name: string): readonly string[] {
    return this.text(name)
      .split(',')
      .map((part) => part.trim())
      .filter((part) => part !== '');
  }

  integer(name: string, bounds: { fewest: number; most: number; usual: number }): number {
    const text = this.text(name, String(bounds.usual));
    const value = Number(text);
    if (Number.isInteger(value) && value >= bounds.fewest && value <= bounds.most) return value;
    this.fault(name, `must be a whole number from ${bounds.fewest} to ${bounds.most}`);
    return bounds.usual;
  }

  oneOf<const Choice extends string>(name: string, choices: readonly Choice[], usual: Choice): Choice {
    const text = this.text(name, usual);
    const found = choices.find((choice) => choice === text);
    if (found !== undefined) return found;
    this.fault(name, `must be one of ${choices.filter((choice) => choice !== '').join(', ')}`);
    return usual;
  }

  url(name: string, protocols: readonly string[]): string {
    const text = this.text(name);
    if (text === '') return '';
    if (URL.canParse(text) && protocols.includes(new URL(text).protocol)) return text;
    this.fault(name, `must be an address that starts with ${protocols.map((part) => `${part}//`).join(' or ')}`);
    return '';
  }

  zone(name: string, usual: string): string {
    const text = this.text(name, usual);
    if (IANAZone.isValidZone(text)) return text;
    this.fault(name, 'must be a time zone by its IANA name, such as Europe/Dublin');
    return usual;
  }
}

/** Whether a host can only be reached from this machine. */
export function isLoopback(host: string): boolean {
  return ['localhost', '::1', '[::1]'].includes(host) || /^127(\.\d{1,3}){3}$/.test(host);
}

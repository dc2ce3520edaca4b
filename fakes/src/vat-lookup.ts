import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerControl, callControl, flag, optionalText, type ControlRoute } from './http/control.js';
import { addressOf, answerJson, readBody, Refusal } from './http/exchange.js';
import { listen } from './http/listener.js';

export type Registered = { readonly valid: boolean; readonly name?: string; readonly address?: string };

export type VatLookupOptions = {
  /** 0 takes a free one. */
  readonly port?: number;
  /** What is known, by number with its country: `DE123456789`. */
  readonly numbers?: Readonly<Record<string, Registered>>;
  /** Whether a number that nobody named counts as valid. */
  readonly othersValid?: boolean;
  /** The instant, in milliseconds since 1970. */
  readonly now?: () => number;
};

export type VatLookupFake = {
  readonly port: number;
  /** The base address; the check is at `/check-vat-number` below it. */
  readonly address: string;
  register(number: string, registered: Registered): void;
  /** Lets the register of a country (or the whole service) be unavailable, or available again. */
  setAvailable(available: boolean, country?: string): void;
  /** The numbers that were asked for, with their country. */
  asked(): readonly string[];
  control(method: 'GET' | 'POST' | 'DELETE', path: string, body?: object): Promise<unknown>;
  close(): Promise<void>;
};

/**
 * Answers of the test service by number. Source: European Commission, DG TAXUD, VIES technical information,
 * `checkVatTestService.wsdl`, as remembered.
 */
const TEST_NUMBERS: Readonly<Record<string, string>> = {
  '100': 'VALID',
  '200': 'INVALID',
  '201': 'INVALID_INPUT',
  '202': 'INVALID_REQUESTER_INFO',
  '300': 'SERVICE_UNAVAILABLE',
  '301': 'MS_UNAVAILABLE',
  '302': 'TIMEOUT',
  '500': 'GLOBAL_MAX_CONCURRENT_REQ',
  '600': 'MS_MAX_CONCURRENT_REQ',
};

const COUNTRIES = 'AT BE BG CY CZ DE DK EE EL ES FI FR HR HU IE IT LT LU LV MT NL PL PT RO SE SI SK XI'.split(' ');

/**
 * Starts a stand-in for the European Commission's lookup of VAT numbers (VIES), its REST form
 * (ec.europa.eu/taxation_customs/vies, "Technical information"): `POST /check-vat-number` and `GET /check-status`.
 */
export async function startVatLookup(options: VatLookupOptions = {}): Promise<VatLookupFake> {
  const register = new VatRegister(options);
  const controls = registerControls(register);
  const listener = await listen(options.port ?? 0, async (request, response) => {
    const { pathname } = addressOf(request);
    if (pathname === '/control' || pathname.startsWith('/control/')) return answerControl(controls, request, response);
    return answerLookup(register, pathname, request, response);
  });
  return {
    port: listener.port,
    address: listener.address,
    register: (number, registered) => register.register(number, registered),
    setAvailable: (available, country) => register.setAvailable(available, country),
    asked: () => register.asked,
    control: (method, path, body) => callControl(listener.address, method, path, body),
    close: () => listener.close(),
  };
}

class VatRegister {
  readonly #numbers: Map<string, Registered>;
  readonly #down = new Set<string>();
  #asked: readonly string[] = [];
  #count = 0;
  #hanging = false;

  constructor(private readonly options: VatLookupOptions) {
    this.#numbers = new Map(Object.entries(options.numbers ?? {}));
  }

  get asked(): readonly string[] {
    return this.#asked;
  }

  get hanging(): boolean {
    return this.#hanging;
  }

  hang(hanging: boolean): void {
    this.#hanging = hanging;
  }

  register(number: string, registered: Registered): void {
    this.#numbers.set(number.toUpperCase(), registered);
  }

  setAvailable(available: boolean, country = ''): void {
    if (available) this.#down.delete(country);
    else this.#down.add(country);
  }

  status() {
    const countries = COUNTRIES.map((countryCode) => ({
      countryCode,
      availability: this.#down.has(countryCode) ? 'Unavailable' : 'Available',
    }));
    return { vow: { available: !this.#down.has('') }, countries };
  }

  /** The answer's body: a verdict, or `actionSucceed: false` with the reason, both with status 200. */
  check(countryCode: string, vatNumber: string, hasRequester: boolean): object {
    this.#asked = [...this.#asked, countryCode + vatNumber];
    const test = TEST_NUMBERS[vatNumber];
    if (this.#down.has('')) return failed('SERVICE_UNAVAILABLE');
    if (this.#down.has(countryCode)) return failed('MS_UNAVAILABLE');
    if (!COUNTRIES.includes(countryCode) || !/^[0-9A-Z+*]{2,12}$/.test(vatNumber)) return failed('INVALID_INPUT');
    if (test !== undefined && test !== 'VALID' && test !== 'INVALID') return failed(test);
    const known = this.#numbers.get(countryCode + vatNumber);
    const valid = known?.valid ?? (test === undefined ? (this.options.othersValid ?? false) : test === 'VALID');
    this.#count += 1;
    return {
      countryCode,
      vatNumber,
      requestDate: new Date((this.options.now ?? Date.now)()).toISOString(),
      valid,
      requestIdentifier: hasRequester ? `WAPI${String(this.#count).padStart(12, '0')}` : '',
      name: valid ? (known?.name ?? 'Fernhollow Trade Buyer') : '---',
      address: valid ? (known?.address ?? 'Test street 1') : '---',
      traderName: '---',
      traderStreet: '---',
      traderPostalCode: '---',
      traderCity: '---',
      traderCompanyType: '---',
      traderNameMatch: 'NOT_PROCESSED',
      traderStreetMatch: 'NOT_PROCESSED',
      traderPostalCodeMatch: 'NOT_PROCESSED',
      traderCityMatch: 'NOT_PROCESSED',
      traderCompanyTypeMatch: 'NOT_PROCESSED',
    };
  }
}

function failed(error: string): object {
  return { actionSucceed: false, errorWrappers: [{ error }] };
}

async function answerLookup(
  register: VatRegister,
  pathname: string,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  if (register.hanging) return;
  if (pathname === '/check-status' && request.method === 'GET') {
    answerJson(response, 200, register.status());
    return;
  }
  if (pathname !== '/check-vat-number' || request.method !== 'POST') {
    answerJson(response, 404, failed('NOT_FOUND'));
    return;
  }
  const asked = readQuestion(await readBody(request));
  if (!asked) answerJson(response, 400, failed('VOW-ERR-1'));
  else answerJson(response, 200, register.check(asked.countryCode, asked.vatNumber, asked.hasRequester));
}

function readQuestion(text: string) {
  let body: unknown;
  try {
    body = JSON.parse(text);
  } catch {
    return undefined;
  }
  const { countryCode, vatNumber, requesterMemberStateCode, requesterNumber } = (body ?? {}) as Record<string, unknown>;
  if (typeof countryCode !== 'string' || typeof vatNumber !== 'string') return undefined;
  const hasRequester = typeof requesterMemberStateCode === 'string' && typeof requesterNumber === 'string';
  return { countryCode, vatNumber: vatNumber.toUpperCase(), hasRequester };
}

function registerControls(register: VatRegister): readonly ControlRoute[] {
  return [
    {
      method: 'POST',
      path: '/control/numbers',
      does: 'Makes a number (with its country) valid or not: number, valid, name, address.',
      run: ({ body }) => {
        const number = optionalText(body, 'number');
        if (number === undefined) throw new Refusal(400, '"number" is missing.');
        const name = optionalText(body, 'name');
        const address = optionalText(body, 'address');
        const known = { ...(name === undefined ? {} : { name }), ...(address === undefined ? {} : { address }) };
        register.register(number, { valid: flag(body, 'valid', true), ...known });
      },
    },
    {
      method: 'POST',
      path: '/control/available',
      does: 'Makes the service, or the register of one country, unavailable or available: available, country.',
      run: ({ body }) => register.setAvailable(flag(body, 'available', false), optionalText(body, 'country')),
    },
    {
      method: 'POST',
      path: '/control/hang',
      does: 'Leaves questions without an answer; hanging: false ends it.',
      run: ({ body }) => register.hang(flag(body, 'hanging', true)),
    },
    { method: 'GET', path: '/control/asked', does: 'Lists the numbers asked for.', run: () => register.asked },
  ];
}

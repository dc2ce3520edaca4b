import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

const at = new Date('2027-03-01T08:00:00Z');
let made = 0;

/** The shop of the specs: Irish, euros, 36.00 an hour at the bench. */
export async function addShop(handle: Kysely<DB>, shop: { oneStopShopFrom?: string } = {}): Promise<void> {
  await handle
    .insertInto('shop')
    .values({
      name: 'Fernhollow Tools',
      legal_name: 'Fernhollow Tools Limited',
      address_line: '4 Mill Lane',
      city: 'Ballyhollow',
      postcode: 'X99 AB12',
      country_code: 'IE',
      email: 'shop@fernhollow.example',
      vat_number: 'IE1234567FA',
      currency: 'EUR',
      zone: 'Europe/Dublin',
      labour_rate_minor: 3600,
      one_stop_shop_from: shop.oneStopShopFrom ?? null,
    })
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

export interface PartRow {
  readonly id: number;
  readonly code: string;
}

type Traced = 'count' | 'delivery' | 'single';

/** A part; everything not said is made up. */
export async function addPart(
  handle: Kysely<DB>,
  part: { code?: string; name?: string; measure?: string; traced?: Traced; letters?: string; weight?: string } = {},
): Promise<PartRow> {
  made += 1;
  const traced = part.traced ?? 'delivery';
  return handle
    .insertInto('part')
    .values({
      code: part.code ?? `PART-${made}`,
      name: part.name ?? `Part ${made}`,
      measure: part.measure ?? 'piece',
      traced,
      serial_letters: traced === 'single' ? (part.letters ?? lettersOf(made)) : null,
      unit_weight_g: part.weight ?? null,
      created_at: at,
    })
    .returning(['id', 'code'])
    .executeTakeFirstOrThrow();
}

export async function addBin(handle: Kysely<DB>, bin: { code?: string; quarantine?: boolean } = {}): Promise<PartRow> {
  made += 1;
  return handle
    .insertInto('bin')
    .values({ code: bin.code ?? `BIN-${made}`, quarantine: bin.quarantine ?? false })
    .returning(['id', 'code'])
    .executeTakeFirstOrThrow();
}

interface NewLot {
  readonly partId: number;
  readonly code?: string;
  readonly kind?: 'standing' | 'delivery' | 'made' | 'unit';
  readonly status?: 'held' | 'released' | 'rejected';
  readonly receivedOn?: string;
  readonly expiresOn?: string;
}

export async function addLot(handle: Kysely<DB>, lot: NewLot): Promise<PartRow> {
  made += 1;
  return handle
    .insertInto('lot')
    .values({
      code: lot.code ?? `L-${made}`,
      part_id: lot.partId,
      kind: lot.kind ?? 'delivery',
      status: lot.status ?? 'released',
      received_on: lot.receivedOn ?? '2027-03-01',
      expires_on: lot.expiresOn ?? null,
      created_at: at,
    })
    .returning(['id', 'code'])
    .executeTakeFirstOrThrow();
}

/** Two or three letters that no other part of the specs has. */
function lettersOf(number: number): string {
  const letter = (value: number) => String.fromCodePoint(65 + (value % 26));
  return letter(Math.floor(number / 676)) + letter(Math.floor(number / 26)) + letter(number);
}

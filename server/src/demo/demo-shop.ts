import type { INestApplicationContext } from '@nestjs/common';
import { electricalParts } from '@emberlot/db/demo/electrical-parts';
import { irons } from '@emberlot/db/demo/irons';
import { mechanicalParts } from '@emberlot/db/demo/mechanical-parts';
import { demoListings, kits } from '@emberlot/db/demo/offers';
import type { DemoBoughtPart, DemoMadePart } from '@emberlot/db/demo/scenario.types';
import { subAssemblies } from '@emberlot/db/demo/sub-assemblies';
import { demoBins, demoSuppliers } from '@emberlot/db/demo/suppliers';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { ContentsService } from '../bills/contents.service.js';
import { DraftBillsService } from '../bills/draft-bills.service.js';
import { ReleaseBillService } from '../bills/release-bill.service.js';
import { PartsService } from '../parts/parts.service.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Database } from '../platform/database/database.js';
import { ShopSettingsService } from '../settings/shop-settings.service.js';
import { TaxSettingsService } from '../settings/tax-settings.service.js';
import { BinsService } from '../stock/bins.service.js';
import { ReceiveDeliveryService } from '../stock/receive-delivery.service.js';
import { SuppliersService } from '../suppliers/suppliers.service.js';
import { demoShopValues } from './shop-values.js';
import type { TurnedClock } from './turned-clock.js';

const boughtParts = [...electricalParts, ...mechanicalParts];

/** Delivery prices of the demo, euro cents net, by country. */
const delivery: readonly (readonly [country: string, netMinor: number, days: number])[] = [
  ['IE', 650, 2], ['GB', 1150, 4], ['DE', 1250, 5], ['FR', 1250, 5], ['NL', 1250, 5], ['AT', 1350, 6],
  ['SE', 1450, 6], ['ES', 1350, 6], ['CH', 1850, 7], ['NO', 1850, 7],
]; // prettier-ignore

/** Sets the shop up as a person would: who it is, its parts, their bills, what it offers. */
export class DemoShop {
  constructor(
    private readonly app: INestApplicationContext,
    private readonly clock: TurnedClock,
    private readonly owner: SignedInUser,
  ) {}

  async setUp(): Promise<void> {
    await this.app.get(ShopSettingsService).setUp(demoShopValues, this.owner);
    for (const [countryCode, netMinor, transitDays] of delivery) {
      const rate = { countryCode, netMinor, transitDays, carriesLithium: true, validFrom: '2024-01-01' };
      await this.app.get(TaxSettingsService).addDeliveryRate(rate, this.owner);
    }
    for (const { code, name, country, leadTimeDays } of demoSuppliers) {
      const email = `orders@${code.toLowerCase()}.example`;
      const supplier = { code, name, email, countryCode: country, currency: 'EUR', leadTimeDays };
      await this.app.get(SuppliersService).create(supplier, this.owner);
    }
    for (const { code, name, quarantine } of demoBins) {
      await this.app.get(BinsService).create({ code, name, quarantine: quarantine ?? false }, this.owner);
    }
  }

  async addParts(): Promise<void> {
    const parts = this.app.get(PartsService);
    for (const part of boughtParts) await parts.create(boughtPart(part), this.owner);
    for (const part of [...subAssemblies, ...irons]) await parts.create(madePart(part), this.owner);
    for (const { code, name } of kits) {
      const kit = { code, name, measure: 'piece', traced: 'count', parameters: [], suppliers: [] } as const;
      await parts.create({ ...kit, parameters: [], suppliers: [] }, this.owner);
    }
  }

  async releaseBills(): Promise<void> {
    for (const part of [...subAssemblies, ...irons]) {
      const draft = await this.app.get(DraftBillsService).create(this.owner, part.code, { from: 'nothing' });
      const content = { ...billContent(part), version: draft.version };
      const edited = await this.app.get(DraftBillsService).edit(this.owner, part.code, draft.number, content);
      await this.app.get(ReleaseBillService).release(this.owner, part.code, draft.number, edited.version);
      this.clock.advance({ minutes: 20 });
    }
    for (const { code, contents } of kits) {
      const { version } = await this.app.get(ContentsService).open(code);
      await this.app
        .get(ContentsService)
        .edit(this.owner, code, { version, lines: contents.map((line) => ({ ...line })) });
    }
  }

  /** One delivery per supplier, of as many packs of each part as are asked for. */
  async receive(packs: number): Promise<void> {
    for (const { code } of demoSuppliers) {
      const lines = boughtParts
        .filter(({ supplier }) => supplier === code)
        .map((part, place) => ({
          part: part.code,
          quantity: String(part.pack * packs),
          unitPrice: part.price,
          bin: part.bin,
          held: false,
          ...(part.traced === 'delivery'
            ? { supplierLot: `${code.slice(0, 3)}-${this.today().slice(2, 7)}-${place + 1}` }
            : {}),
        }));
      if (lines.length === 0) continue;
      const receivedOn = this.today();
      const deliveryNote = `${code.slice(0, 4)} ${receivedOn.replaceAll('-', '')}`;
      await this.app
        .get(ReceiveDeliveryService)
        .receive({ supplier: code, deliveryNote, receivedOn, lines }, this.owner);
      this.clock.advance({ minutes: 15 });
    }
  }

  async offer(): Promise<void> {
    const { handle } = this.app.get(Database);
    for (const [place, listing] of demoListings.entries()) {
      const part = await handle
        .selectFrom('part')
        .select('id')
        .where('code', '=', listing.part)
        .executeTakeFirstOrThrow();
      await handle
        .insertInto('listing')
        .values({
          slug: listing.slug,
          part_id: part.id,
          form: listing.form,
          family: listing.family,
          title: listing.title,
          summary: listing.summary,
          description: listing.description,
          skills: listing.skills ?? null,
          drawing: listing.drawing ?? null,
          net_minor: listing.netMinor,
          place: place + 1,
          published_at: this.clock.now(),
        })
        .execute();
    }
  }

  private today(): string {
    return this.clock.now().toISOString().slice(0, 10);
  }
}

function boughtPart(part: DemoBoughtPart) {
  return {
    code: part.code,
    name: part.name,
    measure: part.measure,
    traced: part.traced,
    unitWeightG: part.weight,
    reorderPoint: part.reorder ?? null,
    parameters: (part.parameters ?? []).map(([name, value, unit]) => ({ name, value, unit: unit ?? null })),
    suppliers: [{ supplier: part.supplier, preferred: true }],
    battery: part.battery ? battery(part.battery) : null,
  };
}

function madePart(part: DemoMadePart) {
  return {
    code: part.code,
    name: part.name,
    measure: 'piece' as const,
    traced: part.traced,
    serialLetters: part.serialLetters ?? null,
    unitWeightG: part.weight,
    parameters: [],
    suppliers: [],
    battery: part.battery ? battery(part.battery) : null,
  };
}

function battery(of: NonNullable<DemoBoughtPart['battery']>) {
  return {
    kind: of.kind,
    chemistry: 'lithium_ion' as const,
    wattHours: of.wattHours,
    cellCount: of.cells,
    transportTestReference: of.testReference ?? null,
    transportTestPassedOn: of.testReference ? '2025-02-14' : null,
  };
}

function billContent(part: DemoMadePart) {
  return {
    lines: part.lines.map((line, place) => ({
      position: place + 1,
      part: line.part,
      quantityPer: line.quantity,
      scrapPercent: line.scrap ?? '0',
      marks: line.marks ?? null,
      alternates: [...(line.alternates ?? [])],
    })),
    steps: part.steps.map(({ title, instruction, minutes, caution }) => ({
      title,
      instruction,
      minutes: new Decimal(minutes).toFixed(),
      caution: caution ?? null,
    })),
    testPlan: part.plan.map((planned) => ({
      name: planned.name,
      kind: planned.unit === undefined ? ('yes_no' as const) : ('numeric' as const),
      unit: planned.unit ?? null,
      lowerLimit: planned.lower ?? null,
      target: planned.target ?? null,
      upperLimit: planned.upper ?? null,
      digits: planned.digits ?? null,
      condition: planned.condition ?? null,
      caution: planned.caution ?? null,
    })),
  };
}

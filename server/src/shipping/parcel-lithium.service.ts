import { Injectable } from '@nestjs/common';
import type { DB, JsonValue } from '@emberlot/db/database.types';
import type { LithiumDecision } from '@emberlot/shared/transport/lithium-decision';
import type { Kysely } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile } from '../platform/errors/app-error.js';
import { LithiumContentsRepository, type LithiumContentRow } from './lithium-contents.repository.js';
import { PackingService } from './packing.service.js';
import { decideParcel, type KeptLithium } from './parcel-lithium.js';
import type { CarrierAnswerInput, LithiumInput } from './parcel.dto.js';
import { ParcelsRepository, type ParcelRow } from './parcels.repository.js';

export interface DecidedParcel {
  readonly decision: LithiumDecision;
  readonly rows: readonly LithiumContentRow[];
  readonly kept: KeptLithium;
}

/** What the lithium rules say of a parcel, and what people said so that they can. */
@Injectable()
export class ParcelLithiumService {
  constructor(
    private readonly clock: Clock,
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly packing: PackingService,
    private readonly contents: LithiumContentsRepository,
    private readonly parcels: ParcelsRepository,
  ) {}

  /** Decides by today's edition; worked out afresh each time, from what lies in the parcel now. */
  async decide(handle: Kysely<DB>, parcel: ParcelRow): Promise<DecidedParcel> {
    const rows = await this.contents.ofParcel(handle, parcel.id);
    const kept = keptOf(parcel);
    const equipment = await this.contents.equipmentCount(handle, parcel.id);
    const facts = { day: this.clock.today(), weightG: parcel.weight_g, equipment, facts: kept.facts };
    return { rows, kept, decision: decideParcel(rows, facts) };
  }

  /** Keeps how a packed parcel travels and what it weighs. An earlier answer of the carrier is asked afresh. */
  async say(parcelNumber: string, input: LithiumInput, person: SignedInUser): Promise<void> {
    const { mode, wattHoursOnCase, chargePercent } = input;
    const kept: KeptLithium = { facts: { mode, wattHoursOnCase, chargePercent } };
    await this.keep(parcelNumber, input.version, kept, person, 'parcel.weighed', input.weightG);
  }

  /**
   * The owner wrote down what the carrier answered.
   *
   * @throws AppError `wrong_state` when nothing was to be asked
   */
  async acknowledge(parcelNumber: string, input: CarrierAnswerInput, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { parcel } = await this.packing.lock(trx, parcelNumber);
      const { decision, kept } = await this.decide(trx, parcel);
      if (decision.answer !== 'ask') {
        throw new AppError('wrong_state', `Nothing about ${parcel.number} is to be asked of the carrier.`);
      }
      const carrierAnswer = { note: input.note, by: person.name, at: this.clock.now().toISOString() };
      await this.write(trx, parcel, input.version, { ...kept, carrierAnswer }, undefined);
      await this.record(trx, parcel, person, 'parcel.carrier_answered', { note: input.note });
    });
  }

  private async keep(
    parcelNumber: string,
    version: number,
    kept: KeptLithium,
    person: SignedInUser,
    action: string,
    weightG: number,
  ): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { parcel } = await this.packing.lock(trx, parcelNumber);
      await this.write(trx, parcel, version, kept, weightG);
      await this.record(trx, parcel, person, action, { ...kept.facts, weightG });
    });
  }

  private async write(
    trx: Parameters<ParcelsRepository['advance']>[0],
    parcel: ParcelRow,
    version: number,
    kept: KeptLithium,
    weightG: number | undefined,
  ): Promise<void> {
    if (parcel.version !== version) throw changedMeanwhile({ version: parcel.version });
    const lithium = JSON.parse(JSON.stringify(kept)) as JsonValue;
    const change = { lithium, ...(weightG === undefined ? {} : { weight_g: weightG }) };
    if (!(await this.parcels.advance(trx, parcel.id, 'packed', change))) {
      throw new AppError('wrong_state', `${parcel.number} is not packed yet, or has left.`);
    }
  }

  private async record(
    trx: Parameters<ParcelsRepository['advance']>[0],
    parcel: ParcelRow,
    actor: SignedInUser,
    action: string,
    after: object,
  ): Promise<void> {
    const subject = { subjectKind: 'shipment', subjectId: parcel.id, subjectCode: parcel.number };
    await this.audit.record(trx, { actor, action, ...subject, after });
  }
}

function keptOf(parcel: ParcelRow): KeptLithium {
  return (parcel.lithium ?? {}) as unknown as KeptLithium;
}

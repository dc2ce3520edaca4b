import { Injectable } from '@nestjs/common';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { ShopService } from '../settings/shop.service.js';
import { byDue, isSafe, orderItem } from './today-queue.js';
import type { TodayBatchDto, TodayDto, TodayFigureDto, TodayItemDto } from './today.dto.js';
import { TodayRepository, type BatchRow, type WaitingOrderRow } from './today.repository.js';

const dayMilliseconds = 86_400_000;

/** What needs a hand today, each with its one action; who may do it decides who sees it. */
@Injectable()
export class TodayService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly repository: TodayRepository,
  ) {}

  async get(person: SignedInUser): Promise<TodayDto> {
    const today = this.clock.today();
    if (person.role === 'accountant') return this.forAccountant(person, today);
    const orders = await this.repository.waitingOrders(this.database.handle);
    const atBench = await this.benchItems();
    const items = orders.filter(({ review }) => review === null || person.role === 'owner');
    const queue = [
      ...items.map((order) => orderItem(order, today)),
      ...atBench,
      ...(person.role === 'owner' ? await this.ownerItems(orders) : []),
    ];
    return {
      day: today,
      promises: promisesOf(orders, today),
      queue: byDue(queue),
      batches: (await this.repository.batches(this.database.handle)).map(batchDto),
      figures: await this.figures(person),
    };
  }

  private async forAccountant(person: SignedInUser, today: string): Promise<TodayDto> {
    const reviews = await this.repository.otherReviews(this.database.handle);
    return {
      day: today,
      promises: null,
      queue: reviews.map(({ id, what, order }) => ({
        ...plain(`review ${id}`),
        sentence: order === null ? 'A payment fits no order.' : `The payment of {order:${order}} waits for the owner.`,
        because: what,
        action: order === null ? null : { label: 'Look at it', to: `/counter/orders/${order}` },
      })),
      batches: [],
      figures: await this.figures(person),
    };
  }

  private async benchItems(): Promise<readonly TodayItemDto[]> {
    const faults = await this.repository.openFaults(this.database.handle);
    const short = await this.repository.shortBatches(this.database.handle);
    return [
      ...faults.map(({ number, what, serial, dueOn }) => ({
        ...plain(`fault ${number}`),
        due: dueOn,
        late: dueOn < this.clock.today(),
        sentence: `{unit:${serial}} has a fault.`,
        because: what,
        action: { label: 'Open the unit', to: `/bench/units/${serial}` },
      })),
      ...short.map(({ batch, dueOn, parts }) => ({
        ...plain(`batch ${batch}`),
        due: dueOn,
        late: dueOn < this.clock.today(),
        sentence: `{batch:${batch}} lacks ${parts.map((code) => `{part:${code}}`).join(', ')}.`,
        action: { label: 'Open the batch', to: `/bench/batches/${batch}` },
      })),
    ];
  }

  private async ownerItems(orders: readonly WaitingOrderRow[]): Promise<readonly TodayItemDto[]> {
    const handle = this.database.handle;
    const waiting = new Set(orders.map(({ number }) => number));
    const reviews = await this.repository.otherReviews(handle);
    const lots = await this.repository.heldLots(handle);
    const mails = await this.repository.failedMails(handle, new Date(this.clock.now().getTime() - 15 * 60_000));
    return [
      ...reviews
        .filter(({ order }) => order === null || !waiting.has(order))
        .map(({ id, what, order }) => ({
          ...plain(`review ${id}`),
          sentence: order === null ? 'A payment fits no order.' : `A payment of {order:${order}} needs a decision.`,
          because: what,
          action: order === null ? null : { label: 'Look at it', to: `/counter/orders/${order}` },
        })),
      ...lots.map(({ code, part, note }) => ({
        ...plain(`lot ${code}`),
        sentence: `{lot:${code}} of {part:${part}} is held.`,
        because: note,
        action: { label: 'Decide', to: `/shelf/lots/${code}` },
      })),
      ...(mails === 0
        ? []
        : [
            {
              ...plain('mails'),
              sentence: mails === 1 ? 'One mail has not left.' : `${mails} mails have not left.`,
              action: { label: 'See the mails', to: '/setup/mails' },
            },
          ]),
    ];
  }

  private async figures(person: SignedInUser): Promise<TodayFigureDto[]> {
    const since = new Date(this.clock.now().getTime() - dayMilliseconds);
    const { paid, paidMinor, shipped, finished } = await this.repository.figures(this.database.handle, since);
    const shop = await this.shop.find(this.database.handle);
    const money = shop && seesMoney(person) ? { amount: paidMinor, currency: shop.currency } : null;
    return [
      { label: 'Orders paid', count: String(paid), money },
      { label: 'Parcels sent', count: String(shipped), money: null },
      { label: 'Units finished', count: String(finished), money: null },
    ];
  }
}

function plain(key: string): Omit<TodayItemDto, 'sentence'> {
  return { key, due: null, late: false, signal: false, because: null, action: null };
}

function promisesOf(orders: readonly WaitingOrderRow[], today: string) {
  const until = new Date(Date.parse(today) + 6 * dayMilliseconds).toISOString().slice(0, 10);
  const thisWeek = orders.filter(({ promisedOn }) => promisedOn <= until);
  return {
    thisWeek: thisWeek.length,
    safe: thisWeek.filter((order) => order.promisedOn >= today && isSafe(order)).length,
  };
}

function batchDto({ code, part, dueOn, units }: BatchRow): TodayBatchDto {
  const next = units.find(({ verdict, stepsDone, stepsTotal }) => verdict === 'open' && stepsDone < stepsTotal);
  return { code, note: `${part}, due ${dueOn}`, units, current: next?.serial ?? null };
}

import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { addDays, isoDay, type IsoDay } from '@emberlot/shared/plan/iso-day';
import type { WorkingCalendar } from '@emberlot/shared/plan/working-calendar';
import type { Kysely } from 'kysely';
import { ShopRepository } from './shop.repository.js';
import { ShopService } from './shop.service.js';

/** Promises and plans do not reach further. */
const horizonDays = 730;

/** The days on which the shop works. */
@Injectable()
export class WorkingCalendarService {
  constructor(
    private readonly shop: ShopService,
    private readonly repository: ShopRepository,
  ) {}

  /** The calendar from a day on, two years ahead. */
  async from(handle: Kysely<DB>, day: IsoDay): Promise<WorkingCalendar> {
    const shop = await this.shop.get(handle);
    const closed = await this.repository.closedDays(handle, day, addDays(day, horizonDays));
    return { weekdays: shop.working_weekdays, closedDays: new Set(closed.map(isoDay)) };
  }
}

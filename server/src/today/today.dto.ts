import { ApiProperty } from '@nestjs/swagger';
import { MoneyDto } from '../platform/api/money.dto.js';

export class TodayActionDto {
  label: string;
  /** The address of the screen where it is done. */
  to: string;
}

export class TodayItemDto {
  key: string;
  due: string | null;
  late: boolean;
  /** Warns without anything being wrong yet. */
  signal: boolean;
  /** Names things in braces. */
  sentence: string;
  because: string | null;
  action: TodayActionDto | null;
}

export class TodayUnitDto {
  serial: string;
  stepsDone: number;
  stepsTotal: number;
  @ApiProperty({ enum: ['open', 'passed', 'failed', 'rework', 'scrapped'] })
  verdict: 'open' | 'passed' | 'failed' | 'rework' | 'scrapped';
}

export class TodayBatchDto {
  code: string;
  note: string;
  units: TodayUnitDto[];
  current: string | null;
}

export class TodayFigureDto {
  label: string;
  count: string | null;
  money: MoneyDto | null;
}

export class TodayPromisesDto {
  thisWeek: number;
  safe: number;
}

export class TodayDto {
  day: string;
  promises: TodayPromisesDto | null;
  queue: TodayItemDto[];
  batches: TodayBatchDto[];
  figures: TodayFigureDto[];
}

import { largestId } from '@emberlot/shared/limits/numbers';
import { inputRefused } from './validation-pipe.js';

/** @throws AppError `invalid_input` for anything but a plain positive whole number */
export function parseId(value: unknown, name: string): number {
  const id = typeof value === 'string' && /^[1-9]\d{0,15}$/.test(value) ? Number(value) : Number.NaN;
  if (id <= largestId) return id;
  throw inputRefused([{ pointer: `/${name}`, code: 'id', detail: 'This is not the number of anything.' }]);
}

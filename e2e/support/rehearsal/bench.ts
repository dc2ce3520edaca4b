import { randomUUID } from 'node:crypto';
import type { APIResponse } from '@playwright/test';
import type { components } from '../../../client/src/api/schema.js';
import { type Caller, bodyOf } from '../caller.js';

type Dto<Name extends keyof components['schemas']> = components['schemas'][Name];

export type Batch = Dto<'BatchDto'>;
export type Characteristic = Dto<'BatchCharacteristicDto'>;

/** The bin that finished units go to. */
const finishedBin = 'G1';

export async function planBatch(owner: Caller, part: string, quantity: number): Promise<Batch> {
  const dueOn = new Date(Date.now() + 7 * 86_400_000).toISOString().slice(0, 10);
  return (await bodyOf(await owner.create('/api/batches', { part, quantity, dueOn }))) as Batch;
}

export async function readBatch(bench: Caller, number: string): Promise<Batch> {
  return (await bodyOf(await bench.get(`/api/batches/${number}`))) as Batch;
}

export async function readPickList(bench: Caller, number: string): Promise<Dto<'PickListDto'>> {
  return (await bodyOf(await bench.get(`/api/batches/${number}/pick-list`))) as Dto<'PickListDto'>;
}

/** Takes what the list says, bin by bin. */
export async function pickAll(bench: Caller, number: string): Promise<void> {
  const { rows } = await readPickList(bench, number);
  const lines = rows.map(({ path, part, lot, bin, quantity }) => ({ path, part: part.code, lot, bin, quantity }));
  await bodyOf(await bench.create(`/api/batches/${number}/issues`, { lines }));
}

/** Begins building; the units get their serial numbers. */
export async function startBuilding(bench: Caller, number: string): Promise<readonly string[]> {
  const batch = (await bodyOf(await bench.post(`/api/batches/${number}/building`))) as Batch;
  return batch.units.map(({ serial }) => serial);
}

export async function tickAllSteps(bench: Caller, number: string, units: readonly string[]): Promise<void> {
  for (const { position } of (await readBatch(bench, number)).steps) {
    await bodyOf(await bench.put(`/api/batches/${number}/steps/${position}`, { done: true, units }));
  }
}

/** Within the limits, with the decimals of the plan. */
export function soundReading({ lowerLimit, target, upperLimit, digits }: Characteristic): string {
  const value = target ?? (upperLimit === null ? Number(lowerLimit) * 2 : Number(upperLimit) * 0.8);
  return Number(value).toFixed(digits ?? 0);
}

/** A tenth above the upper limit. */
export function tooHigh({ name, upperLimit, digits }: Characteristic): string {
  if (upperLimit === null) throw new Error(`${name} has no upper limit`);
  return (Number(upperLimit) * 1.1).toFixed(digits ?? 0);
}

/** Measures a unit against its plan; `instead` gives another reading for the names it holds. */
export async function measure(
  bench: Caller,
  serial: string,
  plan: readonly Characteristic[],
  { run = 1, instead = {} }: { run?: number; instead?: Readonly<Record<string, string>> } = {},
): Promise<Dto<'ReadingResultDto'>> {
  let result: Dto<'ReadingResultDto'> | undefined;
  for (const characteristic of plan) {
    const { position, kind, name } = characteristic;
    const answer = await bench.post(`/api/units/${serial}/readings`, {
      run,
      position,
      measuredAt: new Date().toISOString(),
      clientKey: randomUUID(),
      ...(kind === 'yes_no' ? { answer: true } : { reading: instead[name] ?? soundReading(characteristic) }),
    });
    result = (await bodyOf(answer)) as Dto<'ReadingResultDto'>;
  }
  if (!result) throw new Error('The test plan is empty');
  return result;
}

export async function rework(bench: Caller, number: string): Promise<void> {
  const fault = (await bodyOf(await bench.get(`/api/faults/${number}`))) as Dto<'FaultDto'>;
  await bodyOf(
    await bench.post(`/api/faults/${number}/rework`, {
      version: fault.version,
      cause: 'Clamp not tight',
      action: 'Tightened to 0.8 Nm',
      minutes: '6',
    }),
  );
}

export function finish(bench: Caller, serial: string): Promise<APIResponse> {
  return bench.create(`/api/units/${serial}/completion`, { bin: finishedBin });
}

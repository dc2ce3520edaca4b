import { describe, expect, it } from '@jest/globals';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { faultsOfAccess, owner, refusal, serve, show } from '../../app/testing';
import type { Batch, Characteristic, UnitRuns } from './api/bench';
import { frontOf, readingFault, readingsInHand, suggestionFor, verdictOf } from './components/build/in-hand';
import { Component as PickingPage } from './pages/picking-page';
import { Component as QueuePage } from './pages/queue-page';

const current: Characteristic = {
  position: 1,
  name: 'Pack current',
  kind: 'numeric',
  unit: 'A',
  lowerLimit: '1.9',
  target: null,
  upperLimit: '2.6',
  digits: 2,
  condition: null,
  caution: null,
};
const whole: Characteristic = {
  ...current,
  position: 2,
  name: 'Looks whole',
  kind: 'yes_no',
  unit: null,
  lowerLimit: null,
  upperLimit: null,
  digits: null,
};

const part = { code: 'WREN-60', name: 'Wren 60', measure: 'piece', traced: 'single' };
const batch: Batch = {
  id: 1,
  number: 'B-0001',
  part,
  revision: 1,
  quantity: 1,
  status: 'in_build',
  startOn: null,
  dueOn: '2026-12-10',
  late: false,
  finished: 0,
  scrapped: 0,
  linesShort: 0,
  next: { act: 'pick', sentence: 'Pick 2 lines.' },
  units: [{ serial: 'WR-2649-0001-61', stepsDone: 0, stepsTotal: 1, verdict: 'open', finished: false }],
  version: 1,
  note: null,
  createdAt: '2026-12-01T09:00:00Z',
  buildStartedAt: null,
  finishedAt: null,
  lines: [],
  subAssemblies: [],
  steps: [{ position: 1, part: 'WREN-60', title: 'Solder', instruction: '', minutes: '5', caution: null, doneOn: [] }],
  testPlan: [current, whole],
};
const serial = 'WR-2649-0001-61';
const noRuns: UnitRuns = { serial, nextRun: 1, runs: [] };
const at = (second: number) => new Date(Date.UTC(2026, 11, 1, 9, 0, second)).toISOString();
const typed = (position: number, reading: string, second: number) => ({
  run: 1,
  position,
  reading,
  measuredAt: at(second),
  clientKey: `${position} ${second}`,
});

describe('a unit at the bench', () => {
  it('brings the next step in front, then the next reading', () => {
    expect(frontOf(batch, serial, new Map())).toEqual({ kind: 'step', position: 1 });
    const built = { ...batch, steps: batch.steps.map((step) => ({ ...step, doneOn: [serial] })) };
    expect(frontOf(built, serial, new Map())).toEqual({ kind: 'reading', position: 1 });
    const shown = readingsInHand(batch.testPlan, noRuns, [typed(1, '2.27', 1)]);
    expect(frontOf(built, serial, shown)).toEqual({ kind: 'reading', position: 2 });
    const failed = { ...built, units: built.units.map((unit) => ({ ...unit, verdict: 'failed' as const })) };
    expect(frontOf(failed, serial, shown)).toEqual({ kind: 'fault' });
  });

  it('counts the reading that was measured last, whichever was typed last', () => {
    const shown = readingsInHand(batch.testPlan, noRuns, [typed(1, '2.71', 5), typed(1, '2.27', 1)]);
    expect(shown.get(1)).toMatchObject({ text: '2.71', verdict: 'outside' });
    const second = readingsInHand(batch.testPlan, { ...noRuns, nextRun: 2 }, [typed(1, '2.71', 5)]);
    expect(second.size).toBe(0);
  });

  it('judges what is typed, asks for every digit, and asks about slips', () => {
    expect(verdictOf(current, '2.60')).toBe('within');
    expect(verdictOf(current, '2.61')).toBe('outside');
    expect(verdictOf(whole, false)).toBe('outside');
    expect(readingFault(current, '2.6')).toContain('2');
    expect(readingFault(current, '2.60')).toBeUndefined();
    expect(suggestionFor(current, '2270.00')).toBe('2.27');
    expect(suggestionFor(current, '2.71')).toBeUndefined();
  });
});

describe('the bench', () => {
  it('opens on its queue, each batch with its next act', async () => {
    serve({
      'GET /api/session': () => ({ body: owner }),
      'GET /api/batches': () => ({ body: { items: [batch], total: 1 } }),
    });
    const { container } = show([{ path: '/bench', element: <QueuePage /> }], '/bench');
    expect(await screen.findByText(/Pick 2 lines/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Pick B-0001' })).toHaveAttribute('href', '/bench/batches/B-0001/picking');
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('takes a line of the pick list, and says why one is refused', async () => {
    const row = { path: '1', part, marks: null, bin: 'A-1', lot: 'L-0002', quantity: '12', standsInFor: null };
    const calls = serve({
      'GET /api/session': () => ({ body: owner }),
      'GET /api/batches/B-0001': () => ({ body: batch }),
      'GET /api/batches/B-0001/pick-list': () => ({
        body: { number: 'B-0001', rows: [row], shortages: [], picked: [] },
      }),
      'POST /api/batches/B-0001/issues': () => refusal(400, 'invalid_input', 'Lot L-0002 is held.'),
    });
    const { container } = show(
      [{ path: '/bench/batches/:number/picking', element: <PickingPage /> }],
      '/bench/batches/B-0001/picking',
    );
    await userEvent.click(await screen.findByRole('button', { name: 'Take 12 WREN-60, lot L-0002' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Lot L-0002 is held.');
    expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
      lines: [{ path: '1', part: 'WREN-60', lot: 'L-0002', bin: 'A-1', quantity: '12' }],
    });
    expect(await faultsOfAccess(container)).toEqual([]);
  });
});

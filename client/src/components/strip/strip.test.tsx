import { describe, expect, it, jest } from '@jest/globals';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { faultsOfAccess, show } from '../../app/testing';
import { Strip } from './strip';
import { cellSentence, stripSentence, type StripUnit } from './strip-words';

const unit = (serial: string, verdict: StripUnit['verdict'], stepsDone: number): StripUnit => ({
  serial,
  verdict,
  stepsDone,
  stepsTotal: 5,
});

const units = [
  unit('HR-36', 'passed', 5),
  unit('HR-39', 'failed', 5),
  unit('HR-40', 'rework', 4),
  unit('HR-41', 'open', 3),
  unit('HR-43', 'open', 0),
];

describe('a strip', () => {
  it('says in words what it shows', () => {
    expect(stripSentence('Batch B-117', units)).toBe(
      'Batch B-117: 5 units, 1 passed, 1 failed, 1 in rework, 1 under way, 1 not started',
    );
    expect(stripSentence('Batch B-1', [])).toBe('Batch B-1: 0 units');
    expect(units.map(cellSentence)).toEqual([
      'HR-36, passed',
      'HR-39, failed',
      'HR-40, in rework, 4 of 5 steps done',
      'HR-41, 3 of 5 steps done',
      'HR-43, not started',
    ]);
  });

  it('has a glyph for each verdict, so that colour is never alone', () => {
    show([{ path: '*', element: <Strip label="Batch B-117" units={units} /> }]);
    const cells = within(screen.getByRole('toolbar')).getAllByRole('button');
    expect(cells.map((cell) => cell.textContent)).toEqual(['✓', '✕', '↻', '', '']);
  });

  it('is filled from the bottom as steps are done', () => {
    const { container } = show([{ path: '*', element: <Strip label="Batch B-117" units={units} /> }]);
    const fills = [...container.querySelectorAll<HTMLElement>('button > i')].map(({ style }) => style.height);
    expect(fills).toEqual(['100%', '100%', '80%', '60%', '0%']);
  });

  it('is one stop of the tab key, walked with the arrows, and opens a unit with Enter', async () => {
    const onOpen = jest.fn();
    const { container } = show([
      { path: '*', element: <Strip label="Batch B-117" units={units} current="HR-41" onOpen={onOpen} /> },
    ]);
    await userEvent.tab();
    expect(document.activeElement).toHaveAccessibleName('HR-41, 3 of 5 steps done');
    expect(document.activeElement).toHaveAttribute('aria-current', 'true');
    await userEvent.keyboard('{ArrowLeft}{ArrowLeft}');
    expect(document.activeElement).toHaveAccessibleName('HR-39, failed');
    await userEvent.keyboard('{End}{ArrowRight}{Enter}');
    expect(onOpen).toHaveBeenCalledWith('HR-43');
    await userEvent.tab();
    expect(document.activeElement).toBe(document.body);
    expect(await faultsOfAccess(container)).toEqual([]);
  });
});

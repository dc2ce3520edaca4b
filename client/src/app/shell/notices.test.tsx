import { describe, expect, it } from '@jest/globals';
import { act, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { notify } from '../../lib/notify';
import { faultsOfAccess, show } from '../testing';
import { Notices } from './notices';

const say = (...said: Parameters<typeof notify>) => act(() => notify(...said));

describe('a notice', () => {
  it('is read out, and closed by hand', async () => {
    const { container } = show([{ path: '*', element: <Notices /> }]);
    say('The part is kept.');
    expect(within(screen.getByRole('log', { name: 'Notices' })).getByText('The part is kept.')).toBeVisible();
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(screen.getByRole('button', { name: 'Close this message' }));
    expect(screen.queryByText('The part is kept.')).not.toBeInTheDocument();
  });

  it('offers to undo once', async () => {
    let undone = 0;
    show([{ path: '*', element: <Notices /> }]);
    say('Three lots are moved.', { action: { label: 'Undo', run: () => (undone += 1) } });
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(undone).toBe(1);
    expect(screen.queryByRole('button', { name: 'Undo' })).not.toBeInTheDocument();
  });

  it('stands with the two before it at most, and never twice', () => {
    show([{ path: '*', element: <Notices /> }]);
    for (const text of ['One.', 'Two.', 'Two.', 'Three.', 'Four.']) say(text);
    const shown = screen.getAllByRole('button').length;
    expect(shown).toBe(3);
    expect(screen.queryByText('One.')).not.toBeInTheDocument();
    expect(screen.getAllByText('Two.')).toHaveLength(1);
  });
});

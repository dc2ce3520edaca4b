import { afterEach, describe, expect, it } from '@jest/globals';
import { useMutation, useQuery } from '@tanstack/react-query';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState, type ReactElement } from 'react';
import { onNotice } from '../lib/notify';
import { ApiProblem } from '../lib/problem';
import { queryClient } from './query-client';
import { show } from './testing';

afterEach(() => queryClient.clear());

describe('a change', () => {
  it('is done only when what it touches has been fetched again', async () => {
    let stock = 5;
    function Shelf(): ReactElement {
      const onHand = useQuery({ queryKey: ['stock', 'CLAMP-N2'], queryFn: () => Promise.resolve(stock) });
      const take = useMutation({ mutationFn: () => Promise.resolve((stock -= 1)), meta: { touches: [['stock']] } });
      const [seen, setSeen] = useState<number>();
      const press = async (): Promise<void> => {
        await take.mutateAsync();
        setSeen(queryClient.getQueryData(['stock', 'CLAMP-N2']));
      };
      return (
        <>
          <button onClick={() => void press()}>Take one</button>
          <p>{onHand.data} on the shelf</p>
          <p>{seen} seen afterwards</p>
        </>
      );
    }
    show([{ path: '*', element: <Shelf /> }], '/', queryClient);
    await screen.findByText('5 on the shelf');
    await userEvent.click(screen.getByRole('button'));
    expect(await screen.findByText('4 seen afterwards')).toBeVisible();
    expect(screen.getByText('4 on the shelf')).toBeVisible();
  });

  it.each([
    [false, ['The period is closed.']],
    [true, []],
  ])('that is refused is read out, unless its screen shows it (%s)', async (showsRefusal, expected) => {
    const said: string[] = [];
    const stop = onNotice(({ text }) => said.push(text));
    const problem = new ApiProblem(422, { code: 'rule_broken', detail: 'The period is closed.', errors: [] });
    function Act(): ReactElement {
      const act = useMutation({ mutationFn: () => Promise.reject(problem), meta: { showsRefusal } });
      return (
        <>
          <button onClick={() => act.mutate()}>Act</button>
          <p>{act.isError ? 'refused' : null}</p>
        </>
      );
    }
    show([{ path: '*', element: <Act /> }], '/', queryClient);
    await userEvent.click(screen.getByRole('button'));
    await screen.findByText('refused');
    expect(said).toEqual(expected);
    stop();
  });
});

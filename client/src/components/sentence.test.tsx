import { describe, expect, it } from '@jest/globals';
import { screen } from '@testing-library/react';
import { show } from '../app/testing';
import { piecesOf, Sentence } from './sentence';

describe('a sentence of the server', () => {
  it('is taken apart into words, tags and names', () => {
    expect(piecesOf('{order:O-2648-031} can’t leave: the last {name:Heron 140} failed.')).toEqual([
      { kind: 'order', code: 'O-2648-031' },
      { text: ' can’t leave: the last ' },
      { name: 'Heron 140' },
      { text: ' failed.' },
    ]);
  });

  it('keeps what names nothing we know as plain text', () => {
    expect(piecesOf('a {thing:X} and {order:} stay')).toEqual([
      { text: 'a ' },
      { text: '{thing:X}' },
      { text: ' and {order:} stay' },
    ]);
  });

  it('shows tags as links and never as markup', () => {
    show([{ path: '*', element: <Sentence text="<b>{lot:L-4471}</b> waits" /> }]);
    expect(screen.getByRole('link', { name: 'Lot L-4471' })).toBeVisible();
    expect(screen.getByText(/<b>/)).toBeVisible();
  });
});

import { describe, expect, it } from '@jest/globals';
import { listQuery, readListState, writeListState } from './list-state';

const settings = { filterFields: ['bin', 'short'], defaultSort: 'code', defaultPageSize: 25 };
const read = (search: string) => readListState(new URLSearchParams(search), settings);

describe('a list in the address bar', () => {
  it('is usual when the address says nothing', () => {
    expect(read('')).toEqual({ q: '', filters: {}, sort: 'code', page: 1, pageSize: 25 });
  });

  it('is read whole', () => {
    expect(read('q=clamp&bin=A-12&short=true&sort=-name&page=3&rows=100')).toEqual({
      q: 'clamp',
      filters: { bin: 'A-12', short: 'true' },
      sort: '-name',
      page: 3,
      pageSize: 100,
    });
  });

  it.each(['page=0', 'page=-1', 'page=x', 'page=1e9', 'rows=7', 'page=99999999999'])('overlooks %s', (search) => {
    expect(read(search)).toEqual(read(''));
  });

  it('is written without what is usual, and leaves what is not its own', () => {
    const state = { q: '', filters: { bin: 'B-1' }, sort: 'code', page: 1, pageSize: 25 };
    const next = writeListState(new URLSearchParams('tab=lots&q=old&page=4'), state, settings);
    expect(next.toString()).toBe('tab=lots&bin=B-1');
  });

  it('comes back from what was written', () => {
    const state = { q: 'ä b', filters: { short: 'true' }, sort: '-onHand', page: 2, pageSize: 50 };
    expect(readListState(writeListState(new URLSearchParams(), state, settings), settings)).toEqual(state);
  });

  it('asks the server by the names every list knows', () => {
    expect(listQuery(read('q=x&bin=A&page=2'))).toEqual({ bin: 'A', q: 'x', sort: 'code', page: 2, pageSize: 25 });
  });
});

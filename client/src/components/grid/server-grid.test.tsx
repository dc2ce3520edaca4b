import { beforeEach, describe, expect, it, jest } from '@jest/globals';
import { queryOptions } from '@tanstack/react-query';
import { act, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { faultsOfAccess, show } from '../../app/testing';
import type { ListState } from '../../lib/list-state';
import { ApiProblem } from '../../lib/problem';
import { EmptyState } from '../states';
import { column, quantityColumn, tagColumn } from './columns';
import { ServerGrid } from './server-grid';
import { useServerGrid, type GridFilter, type ListAnswer } from './use-server-grid';

interface Row {
  id: number;
  code: string;
  name: string;
  onHand: string;
}

const rows: Row[] = [
  { id: 1, code: 'CLAMP-N2', name: 'Clamp pair', onHand: '81' },
  { id: 2, code: 'CU-WIRE-15', name: 'Copper wire', onHand: '41.2' },
];

const filters: readonly GridFilter[] = [
  { field: 'bin', label: 'Bin', options: [{ value: 'A-12', label: 'A-12' }] },
  { field: 'short', label: 'Runs short' },
];

const columns = [
  tagColumn<Row>('code', 'Part', 'part', (row) => ({ code: row.code })),
  column<Row>('name', 'What it is', (row) => row.name),
  quantityColumn<Row>('onHand', 'On the shelf', (row) => ({ value: row.onHand })),
];

type Fetch = (state: ListState) => Promise<ListAnswer<Row>>;

function Parts({ fetch }: { fetch: Fetch }): ReactElement {
  const grid = useServerGrid({
    name: 'parts-test',
    query: (state) => queryOptions({ queryKey: ['parts', state], queryFn: () => fetch(state), retry: false }),
    filters,
    defaultSort: 'code',
  });
  return (
    <ServerGrid
      grid={grid}
      columns={columns}
      rowId={(row) => row.id}
      rowHref={(row) => `/shelf/parts/${row.code}`}
      label="Parts"
      counted={['part', 'parts']}
      exportPath="/api/parts/export.csv"
      empty={<EmptyState title="No parts yet">Import them, or add the first.</EmptyState>}
    />
  );
}

const draw = (fetch: Fetch, at = '/') =>
  show(
    [
      { path: '/', element: <Parts fetch={fetch} /> },
      {
        path: '/shelf/parts/:code',
        element: (
          <>
            <h1>A part</h1>
            <Link to="/">back</Link>
          </>
        ),
      },
    ],
    at,
  );

const all: Fetch = () => Promise.resolve({ items: rows, total: 124 });

beforeEach(() => localStorage.clear());

describe('a list', () => {
  it('shows its rows, their count and the export of what is shown', async () => {
    const { container } = draw(all, '/?q=c&bin=A-12&page=2');
    expect(await screen.findByRole('link', { name: 'Part CLAMP-N2' })).toBeInTheDocument();
    expect(screen.getByText('124 parts')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Export these' })).toHaveAttribute(
      'href',
      '/api/parts/export.csv?bin=A-12&q=c&sort=code',
    );
    expect(screen.getByText('26 to 50 of 124')).toBeVisible();
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('asks for the next page and keeps the count meanwhile', async () => {
    let release: () => void = () => undefined;
    const fetch = jest.fn<Fetch>((state) =>
      state.page === 1 ? all(state) : new Promise((resolve) => (release = () => resolve({ items: rows, total: 124 }))),
    );
    const { router } = draw(fetch);
    await screen.findByText('Clamp pair');
    await userEvent.click(screen.getByRole('button', { name: 'Further' }));
    expect(router.state.location.search).toBe('?page=2');
    expect(screen.getByText('124 parts')).toBeVisible();
    release();
    await waitFor(() => expect(fetch).toHaveBeenLastCalledWith(expect.objectContaining({ page: 2 })));
  });

  it('is sorted by the server, and says so in the address', async () => {
    const fetch = jest.fn<Fetch>(all);
    const { router } = draw(fetch);
    await screen.findByText('Clamp pair');
    await userEvent.click(screen.getByRole('columnheader', { name: 'What it is' }));
    await waitFor(() => expect(fetch).toHaveBeenLastCalledWith(expect.objectContaining({ sort: 'name' })));
    expect(router.state.location.search).toBe('?sort=name');
  });

  it('takes several filters at once, each shown as a chip, and begins again at its first page', async () => {
    const fetch = jest.fn<Fetch>(all);
    const { router } = draw(fetch, '/?page=3');
    await screen.findByText('Clamp pair');
    await userEvent.click(screen.getByRole('button', { name: 'Runs short' }));
    await userEvent.click(screen.getByRole('button', { name: 'Bin: any' }));
    await userEvent.click(await screen.findByRole('menuitem', { name: 'A-12' }));
    expect(router.state.location.search).toBe('?short=true&bin=A-12');
    expect(await screen.findByRole('button', { name: 'Bin: A-12' })).toBeVisible();
    expect(screen.getByRole('button', { name: /Runs short/ })).toHaveAttribute('aria-pressed', 'true');
    await userEvent.click(screen.getByRole('button', { name: 'Clear all' }));
    expect(router.state.location.search).toBe('');
  });

  it('waits for a pause in the typing before it searches', async () => {
    const fetch = jest.fn<Fetch>(all);
    const { router } = draw(fetch);
    await screen.findByText('Clamp pair');
    await userEvent.type(screen.getByRole('searchbox', { name: 'Search this list' }), 'clamp');
    await waitFor(() => expect(router.state.location.search).toBe('?q=clamp'));
    await waitFor(() => expect(fetch.mock.calls.map(([state]) => state.q)).toEqual(['', 'clamp']));
  });

  it('opens a row at its own address, and the way back keeps filter and page', async () => {
    const { router } = draw(all, '/?bin=A-12&page=2');
    await userEvent.click(await screen.findByText('Clamp pair'));
    expect(await screen.findByRole('heading', { name: 'A part' })).toBeVisible();
    expect(router.state.location.pathname).toBe('/shelf/parts/CLAMP-N2');
    await act(() => router.navigate(-1));
    expect(router.state.location.search).toBe('?bin=A-12&page=2');
    expect(await screen.findByRole('button', { name: 'Bin: A-12' })).toBeVisible();
  });

  it('remembers which columns are shown', async () => {
    const first = draw(all);
    await screen.findByText('Clamp pair');
    await userEvent.click(screen.getByRole('button', { name: 'Columns' }));
    const dialog = await screen.findByRole('dialog', { name: 'Columns to show' });
    expect(within(dialog).queryByRole('checkbox', { name: 'Part' })).not.toBeInTheDocument();
    await userEvent.click(within(dialog).getByRole('checkbox', { name: 'What it is' }));
    first.unmount();
    draw(all);
    await screen.findByRole('link', { name: 'Part CLAMP-N2' });
    expect(screen.queryByRole('columnheader', { name: 'What it is' })).not.toBeInTheDocument();
  });
});

describe('a list that shows nothing', () => {
  it('says what to do first where there is nothing yet', async () => {
    draw(() => Promise.resolve({ items: [], total: 0 }));
    expect(await screen.findByText('No parts yet')).toBeVisible();
    expect(screen.getByText('Import them, or add the first.')).toBeVisible();
  });

  it('offers to show all again where nothing matches', async () => {
    const fetch = jest.fn<Fetch>((state) => (state.q ? Promise.resolve({ items: [], total: 0 }) : all(state)));
    draw(fetch, '/?q=nothing');
    await userEvent.click(await screen.findByRole('button', { name: 'Show all again' }));
    expect(await screen.findByText('Clamp pair')).toBeVisible();
  });

  it('says what went wrong and tries again when asked', async () => {
    const fetch = jest
      .fn<Fetch>()
      .mockRejectedValueOnce(
        new ApiProblem(503, { code: 'service_unavailable', detail: 'The database rests.', errors: [] }),
      )
      .mockImplementation(all);
    draw(fetch);
    expect(await screen.findByText('The database rests.')).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Clamp pair')).toBeVisible();
  });
});

describe('a list on a phone', () => {
  it('stands as lines with the facts under each other', async () => {
    window.matchMedia = jest.fn(
      (query: string) =>
        ({
          matches: query.includes('max-width'),
          media: query,
          addEventListener: () => undefined,
          removeEventListener: () => undefined,
          addListener: () => undefined,
          removeListener: () => undefined,
        }) as unknown as MediaQueryList,
    );
    try {
      const { container } = draw(all);
      const list = await screen.findByRole('list', { name: 'Parts' });
      const [line] = within(list).getAllByRole('listitem');
      expect(line).toHaveTextContent('CLAMP-N2What it isClamp pairOn the shelf81');
      expect(await faultsOfAccess(container)).toEqual([]);
    } finally {
      Reflect.deleteProperty(window, 'matchMedia');
    }
  });
});

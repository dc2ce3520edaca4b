import { beforeEach, describe, expect, it } from '@jest/globals';
import { act, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { request } from '../api/request';
import type { Session } from '../api/session';
import { areas } from './areas';
import { queryClient } from './query-client';
import { routes } from './routes';
import { faultsOfAccess, owner, refusal, serve, show } from './testing';

const emptyToday = { day: '2026-12-01', promises: null, queue: [], batches: [], figures: [] };

function as(role: 'owner' | 'assembler' | 'accountant' | 'customer' | null): Session {
  return { ...owner, person: role && owner.person ? { ...owner.person, role } : null };
}

const answers = (session: Session) => ({
  'GET /api/session': () => ({ body: session }),
  'GET /api/today': () => ({ body: emptyToday }),
  'GET /api/staff': () => ({ body: { items: [], total: 0 } }),
  'GET /api/audit-entries': () => ({ body: { items: [], total: 0 } }),
});

const at = (address: string) => show(routes, address, queryClient);

beforeEach(() => {
  queryClient.clear();
  sessionStorage.clear();
});

describe('who may enter which area', () => {
  // The table of roles and areas of the product, written out again here.
  it.each([
    ['Today', ['owner', 'assembler', 'accountant']],
    ['Shelf', ['owner', 'assembler', 'accountant']],
    ['Designs', ['owner', 'assembler']],
    ['Ahead', ['owner', 'assembler', 'accountant']],
    ['Bench', ['owner', 'assembler']],
    ['Counter', ['owner', 'assembler', 'accountant']],
    ['Books', ['owner', 'accountant']],
    ['Set-up', ['owner', 'accountant']],
  ])('%s is open to %s', (label, roles) => {
    expect(areas.find((area) => area.label === label)?.roles).toEqual(roles);
  });

  it('sends a visitor to sign in, and knows the way back', async () => {
    serve(answers(as(null)));
    const { router } = at('/setup/audit?page=2');
    expect(await screen.findByRole('heading', { name: 'Sign in', level: 1 })).toBeVisible();
    expect(router.state.location.pathname + router.state.location.search).toBe(
      '/sign-in?to=%2Fsetup%2Faudit%3Fpage%3D2',
    );
  });

  it('sends everybody to the first owner’s page while there is none', async () => {
    serve(answers({ ...as(null), needsOwner: true }));
    at('/today');
    expect(await screen.findByRole('heading', { name: 'Begin here' })).toBeVisible();
  });

  it('tells a customer that Today is not theirs', async () => {
    serve(answers(as('customer')));
    at('/today');
    expect(await screen.findByRole('heading', { name: 'This is not open to you' })).toBeVisible();
    expect(screen.queryByRole('navigation', { name: 'Areas' })).not.toBeInTheDocument();
  });

  it('tells an assembler that Set-up is not theirs, and leaves the shell standing', async () => {
    serve(answers(as('assembler')));
    at('/setup/audit');
    expect(await screen.findByRole('heading', { name: 'This is not open to you' })).toBeVisible();
    expect(
      within(screen.getByRole('navigation', { name: 'Areas' })).queryByRole('link', { name: 'Set-up' }),
    ).not.toBeInTheDocument();
  });

  it('shows the accountant the audit but not the people', async () => {
    serve(answers(as('accountant')));
    at('/setup/audit');
    expect(await screen.findByRole('heading', { name: 'Audit', level: 1 })).toBeVisible();
    const lists = screen.getByRole('navigation', { name: 'In Set-up' });
    expect(
      within(lists)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual(['Audit']);
  });

  it('says so where there is nothing at an address', async () => {
    serve(answers(as('owner')));
    at('/setup/nothing-here');
    expect(await screen.findByRole('heading', { name: 'There is nothing at this address' })).toBeVisible();
  });
});

describe('the staff shell', () => {
  it('has landmarks, a skip link, one h1, and the page’s name in the tab', async () => {
    serve(answers(as('owner')));
    const { container } = at('/today');
    expect(await screen.findByRole('heading', { level: 1, name: 'Nothing needs you just now' })).toBeVisible();
    expect(screen.getAllByRole('heading', { level: 1 })).toHaveLength(1);
    expect(screen.getByRole('banner')).toBeVisible();
    expect(screen.getByRole('main')).toHaveAttribute('id', 'content');
    expect(screen.getByRole('link', { name: 'Skip to the content' })).toHaveAttribute('href', '#content');
    expect(
      within(screen.getByRole('navigation', { name: 'Areas' })).getByRole('link', { name: 'Today' }),
    ).toHaveAttribute('aria-current', 'page');
    expect(document.title).toBe('Today, Emberlot');
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('goes to a thing by its letters, with the keyboard alone, and remembers it', async () => {
    serve({
      ...answers(as('owner')),
      'GET /api/find': ({ url }) => ({
        body: {
          items: [{ kind: 'lot', code: 'L-4471', story: '18650 cells' }].filter(({ code }) =>
            code.includes(url.searchParams.get('q') ?? ''),
          ),
        },
      }),
    });
    const { router } = at('/today');
    await screen.findByRole('heading', { level: 1 });
    await userEvent.keyboard('/');
    const field = screen.getByRole('combobox', { name: 'Find, or scan anything' });
    expect(field).toHaveFocus();
    await userEvent.keyboard('L-44');
    expect(await screen.findByRole('option', { name: /L-4471/ })).toHaveAttribute('aria-selected', 'true');
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/shelf/lots/L-4471'));
    await userEvent.keyboard('/');
    expect(await screen.findByRole('option', { name: /L-4471/ })).toBeVisible();
  });

  it('goes to a page by the beginning of its name', async () => {
    serve({ ...answers(as('owner')), 'GET /api/find': () => ({ body: { items: [] } }) });
    const { router } = at('/today');
    await screen.findByRole('heading', { level: 1 });
    await userEvent.keyboard('/peo');
    await screen.findByRole('option', { name: /People/ });
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/setup/people'));
  });

  it('goes to what is scanned anywhere on the page', async () => {
    serve({
      ...answers(as('owner')),
      'GET /api/find': () => ({ body: { items: [{ kind: 'unit', code: 'WR-2648-0093-41' }] } }),
    });
    const { router } = at('/today');
    await screen.findByRole('heading', { level: 1 });
    scan('WR-2648-0093-41');
    await waitFor(() => expect(router.state.location.pathname).toBe('/bench/units/WR-2648-0093-41'));
  });
});

/** Keys as fast as a scanner's. */
function scan(code: string): void {
  act(() => {
    for (const key of [...Array.from(code), 'Enter']) {
      (document.activeElement ?? document.body).dispatchEvent(
        new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }),
      );
    }
  });
}

describe('signing in', () => {
  const entry = {
    ...answers(as(null)),
    'POST /api/session': ({ body }: { body: unknown }) =>
      (body as { password: string }).password === 'right'
        ? { body: { ...as('accountant'), csrfToken: 'token-2' } }
        : refusal(401, 'wrong_credentials', 'Address and password do not belong together.'),
  };

  it('says what is wrong, keeps the address, and leads back to where one wanted to go', async () => {
    const calls = serve(entry);
    const { router, container } = at('/sign-in?to=%2Fsetup%2Faudit%3Fpage%3D1');
    await userEvent.type(await screen.findByRole('textbox', { name: /E-mail/ }), 'accountant@fernhollow.example');
    await userEvent.type(screen.getByLabelText('Password'), 'wrong');
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('Address and password do not belong together.')).toBeVisible();
    expect(screen.getByRole('textbox', { name: /E-mail/ })).toHaveValue('accountant@fernhollow.example');
    await userEvent.clear(screen.getByLabelText('Password'));
    await userEvent.type(screen.getByLabelText('Password'), 'right{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/setup/audit'));
    await request('GET', '/api/audit-entries');
    expect(calls.filter(({ route }) => route === 'POST /api/session')).toHaveLength(2);
  });

  it('never leads to another site', async () => {
    serve(entry);
    const { router } = at('/sign-in?to=%2F%2Fevil.example%2Ftoday');
    await userEvent.type(await screen.findByRole('textbox', { name: /E-mail/ }), 'a@fernhollow.example');
    await userEvent.type(screen.getByLabelText('Password'), 'right{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/today'));
  });
});

describe('a session that ends while a form is filled in', () => {
  it('asks to sign in again over the page and then sends what was typed', async () => {
    let signedIn = true;
    let invited: unknown;
    serve({
      ...answers(as('owner')),
      'POST /api/session': () => {
        signedIn = true;
        return { body: { ...as('owner'), csrfToken: 'token-2' } };
      },
      'POST /api/invitations': ({ body, headers }) => {
        if (!signedIn) return refusal(401, 'not_signed_in', 'Please sign in.');
        invited = { body, token: headers.get('x-csrf-token') };
        return { status: 201, body: { id: 9, ...(body as object), status: 'invited', version: 1 } };
      },
    });
    const { router } = at('/setup/people/invite');
    await userEvent.type(await screen.findByRole('textbox', { name: 'Name' }), 'Second assembler');
    await userEvent.type(screen.getByRole('textbox', { name: 'E-mail address' }), 'bench2@fernhollow.example');
    signedIn = false;
    await userEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    const dialog = await screen.findByRole('dialog', { name: 'Please sign in again' });
    expect(within(dialog).getByRole('textbox', { name: /E-mail/ })).toHaveValue('owner@fernhollow.example');
    await userEvent.type(within(dialog).getByLabelText('Password'), 'right{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/setup/people'));
    expect(invited).toEqual({
      body: { name: 'Second assembler', email: 'bench2@fernhollow.example', role: 'assembler' },
      token: 'token-2',
    });
  });
});

import { describe, expect, it, jest } from '@jest/globals';
import { act, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import jsQR from 'jsqr';
import { faultsOfAccess, show } from '../../app/testing';
import { onNotice, type Notice } from '../../lib/notify';
import { PrintedLabel, qrPath } from './printed-label';
import { Tag } from './tag';
import { outlinedKinds, tagEdges, type TagKind } from './tag-kinds';

const at = (element: React.ReactElement) => show([{ path: '*', element }]);

describe('a tag', () => {
  it.each<[TagKind, string, string]>([
    ['part', 'CLAMP-N2', '/shelf/parts/CLAMP-N2'],
    ['lot', 'L-4471', '/shelf/lots/L-4471'],
    ['unit', 'WR-2648-0093-41', '/bench/units/WR-2648-0093-41'],
    ['batch', 'B-118', '/bench/batches/B-118'],
    ['order', 'O-2648-031', '/counter/orders/O-2648-031'],
    ['invoice', '2026/0412', '/books/invoices/2026%2F0412'],
    ['bin', 'A 12', '/shelf/bins/A%2012'],
  ])('of a %s leads to it', (kind, code, address) => {
    at(<Tag kind={kind} code={code} />);
    expect(screen.getByRole('link', { name: new RegExp(`^${kind} ${code}$`, 'i') })).toHaveAttribute('href', address);
  });

  it('draws another left edge for each kind', () => {
    expect(new Set(outlinedKinds.map((kind) => tagEdges[kind])).size).toBe(outlinedKinds.length);
  });

  it('shows its story on focus and puts it away with Escape', async () => {
    const { container } = at(<Tag kind="lot" code="L-4471" story="18650 cells, held for inspection" />);
    await userEvent.tab();
    expect(screen.getByRole('link')).toHaveAccessibleDescription('18650 cells, held for inspection');
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('tooltip')).not.toBeInTheDocument();
  });

  it('shows its story under the pointer', async () => {
    at(<Tag kind="lot" code="L-4471" story="18650 cells" />);
    await userEvent.hover(screen.getByRole('link'));
    expect(screen.getByRole('tooltip')).toHaveTextContent('18650 cells');
  });

  it('is copied by the keyboard, and says so', async () => {
    const user = userEvent.setup();
    const said: Notice[] = [];
    const stop = onNotice((notice) => said.push(notice));
    at(<Tag kind="lot" code="L-4471" />);
    await user.tab();
    await user.keyboard('{Control>}c{/Control}');
    expect(await navigator.clipboard.readText()).toBe('L-4471');
    expect(said.map(({ text }) => text)).toEqual(['L-4471 is copied.']);
    stop();
  });

  it('leads nowhere on a public page', () => {
    at(<Tag kind="unit" code="WR-2648-0093-41" to={null} />);
    expect(screen.queryByRole('link')).not.toBeInTheDocument();
    expect(screen.getByText('WR-2648-0093-41')).toBeVisible();
  });
});

describe('a printed label', () => {
  it('has the outline of the tag on the screen', () => {
    const { container } = at(<PrintedLabel kind="unit" code="WR-2648-0093-41" story="Wren 60, built in week 48" />);
    expect(container.querySelector(`path[d="${tagEdges.unit}"]`)).not.toBeNull();
    expect(screen.getByText('WR-2648-0093-41')).toBeInTheDocument();
    expect(screen.getByText('Wren 60, built in week 48')).toBeInTheDocument();
  });

  // ISO/IEC 18004:2024 (QR code), read back by an independent reader.
  it.each(['L-4471', 'WR-2648-0093-41', 'CELL-18-25', 'O-2648-031 ä'])('can be scanned: %s', (code) => {
    const { path, size } = qrPath(code);
    const quiet = 4;
    const scale = 4;
    const side = (size + 2 * quiet) * scale;
    const pixels = new Uint8ClampedArray(side * side * 4).fill(255);
    for (const [, column, row] of path.matchAll(/M(\d+) (\d+)h1v1h-1z/g)) {
      for (let y = 0; y < scale; y += 1) {
        for (let x = 0; x < scale; x += 1) {
          const place = (((Number(row) + quiet) * scale + y) * side + (Number(column) + quiet) * scale + x) * 4;
          pixels.fill(0, place, place + 3);
        }
      }
    }
    // Loaded as a CommonJS module, the function stands one step deeper than its types say.
    const decode = (jsQR as unknown as { default: typeof jsQR }).default;
    expect(decode(pixels, side, side)?.data).toBe(code);
  });

  it('prints through the browser and leaves the page as it was', async () => {
    window.print = jest.fn(() => {
      expect(document.body.dataset.printing).toBe('label');
      window.dispatchEvent(new Event('afterprint'));
    });
    const { printLabel } = await import('./print-label');
    act(() => printLabel({ kind: 'lot', code: 'L-4471' }));
    expect(window.print).toHaveBeenCalledTimes(1);
    expect(document.querySelector('[data-print-label]')).toBeNull();
    expect(document.body.dataset.printing).toBeUndefined();
  });
});

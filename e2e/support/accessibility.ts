import { AxeBuilder } from '@axe-core/playwright';
import { type Page, expect } from '@playwright/test';

/** Asserts that axe finds nothing on the page as it stands, with all its rules. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const found = violations.flatMap((violation) =>
    violation.nodes.map((node) => `${violation.id}: ${violation.help}\n  ${node.target.join(' ')}\n  ${node.html}`),
  );
  expect(found, `axe on ${page.url()}`).toEqual([]);
}

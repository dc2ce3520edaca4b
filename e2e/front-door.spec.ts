import { expectAccessible } from './support/accessibility.js';
import { expect, test } from './support/fixtures.js';

test('the front page opens, and axe finds nothing on it', async ({ page }) => {
  const answer = await page.goto('/');
  expect(answer?.status()).toBe(200);
  await expect(page.getByRole('main')).toBeVisible();
  await expectAccessible(page);
});

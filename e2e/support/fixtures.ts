import { test as base, expect } from '@playwright/test';
import { type Product, startProduct } from './product.js';

/**
 * The test function of all browser tests. Each file has a product of its own (server, database, stand-ins), started
 * when its first test asks for a page; faults of the page's own scripts fail the test that met them.
 */
export const test = base.extend<{ pageFaults: string[] }, { product: Product }>({
  product: [
    async ({}, use) => {
      const product = await startProduct();
      await use(product);
      await product.stop();
    },
    { scope: 'worker', timeout: 120_000 },
  ],
  baseURL: async ({ product }, use) => {
    await use(product.url);
  },
  pageFaults: [
    async ({ context, product }, use, testInfo) => {
      const faults: string[] = [];
      context.on('weberror', (fault) => faults.push(fault.error().stack ?? fault.error().message));
      context.on('console', (message) => {
        if (/Content Security Policy/i.test(message.text())) faults.push(message.text());
      });
      await use(faults);
      if (testInfo.status !== testInfo.expectedStatus) {
        await testInfo.attach('server.log', { body: product.serverLog(), contentType: 'text/plain' });
      }
      expect(faults, 'faults of the page itself').toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };

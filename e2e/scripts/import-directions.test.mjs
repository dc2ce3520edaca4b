import { describe, expect, test } from '@jest/globals';
import { importFault } from './import-directions.mjs';

describe('an import that flows the right way', () => {
  test.each([
    ['shared/src/bill/explode.ts', '../money/round.js'],
    ['shared/src/bill/explode.ts', 'decimal.js'],
    ['shared/src/bill/explode.test.ts', 'fast-check'],
    ['db/src/database.ts', '@emberlot/shared/errors/codes'],
    ['server/src/main.ts', './demo/load.js'],
    ['server/src/orders/orders.service.ts', '../stock/stock.service.js'],
    ['server/src/orders/orders.service.ts', '../payments/payments.service.js'],
    ['server/src/orders/orders.service.ts', './orders.repository.js'],
    ['server/src/orders/lines/lines.service.ts', '../orders.repository.js'],
    ['server/src/payments/payments.spec.ts', '@emberlot/fakes/payments/server'],
    ['server/src/stock/stock.spec.ts', '../app.module.js'],
    ['client/src/app/routes.tsx', '../features/shelf/pages/parts-page.js'],
    ['client/src/features/shelf/pages/parts-page.tsx', '../components/lot-row'],
    ['client/src/features/shelf/pages/parts-page.tsx', '../../bench/links'],
    ['client/src/components/tag.tsx', '../lib/format-money'],
    ['e2e/rehearsal.spec.ts', '@emberlot/fakes/payments/server'],
    ['server/scripts/start.mjs', '../../db/scripts/cluster.mjs'],
  ])('%s may import %s', (from, specifier) => {
    expect(importFault(from, specifier)).toBeUndefined();
  });
});

describe('an import against the direction', () => {
  test.each([
    ['shared/src/bill/explode.ts', 'node:fs', /knows no machine/],
    ['shared/src/bill/explode.ts', '@emberlot/db/database', /shared must not import db/],
    ['shared/src/bill/explode.test.ts', '../../../db/src/database.js', /shared must not import db/],
    ['db/src/database.ts', '@emberlot/server/main', /db must not import server/],
    ['client/src/lib/api.ts', '@emberlot/db/database.types', /client must not import db/],
    ['client/src/lib/api.ts', '../../../server/src/parts/parts.dto', /client must not import server/],
    ['fakes/src/main.ts', '@emberlot/shared/money/round', /fakes must not import shared/],
    ['server/src/payments/payments.service.ts', '@emberlot/fakes/payments/server', /server must not import fakes/],
    ['server/src/stock/stock.service.ts', '../orders/orders.service.js', /stock must not import orders/],
    ['server/src/platform/jobs/jobs.ts', '../../people/people.service.js', /platform must not import people/],
    ['server/src/orders/orders.service.ts', '../stock/stock.repository.js', /not its repository/],
    ['server/src/orders/orders.service.ts', '../app.module.js', /puts the application together/],
    ['server/src/reports/reports.service.ts', '../stock/stock.service.js', /stands in no row/],
    ['client/src/components/tag.tsx', '../features/shelf/links', /components must not import features/],
    ['client/src/lib/format.ts', '../components/tag', /lib must not import components/],
    ['client/src/features/shelf/pages/parts-page.tsx', '../../../app/theme', /features must not import app/],
    ['client/src/features/shelf/pages/parts-page.tsx', '../../bench/pages/unit-page', /insides of bench/],
    ['client/src/helpers/any.ts', '../lib/format', /none of the client's layers/],
  ])('%s may not import %s', (from, specifier, fault) => {
    expect(importFault(from, specifier)).toMatch(fault);
  });
});

import { expect, test } from '@jest/globals';
import type { TestSummary } from './test-summary.js';
import { checkTestSummary, testSummaryItems } from './test-summary.js';

// UN Manual of Tests and Criteria, Part III, 38.3.5: the items (a) to (j) of the test summary.
const full: TestSummary = Object.fromEntries(testSummaryItems.map((item) => [item, 'stated']));

test('a summary that states every item is complete', () => {
  expect(checkTestSummary(full, true)).toEqual({ complete: true, missing: [] });
});

test('each item of the Manual is asked for', () => {
  for (const item of testSummaryItems) {
    expect(checkTestSummary({ ...full, [item]: '  ' }, true)).toEqual({ complete: false, missing: [item] });
  }
  expect(checkTestSummary({}, true).missing).toEqual([
    'manufacturer_name',
    'manufacturer_contact',
    'laboratory_name_and_contact',
    'test_report_id',
    'test_report_date',
    'description_type',
    'description_mass',
    'description_rating',
    'description_physical',
    'description_models',
    'tests_and_results',
    'assembled_battery_reference',
    'manual_revision',
    'responsible_person',
  ]);
});

test('the reference for assembled batteries is asked for only where it applies', () => {
  const { assembled_battery_reference: _left, ...rest } = full;
  expect(checkTestSummary(rest, false).complete).toBe(true);
  expect(checkTestSummary(rest, true).missing).toEqual(['assembled_battery_reference']);
});

/** The items of a UN 38.3 test summary, in the order of the Manual. */
export const testSummaryItems = [
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
] as const;

export type TestSummaryItem = (typeof testSummaryItems)[number];

/** What the summary states, as text; an item that is absent or blank is missing. */
export type TestSummary = Partial<Readonly<Record<TestSummaryItem, string>>>;

export interface TestSummaryCheck {
  readonly complete: boolean;
  readonly missing: readonly TestSummaryItem[];
}

export const testSummarySentences: Record<TestSummaryItem, string> = {
  manufacturer_name: 'Name of the manufacturer of the cell, battery or product.',
  manufacturer_contact: 'Address, telephone, e-mail and web address of the manufacturer.',
  laboratory_name_and_contact: 'Name and contact of the test laboratory.',
  test_report_id: 'A unique number of the test report.',
  test_report_date: 'Date of the test report.',
  description_type: 'Lithium ion or lithium metal, cell or battery.',
  description_mass: 'Mass of the cell or battery.',
  description_rating: 'Watt-hours, or grams of lithium.',
  description_physical: 'Physical description of the cell or battery.',
  description_models: 'Model numbers.',
  tests_and_results: 'List of the tests done, each passed or failed.',
  assembled_battery_reference: 'Reference to the requirements for assembled batteries, 38.3.3 (f) and (g).',
  manual_revision: 'Revision of the Manual used, with its amendments.',
  responsible_person: 'Name and title of the responsible person.',
};

/**
 * Whether a UN 38.3 test summary states everything that it has to.
 *
 * @param summary the items as text
 * @param assembledBattery whether batteries joined from tested batteries are covered: only then is the reference to
 * 38.3.3 (f) and (g) asked for
 * @returns complete or not, and the missing items in the Manual's order
 * @source UN Manual of Tests and Criteria, Part III, 38.3.5, "Lithium cell and battery test summary"
 */
export function checkTestSummary(summary: TestSummary, assembledBattery: boolean): TestSummaryCheck {
  const missing = testSummaryItems
    .filter((item) => item !== 'assembled_battery_reference' || assembledBattery)
    .filter((item) => (summary[item] ?? '').trim() === '');
  return { complete: missing.length === 0, missing };
}

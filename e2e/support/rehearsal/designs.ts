import { type Locator, type Page, expect } from '@playwright/test';
import { contentsOf, designOf } from './data.js';

/** Adds the build steps and the test plan to the draft of a bill that is open. */
export async function writeStepsAndPlan(page: Page, code: string): Promise<void> {
  await page.getByRole('link', { name: 'Edit the draft' }).click();
  const draft = page.getByRole('form', { name: 'Draft' });
  await writeSteps(draft, code);
  await writePlan(draft, code);
  await draft.getByRole('button', { name: 'Save the draft' }).click();
  await expect(page.getByRole('button', { name: 'Release revision 1' })).toBeVisible();
}

async function writeSteps(draft: Locator, code: string): Promise<void> {
  for (const [index, step] of designOf(code).steps.entries()) {
    await draft.getByRole('button', { name: 'Add a step' }).click();
    await fillRow(draft, `step ${index + 1}`, {
      'What to do': step.title,
      How: step.instruction,
      Minutes: step.minutes,
      Caution: step.caution ?? '',
    });
  }
}

async function writePlan(draft: Locator, code: string): Promise<void> {
  for (const [index, plan] of designOf(code).plan.entries()) {
    const row = `test ${index + 1}`;
    await draft.getByRole('button', { name: 'Add a line to the test plan' }).click();
    await fillRow(draft, row, { 'What is looked at': plan.name, 'Taken at': plan.condition ?? '' });
    if (plan.unit === undefined) {
      await draft.getByLabel(`Answered by, ${row}`, { exact: true }).selectOption('yes or no');
    } else {
      await fillRow(draft, row, {
        'At least': plan.lower ?? '',
        Aim: plan.target ?? '',
        'At most': plan.upper ?? '',
        Unit: plan.unit,
        Decimals: String(plan.digits ?? 0),
      });
    }
    if (plan.caution !== undefined) await fillRow(draft, row, { Caution: plan.caution });
  }
}

/** Puts the draft on the page in force. */
export async function releaseBill(page: Page, code: string): Promise<void> {
  await page.getByRole('button', { name: 'Release revision 1' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Release it' }).click();
  await expect(page.getByText(`Revision 1 of ${code} is in force.`)).toBeVisible();
}

/** Writes what goes into which bag of a kit. */
export async function writeContents(page: Page, code: string): Promise<void> {
  await page.goto(`/designs/kits/${code}`);
  const list = page.getByRole('form', { name: 'Contents' });
  for (const [index, line] of contentsOf(code).entries()) {
    await list.getByRole('button', { name: 'Add a line', exact: true }).click();
    await fillRow(list, `line ${index + 1}`, { Bag: line.bag, Part: line.part, 'How many': line.quantity });
  }
  await list.getByRole('button', { name: 'Save the contents' }).click();
  await expect(page.getByText(`The contents of ${code} are saved.`)).toBeVisible();
}

/** Types what differs from what a new row begins with: hundreds of cells take their time. */
async function fillRow(form: Locator, row: string, cells: Readonly<Record<string, string>>): Promise<void> {
  for (const [title, value] of Object.entries(cells)) {
    if (value !== '') await form.getByLabel(`${title}, ${row}`, { exact: true }).fill(value);
  }
}

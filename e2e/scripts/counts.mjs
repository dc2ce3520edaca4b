// The file in which every runner notes how many tests passed and failed, and their sum.
import { appendFileSync, existsSync, readFileSync } from 'node:fs';

/** Notes the counts of one runner for the run that called it; on its own, prints them as a closing line. */
export function noteCounts({ passed, failed }) {
  const line = `${passed} passed, ${failed} failed`;
  const file = process.env.EMBERLOT_COUNT_FILE;
  if (file) appendFileSync(file, `${line}\n`);
  else process.stdout.write(`${line}\n`);
}

/** @param {string} file @returns {{ passed: number, failed: number }} */
export function sumCounts(file) {
  const lines = existsSync(file) ? readFileSync(file, 'utf8').split('\n') : [];
  const counts = lines.flatMap((line) => {
    const found = /^(\d+) passed, (\d+) failed$/.exec(line);
    return found ? [{ passed: Number(found[1]), failed: Number(found[2]) }] : [];
  });
  return counts.reduce((sum, each) => ({ passed: sum.passed + each.passed, failed: sum.failed + each.failed }), {
    passed: 0,
    failed: 0,
  });
}

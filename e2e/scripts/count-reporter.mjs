import { appendFileSync } from 'node:fs';

/** Prints one closing line a person and a script can read; the whole run adds these lines up. */
export default class CountReporter {
  onRunComplete(_contexts, results) {
    const brokenSuites = results.testResults.filter(
      (suite) => suite.testExecError && suite.numFailingTests === 0,
    ).length;
    const failed = results.numFailedTests + brokenSuites;
    const line = `${results.numPassedTests} passed, ${failed} failed`;
    process.stdout.write(`${line}\n`);
    const file = process.env.EMBERLOT_COUNT_FILE;
    if (file) appendFileSync(file, `${line}\n`);
  }
}

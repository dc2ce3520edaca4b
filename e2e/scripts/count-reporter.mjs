import { noteCounts } from './counts.mjs';

/** Jest's counts; a file that could not be run counts as one failed test. */
export default class CountReporter {
  onRunComplete(_contexts, results) {
    const brokenSuites = results.testResults.filter(
      (suite) => suite.testExecError && suite.numFailingTests === 0,
    ).length;
    noteCounts({ passed: results.numPassedTests, failed: results.numFailedTests + brokenSuites });
  }
}

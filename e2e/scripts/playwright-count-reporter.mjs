import { noteCounts } from './counts.mjs';

/** Playwright's counts. What did not run because something before it failed has not passed, so it counts as failed. */
export default class PlaywrightCountReporter {
  #suite;
  #brokenFiles = 0;

  onBegin(_config, suite) {
    this.#suite = suite;
  }

  /** A fault outside any test: a file that does not load, a set-up that fails. */
  onError() {
    this.#brokenFiles += 1;
  }

  onEnd(result) {
    const tests = this.#suite?.allTests() ?? [];
    const passed = tests.filter((test) => test.outcome() === 'expected').length;
    const failed = tests.length - passed + this.#brokenFiles;
    noteCounts({ passed, failed: result.status === 'passed' ? failed : Math.max(failed, 1) });
  }

  printsToStdio() {
    return true;
  }
}

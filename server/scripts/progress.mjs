// Tells a person at a terminal what is going on: a line for each step, with how long it took.

const write = (text) => process.stdout.write(text);

/** Whether the line of a step is still open, waiting for its result. */
let lineOpen = false;

/** A remark in the middle of a step, or between two. */
export function remark(text) {
  write(`${lineOpen ? '\n' : ''}    ${text}\n`);
  lineOpen = false;
}

/**
 * @template Result
 * @param {string} name
 * @param {() => Result | Promise<Result>} work what it answers is handed on; a string is shown as the outcome
 * @returns {Promise<Result>}
 */
export async function step(name, work) {
  const started = Date.now();
  write(`  ${name} … `);
  lineOpen = true;
  try {
    const result = await work();
    const outcome = typeof result === 'string' ? result : 'done';
    write(`${lineOpen ? '' : `  ${name}: `}${outcome} (${((Date.now() - started) / 1000).toFixed(1)} s)\n`);
    return result;
  } catch (error) {
    write(`${lineOpen ? '' : `  ${name}: `}failed\n`);
    throw error;
  } finally {
    lineOpen = false;
  }
}

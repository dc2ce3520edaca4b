// Child processes that run until they are told to stop. Node alone.
import { spawn } from 'node:child_process';
import { closeSync, existsSync, mkdirSync, openSync, readFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * Starts a process of its own group, so that Ctrl-C in the terminal reaches it only through the one who started it.
 * @param {{ name: string, command?: string, args: string[], cwd: string, env: NodeJS.ProcessEnv, log: string,
 *   guard: import('../../db/scripts/guard.mjs').Guard }} options its output goes to the file `log`
 */
export function startProcess({ name, command = process.execPath, args, cwd, env, log, guard }) {
  mkdirSync(dirname(log), { recursive: true });
  const output = openSync(log, 'w');
  const child = spawn(command, args, { cwd, env, stdio: ['ignore', output, output], detached: true });
  closeSync(output);
  const takeBack = child.pid ? guard.entrust({ process: child.pid }) : () => {};
  let ended = false;
  const exited = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (code, signal) => resolve(signal ?? `code ${code}`));
  }).then((outcome) => {
    ended = true;
    takeBack();
    return outcome;
  });
  const tail = () => (existsSync(log) ? readFileSync(log, 'utf8').trim().split('\n').slice(-15).join('\n') : '');
  return { name, pid: child.pid, exited, hasEnded: () => ended, tail, log };
}

/** Waits until an address answers with success; fails early when the process that should answer has ended. */
export async function untilAnswers(url, child, seconds = 60) {
  const until = Date.now() + seconds * 1000;
  while (Date.now() < until) {
    if (child.hasEnded()) throw new Error(`${child.name} ended (${await child.exited}):\n${child.tail()}`);
    const answer = await fetch(url, { signal: AbortSignal.timeout(2_000) }).catch(() => undefined);
    await answer?.body?.cancel();
    if (answer?.ok) return;
    await sleep(100);
  }
  throw new Error(`${child.name} did not answer at ${url} within ${seconds} s:\n${child.tail()}`);
}

// A helper process that outlives this one just long enough to end what this one started, however this one ends:
// Ctrl-C, a fault, or a kill that no handler sees. Node alone.
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const program = fileURLToPath(new URL('guard-process.mjs', import.meta.url));

/**
 * @typedef {{ process: number } | { folder: string }
 *   | { cluster: { binaries: string, data: string, mode: 'fast' | 'immediate' } }} Entrusted
 *   a process group's leader, a folder to remove, a PostgreSQL server to stop
 * @typedef {{ entrust: (thing: Entrusted) => () => void, end: () => Promise<void> }} Guard
 *   `entrust` answers how to take the thing back; `end` ends everything still entrusted, the last first
 * @returns {Guard}
 */
export function startGuard() {
  const child = spawn(process.execPath, [program], { stdio: ['pipe', 'ignore', 'inherit'], detached: true, cwd: '/' });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.unref();
  child.stdin.unref?.();
  child.stdin.on('error', () => {
    // The guard is gone, which `ended` tells.
  });
  const tell = (message) => child.stdin.write(`${JSON.stringify(message)}\n`);
  let count = 0;
  return {
    entrust(thing) {
      const id = String((count += 1));
      tell({ add: id, ...thing });
      return () => tell({ remove: id });
    },
    async end() {
      child.ref();
      child.stdin.end();
      await ended;
    },
  };
}

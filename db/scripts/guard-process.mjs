// Waits until the process that started it is gone (the pipe to it closes), then ends what that process left.
// It is told line by line, as JSON, what there is: { add: id, process | cluster | folder } and { remove: id }.
import { rmSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { setTimeout as sleep } from 'node:timers/promises';
import { stopServer } from './cluster.mjs';

/** @type {Map<string, { process?: number, cluster?: { binaries: string, data: string, mode: 'fast' | 'immediate' }, folder?: string }>} */
const entrusted = new Map();

/** Signals a process group; false when it is gone. */
function signal(pid, name) {
  try {
    process.kill(-pid, name);
    return true;
  } catch {
    return false;
  }
}

async function endProcess(pid) {
  signal(pid, 'SIGTERM');
  for (let waited = 0; waited < 15_000 && signal(pid, 0); waited += 50) await sleep(50);
  signal(pid, 'SIGKILL');
}

/** What came last is ended first: servers before the database they use. */
async function endAll() {
  for (const thing of [...entrusted.values()].toReversed()) {
    if (thing.process) await endProcess(thing.process);
    if (thing.cluster) stopServer(thing.cluster);
    if (thing.folder) rmSync(thing.folder, { recursive: true, force: true, maxRetries: 5 });
  }
}

for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, () => {});

createInterface({ input: process.stdin })
  .on('line', (line) => {
    const { add, remove, ...thing } = JSON.parse(line);
    if (add) entrusted.set(add, thing);
    else entrusted.delete(remove);
  })
  .once('close', () => {
    void endAll().finally(() => process.exit(0));
  });

// Waits until the process that started it is gone (the pipe to it closes), then removes that process's cluster.
//   node cluster-guard.mjs BINARIES FOLDER
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { stopServer } from './cluster.mjs';

const [binaries, folder] = process.argv.slice(2);

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => {});
process.stdin.resume();
process.stdin.once('close', () => {
  stopServer({ binaries, data: join(folder, 'data'), mode: 'immediate' });
  rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
  process.exit(0);
});

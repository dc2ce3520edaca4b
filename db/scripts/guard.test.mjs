import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from '@jest/globals';

const guardModule = JSON.stringify(new URL('guard.mjs', import.meta.url).href);
const clusterModule = JSON.stringify(new URL('cluster.mjs', import.meta.url).href);

function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

async function until(condition) {
  for (let waited = 0; waited < 15_000; waited += 50) {
    if (condition()) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('It did not come about in time');
}

/** Runs a program in a process of its own until it has written a line of JSON, and answers both. */
async function runUntilItTells(program) {
  const child = spawn(process.execPath, ['--input-type=module', '-e', program], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const line = await new Promise((resolve) => child.stdout.once('data', (data) => resolve(String(data))));
  return { child, told: JSON.parse(line) };
}

const startsChild = (folder) => `
  import { spawn } from 'node:child_process';
  import { startGuard } from ${guardModule};
  const guard = startGuard();
  guard.entrust({ folder: ${JSON.stringify(folder)} });
  const child = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)'], { detached: true, stdio: 'ignore' });
  guard.entrust({ process: child.pid });
  console.log(JSON.stringify({ pid: child.pid }));
  setInterval(() => {}, 1000);`;

test.each(['SIGKILL', 'SIGTERM', 'SIGINT'])(
  '%s leaves neither the process nor the folder that were entrusted',
  async (signal) => {
    const folder = mkdtempSync(join(tmpdir(), 'emberlot-guard-'));
    const { child, told } = await runUntilItTells(startsChild(folder));
    expect(isAlive(told.pid)).toBe(true);
    child.kill(signal);
    await until(() => !isAlive(told.pid) && !existsSync(folder));
  },
);

test('a killed test run leaves no cluster', async () => {
  const { child, told } = await runUntilItTells(`
    import { startThrowAwayCluster } from ${clusterModule};
    const { adminUrl } = await startThrowAwayCluster();
    console.log(JSON.stringify({ port: Number(new URL(adminUrl).port) }));
    setInterval(() => {}, 1000);`);
  const { createConnection } = await import('node:net');
  const answers = () =>
    new Promise((resolve) => {
      const socket = createConnection(told.port, '127.0.0.1');
      socket.once('connect', () => resolve(true) ?? socket.destroy());
      socket.once('error', () => resolve(false));
    });
  expect(await answers()).toBe(true);
  child.kill('SIGKILL');
  for (let tries = 0; (await answers()) && tries < 300; tries += 1)
    await new Promise((resolve) => setTimeout(resolve, 50));
  expect(await answers()).toBe(false);
}, 60_000);

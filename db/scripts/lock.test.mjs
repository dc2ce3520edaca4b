import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from '@jest/globals';
import { tryLock, withLock } from './lock.mjs';

let folder;
let file;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'emberlot-lock-'));
  file = join(folder, 'lock');
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** Another process that takes the lock, tells so, and holds it until it is ended. */
async function holdElsewhere() {
  const program = `
    import { tryLock } from ${JSON.stringify(new URL('lock.mjs', import.meta.url).href)};
    tryLock(${JSON.stringify(file)});
    console.log('held');
    setInterval(() => {}, 1000);`;
  const child = spawn(process.execPath, ['--input-type=module', '-e', program], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  await new Promise((resolve) => child.stdout.once('data', resolve));
  return child;
}

test('a lock that another process holds is refused by that process’s number', async () => {
  const child = await holdElsewhere();
  expect(tryLock(file)).toEqual({ heldBy: child.pid });
  child.kill('SIGKILL');
  await new Promise((resolve) => child.once('exit', resolve));
});

test('the lock of a process that was killed is void', async () => {
  const child = await holdElsewhere();
  child.kill('SIGKILL');
  await new Promise((resolve) => child.once('exit', resolve));
  expect(tryLock(file)).toHaveProperty('release');
});

test('a later process with the same number does not hold it', () => {
  writeFileSync(file, `${process.pid} 1`);
  expect(tryLock(file)).toHaveProperty('release');
});

test('work under the lock does not overlap, and a fault releases it', async () => {
  let inside = 0;
  let most = 0;
  const work = async () => {
    inside += 1;
    most = Math.max(most, inside);
    await new Promise((resolve) => setTimeout(resolve, 20));
    inside -= 1;
  };
  await expect(
    withLock(file, () => {
      throw new Error('out of paper');
    }),
  ).rejects.toThrow('out of paper');
  await Promise.all([withLock(file, work), withLock(file, work), withLock(file, work)]);
  expect(most).toBe(1);
});

test('waiting has an end', async () => {
  const lock = tryLock(file);
  await expect(withLock(file, () => 'late', 0.1)).rejects.toThrow(/still holds/);
  lock.release();
});

// A lock that a file stands for, held by a process and void when that process is gone. Node alone.
import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

/** Tells this process from a later one that happens to get the same number. */
function identityOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return `${pid} ${stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19]}`;
  } catch {
    return undefined;
  }
}

function holderOf(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}

/**
 * @param {string} file
 * @returns {{ release: () => void } | { heldBy: number }} the lock, or the process that has it
 */
export function tryLock(file) {
  mkdirSync(dirname(file), { recursive: true });
  const mine = identityOf(process.pid) ?? String(process.pid);
  for (;;) {
    try {
      writeFileSync(file, mine, { flag: 'wx' });
      return { release: () => rmSync(file, { force: true }) };
    } catch (error) {
      if (error.code !== 'EEXIST') throw error;
    }
    const holder = holderOf(file);
    const pid = Number(holder?.split(' ')[0]);
    if (holder && identityOf(pid) === holder) return { heldBy: pid };
    if (holder !== undefined) removeVoid(file, holder);
  }
}

/** Moves the void lock aside before removing it: of several who try, one has it, and a fresh lock is put back. */
function removeVoid(file, holder) {
  const aside = `${file}.${process.pid}`;
  try {
    renameSync(file, aside);
  } catch {
    return;
  }
  if (holderOf(aside) === holder) rmSync(aside, { force: true });
  else renameSync(aside, file);
}

/**
 * Waits for the lock, then does the work under it.
 * @template Result
 * @param {string} file
 * @param {() => Result | Promise<Result>} work
 * @param {number} [seconds] how long to wait for it
 * @returns {Promise<Result>}
 */
export async function withLock(file, work, seconds = 120) {
  const until = Date.now() + seconds * 1000;
  let lock = tryLock(file);
  while ('heldBy' in lock) {
    if (Date.now() > until) throw new Error(`Process ${lock.heldBy} still holds ${file}; try again when it has ended.`);
    await sleep(100);
    lock = tryLock(file);
  }
  try {
    return await work();
  } finally {
    lock.release();
  }
}

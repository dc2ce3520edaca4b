import { Injectable, Module } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { type JobTask, Task } from './job-task.js';
import { JobRunner } from './job-runner.js';
import { Jobs } from './jobs.js';

const done: string[] = [];

@Injectable()
@Task({ name: 'note_down' })
class NoteDownTask implements JobTask<{ word: string }> {
  async run({ word }: { word: string }): Promise<void> {
    done.push(word);
    if (word === 'fails once' && done.filter((other) => other === word).length === 1) throw new Error('not yet');
  }
}

@Module({ providers: [NoteDownTask] })
class NotesModule {}

describe('jobs', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp({ modules: [NotesModule] });
  });

  afterAll(() => app.close());

  const add = (word: string, timing = {}) =>
    app.transaction((trx) => app.get(Jobs).add(trx, 'note_down', { word }, timing));

  it('run after the transaction that added them, once', async () => {
    await add('first');
    expect(done).not.toContain('first');
    await app.runJobs();
    await app.runJobs();
    expect(done.filter((word) => word === 'first')).toHaveLength(1);
  });

  it('are not there when the transaction rolls back', async () => {
    const failing = app.transaction(async (trx) => {
      await app.get(Jobs).add(trx, 'note_down', { word: 'never' });
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    await app.runJobs();
    expect(done).not.toContain('never');
  });

  it('wait for their instant, by the product’s clock', async () => {
    const runAt = new Date(app.clock.now().getTime() + 3_600_000);
    await add('in an hour', { runAt });
    await app.runJobs();
    expect(done).not.toContain('in an hour');
    app.clock.advance({ hours: 1 });
    await app.runJobs();
    expect(done).toContain('in an hour');
  });

  it('are replaced by a later one of the same key', async () => {
    await add('replaced', { jobKey: 'one of a kind' });
    await add('replacement', { jobKey: 'one of a kind' });
    await app.runJobs();
    expect(done).toContain('replacement');
    expect(done).not.toContain('replaced');
  });

  it('are tried again when they fail', async () => {
    await add('fails once');
    await app.runJobs();
    app.clock.advance({ days: 400 });
    app.clock.set(new Date(Math.max(app.clock.now().getTime(), Date.now() + 60_000)));
    await app.runJobs();
    expect(done.filter((word) => word === 'fails once')).toHaveLength(2);
  });

  it('are done by the runner while the server runs, and it stops with the server', async () => {
    const other = await startTestApp({ modules: [NotesModule] });
    await other.get(JobRunner).start();
    await other.transaction((trx) => other.get(Jobs).add(trx, 'note_down', { word: 'in the background' }));
    const deadline = Date.now() + 5_000;
    while (!done.includes('in the background') && Date.now() < deadline) {
      await new Promise((resolve) => {
        setTimeout(resolve, 20);
      });
    }
    await other.close();
    expect(done).toContain('in the background');
  });
});

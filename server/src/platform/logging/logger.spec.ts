import { Writable } from 'node:stream';
import { describe, expect, it } from '@jest/globals';
import express from 'express';
import supertest from 'supertest';
import { PinoLoggerService, createLogger, requestLog } from './logger.js';

function memory() {
  const lines: string[] = [];
  const stream = new Writable({
    write(chunk: Buffer, _encoding, done) {
      lines.push(chunk.toString());
      done();
    },
  });
  return { lines, logger: createLogger('info', stream) };
}

describe('the log', () => {
  it('has a line of JSON for each request, without what was sent', async () => {
    const { lines, logger } = memory();
    const app = express()
      .use(requestLog(logger), express.json())
      .post('/in/:word', (_request, response) => void response.json({ answer: 'secret-answer' }));
    await supertest(app)
      .post('/in/a%0d%0aforged%1b[31m?token=secret-token')
      .set({ Cookie: 'secret-cookie=1', Authorization: 'secret-header', 'x-csrf-token': 'secret-form' })
      .send({ password: 'secret-password' })
      .expect(200);
    expect(lines).toHaveLength(1);
    const [line = ''] = lines;
    expect(line).not.toContain('secret');
    expect(line.trimEnd()).not.toMatch(/\p{Cc}/u);
    expect(JSON.parse(line)).toMatchObject({
      level: 30,
      time: expect.stringMatching(/^\d{4}-\d\d-\d\dT[\d:.]+Z$/),
      req: { method: 'POST', path: '/in/a%0d%0aforged%1b[31m' },
      res: { status: 200 },
      reqId: expect.stringMatching(/^[\da-f-]{36}$/),
    });
  });

  it('takes Nest’s messages, with their speaker, and escapes what could forge a line', () => {
    const { lines, logger } = memory();
    const nest = new PinoLoggerService(logger);
    nest.warn('two\nlines', 'Speaker');
    nest.error({ event: 'broken', err: new Error('why') }, 'Other');
    nest.log('Mapped a route', 'RouterExplorer');
    expect(lines.map((line) => JSON.parse(line) as object)).toMatchObject([
      { level: 40, msg: 'two\nlines', context: 'Speaker' },
      { level: 50, event: 'broken', context: 'Other', err: { message: 'why' } },
    ]);
  });
});

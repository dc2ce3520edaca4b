import { createHash, randomBytes } from 'node:crypto';
import { buffer } from 'node:stream/consumers';
import { Controller, Get, Module, Res } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Response } from 'express';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { Roles } from '../auth/access.js';
import { IdParam } from '../validation/id-param.js';
import { Files, type StoreOptions } from './files.js';
import { attachmentNamed, sendFile } from './send-file.js';

/** The smallest pictures of their kinds. */
const png = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);
const pdf = Buffer.from('%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF\n');

@Controller('papers')
@Roles('owner')
class PapersController {
  constructor(private readonly files: Files) {}

  @Get(':id')
  async read(@IdParam() id: number, @Res() response: Response): Promise<void> {
    await sendFile(response, this.files, await this.files.describe(id), 'Rechnung "12"\r\n€.pdf');
  }
}

@Module({ controllers: [PapersController] })
class PapersModule {}

describe('files', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp({ modules: [PapersModule], env: { FILE_QUOTA_MB: '27' } });
  });

  afterAll(() => app.close());

  const store = (content: Uint8Array | AsyncIterable<Uint8Array>, options: StoreOptions) =>
    app.transaction((trx) => app.get(Files).store(trx, content, options));

  const chunksOf = async (fileId: number) => {
    const rows = await app.database.handle
      .selectFrom('file_chunk')
      .select('position')
      .where('file_id', '=', fileId)
      .orderBy('position')
      .execute();
    return rows.length;
  };

  it('come back byte by byte, found by their digest, in chunks', async () => {
    const bytes = Buffer.from(randomBytes(600_000).toString('base64'));
    const file = await store(bytes, { fileName: 'capture.TXT' });
    expect(file).toMatchObject({ byteSize: bytes.length, mediaType: 'text/plain' });
    expect(file.sha256).toBe(createHash('sha256').update(bytes).digest('hex'));
    expect(await chunksOf(file.id)).toBe(Math.ceil(bytes.length / (256 * 1_024)));
    expect((await buffer(app.get(Files).stream(file.id))).equals(bytes)).toBe(true);
  });

  it('are kept once however often they are stored, also at the same moment', async () => {
    const one = await store(png, { fileName: 'iron.png' });
    const again = await Promise.all([store(png, { fileName: 'same.png' }), store(png, { fileName: 'iron.png' })]);
    expect(again.map((file) => file.id)).toEqual([one.id, one.id]);
    const fresh = Buffer.from('stored twice at the same moment');
    const both = await Promise.all([store(fresh, { fileName: 'a.txt' }), store(fresh, { fileName: 'b.txt' })]);
    expect(both[0].id).toBe(both[1].id);
    expect(await chunksOf(both[0].id)).toBe(1);
  });

  it('may come as a stream', async () => {
    async function* parts() {
      yield Buffer.from('first;');
      yield Buffer.from('second\n');
    }
    const file = await store(parts(), { fileName: 'a.csv', types: ['text/csv'] });
    expect((await buffer(app.get(Files).stream(file.id))).toString()).toBe('first;second\n');
  });

  it.each<[string, Buffer, string]>([
    ['a page named as a picture', Buffer.from('<!doctype html><script>alert(1)</script>'), 'iron.png'],
    ['a page named as a table', Buffer.from('  <html><script>alert(1)</script>'), 'parts.csv'],
    ['a drawing that can hold scripts', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), 'iron.svg'],
    ['a drawing named as a text', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), 'iron.txt'],
    ['a picture named as a table', png, 'parts.csv'],
    ['a program', Buffer.from('MZ\u0090\u0000\u0003', 'latin1'), 'setup.exe'],
    ['bytes named as text', Buffer.from([0x61, 0xff, 0xfe, 0x62]), 'notes.txt'],
    ['a name without a kind', Buffer.from('text'), 'notes'],
    ['a name of another kind', Buffer.from('text'), 'notes.txt.php'],
  ])('are refused when they are %s', async (_what, bytes, fileName) => {
    await expect(store(bytes, { fileName })).rejects.toMatchObject({ code: 'unsupported_media' });
  });

  it('are refused where another kind belongs', async () => {
    const refused = store(pdf, { fileName: 'a.pdf', types: ['image/png', 'image/jpeg'] });
    await expect(refused).rejects.toThrow('png, jpg, jpeg');
    await expect(store(pdf, { fileName: 'a.pdf', types: ['application/pdf'] })).resolves.toBeDefined();
  });

  it('are refused when they are empty, too large, or more than the shop has room for', async () => {
    await expect(store(Buffer.alloc(0), { fileName: 'a.txt' })).rejects.toMatchObject({ code: 'invalid_input' });
    const tooLarge = store(Buffer.alloc(25 * 1_024 * 1_024 + 1, 'x'), { fileName: 'a.txt' });
    await expect(tooLarge).rejects.toMatchObject({ code: 'too_large' });
    await store(Buffer.alloc(20_000_000, 'x'), { fileName: 'a.txt' });
    const noRoom = store(Buffer.alloc(7_000_000, 'y'), { fileName: 'b.txt' });
    await expect(noRoom).rejects.toThrow('There is no room left');
  });

  it('are given out to be saved, under our name, with nothing that a browser would run', async () => {
    const { id } = await store(pdf, { fileName: 'invoice.pdf' });
    const answer = await (await app.agentFor('owner')).get(`/api/papers/${id}`).expect(200);
    expect(answer.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-length': String(pdf.length),
      'content-security-policy': "default-src 'none'; sandbox",
      'x-content-type-options': 'nosniff',
      'cache-control': 'no-store',
    });
    expect(answer.headers['content-disposition']).toMatch(
      /^attachment; filename="[\w ._-]+"; filename\*=UTF-8''[\w%.]+$/,
    );
    await (await app.agentFor('owner')).get('/api/papers/999999').expect(404);
    await (await app.agentFor('customer')).get(`/api/papers/${id}`).expect(403);
  });

  it('have names of any language in their header', () => {
    expect(attachmentNamed("Zoë's 1.pdf")).toBe(
      `attachment; filename="Zo__s 1.pdf"; filename*=UTF-8''Zo%C3%AB%27s%201.pdf`,
    );
  });
});

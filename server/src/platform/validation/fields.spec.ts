import 'reflect-metadata';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, ValidateNested } from 'class-validator';
import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { AppError } from '../errors/app-error.js';
import { FromDigits, PageQuery } from '../paging/page-query.dto.js';
import { Code, Day, Email, Id, MinorAmount, Nullable, Optional, Quantity, Text, Whole } from './fields.js';
import { parseId } from './id-param.js';
import { createValidationPipe } from './validation-pipe.js';

class LineDto {
  @Id()
  partId: number;

  @Quantity()
  quantity: string;
}

class SampleDto {
  @Text({ max: 10 })
  name: string;

  @Optional()
  @Text({ max: 20, min: 0, lines: true })
  note?: string;

  @Optional()
  @Nullable()
  @Email()
  email?: string | null;

  @Optional()
  @Quantity({ negative: true, zero: true })
  change?: string;

  @Optional()
  @MinorAmount()
  price?: number;

  @Optional()
  @Whole({ min: 0, max: 9 })
  digit?: number;

  @Optional()
  @Day()
  day?: string;

  @Optional()
  @Code()
  code?: string;

  @Optional()
  @IsArray()
  @ArrayMaxSize(2)
  @ValidateNested({ each: true })
  @Type(() => LineDto)
  lines?: LineDto[];
}

const pipe = createValidationPipe();

async function read(body: unknown): Promise<SampleDto> {
  return (await pipe.transform(body, { type: 'body', metatype: SampleDto })) as SampleDto;
}

async function faultsOf(body: unknown): Promise<readonly string[]> {
  try {
    await read(body);
    return [];
  } catch (error) {
    if (error instanceof AppError) return error.faults.map((fault) => `${fault.pointer} ${fault.code}`);
    throw error;
  }
}

describe('the fields of a request', () => {
  it('come out trimmed and in one form of Unicode', async () => {
    expect(await read({ name: '  Zoe\u0308 ' })).toEqual({ name: 'Zo\u00eb' });
  });

  it.each([
    [{ name: 'ok', note: null }, '/note text'],
    [{ name: 'ok', extra: 1 }, '/extra unknown_field'],
    [{}, '/name text'],
    [{ name: '   ' }, '/name text'],
    [{ name: 'eleven char' }, '/name text'],
    [{ name: 'a\u0000b' }, '/name text'],
    [{ name: 'a\nb' }, '/name text'],
    [{ name: 'a\u202eb'.repeat(4) }, '/name text'],
    [{ name: ['ok'] }, '/name text'],
    [{ name: { toString: 'ok' } }, '/name text'],
    [{ name: 'ok', email: 'a@b' }, '/email email'],
    [{ name: 'ok', email: 'a@b.example, c@d.example' }, '/email email'],
    [{ name: 'ok', change: 5 }, '/change quantity'],
    [{ name: 'ok', change: '1e3' }, '/change quantity'],
    [{ name: 'ok', change: '01' }, '/change quantity'],
    [{ name: 'ok', change: '1.0000001' }, '/change quantity'],
    [{ name: 'ok', change: '1234567890123' }, '/change quantity'],
    [{ name: 'ok', change: 'NaN' }, '/change quantity'],
    [{ name: 'ok', price: '5' }, '/price wrong_type'],
    [{ name: 'ok', price: 0.5 }, '/price wrong_type'],
    [{ name: 'ok', price: -1 }, '/price min'],
    [{ name: 'ok', price: 1e21 }, '/price max'],
    [{ name: 'ok', digit: true }, '/digit wrong_type'],
    [{ name: 'ok', digit: 10 }, '/digit max'],
    [{ name: 'ok', day: '2027-02-30' }, '/day day'],
    [{ name: 'ok', day: '2027-2-3' }, '/day day'],
    [{ name: 'ok', code: 'lower-1' }, '/code matches'],
    [{ name: 'ok', lines: [{ partId: 1, quantity: '0' }] }, '/lines/0/quantity quantity'],
    [{ name: 'ok', lines: [{ partId: 1, quantity: '-1' }] }, '/lines/0/quantity quantity'],
    [{ name: 'ok', lines: [{ partId: 0, quantity: '1' }] }, '/lines/0/partId min'],
    [{ name: 'ok', lines: [{ partId: 2 ** 53, quantity: '1' }] }, '/lines/0/partId max'],
    [{ name: 'ok', lines: [{ partId: 1, quantity: '1', price: 1 }] }, '/lines/0/price unknown_field'],
    [{ name: 'ok', lines: 'none' }, '/lines wrong_type'],
  ])('are refused in %j', async (body, fault) => {
    expect(await faultsOf(body)).toContain(fault);
  });

  it('are refused when there are more lines than a form has', async () => {
    const line = { partId: 1, quantity: '1' };
    expect(await faultsOf({ name: 'ok', lines: [line, line, line] })).toEqual(['/lines array_max_size']);
  });

  it('are all named at once', async () => {
    const faults = await faultsOf({ name: '', digit: 'x', lines: [{ partId: 'x', quantity: 'x' }] });
    expect(faults).toEqual([
      '/name text',
      '/digit wrong_type',
      '/lines/0/partId wrong_type',
      '/lines/0/quantity quantity',
    ]);
  });

  it.each([
    [{ name: 'ok', email: null }],
    [{ name: 'ok', note: 'two\nlines' }],
    [{ name: 'ok', change: '-0.000001' }],
    [{ name: 'ok', change: '0' }],
    [{ name: 'ok', change: '123456789012.123456' }],
    [{ name: 'ok', price: 0, digit: 9, day: '2028-02-29', code: 'WREN-60' }],
    [{ name: '🔥'.repeat(10) }],
  ])('are taken in %j', async (body) => {
    expect(await faultsOf(body)).toEqual([]);
  });

  it('never do anything but pass or be refused, whatever is sent', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.object({ key: fc.constantFrom('name', 'note', 'email', 'lines', 'price'), maxDepth: 3 }),
        (body) => faultsOf(body).then((faults) => faults.every((fault) => fault.startsWith('/'))),
      ),
      { numRuns: 300 },
    );
  });

  it('speak to a person', async () => {
    await expect(read({ name: '' })).rejects.toThrow('Fill this in.');
    await expect(read({ name: 'ok', digit: 10 })).rejects.toThrow('Give a whole number from 0 to 9.');
    await expect(read({ name: '', digit: 10 })).rejects.toThrow('2 fields need another look.');
  });
});

describe('a query of a list', () => {
  class Query extends PageQuery {
    @Optional()
    @FromDigits()
    @Id()
    partId?: number;
  }

  const readQuery = (query: Record<string, unknown>) => pipe.transform(query, { type: 'query', metatype: Query });

  it('has a first page of fifty when nothing is said', async () => {
    expect(await readQuery({})).toEqual({ page: 1, pageSize: 50 });
    expect(await readQuery({ page: '3', partId: '12', q: ' tip ' })).toMatchObject({ page: 3, partId: 12, q: 'tip' });
  });

  it.each([
    { page: '0' },
    { page: '1.5' },
    { page: '1e3' },
    { page: '' },
    { page: '99999999999999999999' },
    { pageSize: '201' },
    { partId: '0x10' },
    { sort: 'name; drop' },
    { sort: '--name' },
    { q: 'x'.repeat(101) },
    { unknown: '1' },
  ])('is refused with %j', async (query) => {
    await expect(readQuery(query)).rejects.toThrow(AppError);
  });
});

describe('the id in a path', () => {
  it.each(['0', '-1', '1.0', '1e3', '0x10', ' 1', '01', '9007199254740993', '', 'null', "1' or '1"])(
    'is not %j',
    (text) => {
      expect(() => parseId(text, 'id')).toThrow(AppError);
    },
  );

  it('is a plain positive whole number', () => {
    expect([parseId('1', 'id'), parseId('9007199254740991', 'id')]).toEqual([1, Number.MAX_SAFE_INTEGER]);
  });
});

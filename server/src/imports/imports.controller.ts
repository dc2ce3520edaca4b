import { Body, Controller, Get, Header, HttpCode, Param, Post, Query, Res, UploadedFile } from '@nestjs/common';
import { ApiOkResponse } from '@nestjs/swagger';
import type { Response } from 'express';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { csvOf, TakesCsv, type ReceivedFile } from './csv-upload.js';
import { ImportKinds } from './import-kinds.js';
import { importTemplate } from './import-template.js';
import {
  AppliedImportDto,
  ImportCheckDto,
  ImportFormDto,
  ImportKindsDto,
  ImportRunPageDto,
  ImportsQuery,
} from './imports.dto.js';
import { ImportsService } from './imports.service.js';

@Controller('imports')
@Roles('owner')
export class ImportsController {
  constructor(
    private readonly imports: ImportsService,
    private readonly kinds: ImportKinds,
  ) {}

  /** Files taken in so far, newest first. */
  @Get()
  async list(@Query() query: ImportsQuery): Promise<ImportRunPageDto> {
    return this.imports.list(query);
  }

  @Get('kinds')
  listKinds(): ImportKindsDto {
    const items = this.kinds.all.map(({ key, title, sentence, columns }) => ({
      kind: key,
      title,
      sentence,
      columns: columns.map((column) => ({
        key: column.key,
        title: column.title,
        required: column.required ?? false,
        sentence: column.sentence,
      })),
    }));
    return { items, total: items.length };
  }

  @Get(':kind/template')
  @Header('Content-Type', 'text/csv; charset=utf-8')
  @ApiOkResponse({ schema: { type: 'string' } })
  template(@Param('kind') kind: string, @Res({ passthrough: true }) response: Response): string {
    const text = importTemplate(this.kinds.get(kind));
    response.setHeader('Content-Disposition', `attachment; filename="emberlot-${kind.replaceAll('_', '-')}.csv"`);
    return text;
  }

  /** Says what the file would do; changes nothing. */
  @Post(':kind/dry-run')
  @HttpCode(200)
  @TakesCsv()
  async dryRun(
    @Param('kind') kind: string,
    @UploadedFile() file: ReceivedFile | undefined,
    @Body() form: ImportFormDto,
  ): Promise<ImportCheckDto> {
    return this.imports.dryRun(kind, csvOf(file), form);
  }

  @Post(':kind')
  @Creates()
  @TakesCsv()
  async apply(
    @Param('kind') kind: string,
    @UploadedFile() file: ReceivedFile | undefined,
    @Body() form: ImportFormDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<AppliedImportDto> {
    return this.imports.apply(kind, csvOf(file), form, person);
  }
}

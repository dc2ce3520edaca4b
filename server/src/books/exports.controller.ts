import { Body, Controller, Get, HttpCode, Param, Post, Query, Res } from '@nestjs/common';
import { ApiProduces } from '@nestjs/swagger';
import type { Response } from 'express';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { notFound } from '../platform/errors/app-error.js';
import { attachmentNamed } from '../platform/files/send-file.js';
import { ExportQuery, ExportTotalsDto, MonthsDto, ReopenMonthInput } from './books.dto.js';
import { ExportsService } from './exports.service.js';
import { PeriodsService } from './periods.service.js';

/** Files of a period, and the closing of months. */
@Controller()
@Roles('accountant', 'owner')
export class ExportsController {
  constructor(
    private readonly exports: ExportsService,
    private readonly periods: PeriodsService,
  ) {}

  @Get('book-exports/totals')
  async totals(@Query() query: ExportQuery): Promise<ExportTotalsDto> {
    return this.exports.totals(query);
  }

  @Get('book-exports/invoices.csv')
  @ApiProduces('text/csv')
  async invoices(@Query() query: ExportQuery, @Res() response: Response): Promise<void> {
    sendCsv(response, await this.exports.invoices(query), `invoices ${query.from} to ${query.to}.csv`);
  }

  @Get('book-exports/entries.csv')
  @ApiProduces('text/csv')
  async entries(@Query() query: ExportQuery, @Res() response: Response): Promise<void> {
    sendCsv(response, await this.exports.entries(query), `entries ${query.from} to ${query.to}.csv`);
  }

  @Get('periods')
  async months(): Promise<MonthsDto> {
    return this.periods.list();
  }

  @Post('periods/:month/closed')
  @HttpCode(204)
  @Roles('accountant')
  async close(@Param('month') month: string, @CurrentUser() person: SignedInUser): Promise<void> {
    await this.periods.close(monthOf(month), person);
  }

  @Post('periods/:month/reopened')
  @HttpCode(204)
  @Roles('accountant')
  async reopen(
    @Param('month') month: string,
    @Body() input: ReopenMonthInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.periods.reopen(monthOf(month), input.reason, person);
  }
}

/** A month as `2027-03`; anything else names none. */
function monthOf(text: string): string {
  if (!/^20\d\d-(0[1-9]|1[0-2])$/.test(text)) throw notFound('month');
  return text;
}

function sendCsv(response: Response, content: string, fileName: string): void {
  response.setHeader('Content-Security-Policy', "default-src 'none'; sandbox");
  response.setHeader('Content-Disposition', attachmentNamed(fileName));
  response.type('text/csv').send(content);
}

import { Controller, Get, Query, Res } from '@nestjs/common';
import { ApiProduces } from '@nestjs/swagger';
import type { Response } from 'express';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Files } from '../platform/files/files.js';
import { sendFile } from '../platform/files/send-file.js';
import { CodeParam } from '../platform/validation/codes.js';
import { InvoiceDto, InvoicePageDto, InvoicesQuery } from './invoice.dto.js';
import { IssuedInvoicesService } from './issued-invoices.service.js';

/** Invoices and credit notes, under their numbers. */
@Controller('invoices')
export class InvoicesController {
  constructor(
    private readonly invoices: IssuedInvoicesService,
    private readonly files: Files,
  ) {}

  @Get()
  @Roles('owner', 'accountant')
  async list(@Query() query: InvoicesQuery): Promise<InvoicePageDto> {
    return this.invoices.list(query);
  }

  @Get(':code')
  @Roles('owner', 'accountant')
  async get(@CodeParam('document') number: string): Promise<InvoiceDto> {
    return this.invoices.get(number);
  }

  /** The paper, also for the buyer whose it is. */
  @Get(':code/pdf')
  @ApiProduces('application/pdf')
  @Roles('owner', 'accountant', 'customer')
  async pdf(
    @CodeParam('document') number: string,
    @CurrentUser() person: SignedInUser,
    @Res() response: Response,
  ): Promise<void> {
    const { fileId, fileName } = await this.invoices.file(number, person);
    await sendFile(response, this.files, await this.files.describe(fileId), fileName);
  }
}

import { Controller, Get, Header, Param, Query, StreamableFile } from '@nestjs/common';
import { ApiProduces } from '@nestjs/swagger';
import { Public, Roles } from '../platform/auth/access.js';
import { CodeParam } from '../platform/validation/codes.js';
import { SerialParam } from './serial.js';
import { PublicUnitDto, UnitDto, UnitPageDto, UnitsQuery } from './unit.dto.js';
import { UnitPagesService } from './unit-pages.service.js';

@Controller()
@Roles('owner', 'assembler')
export class UnitsController {
  constructor(private readonly units: UnitPagesService) {}

  @Get('units')
  async list(@Query() query: UnitsQuery): Promise<UnitPageDto> {
    return this.units.list(query);
  }

  @Get('units/:serial')
  async open(@SerialParam() serial: string): Promise<UnitDto> {
    return this.units.open(serial);
  }

  @Get('units/:serial/label')
  @ApiProduces('application/pdf')
  async label(@SerialParam() serial: string): Promise<StreamableFile> {
    return pdf(await this.units.label(serial), `${serial}.pdf`);
  }

  @Get('batches/:number/labels')
  @ApiProduces('application/pdf')
  async labels(@CodeParam('document', 'number') number: string): Promise<StreamableFile> {
    return pdf(await this.units.labelsOfBatch(number), `Labels ${number}.pdf`);
  }

  /** Opened by the code on a unit's label; kept out of search engines. */
  @Get('unit-pages/:token')
  @Public()
  @Header('X-Robots-Tag', 'noindex, nofollow')
  @Header('Cache-Control', 'no-store')
  async publicPage(@Param('token') token: string): Promise<PublicUnitDto> {
    return this.units.publicPage(token);
  }
}

function pdf(content: Buffer, fileName: string): StreamableFile {
  return new StreamableFile(content, { type: 'application/pdf', disposition: `inline; filename="${fileName}"` });
}

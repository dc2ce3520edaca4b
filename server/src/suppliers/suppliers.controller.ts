import { Body, Controller, Get, Post, Put, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { SupplierDto, SupplierEditDto, SupplierInputDto, SupplierPageDto, SuppliersQuery } from './supplier.dto.js';
import { SuppliersService } from './suppliers.service.js';

@Controller('suppliers')
export class SuppliersController {
  constructor(private readonly suppliers: SuppliersService) {}

  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: SuppliersQuery): Promise<SupplierPageDto> {
    return this.suppliers.list(query);
  }

  @Get(':code')
  @Roles('owner', 'assembler', 'accountant')
  async get(@CodeParam('supplier') code: string): Promise<SupplierDto> {
    return this.suppliers.get(code);
  }

  @Post()
  @Roles('owner')
  @Creates()
  async create(@Body() input: SupplierInputDto, @CurrentUser() person: SignedInUser): Promise<SupplierDto> {
    return this.suppliers.create(input, person);
  }

  @Put(':code')
  @Roles('owner')
  async edit(
    @CodeParam('supplier') code: string,
    @Body() input: SupplierEditDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<SupplierDto> {
    return this.suppliers.edit(code, input, person);
  }
}

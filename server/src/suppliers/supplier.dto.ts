import { Matches } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Email, Nullable, Optional, Text, Version, Whole } from '../platform/validation/fields.js';

export class SupplierInputDto {
  @CodeOf('supplier')
  code: string;

  @Text({ max: textLimit.name })
  name: string;

  @Optional()
  @Nullable()
  @Email()
  email?: string | null;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  phone?: string | null;

  @Optional()
  @Nullable()
  @Matches(/^[A-Z]{2}$/, { message: 'Give the country by its two letters.' })
  countryCode?: string | null;

  /** The currency it bills in. */
  @Matches(/^[A-Z]{3}$/, { message: 'Give the currency by its three letters, such as EUR.' })
  currency: string;

  /** Days from order to delivery, where a part says nothing else. */
  @Optional()
  @Nullable()
  @Whole({ min: 0, max: 730 })
  leadTimeDays?: number | null;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  note?: string | null;
}

export class SupplierEditDto extends SupplierInputDto {
  @Version()
  version: number;
}

export class SuppliersQuery extends PageQuery {}

export class SupplierItemDto {
  id: number;
  code: string;
  name: string;
  countryCode: string | null;
  leadTimeDays: number | null;
  /** How many parts can be bought there. */
  partCount: number;
  /** The day of the latest delivery. */
  lastReceivedOn: string | null;
}

export class SupplierPageDto {
  items: SupplierItemDto[];
  total: number;
}

export class SuppliedPartDto {
  code: string;
  name: string;
  supplierPartCode: string | null;
  leadTimeDays: number | null;
  preferred: boolean;
}

export class SupplierDeliveryDto {
  number: string;
  receivedOn: string;
  deliveryNote: string | null;
  lotCount: number;
}

export class SupplierDto extends SupplierInputDto {
  id: number;
  version: number;
  parts: SuppliedPartDto[];
  /** The latest, newest first. */
  deliveries: SupplierDeliveryDto[];
}

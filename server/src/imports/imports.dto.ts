import { IsIn } from 'class-validator';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { Optional, Text } from '../platform/validation/fields.js';

export class ImportColumnDto {
  key: string;
  title: string;
  required: boolean;
  /** What belongs there. */
  sentence: string;
}

export class ImportKindDto {
  kind: string;
  title: string;
  sentence: string;
  columns: ImportColumnDto[];
}

export class ImportKindsDto {
  items: ImportKindDto[];
  total: number;
}

/** What comes with the file, as form fields. */
export class ImportFormDto {
  /** Corrections of the columns found, as JSON: per column of the file (from 0) a key, or null to leave it alone. */
  @Optional()
  @Text({ max: 10_000 })
  mapping?: string;

  /** Which sign the file writes before decimals, where its numbers do not show it. */
  @Optional()
  @IsIn(['point', 'comma'], { message: 'Choose the point or the comma.' })
  decimalSign?: 'point' | 'comma';
}

export class FileColumnDto {
  /** Its place in the file, from 0. */
  index: number;
  header: string;
  /** The key of the column it fills; null when it is left alone. */
  key: string | null;
  title: string | null;
  /** The first value in it. */
  sample: string;
}

export class RowFaultDto {
  /** In the file; the header is line 1. */
  line: number;
  column: string | null;
  sentence: string;
}

export class ImportCheckDto {
  kind: string;
  fileName: string;
  rowCount: number;
  /** What cuts the file into cells. */
  separator: string;
  decimalSign: 'point' | 'comma' | null;
  columns: FileColumnDto[];
  /** All of them are counted; the first thousand are listed. */
  faultCount: number;
  faults: RowFaultDto[];
  /** What would be added, and what is there already. */
  notes: string[];
  additions: number;
  /** Whether it can be applied: no fault, and something to add. */
  ready: boolean;
}

export class ImportRunDto {
  id: number;
  kind: string;
  title: string;
  fileName: string;
  rowCount: number;
  appliedAt: string;
  appliedBy: string;
  /** The document that carries what was taken in. */
  document: string | null;
}

export class ImportsQuery extends PageQuery {}

export class ImportRunPageDto {
  items: ImportRunDto[];
  total: number;
}

export class AppliedImportDto extends ImportRunDto {
  notes: string[];
}

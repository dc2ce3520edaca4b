import { Inject, Injectable } from '@nestjs/common';
import { notFound } from '../platform/errors/app-error.js';
import type { ImportKind } from './import-kind.js';

/** All kinds of table that can be taken in; the module lists them. */
export const importKinds = Symbol('importKinds');

@Injectable()
export class ImportKinds {
  constructor(@Inject(importKinds) readonly all: readonly ImportKind[]) {}

  /** @throws AppError `not_found` */
  get(key: string): ImportKind {
    const kind = this.all.find((candidate) => candidate.key === key);
    if (!kind) throw notFound('kind of import');
    return kind;
  }
}

import { applyDecorators, UseInterceptors } from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import { ApiBody, ApiConsumes } from '@nestjs/swagger';
import multer from 'multer';
import { csvLimit } from '@emberlot/shared/limits/imports';
import { fieldFault } from '../platform/errors/app-error.js';
import type { UploadedCsv } from './imports.service.js';

/** What multer hands over of the one file. */
export interface ReceivedFile {
  readonly originalname: string;
  readonly buffer: Buffer;
}

/** A route that takes one file under the name `file`, held in memory while it is read, and few form fields. */
export function TakesCsv(): MethodDecorator {
  const limits = {
    fileSize: csvLimit.bytes,
    files: 1,
    fields: 4,
    parts: 5,
    fieldSize: 20_000,
    fieldNameSize: 40,
    headerPairs: 20,
  };
  return applyDecorators(
    UseInterceptors(FileInterceptor('file', { storage: multer.memoryStorage(), limits })),
    ApiConsumes('multipart/form-data'),
    ApiBody({
      schema: {
        type: 'object',
        required: ['file'],
        properties: {
          file: { type: 'string', format: 'binary' },
          mapping: { type: 'string' },
          decimalSign: { type: 'string', enum: ['point', 'comma'] },
        },
      },
    }),
  );
}

/** @throws AppError `invalid_input` when no file came */
export function csvOf(file: ReceivedFile | undefined): UploadedCsv {
  if (!file) throw fieldFault('/file', 'missing', 'Choose a CSV file.');
  // Browsers send the name in UTF-8, which the multipart parser reads byte by byte.
  const name = Buffer.from(file.originalname, 'latin1').toString('utf8');
  return {
    fileName:
      name
        .replaceAll(/[\p{Cc}\\/]/gu, ' ')
        .trim()
        .slice(0, 200) || 'file.csv',
    bytes: file.buffer,
  };
}

import { randomUUID } from 'node:crypto';
import type { LoggerService } from '@nestjs/common';
import { type DestinationStream, type Logger, pino } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Request, RequestHandler } from 'express';

/** The logger behind Nest's own, by this token. */
export const appLogger = Symbol('appLogger');

/** One JSON object a line, instants in UTC. What must never be read in a log is never handed to it. */
export function createLogger(level: string, destination?: DestinationStream): Logger {
  return pino({ level, timestamp: pino.stdTimeFunctions.isoTime, base: undefined }, destination);
}

/** Nest names each module and route while it puts the application together. */
const assembling: ReadonlySet<string> = new Set(['InstanceLoader', 'RouterExplorer', 'RoutesResolver']);

/** Nest's messages, in the same lines as everything else. */
export class PinoLoggerService implements LoggerService {
  constructor(private readonly logger: Logger) {}

  log(message: unknown, ...more: unknown[]): void {
    this.#write(assembling.has(String(more.at(-1))) ? 'debug' : 'info', message, more);
  }

  error(message: unknown, ...more: unknown[]): void {
    this.#write('error', message, more);
  }

  warn(message: unknown, ...more: unknown[]): void {
    this.#write('warn', message, more);
  }

  debug(message: unknown, ...more: unknown[]): void {
    this.#write('debug', message, more);
  }

  /** Nest puts the name of the speaker last, and a stack before it when there is one. */
  #write(level: 'info' | 'error' | 'warn' | 'debug', message: unknown, more: readonly unknown[]): void {
    const context = more.at(-1);
    const stack = more.length > 1 ? more[0] : undefined;
    const fields = typeof message === 'object' && message !== null ? message : { msg: String(message) };
    this.logger[level]({ context, ...(stack === undefined ? {} : { stack }), ...fields });
  }
}

/** One line for each request: the path without its query, nothing of headers or bodies. */
export function requestLog(logger: Logger): RequestHandler {
  return pinoHttp<Request>({
    logger,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    quietReqLogger: true,
    customLogLevel: (_request, response, error) => {
      if (error || response.statusCode >= 500) return 'error';
      return response.statusCode >= 400 ? 'warn' : 'info';
    },
    serializers: {
      req: (request: { raw: Request }) => ({
        method: request.raw.method,
        path: request.raw.originalUrl.split('?')[0],
        address: request.raw.ip,
        userId: request.raw.user?.id,
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  }) as RequestHandler;
}

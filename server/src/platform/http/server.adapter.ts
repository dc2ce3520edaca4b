import { createServer } from 'node:http';
import type { NestApplicationOptions } from '@nestjs/common';
import { ExpressAdapter } from '@nestjs/platform-express';

/** How long a client may take: to send its headers, its whole request, and between two requests. */
const patience = {
  headersTimeout: 10_000,
  requestTimeout: 60_000,
  keepAliveTimeout: 5_000,
  // Node looks at the two limits above only this often; its usual 30 s would let slow clients live that much longer.
  connectionsCheckingInterval: 2_000,
  maxHeaderSize: 16 * 1_024,
} as const;

/** Express under Nest, on a server that does not wait for slow clients. */
export class ServerAdapter extends ExpressAdapter {
  override initHttpServer(options: NestApplicationOptions): void {
    super.initHttpServer(options);
    this.httpServer = createServer(patience, this.getInstance());
  }
}

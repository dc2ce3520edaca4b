import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { SessionStore } from './session.store.js';

/** Stops the sweeping of old sessions before the connections are closed. */
@Injectable()
export class SessionStoreCloser implements OnApplicationShutdown {
  constructor(private readonly store: SessionStore) {}

  onApplicationShutdown(): void {
    this.store.close();
  }
}

import { Injectable } from '@nestjs/common';

/** Whether this process takes requests: no longer, once it has begun to stop. */
@Injectable()
export class Readiness {
  #leaving = false;

  get leaving(): boolean {
    return this.#leaving;
  }

  leave(): void {
    this.#leaving = true;
  }
}

import type { Steps } from './planned-part.js';

interface Layer {
  readonly expires: number;
  quantity: Steps;
}

/** What lies on the shelf through time, used up in the order in which it expires; may be overdrawn. */
export class ShelfLayers {
  private layers: Layer[] = [];
  private overdrawn = 0;

  get balance(): Steps {
    return this.layers.reduce((sum, { quantity }) => sum + quantity, 0) - this.overdrawn;
  }

  copy(): ShelfLayers {
    const copy = new ShelfLayers();
    copy.layers = this.layers.map((layer) => ({ ...layer }));
    copy.overdrawn = this.overdrawn;
    return copy;
  }

  add(quantity: Steps, expires: number): void {
    const repaid = Math.min(quantity, this.overdrawn);
    this.overdrawn -= repaid;
    const left = quantity - repaid;
    if (left === 0) return;
    const at = this.layers.findIndex((layer) => layer.expires >= expires);
    const found = this.layers[at];
    if (found?.expires === expires) found.quantity += left;
    else this.layers.splice(at < 0 ? this.layers.length : at, 0, { expires, quantity: left });
  }

  /** Drops what can no longer be used in a period. Answers how much that is. */
  expire(period: number): Steps {
    let dropped = 0;
    while ((this.layers[0]?.expires ?? Infinity) <= period) dropped += this.layers.shift()?.quantity ?? 0;
    return dropped;
  }

  take(quantity: Steps): void {
    let left = quantity;
    while (left > 0) {
      const [first] = this.layers;
      if (first === undefined) {
        this.overdrawn += left;
        return;
      }
      const taken = Math.min(left, first.quantity);
      first.quantity -= taken;
      left -= taken;
      if (first.quantity === 0) this.layers.shift();
    }
  }
}

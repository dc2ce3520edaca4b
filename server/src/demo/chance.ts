/** Numbers from a fixed seed, so that each load of the demo tells the same story (mulberry32, public domain). */
export class Chance {
  #state: number;

  constructor(seed: number) {
    this.#state = seed >>> 0;
  }

  /** From 0 to below 1. */
  next(): number {
    this.#state = (this.#state + 0x6d2b79f5) >>> 0;
    let mixed = this.#state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  }

  /** About normal: mean 0, deviation 1 (sum of twelve). */
  bell(): number {
    let sum = -6;
    for (let count = 0; count < 12; count += 1) sum += this.next();
    return sum;
  }

  pick<Item>(items: readonly [Item, ...Item[]]): Item {
    return items[Math.floor(this.next() * items.length)] ?? items[0];
  }

  /** A random UUID of version 4 form. */
  uuid(): string {
    const hex = Array.from({ length: 32 }, () => Math.floor(this.next() * 16).toString(16));
    hex[12] = '4';
    hex[16] = '8';
    const text = hex.join('');
    return `${text.slice(0, 8)}-${text.slice(8, 12)}-${text.slice(12, 16)}-${text.slice(16, 20)}-${text.slice(20)}`;
  }
}

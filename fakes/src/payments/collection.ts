/** Things by id in the order they came to be; a change replaces the thing, so that a snapshot once taken stays as it was. */
export class Collection<T extends { readonly id: string }> {
  readonly #things = new Map<string, T>();

  add(thing: T): T {
    if (this.#things.has(thing.id)) throw new Error(`There is a ${thing.id} already.`);
    this.#things.set(thing.id, thing);
    return thing;
  }

  find(id: string): T | undefined {
    return this.#things.get(id);
  }

  get(id: string): T {
    const thing = this.#things.get(id);
    if (!thing) throw new Error(`There is no ${id}.`);
    return thing;
  }

  change(id: string, patch: Partial<T>): T {
    const changed = { ...this.get(id), ...patch };
    this.#things.set(id, changed);
    return changed;
  }

  oldestFirst(): readonly T[] {
    return [...this.#things.values()];
  }

  newestFirst(): readonly T[] {
    return this.oldestFirst().toReversed();
  }

  replaceAll(things: readonly T[]): void {
    this.#things.clear();
    for (const thing of things) this.#things.set(thing.id, thing);
  }
}

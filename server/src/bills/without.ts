/** A copy that leaves some members out. */
export function without<Item extends object, Key extends keyof Item>(
  item: Item,
  ...keys: readonly Key[]
): Omit<Item, Key> {
  const left = new Set<PropertyKey>(keys);
  return Object.fromEntries(Object.entries(item).filter(([key]) => !left.has(key))) as Omit<Item, Key>;
}

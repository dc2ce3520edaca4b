/** `1 part`, `2 parts`, `12,480 parts`. */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${count.toLocaleString('en')} ${count === 1 ? one : many}`;
}

/** The first few names of a list, and how many more there are. */
export function listed(names: readonly string[], most = 20): string {
  const shown = names.slice(0, most).join(', ');
  return names.length > most ? `${shown} and ${(names.length - most).toLocaleString('en')} more` : shown;
}

import { badParameter } from './api-error.js';

export type FormValue = string | FormTree;
export type FormTree = { [name: string]: FormValue };

/**
 * Decodes a form body with nested keys: `a[b][0][c]=x`, `a[]=x`.
 *
 * @param text application/x-www-form-urlencoded
 * @returns a tree; lists are trees whose names are positions
 */
export function parseForm(text: string): FormTree {
  const tree = emptyTree();
  for (const [key, value] of new URLSearchParams(text)) place(tree, pathOf(key), value, key);
  return tree;
}

function emptyTree(): FormTree {
  // Without a prototype, so that a key such as __proto__ is a name like any other.
  return Object.create(null) as FormTree;
}

function pathOf(key: string): string[] {
  const start = key.indexOf('[');
  if (start < 0) return [key];
  const rest = key.slice(start);
  if (!/^(\[[^[\]]*\])+$/.test(rest)) throw badParameter(key, `Invalid parameter name: ${key}`);
  return [key.slice(0, start), ...Array.from(rest.matchAll(/\[([^[\]]*)\]/g), (match) => match[1] ?? '')];
}

function place(tree: FormTree, path: readonly string[], value: string, key: string): void {
  let branch = tree;
  for (const [depth, part] of path.entries()) {
    const name = part === '' ? String(Object.keys(branch).length) : part;
    if (depth === path.length - 1) {
      branch[name] = value;
      return;
    }
    const next = branch[name] ?? (branch[name] = emptyTree());
    if (typeof next === 'string') throw badParameter(key, `Invalid object: ${key}`);
    branch = next;
  }
}

/** One text for one set of parameters, whatever the order they came in. */
export function canonical(value: FormValue): string {
  if (typeof value === 'string') return JSON.stringify(value);
  const parts = Object.keys(value)
    .toSorted()
    .map((name) => `${JSON.stringify(name)}:${canonical(value[name] ?? '')}`);
  return `{${parts.join(',')}}`;
}

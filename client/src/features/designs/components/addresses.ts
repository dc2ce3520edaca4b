import type { RevisionPlace } from '../api/bills';

/** Where a part's design is shown; with a number, that revision of it. */
export function billAddress(code: string, number?: number): string {
  const page = `/designs/bills/${encodeURIComponent(code)}`;
  return number === undefined ? page : `${page}?revision=${number}`;
}

export function editAddress({ code, number }: RevisionPlace): string {
  return `/designs/bills/${encodeURIComponent(code)}/revisions/${number}/edit`;
}

export function compareAddress(code: string, from: number, to: number): string {
  return `/designs/bills/${encodeURIComponent(code)}/compare?from=${from}&to=${to}`;
}

export function kitAddress(code: string): string {
  return `/designs/kits/${encodeURIComponent(code)}`;
}

export function editKitAddress(code: string): string {
  return `${kitAddress(code)}?edit=yes`;
}

export function whereUsedAddress(code: string): string {
  return `/designs/where-used?part=${encodeURIComponent(code)}`;
}

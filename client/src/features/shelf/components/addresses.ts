/** Addresses within the shelf, with what a form should begin with. */
export function transferAddress(from: { part?: string; lot?: string; bin?: string; quantity?: string }): string {
  return withQuery('/shelf/transfer', from);
}

export function adjustAddress(of: { part?: string; lot?: string; bin?: string; reason?: string }): string {
  return withQuery('/shelf/adjust', of);
}

export function receiveAddress(of: { part?: string; supplier?: string }): string {
  return withQuery('/shelf/deliveries/new', of);
}

export function partAddress(code: string): string {
  return `/shelf/parts/${encodeURIComponent(code)}`;
}

export function lotAddress(code: string): string {
  return `/shelf/lots/${encodeURIComponent(code)}`;
}

/** Back to what the form was opened from. */
export function backTo({ part, lot, bin }: { part: string; lot: string; bin: string }): string {
  if (bin && !lot) return `/shelf/bins/${encodeURIComponent(bin)}`;
  if (lot) return lotAddress(lot);
  return part ? partAddress(part) : '/shelf/moves';
}

function withQuery(path: string, values: Readonly<Record<string, string | undefined>>): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(values)) if (value) query.set(name, value);
  const text = query.toString();
  return text ? `${path}?${text}` : path;
}

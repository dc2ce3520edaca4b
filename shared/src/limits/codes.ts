/** Codes that are printed on tags and labels; forms, imports, server and database take the same ones. */
export const codePattern = {
  part: /^[A-Z0-9][A-Z0-9./-]{0,31}$/,
  supplier: /^[A-Z0-9][A-Z0-9-]{0,23}$/,
  bin: /^[A-Z0-9][A-Z0-9.-]{0,23}$/,
  lot: /^[A-Z0-9][A-Z0-9./-]{0,39}$/,
  document: /^[A-Z]{1,4}-[A-Z0-9-]{1,30}$/,
} as const;

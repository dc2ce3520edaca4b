/** What an imported CSV file may hold at most: bytes, lines below the header, columns, characters in a cell. */
export const csvLimit = { bytes: 16 * 1_048_576, rows: 100_000, columns: 100, cell: 2_000 } as const;

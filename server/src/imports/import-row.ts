export type CellValue = string | number | null;

/** One line of a file, its cells read by their columns' types. A column that the file lacks reads as empty. */
export class ImportRow {
  constructor(
    readonly line: number,
    private readonly cells: ReadonlyMap<string, CellValue>,
  ) {}

  /** A text, code, plain decimal, day or choice; null for an empty cell. */
  text(key: string): string | null {
    const value = this.cells.get(key) ?? null;
    return typeof value === 'number' ? String(value) : value;
  }

  /** A cell that the column requires. */
  required(key: string): string {
    const value = this.text(key);
    if (value === null) throw new Error(`the column ${key} was not required, or its fault was passed over`);
    return value;
  }

  whole(key: string): number | null {
    const value = this.cells.get(key) ?? null;
    return typeof value === 'string' ? Number(value) : value;
  }

  /** The keys that have a value, in the order of the file's columns. */
  filled(): readonly string[] {
    return [...this.cells].filter(([, value]) => value !== null).map(([key]) => key);
  }
}

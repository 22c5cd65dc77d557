type Cell = string | number | boolean | null | readonly number[];

/** One row of a reference table, its cells by column name. */
export class TableRow {
  constructor(
    private readonly columns: readonly string[],
    private readonly cells: readonly Cell[],
  ) {}

  cell(column: string): Cell {
    const value = this.cells[this.columns.indexOf(column)];
    if (value === undefined) throw new RangeError(`no column ${column} in the table`);
    return value;
  }

  number(column: string): number {
    const value = this.cell(column);
    if (typeof value !== 'number') throw new TypeError(`${column} is not a number`);
    return value;
  }

  isIn(column: string, values: readonly Cell[]): boolean {
    return values.includes(this.cell(column));
  }
}

export function tableRows(columns: readonly string[], rows: readonly (readonly Cell[])[]): TableRow[] {
  return rows.map((cells) => new TableRow(columns, cells));
}

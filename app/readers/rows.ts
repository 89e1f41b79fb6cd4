/** Rows of cells of a table, wherever they lie. */
export interface Rows {
  readonly length: number;
  /** Cells of a row, from 0; none beyond the last row. */
  row: (index: number) => string[];
  /** One cell, without the others of its row being made; undefined beyond the row's end. */
  cell: (row: number, column: number) => string | undefined;
  /** Number of cells of a row. */
  width: (row: number) => number;
}

/** Rows that are there as lists of cells. */
export function rowsOf(cells: readonly string[][]): Rows {
  return {
    length: cells.length,
    row: (index) => cells[index] ?? [],
    cell: (row, column) => cells[row]?.[column],
    width: (row) => cells[row]?.length ?? 0,
  };
}

/**
 * Rows of a text without quotation marks, one a line: only where each cell begins is kept, and cells are cut out as they
 * are asked for. A million lines take a tenth of what lists of cells take, which the collector would copy about.
 * @param delimiter one character
 */
export function packedRows(text: string, delimiter: string): Rows {
  const lines = countOf(text, "\n") + 1;
  const starts = new Uint32Array(lines + countOf(text, delimiter) + 1);
  const firsts = new Uint32Array(lines + 1);
  let cells = 0;
  let start = 0;
  let end = text.indexOf("\n");
  for (let line = 0; line < lines; line += 1) {
    if (end < 0) end = text.length;
    firsts[line] = cells;
    starts[cells++] = start;
    for (let at = start; at < end; at += 1) if (text[at] === delimiter) starts[cells++] = at + 1;
    start = end + 1;
    end = text.indexOf("\n", start);
  }
  firsts[lines] = cells;
  starts[cells] = text.length + 1;
  // A cell ends where the next begins, less the delimiter or the line end between them.
  const cut = (cell: number): string => text.slice(starts[cell], (starts[cell + 1] ?? 0) - 1);
  const width = (row: number): number => (row >= 0 && row < lines ? (firsts[row + 1] ?? 0) - (firsts[row] ?? 0) : 0);
  return {
    length: lines,
    row: (index) => Array.from({ length: width(index) }, (_, column) => cut((firsts[index] ?? 0) + column)),
    cell: (row, column) => (column >= 0 && column < width(row) ? cut((firsts[row] ?? 0) + column) : undefined),
    width,
  };
}

/** Some rows of others, in the given order. */
export function chosenRows(rows: Rows, indices: readonly number[]): Rows {
  const at = (index: number): number => indices[index] ?? -1;
  return {
    length: indices.length,
    row: (index) => rows.row(at(index)),
    cell: (row, column) => rows.cell(at(row), column),
    width: (row) => rows.width(at(row)),
  };
}

/** All cells of one column, a row without it as a blank. */
export function* columnOf(rows: Rows, column: number): Generator<string> {
  for (let row = 0; row < rows.length; row += 1) yield rows.cell(row, column) ?? "";
}

function countOf(text: string, character: string): number {
  let count = 0;
  for (let at = text.indexOf(character); at >= 0; at = text.indexOf(character, at + 1)) count += 1;
  return count;
}

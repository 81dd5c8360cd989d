import { readFileSync } from 'node:fs';
import { afterAll } from 'vitest';

/** One row of a reference table: the cell of a column as text or as a number. */
export type ReferenceRow = { text: (column: string) => string; number: (column: string) => number };

/** Rows of tests/reference/<file>; lines starting with # say where the table comes from. */
export function referenceRows(file: string): ReferenceRow[] {
  const lines = readFileSync(`tests/reference/${file}`, 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map(cellsOf);
  const [header, ...rows] = lines;
  return rows.map((cells) => {
    const text = (column: string): string => {
      const cell = cells[header!.indexOf(column)];
      if (cell === undefined) throw new Error(`${file} has no column ${column}.`);
      return cell;
    };
    return {
      text,
      number: (column) => {
        const value = Number(text(column));
        if (text(column) === '' || !Number.isFinite(value)) throw new Error(`${file}: ${column} is "${text(column)}".`);
        return value;
      },
    };
  });
}

function cellsOf(line: string): string[] {
  return [...line.matchAll(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)]
    .map((match) => match[1]!)
    .slice(0, -1)
    .map((cell) => (cell.startsWith('"') ? cell.slice(1, -1).replaceAll('""', '"') : cell));
}

/** Collects errors per column and prints one line of them when the file's tests are over. */
export class ErrorReport {
  readonly #errors = new Map<string, number[]>();

  constructor(table: string) {
    afterAll(() => {
      for (const [column, errors] of this.#errors) {
        console.log(
          `${table} ${column}: ${errors.length} rows, worst ${this.worst(column).toFixed(5)}, RMS ${this.rms(column).toFixed(5)}`,
        );
      }
    });
  }

  note(column: string, error: number): number {
    const errors = this.#errors.get(column) ?? [];
    errors.push(error);
    this.#errors.set(column, errors);
    return error;
  }

  worst(column: string): number {
    return Math.max(...this.#of(column).map(Math.abs));
  }

  rms(column: string): number {
    const errors = this.#of(column);
    return Math.sqrt(errors.reduce((sum, error) => sum + error * error, 0) / errors.length);
  }

  #of(column: string): number[] {
    const errors = this.#errors.get(column);
    if (errors === undefined || errors.length === 0) throw new Error(`No errors noted for ${column}.`);
    return errors;
  }
}

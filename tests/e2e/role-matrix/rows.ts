import { type Client, createClient, type Value } from '@libsql/client';
import { createHash } from 'node:crypto';
import { rmSync } from 'node:fs';
import type { Server } from '../support/server';

/** Tables that keep books about asking itself: a refused try is counted before anybody knows who may. */
const bookkeeping = ['rate_limits'];

/** A row that came, went or became another, as text that holds all of its values. */
export type ChangedRow = { table: string; row: string };

/** Every row of a server's database, against what it was at first. */
export class Rows {
  readonly #reader: Client;
  readonly #writer: Client;
  #first: ReadonlyMap<string, ReadonlySet<string>> = new Map();
  #seen: { version: number; different: ChangedRow[] } = { version: -1, different: [] };

  private constructor({ databaseFile }: Server) {
    this.#reader = createClient({ url: `file:${databaseFile}` });
    this.#writer = createClient({ url: `file:${databaseFile}` });
  }

  /** Keeps how everything is now. */
  static async keep(server: Server): Promise<Rows> {
    const rows = new Rows(server);
    const kept = server.databaseFile.replace(/\.db$/, '-kept.db');
    rmSync(kept, { force: true });
    await rows.#writer.execute({ sql: 'vacuum into ?', args: [kept] });
    // Rows are put back table by table: what they refer to may still be missing then.
    await rows.#writer.executeMultiple('pragma busy_timeout = 5000; pragma foreign_keys = off;');
    await rows.#writer.execute({ sql: 'attach database ? as kept', args: [kept] });
    rows.#seen = { version: await rows.#version(), different: [] };
    rows.#first = await rows.#readAll();
    return rows;
  }

  /** What is different from the first state, without the bookkeeping. */
  async changed(): Promise<ChangedRow[]> {
    return (await this.#different()).filter(({ table }) => !bookkeeping.includes(table));
  }

  /** What is different from a state that was `changed` before. */
  async changedSince(before: readonly ChangedRow[]): Promise<ChangedRow[]> {
    const now = await this.changed();
    const without = (those: readonly ChangedRow[], others: readonly ChangedRow[]) => {
      const known = new Set(others.map(({ table, row }) => `${table} ${row}`));
      return those.filter(({ table, row }) => !known.has(`${table} ${row}`));
    };
    return [...without(now, before), ...without(before, now)];
  }

  /** Sets the scene of one question; `restore` takes it back. */
  async write(sql: string): Promise<void> {
    await this.#writer.executeMultiple(sql);
  }

  /** Makes everything as it was at first. */
  async restore(): Promise<void> {
    const tables = [...new Set((await this.#different()).map(({ table }) => table))];
    if (tables.length === 0) return;
    const again = tables.map(
      (table) => `delete from main."${table}"; insert into main."${table}" select * from kept."${table}";`,
    );
    await this.#writer.executeMultiple(`begin immediate; ${again.join(' ')} commit;`);
    for (const table of tables)
      if (this.#differenceIn(table, await this.#readTable(table)).length > 0)
        throw new Error(`The table ${table} could not be made as it was.`);
    this.#seen = { version: await this.#version(), different: [] };
  }

  close(): void {
    this.#reader.close();
    this.#writer.close();
  }

  /** Looks at every row only when somebody has written since: most questions write nothing. */
  async #different(): Promise<ChangedRow[]> {
    const version = await this.#version();
    if (version !== this.#seen.version) {
      const different: ChangedRow[] = [];
      for (const [table, rows] of await this.#readAll()) different.push(...this.#differenceIn(table, rows));
      this.#seen = { version, different };
    }
    return this.#seen.different;
  }

  #differenceIn(table: string, now: ReadonlySet<string>): ChangedRow[] {
    const former = this.#first.get(table) ?? new Set<string>();
    const changed = [...[...now].filter((row) => !former.has(row)), ...[...former].filter((row) => !now.has(row))];
    return changed.map((row) => ({ table, row }));
  }

  /** Another number after every write of another connection, the server's among them. */
  async #version(): Promise<number> {
    const { rows } = await this.#reader.execute('pragma data_version');
    return Number(rows[0]?.[0]);
  }

  async #readAll(): Promise<Map<string, ReadonlySet<string>>> {
    const listed = await this.#reader.execute(
      `select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name not like '\\_\\_%' escape '\\'`,
    );
    const tables = new Map<string, ReadonlySet<string>>();
    for (const { name } of listed.rows) tables.set(String(name), await this.#readTable(String(name)));
    return tables;
  }

  async #readTable(table: string): Promise<ReadonlySet<string>> {
    const { rows, columns } = await this.#reader.execute(`select * from "${table}"`);
    return new Set(rows.map((row) => JSON.stringify(columns.map((_, index) => plain(row[index])))));
  }
}

/** A picture stands for itself by its digest. */
function plain(value: Value | undefined): Value | undefined {
  return value instanceof ArrayBuffer ? createHash('sha256').update(new Uint8Array(value)).digest('hex') : value;
}

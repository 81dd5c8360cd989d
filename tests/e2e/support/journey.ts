import type { Browser } from 'playwright-core';
import { join } from 'node:path';
import { Visitor, type VisitorOptions } from './browser';
import { shotsFolder } from './place';
import { seededDatabase } from './seeded';
import { Server, type ServerOptions } from './server';

export type Journey = {
  name: string;
  /** After which it is ended and counts as failed. */
  seconds: number;
  /** Nothing else runs beside it: it measures time. */
  alone?: boolean;
  run: (stage: Stage) => Promise<void>;
};

export type Check = { what: string; good: boolean; detail: string };

/** What a journey has at hand; whatever it opens is closed, and looked through for complaints, when it ends. */
export class Stage {
  readonly checks: Check[] = [];
  readonly #servers: Server[] = [];
  readonly #visitors: Visitor[] = [];

  constructor(
    readonly journey: string,
    readonly browser: Browser,
  ) {}

  /** One thing that has to be true. A check that fails does not end the journey. */
  check(what: string, good: boolean, detail: unknown = ''): void {
    const words = typeof detail === 'string' ? detail : JSON.stringify(detail);
    this.checks.push({ what, good, detail: good ? '' : words });
  }

  equal(what: string, found: unknown, wanted: unknown): void {
    const [is, should] = [JSON.stringify(found), JSON.stringify(wanted)];
    this.check(what, is === should, `found ${is}, wanted ${should}`);
  }

  /** Nothing may be in the list; what is, is shown. */
  none(what: string, found: readonly unknown[]): void {
    const shown = found.slice(0, 12).map((each) => (typeof each === 'string' ? each : JSON.stringify(each)));
    const more = found.length > shown.length ? [`and ${found.length - shown.length} more`] : [];
    this.check(what, found.length === 0, ['', ...shown, ...more].join('\n        '));
  }

  /** A part that may fail by itself, with everything in it, and lets the journey go on. */
  async part(what: string, run: () => Promise<void>): Promise<void> {
    try {
      await run();
    } catch (problem) {
      this.check(what, false, wordsOf(problem));
      await this.picture(what);
    }
  }

  async server(options: ServerOptions): Promise<Server> {
    const seed = options.fresh ? undefined : await seededDatabase(options.clock);
    const server = await Server.start(options, seed);
    this.#servers.push(server);
    return server;
  }

  async visitor(server: Server, name: string, options?: VisitorOptions): Promise<Visitor> {
    const visitor = await Visitor.open(this.browser, server, name, options);
    this.#visitors.push(visitor);
    return visitor;
  }

  /** What each open page looks like now, for whoever has to find out what went wrong. */
  async picture(what: string): Promise<void> {
    const place = `failed-${this.journey}-${what}`.replace(/\W+/g, '-').slice(0, 90);
    for (const [number, { page, name }] of this.#visitors.entries())
      await page
        .screenshot({ path: join(shotsFolder, `${place}-${number}-${name.replace(/\W+/g, '-')}.png`), timeout: 5000 })
        .catch(() => undefined);
  }

  async end(): Promise<void> {
    for (const { name, complaints } of this.#visitors) this.none(`no complaint in the browser of ${name}`, complaints);
    await Promise.all(this.#visitors.map(({ context }) => context.close().catch(() => undefined)));
    await Promise.all(this.#servers.map((server) => server.stop()));
    for (const server of this.#servers)
      this.none(`no error or warning in the log of ${server.options.name}`, server.complaints);
  }
}

export function wordsOf(problem: unknown): string {
  return problem instanceof Error
    ? `${problem.stack ?? problem.message}`.replace(/\u001b\[\d+m/g, '')
    : String(problem);
}

import { type ChildProcess, spawn } from 'node:child_process';
import { appendFileSync, copyFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { buildFolder, inRoot, root, runFolder } from './place';
import { serverSecret } from './server-secret';
import { until } from './waiting';

export type ServerOptions = {
  /** Names the database and the log. */
  name: string;
  /** What time it is when it starts, as an instant; its clock ticks on from there. */
  clock: string;
  /** The address that people type, where it is not the one that is listened on. */
  origin?: string;
  /** Further settings of its environment, such as MAIL. */
  variables?: Readonly<Record<string, string>>;
  /** Opened as http://localhost and not by its number, which some things of a browser need. */
  byName?: boolean;
  /** Starts without any database, and makes its demo household beside the first requests. */
  fresh?: boolean;
};

/** The wrong zone on purpose: a server that tells hours by its own machine is caught. */
const machineZone = 'Asia/Kathmandu';
export { serverSecret };

/** A production server of the build under test, on a free port, with a database of its own. */
export class Server {
  readonly address: string;
  readonly databaseFile: string;
  readonly log: string[] = [];
  #child: ChildProcess | undefined;

  private constructor(
    readonly options: ServerOptions,
    readonly port: number,
  ) {
    this.address = `http://${options.byName ? 'localhost' : '127.0.0.1'}:${port}`;
    this.databaseFile = databaseFileOf(options.name);
  }

  /** @param seed the database to start from a copy of */
  static async start(options: ServerOptions, seed?: string): Promise<Server> {
    const server = new Server(options, await freePort());
    for (const suffix of ['', '-wal', '-shm']) rmSync(server.databaseFile + suffix, { force: true });
    if (seed !== undefined) copyFileSync(seed, server.databaseFile);
    writeFileSync(server.logFile, '');
    await server.#run(options.clock);
    return server;
  }

  get logFile(): string {
    return join(runFolder, `${this.options.name}.log`);
  }

  /** The origin that a browser would say it is on. */
  get origin(): string {
    return this.options.origin ?? this.address;
  }

  /** Stops it and starts it again on the same database, at another time if one is given. */
  async restart(clock: string): Promise<void> {
    await this.stop();
    await this.#run(clock);
  }

  /** As a power cut would. */
  async kill(): Promise<void> {
    await this.#end('SIGKILL');
  }

  async stop(): Promise<void> {
    await this.#end('SIGTERM');
  }

  /** What it said that should worry somebody. */
  get complaints(): string[] {
    return this.log.filter((line) => /error|warn|⨯|unhandled|exception/i.test(line) || /"level":[456]\d/.test(line));
  }

  async #run(clock: string): Promise<void> {
    const { APP_ORIGIN: _origin, MAIL: _mail, SMTP_URL: _smtp, ...env } = process.env;
    const child = spawn(
      process.execPath,
      [inRoot('node_modules/next/dist/bin/next'), 'start', '-H', '127.0.0.1', '-p', `${this.port}`],
      {
        cwd: root,
        env: {
          ...env,
          NODE_ENV: 'production',
          NEXT_DIST_DIR: buildFolder,
          NEXT_TELEMETRY_DISABLED: '1',
          TZ: machineZone,
          PORT: `${this.port}`,
          DATABASE_URL: `file:${this.databaseFile}`,
          TEST_CLOCK: clock,
          WADEWELL_SECRET: serverSecret,
          ...this.options.variables,
          ...(this.origin === `http://127.0.0.1:${this.port}` ? {} : { APP_ORIGIN: this.origin }),
        },
        stdio: ['ignore', 'pipe', 'pipe'],
      },
    );
    this.#child = child;
    const keep = (piece: Buffer) => {
      appendFileSync(this.logFile, piece);
      this.log.push(...piece.toString().split('\n').filter(Boolean));
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    const up = await until(() => child.exitCode !== null || this.#answers(), { seconds: 60 });
    if (!up || child.exitCode !== null)
      throw new Error(`The server "${this.options.name}" did not start:\n${this.log.slice(-20).join('\n')}`);
  }

  async #answers(): Promise<boolean> {
    try {
      return (await fetch(`${this.address}/api/health`, { signal: AbortSignal.timeout(2000) })).ok;
    } catch {
      return false;
    }
  }

  async #end(signal: 'SIGTERM' | 'SIGKILL'): Promise<void> {
    const child = this.#child;
    if (!child || child.exitCode !== null || child.signalCode !== null) return;
    const gone = new Promise((resolve) => child.once('exit', resolve));
    child.kill(signal);
    const lingering = setTimeout(() => child.kill('SIGKILL'), 5000);
    await gone;
    clearTimeout(lingering);
  }
}

/** The name says that it is a test's: nothing else may have its clock set. */
export const databaseFileOf = (name: string): string => join(runFolder, `test-${name}.db`);

export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      const port = address !== null && typeof address === 'object' ? address.port : 0;
      probe.close(() => resolve(port));
    });
  });
}

import type { Client, InStatement, Transaction } from '@libsql/client';
import { isBusy, retryWhileBusy } from './busy';

type Release = () => void;
type Statement = InStatement | [string, unknown?];

/**
 * A client whose writes take turns.
 *
 * On a local file the client is synchronous and pooled: a second writer would wait IN the event loop, so the transaction
 * it waits for could never commit. Inside `db.transaction()` use `tx` only: `db` would wait for itself.
 */
export function takingTurns(client: Client, waitAtMost = 10_000): Client {
  const turns = new Turns(waitAtMost);

  async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    const release = await turns.next();
    try {
      return await retryWhileBusy(() => healing(work), waitAtMost);
    } finally {
      release();
    }
  }

  // After SQLITE_BUSY the statement is left un-reset and every later COMMIT on that pooled connection fails.
  async function healing<T>(work: () => Promise<T>): Promise<T> {
    try {
      return await work();
    } catch (error) {
      if (isBusy(error)) await client.reconnect();
      throw error;
    }
  }

  async function beginInTurn(): Promise<Transaction> {
    const release = await turns.next();
    try {
      return releasing(await healing(() => client.transaction('write')), release);
    } catch (error) {
      release();
      throw error;
    }
  }

  const own: Partial<Record<keyof Client, unknown>> = {
    execute: (...call: Parameters<Client['execute']>) =>
      isRead(call[0]) ? client.execute(...call) : inTurn(() => client.execute(...call)),
    batch: (...call: Parameters<Client['batch']>) =>
      call[0].every(isRead) ? client.batch(...call) : inTurn(() => client.batch(call[0], 'write')),
    migrate: (...call: Parameters<Client['migrate']>) => inTurn(() => client.migrate(...call)),
    executeMultiple: (statements: string) => inTurn(() => client.executeMultiple(statements)),
    transaction: (mode?: 'write' | 'read' | 'deferred') => (mode === 'read' ? client.transaction(mode) : beginInTurn()),
  };
  return new Proxy(client, {
    get: (target, name) => (name in own ? own[name as keyof Client] : memberOf(target, name)),
  });
}

/** One holder at a time, first come first served. */
class Turns {
  private last: Promise<void> = Promise.resolve();

  constructor(private readonly waitAtMost: number) {}

  next(): Promise<Release> {
    let release: Release = () => {};
    const mine = new Promise<void>((resolve) => {
      release = resolve;
    });
    const before = this.last;
    this.last = before.then(() => mine);
    return new Promise((resolve, reject) => {
      const timer = setTimeout(() => {
        // This turn is given up, so that those behind it go on.
        release();
        reject(new Error(`The write lock was not free after ${this.waitAtMost} ms: was db used inside a transaction?`));
      }, this.waitAtMost);
      void before.then(() => {
        clearTimeout(timer);
        resolve(release);
      });
    });
  }
}

/** The turn ends with the transaction, however it ends. */
function releasing(transaction: Transaction, release: Release): Transaction {
  const ends = new Set<PropertyKey>(['commit', 'rollback', 'close']);
  return new Proxy(transaction, {
    get: (target, name) => {
      if (!ends.has(name)) return memberOf(target, name);
      return async () => {
        try {
          await target[name as 'commit' | 'rollback']();
        } finally {
          release();
        }
      };
    },
  });
}

/** A member of the client itself: its methods and getters rely on private fields that a proxy does not have. */
function memberOf(target: object, name: PropertyKey): unknown {
  const member: unknown = Reflect.get(target, name, target);
  return typeof member === 'function' ? (member.bind(target) as unknown) : member;
}

function isRead(statement: Statement): boolean {
  const text = typeof statement === 'string' ? statement : Array.isArray(statement) ? statement[0] : statement.sql;
  return /^\s*(select|values|explain|pragma)\b/i.test(text);
}

import * as sqlite3 from 'sqlite3';
import { Gate, type LongHold } from './gate';
import { openHandles } from './handles';
import { PlainLine } from './plain-line';
import type { Answer, SqliteCall } from './sqlite-call';
import { StoreHandles } from './store-handles';
import { TableShapes } from './table-shapes';
import { TransactionLine } from './transaction-line';

type Line = PlainLine | TransactionLine;
type Closed = (error: Error | null) => void;

/**
 * A `dialectModule` for one sequelize instance: all its connections share one write handle behind a gate and a few
 * read handles. Sequelize opens its plain connection first and one more for each transaction.
 */
export function singleWriterDialect(onLongHold: LongHold): object {
  let store: Promise<StoreHandles> | undefined;
  const shapes = new TableShapes();

  /** What sequelize takes for a sqlite3 connection. */
  class Database {
    /** Set by sequelize on a transaction's connection; without it sequelize keeps the connection open. */
    uuid?: string;
    private readonly line: Promise<Line>;

    constructor(
      readonly filename: string,
      _mode: number,
      opened: Closed,
    ) {
      if (store) {
        this.line = store.then((handles) => new TransactionLine(handles));
      } else {
        store = openHandles(filename).then((handles) => new StoreHandles(handles, new Gate(onLongHold)));
        this.line = store.then((handles) => new PlainLine(handles));
      }
      this.line.then(() => opened(null), opened);
    }

    serialize(work: () => void): void {
      work();
    }

    run(sql: string, bind?: unknown, answer?: Answer): this {
      return this.send({ method: 'run', sql, ...bindAndAnswer(bind, answer) });
    }

    all(sql: string, bind?: unknown, answer?: Answer): this {
      return this.send({ method: 'all', sql, ...bindAndAnswer(bind, answer) });
    }

    get(sql: string, bind?: unknown, answer?: Answer): this {
      return this.send({ method: 'get', sql, ...bindAndAnswer(bind, answer) });
    }

    exec(sql: string, answer?: Answer): this {
      return this.send({ method: 'exec', sql, ...bindAndAnswer(undefined, answer) });
    }

    close(closed: Closed = () => undefined): void {
      this.line.then((line) => line.close()).then(() => closed(null), closed);
    }

    private send(call: SqliteCall): this {
      if (shapes.answers(call)) return this;
      this.line.then(
        (line) => line.send(call),
        (error: Error) => call.answer.call(undefined, error),
      );
      return this;
    }
  }

  return { ...sqlite3, Database };
}

function bindAndAnswer(bind: unknown, answer: Answer = () => undefined): Pick<SqliteCall, 'bind' | 'answer'> {
  return typeof bind === 'function' ? { bind: undefined, answer: bind as Answer } : { bind, answer };
}

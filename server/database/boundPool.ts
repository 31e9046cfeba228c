import type { DataSource } from 'typeorm';
import { unavailable } from '../http/problem.ts';

type Connection = { release(): void };
type Done = (error: Error | null, connection?: Connection) => void;
type Pool = { getConnection(done: Done): void };

const patience = 2000;

/**
 * mysql2 waits for a free connection for ever. Behind this, a caller waits two seconds and is
 * then answered 503; a connection that comes too late goes straight back.
 */
export function boundPool(dataSource: DataSource): void {
  const { pool } = dataSource.driver as unknown as { pool: Pool };
  const wait = pool.getConnection.bind(pool);
  pool.getConnection = (done) => {
    let answered = false;
    const timer = setTimeout(() => {
      answered = true;
      done(unavailable('The database does not answer. Nothing was stored.'));
    }, patience);
    wait((error, connection) => {
      clearTimeout(timer);
      if (answered) connection?.release();
      else done(error, connection);
    });
  };
}

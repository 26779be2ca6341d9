import * as mysql from 'mysql2';
import { Refusal } from '../common/refusal';

/** A statement that runs longer is ended by the server. */
const statementSeconds = 15;
/** Somebody whose row is held by another's transaction waits this long, and then tries the whole again. */
const lockWaitSeconds = 5;
/** mysql2 lets callers wait for a free connection for ever; here they are told to come back. */
const connectionWaitMs = 5_000;

/** What each connection is set to before its first use: by itself MariaDB ends no statement. */
const sessionSettings =
  `SET SESSION max_statement_time = ${statementSeconds}, innodb_lock_wait_timeout = ${lockWaitSeconds}, ` +
  "sql_mode = 'STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION'";

type Taken = (fault: NodeJS.ErrnoException | null, connection: mysql.PoolConnection) => void;

/** mysql2 as TypeORM takes it, with pools that set their connections up and do not let anybody wait without end. */
export const guardedDriver = {
  ...mysql,
  createPool(options: mysql.PoolOptions): mysql.Pool {
    const pool = mysql.createPool(options);
    pool.on('connection', (connection) => {
      // Stands in the connection's own queue before whatever it was made for.
      connection.query(sessionSettings, (fault) => {
        if (fault) connection.destroy();
      });
    });
    return withWaitingLimit(pool);
  },
};

function withWaitingLimit(pool: mysql.Pool): mysql.Pool {
  const take = pool.getConnection.bind(pool) as (taken: Taken) => void;
  pool.getConnection = (taken: Taken) => {
    let gone = false;
    const timer = setTimeout(() => {
      gone = true;
      failed(taken, noConnection());
    }, connectionWaitMs);
    take((fault, connection) => {
      clearTimeout(timer);
      if (!gone) taken(fault, connection);
      else if (!fault) connection.release();
    });
  };
  return pool;
}

/** The callback's second argument means nothing where there is a first, in mysql2 as everywhere in Node. */
function failed(taken: Taken, fault: Error): void {
  (taken as (fault: Error) => void)(fault);
}

const noConnection = () =>
  new Refusal(503, 'service.unavailable', 'Too much is going on just now; try again.', {}, [], {
    'Retry-After': '2',
  });

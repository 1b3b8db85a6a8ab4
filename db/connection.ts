import { Sequelize } from 'sequelize';

const DEFAULT_POOL_MAX = 10;
const DEFAULT_STATEMENT_TIMEOUT_MS = 10_000;
const ACQUIRE_TIMEOUT_MS = 10_000;

export interface ConnectOptions {
  poolMax?: number;
  /** 0 lets a statement take as long as it needs. */
  statementTimeoutMs?: number;
}

/**
 * A Sequelize for DATABASE_URL. The address is asked for on the first query, not on import,
 * because a build loads this file without a database.
 */
export function connect(options: ConnectOptions = {}): Sequelize {
  const url = process.env.DATABASE_URL;
  const timeoutMs =
    options.statementTimeoutMs ??
    numberFromEnv('DATABASE_STATEMENT_TIMEOUT_MS', DEFAULT_STATEMENT_TIMEOUT_MS);
  return new Sequelize(url ?? 'postgres://unset/unset', {
    dialect: 'postgres',
    logging: process.env.DATABASE_LOG === '1' ? (sql) => console.log(sql) : false,
    pool: {
      max: options.poolMax ?? numberFromEnv('DATABASE_POOL_MAX', DEFAULT_POOL_MAX),
      min: 0,
      acquire: ACQUIRE_TIMEOUT_MS,
    },
    dialectOptions: {
      application_name: 'ellwise',
      statement_timeout: timeoutMs,
      idle_in_transaction_session_timeout: timeoutMs,
    },
    hooks: {
      beforeConnect() {
        if (!url) throw new Error('DATABASE_URL is not set: use `npm start`, or set the address');
      },
    },
  });
}

function numberFromEnv(name: string, fallback: number): number {
  const value = Number(process.env[name] ?? fallback);
  if (!Number.isInteger(value) || value < 0) throw new Error(`${name} must be a whole number`);
  return value;
}

declare global {
  var ellwiseSequelize: Sequelize | undefined;
}

/** The one connection pool: kept on globalThis, since the dev server evaluates modules again. */
export const sequelize = (globalThis.ellwiseSequelize ??= connect());

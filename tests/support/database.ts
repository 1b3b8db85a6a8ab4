import { QueryTypes } from 'sequelize';
import { sequelize } from '../../db/connection.ts';

/** Empties every table but the record of migrations: call it in `beforeEach` where rows matter. */
export async function emptyDatabase(): Promise<void> {
  const tables = await sequelize.query<{ name: string }>(
    `select format('%I.%I', schemaname, tablename) as name
       from pg_tables where schemaname = 'public' and tablename <> 'schema_migrations'`,
    { type: QueryTypes.SELECT },
  );
  if (tables.length === 0) return;
  const names = tables.map(({ name }) => name).join(', ');
  await sequelize.query(`truncate ${names} restart identity cascade`);
}

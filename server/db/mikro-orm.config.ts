import { ormOptions } from '#server/db/orm-options.ts';

/** For the command line of the ORM alone: `npx tsx node_modules/@mikro-orm/cli/cli --config server/db/mikro-orm.config.ts migration:create` writes a migration's first draft and the snapshot. */
export default ormOptions(process.env['DATABASE_URL'] ?? 'postgresql://127.0.0.1/upstand', {
  snapshot: true,
});

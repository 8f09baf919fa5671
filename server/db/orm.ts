import { MikroORM } from '@mikro-orm/postgresql';
import { ormOptions, type OrmOptions } from '#server/db/orm-options.ts';

/** One ORM a process; one fresh `orm.em.fork()` a request and a job. */
export function createOrm(url: string, options: OrmOptions = {}): Promise<MikroORM> {
  return MikroORM.init(ormOptions(url, options));
}

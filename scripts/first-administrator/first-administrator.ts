/**
 * Makes the first administrator of an installation on an existing database, with the same settings as the server:
 * `DATABASE_URL=… npm run first-administrator -- --owner "…" --name "…" --email …`
 */
import { parseArgs } from 'node:util';
import { ConfigError, loadConfig } from '#server/config/config.ts';
import { createOrm } from '#server/db/orm.ts';
import { Problem } from '#server/http/problem.ts';
import { firstAdministrator } from '#server/modules/people/first-administrator.ts';

const USAGE =
  'Give all three: --owner "Name of the utility" --name "Name of the person" --email person@utility.example';

process.exitCode = await main();

async function main(): Promise<number> {
  const { owner, name, email } = readArgs();
  if (!owner?.trim() || !name?.trim() || !email?.includes('@')) {
    console.error(USAGE);
    return 2;
  }
  try {
    const config = loadConfig(process.env);
    const orm = await createOrm(config.databaseAppUrl);
    try {
      const { token, hours } = await firstAdministrator(orm.em.fork(), { owner, name, email });
      console.log(
        `${name} sets a password here, within ${hours} hours:\n${config.publicUrl}/password-reset/${token}`,
      );
      return 0;
    } finally {
      await orm.close(true);
    }
  } catch (error) {
    if (!(error instanceof Problem || error instanceof ConfigError)) throw error;
    console.error(error instanceof Problem ? error.detail : error.message);
    return 1;
  }
}

function readArgs(): { owner?: string; name?: string; email?: string } {
  try {
    const text = { type: 'string' } as const;
    return parseArgs({ options: { owner: text, name: text, email: text } }).values;
  } catch {
    return {};
  }
}

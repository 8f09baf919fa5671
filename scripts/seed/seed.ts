import { loadConfig } from '#server/config/config.ts';
import { createOrm } from '#server/db/orm.ts';
import { row, run } from '#server/db/rows.ts';
import { type ApiClient, signIn } from './api-client.ts';
import { type Cast, playBatch } from './play-batch.ts';
import { seedFoundation } from './seed-foundation.ts';
import { BATCHES } from './story/batches.ts';
import { WORK_ORDERS } from './story/work-orders.ts';

const config = loadConfig(process.env);
const baseUrl = process.env['UPSTAND_URL'] ?? config.publicUrl;
if (!config.demo || config.demoPassword === null) {
  console.error('The demo is seeded by npm start alone, into its own database.');
  process.exit(2);
}
const password = config.demoPassword;
const orm = await createOrm(config.databaseAppUrl);
try {
  console.log(await seed());
} finally {
  await orm.close(true);
}

/** Each part is marked in the database when it is done; a start that was broken off goes on with the next part. */
async function seed(): Promise<string> {
  const parts = [...(await foundation()), ...(await batches())];
  return parts.length === 0 ? 'already there' : `made: ${parts.length} parts`;
}

async function foundation(): Promise<string[]> {
  return orm.em.fork().transactional(async (em) => {
    if (!(await mark('demo', em))) return [];
    await seedFoundation(em, { password });
    return ['foundation'];
  });
}

async function batches(): Promise<string[]> {
  const done: string[] = [];
  let clients: Awaited<ReturnType<typeof signInAll>> | null = null;
  for (const story of BATCHES) {
    const key = `demo batch: ${story.key}`;
    if (await isMarked(key)) continue;
    clients ??= await signInAll();
    const order = WORK_ORDERS.find((each) => each.number === story.workOrder)!;
    const cast: Cast = { ...clients.owner, contractor: clients.contractors[order.contractor] };
    await playBatch(story, { cast, workOrderId: await workOrderId(cast.contractor, story.workOrder) });
    await mark(key);
    done.push(story.key);
  }
  return done;
}

async function signInAll() {
  const as = (email: string): Promise<ApiClient> => signIn(baseUrl, { email, password });
  return {
    contractors: {
      brindle: await as('contractor@brindle.example'),
      tamsett: await as('contractor@tamsett.example'),
    },
    owner: {
      inspector: await as('inspector@larkmoor.example'),
      engineer: await as('engineer@larkmoor.example'),
      clerk: await as('clerk@larkmoor.example'),
    },
  };
}

async function workOrderId(contractor: ApiClient, number: string): Promise<string> {
  const { items } = await contractor.get<{ items: { id: string; number: string }[] }>(
    '/api/work-orders?limit=200',
  );
  const found = items.find((order) => order.number === number);
  if (!found) throw new Error(`The contractor does not see work order ${number}.`);
  return found.id;
}

/** @returns false when it was marked before */
async function mark(key: string, em = orm.em.fork()): Promise<boolean> {
  return (
    (await run(em, `insert into installation (key, value) values ($1, 'true') on conflict do nothing`, [
      key,
    ])) === 1
  );
}

async function isMarked(key: string): Promise<boolean> {
  return (await row(orm.em.fork(), 'select 1 as found from installation where key = $1', [key])) !== null;
}

import { createWorkOrder } from '#tests/factories/work-orders.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { row } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';
import { buildBatches } from './build-batches.ts';
import type { OwnObjects } from './own-objects.ts';
import { reviewBatches } from './review-batches.ts';

/** The columns of the table, but `nobody` and the two contractors. `inspector` holds the reviews, `colleague` none. */
export const OWNERS_PEOPLE = [
  'inspector',
  'colleague',
  'engineer',
  'clerk',
  'auditor',
  'administrator',
] as const;
export type OwnersPerson = (typeof OWNERS_PEOPLE)[number];
export type Caller = OwnersPerson | 'first' | 'second';

export type Shared = {
  readonly lotId: string;
  readonly lotNumber: string;
  readonly productId: string;
  readonly draftStandard: number;
  readonly mailId: string;
  readonly personId: string;
  readonly personEmail: string;
  readonly ownerId: string;
  readonly contractorOrgId: string;
  readonly organisationName: string;
  /** Of an invitation that nobody has followed yet. */
  readonly invitationToken: string;
};

export type World = {
  readonly harness: Stage;
  readonly people: Readonly<Record<Caller, Actor>>;
  readonly agents: Readonly<Record<Caller, Agent>>;
  /** Objects of each contractor, alike in every way but whose they are. */
  readonly of: Readonly<Record<'first' | 'second', OwnObjects>>;
  readonly shared: Shared;
};

/** One of everything for each of two contractors, made through the API; nothing of it is changed by the table's requests. */
export async function buildWorld(harness: Stage): Promise<World> {
  const first = await createWorkSite(harness, { planned: plannedFor('A'), number: '17' });
  const contractor = await harness.person('contractor');
  const order = await createWorkOrder(harness.em(), {
    contractorId: contractor.orgId,
    number: '18',
    planned: plannedFor('B').map((structureNumber) => ({ structureNumber })),
  });
  const second: WorkSite = { ...first, contractor, order };

  const people = { first: first.contractor, second: contractor } as Record<Caller, Actor>;
  for (const name of OWNERS_PEOPLE)
    people[name] = await harness.person(name === 'colleague' ? 'inspector' : name);
  const agents = {} as Record<Caller, Agent>;
  for (const [name, person] of Object.entries(people)) agents[name as Caller] = await harness.signIn(person);

  const handedIn = {
    first: await buildBatches(harness, { site: first, agent: agents.first, prefix: 'A' }),
    second: await buildBatches(harness, { site: second, agent: agents.second, prefix: 'B' }),
  };
  const of = {
    first: await reviewBatches({ agents, handedIn: handedIn.first }),
    second: await reviewBatches({ agents, handedIn: handedIn.second }),
  };
  await harness.drain();
  return { harness, people, agents, of, shared: await readShared({ harness, people, agents, site: first }) };
}

export const plannedFor = (prefix: string): string[] =>
  ['draft', 'queued', 'open-1', 'open-2', 'done-1', 'done-2', 'spare'].map((name) => `${prefix}-${name}`);

async function readShared(made: {
  harness: Stage;
  people: Readonly<Record<Caller, Actor>>;
  agents: Readonly<Record<Caller, Agent>>;
  site: WorkSite;
}): Promise<Shared> {
  const { harness, agents, people, site } = made;
  const published = await agents.engineer.get('/api/standard/versions/1');
  const draft = await agents.engineer
    .post('/api/standard/versions')
    .send({ effectiveOn: '2099-01-01', body: published.body.body });
  if (draft.status !== 201) throw new Error(`The standard was not drafted: ${draft.text}`);
  const invitationToken = await invite(harness, agents.administrator);
  const mail = await agents.administrator.get('/api/mail?limit=1');
  return {
    lotId: site.lot.id,
    lotNumber: site.lot.number,
    productId: site.product.id,
    draftStandard: draft.body.n,
    mailId: mail.body.items[0].id,
    personId: people.clerk.id,
    personEmail: people.clerk.email,
    ownerId: (await harness.owner()).id,
    contractorOrgId: people.first.orgId,
    organisationName: people.first.orgName,
    invitationToken,
  };
}

async function invite(harness: Stage, administrator: Agent): Promise<string> {
  const email = 'invited@people.example';
  const invited = await administrator
    .post('/api/people')
    .send({ email, name: 'Ada Rowe', role: 'clerk', organisationId: (await harness.owner()).id });
  if (invited.status !== 201) throw new Error(`Nobody was invited: ${invited.text}`);
  const mail = await row<{ link: string }>(
    harness.em(),
    `select data ->> 'link' as link from outbox where recipient = $1`,
    [email],
  );
  return mail?.link.split('/').at(-1) ?? '';
}

import type {
  Batch,
  CloseReviewReply,
  Concession,
  FindingRow,
  RecordRow,
  RegisterEntriesReply,
  Transmittal,
} from '#shared/generated/api-types.ts';
import type { ApiClient } from './api-client.ts';
import { findingsOf, handIn } from './hand-in.ts';
import { buildBatchRows } from './story/build-batch-rows.ts';
import type { StoryBatch, StoryDecision } from './story/batches.ts';

export type Cast = { contractor: ApiClient; inspector: ApiClient; engineer: ApiClient; clerk: ApiClient };

const DAYS_TO_MEND = 30;

/** Takes one batch of the story from its beginning to its state, each step as the person whose step it is. */
export async function playBatch(
  story: StoryBatch,
  { cast, workOrderId }: { cast: Cast; workOrderId: string },
): Promise<void> {
  const batch = await cast.contractor.post<Batch>(`/api/work-orders/${workOrderId}/batches`);
  if (story.state === 'draft') return;
  const batchId = batch.id;
  await handIn(cast.contractor, { batchId, rows: buildBatchRows(story), fileName: `${batch.number}.xlsx` });
  if (story.state === 'checked') return;
  await answerAndSubmit(cast.contractor, { batchId, answers: story.answers ?? {} });
  if (story.state === 'submitted') return;
  await review(cast, { batchId, story });
  if (story.state === 'in-review') return;
  await cast.inspector.post<CloseReviewReply>(`/api/batches/${batchId}/close-review`);
  if (story.next) {
    const rows = buildBatchRows({ workOrder: story.workOrder, lines: story.next.lines });
    await handIn(cast.contractor, { batchId, rows, fileName: `${batch.number}-1.xlsx` });
    if (story.next.state === 'submitted') await answerAndSubmit(cast.contractor, { batchId, answers: {} });
  }
  if (story.state === 'on-record') await record(cast.clerk, { batchId, title: story.transmittal ?? null });
}

async function answerAndSubmit(
  contractor: ApiClient,
  { batchId, answers }: { batchId: string; answers: Readonly<Record<string, string>> },
): Promise<void> {
  const findings = await findingsOf(contractor, batchId);
  for (const [key, text] of Object.entries(answers))
    await contractor.put(`/api/findings/${finding(findings, key).id}/answer`, { text });
  await contractor.post(`/api/batches/${batchId}/submit`);
}

async function review(cast: Cast, { batchId, story }: { batchId: string; story: StoryBatch }): Promise<void> {
  await cast.inspector.post(`/api/batches/${batchId}/take`);
  await cast.inspector.post(`/api/batches/${batchId}/approve-clean`);
  const findings = await findingsOf(cast.inspector, batchId);
  for (const [key, decision] of Object.entries(story.decisions ?? {}))
    await decide(cast, finding(findings, key), decision);
}

async function decide(cast: Cast, found: FindingRow, story: StoryDecision): Promise<void> {
  const path = `/api/findings/${found.id}`;
  if (story.decision === 'approve') {
    await cast.inspector.put(
      `${path}/decision`,
      { decision: 'approve', grounds: story.grounds, reason: story.reason },
      found.version,
    );
    return;
  }
  if (story.decision === 'reject') {
    const body = { decision: 'reject', action: story.action, reason: story.reason, dueOn: dueDay() };
    await cast.inspector.put(`${path}/decision`, body, found.version);
    return;
  }
  const concession = await cast.inspector.post<Concession>(`${path}/concession`, { reason: story.asked });
  if (!story.granted) return;
  const answer = {
    decision: 'grant',
    reason: story.granted.reason,
    condition: story.granted.condition,
    endsOn: null,
  };
  await cast.engineer.put(`/api/concessions/${concession.id}/decision`, answer, concession.version);
}

/** The work is of the story's spring, the review of today: what is due lies ahead. */
function dueDay(): string {
  return new Date(Date.now() + DAYS_TO_MEND * 86_400_000).toISOString().slice(0, 10);
}

async function record(
  clerk: ApiClient,
  { batchId, title }: { batchId: string; title: string | null },
): Promise<void> {
  const { items } = await clerk.get<{ items: RecordRow[] }>(`/api/batches/${batchId}/records?limit=200`);
  const recordIds = items.filter((record) => record.state === 'approved').map((record) => record.id);
  const { entries } = await clerk.post<RegisterEntriesReply>('/api/register/entries', { recordIds });
  if (title === null) return;
  const recordNumbers = entries.map((entry) => entry.recordNumber);
  await clerk.post<Transmittal>('/api/transmittals', {
    scope: { recordNumbers },
    title,
  });
}

function finding(findings: ReadonlyMap<string, FindingRow>, key: string): FindingRow {
  const found = findings.get(key);
  if (!found)
    throw new Error(
      `The story counts on the finding “${key}”; the check found: ${[...findings.keys()].join(', ') || 'nothing'}.`,
    );
  return found;
}

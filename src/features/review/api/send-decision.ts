import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type {
  Concession,
  FindingDecisionBody,
  FindingRow,
  RecordDecisionBody,
  RecordRow,
} from '#shared/generated/api-types.ts';

/** What an inspector can say on the desk. Each names the thing as it was seen: its version goes along. */
export type Decision =
  | { readonly type: 'finding'; readonly finding: FindingRow; readonly request: FindingDecisionBody }
  | { readonly type: 'undo-finding'; readonly finding: FindingRow }
  | { readonly type: 'concession'; readonly finding: FindingRow; readonly reason: string }
  | { readonly type: 'line'; readonly record: RecordRow; readonly request: RecordDecisionBody }
  | { readonly type: 'undo-line'; readonly record: RecordRow };

/** The thing as the server has it after the decision; null where the reply is about another thing. */
export type Decided = { readonly finding?: FindingRow; readonly record?: RecordRow };

/** @throws ApiProblem 409 another holds the batch, 412 it changed meanwhile (`current`), 422 a field */
export async function sendDecision(decision: Decision): Promise<Decided> {
  switch (decision.type) {
    case 'finding':
      return {
        finding: await api<FindingRow>(`/api/findings/${decision.finding.id}/decision`, {
          method: 'PUT',
          body: decision.request,
          ifMatch: decision.finding.version,
        }),
      };
    case 'undo-finding':
      return {
        finding: await api<FindingRow>(`/api/findings/${decision.finding.id}/decision`, {
          method: 'DELETE',
          ifMatch: decision.finding.version,
        }),
      };
    case 'concession':
      await api<Concession>(`/api/findings/${decision.finding.id}/concession`, {
        method: 'POST',
        body: { reason: decision.reason },
        ifMatch: decision.finding.version,
        idempotencyKey: newIdempotencyKey(),
      });
      return {};
    case 'line':
      return {
        record: await api<RecordRow>(`/api/records/${decision.record.id}/decision`, {
          method: 'PUT',
          body: decision.request,
          ifMatch: decision.record.version,
        }),
      };
    case 'undo-line':
      return {
        record: await api<RecordRow>(`/api/records/${decision.record.id}/decision`, {
          method: 'DELETE',
          ifMatch: decision.record.version,
        }),
      };
  }
}

import { paths } from '#src/config/paths.ts';
import type { TrailEntry } from '#shared/generated/api-types.ts';

/** The page of what a step concerned; null where it has none. */
export function subjectLink({ type, id, label }: TrailEntry['subject']): string | null {
  switch (type) {
    case 'batch':
      return paths.batch.to(id);
    case 'record':
      return paths.record.to(id);
    case 'register':
      return label ? paths.registerRecord.to(label) : null;
    case 'transmittal':
      return paths.transmittal.to(id);
    case 'concession':
      return paths.concession.to(id);
    case 'lot':
      return paths.lot.to(id);
    case 'work-order':
      return paths.workOrder.to(id);
    case 'standard': {
      const n = /(\d+)$/.exec(label ?? '')?.[1];
      return n ? paths.standardVersion.to(Number(n)) : paths.standard.to();
    }
    default:
      return null;
  }
}

export const SUBJECT_OPTIONS = [
  { value: 'batch', label: 'batch' },
  { value: 'record', label: 'line' },
  { value: 'finding', label: 'finding' },
  { value: 'concession', label: 'concession' },
  { value: 'register', label: 'register' },
  { value: 'transmittal', label: 'transmittal' },
  { value: 'lot', label: 'lot' },
  { value: 'standard', label: 'standard' },
  { value: 'work-order', label: 'work order' },
  { value: 'person', label: 'person' },
  { value: 'organisation', label: 'organisation' },
  { value: 'job', label: 'job' },
] as const;

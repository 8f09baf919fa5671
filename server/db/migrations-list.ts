import { Foundation20260105090000 } from '#migrations/20260105090000-foundation.ts';
import { Work20260105090100 } from '#migrations/20260105090100-work.ts';
import { Batches20260105090200 } from '#migrations/20260105090200-batches.ts';
import { Findings20260105090300 } from '#migrations/20260105090300-findings.ts';
import { FindingStates20260105090400 } from '#migrations/20260105090400-finding-states.ts';
import { Register20260105090500 } from '#migrations/20260105090500-register.ts';
import { Trail20260105090600 } from '#migrations/20260105090600-trail.ts';
import { Messages20260105090700 } from '#migrations/20260105090700-messages.ts';
import { RefusalCounts20260105090900 } from '#migrations/20260105090900-refusal-counts.ts';
import { ListIndexes20260105091000 } from '#migrations/20260105091000-list-indexes.ts';
import { SheetFiles20260105091200 } from '#migrations/20260105091200-sheet-files.ts';

/** All migrations in order, by name: a bundled server has no folder to read them from. */
export const MIGRATIONS = [
  { name: '20260105090000-foundation', class: Foundation20260105090000 },
  { name: '20260105090100-work', class: Work20260105090100 },
  { name: '20260105090200-batches', class: Batches20260105090200 },
  { name: '20260105090300-findings', class: Findings20260105090300 },
  { name: '20260105090400-finding-states', class: FindingStates20260105090400 },
  { name: '20260105090500-register', class: Register20260105090500 },
  { name: '20260105090600-trail', class: Trail20260105090600 },
  { name: '20260105090700-messages', class: Messages20260105090700 },
  { name: '20260105090900-refusal-counts', class: RefusalCounts20260105090900 },
  { name: '20260105091000-list-indexes', class: ListIndexes20260105091000 },
  { name: '20260105091200-sheet-files', class: SheetFiles20260105091200 },
];

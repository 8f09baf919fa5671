import type { CheckContext, DesignFact, EarlierFailure } from '#shared/rules/types.ts';
import type { RefusalCode, RefusalParams } from '#shared/workbook/workbook-refused.ts';
import type { LineRow } from './load-lines.ts';
import type { LotRow } from './load-lots.ts';
import type { PhotoToPlace } from './load-photos.ts';
import type { StartedRun } from './start-run.ts';

/** What a workbook names, for the queries that find what the batch must know beside it. */
export type SourceNeeds = {
  readonly lines: number;
  readonly structureKeys: readonly string[];
  /** Squares of a hundredth of a degree in and beside which its lines lie. */
  readonly squares: readonly { readonly i: number; readonly j: number }[];
  /** Keys of shared/rules/lot-index.ts. */
  readonly lotKeys: readonly string[];
};

/** Lists that grow with the batch; they cross in slices, so that no single message holds the server up. */
export type ContextLists = {
  readonly photos: readonly PhotoToPlace[];
  readonly lines: readonly LineRow[];
  readonly design: readonly DesignFact[];
  readonly previous: readonly (readonly [lineKey: string, failures: readonly EarlierFailure[]])[];
};
export type ListName = keyof ContextLists;

/** Everything else that the computation takes. */
export type CheckFrame = {
  readonly run: StartedRun;
  readonly orderNumber: string;
  readonly lots: readonly LotRow[];
  readonly context: Omit<CheckContext, 'photos' | 'siblings' | 'design' | 'previous' | 'lots'>;
};
export type CheckInputs = { readonly frame: CheckFrame; readonly lists: ContextLists };
/** The same where it is loaded: the longest list page by page, never whole. */
export type LoadedInputs = {
  readonly frame: CheckFrame;
  readonly lists: Omit<ContextLists, 'photos'>;
  readonly photos: AsyncIterable<ContextLists['photos']>;
};

/** What is stored of a check beside its rows. */
export type CheckSummary = {
  /** Lines as a JSON document of rows with their ids; those known already keep theirs. */
  readonly lines: string;
  readonly counts: Readonly<Record<string, unknown>> & { readonly lines: number };
  /** JSON documents for the columns of the run. */
  readonly skipped: string;
  readonly notices: string;
  readonly batchSheet: string;
  readonly templateVersion: string | null;
};

export type StoredTable = 'records' | 'pours' | 'findings' | 'photo_matches';
/** Rows as one JSON document, ready to be a parameter. */
export type RowsDocument = {
  readonly table: StoredTable;
  readonly columns: readonly string[];
  readonly text: string;
  readonly rows: number;
};

export type ToCheck =
  | { readonly type: 'list'; readonly name: ListName; readonly rows: readonly unknown[] }
  | { readonly type: 'frame'; readonly frame: CheckFrame }
  | { readonly type: 'next' };

export type FromCheck =
  | { readonly type: 'needs'; readonly needs: SourceNeeds }
  | { readonly type: 'summary'; readonly summary: CheckSummary }
  | { readonly type: 'rows'; readonly document: RowsDocument }
  | { readonly type: 'done' }
  | { readonly type: 'refused'; readonly code: RefusalCode; readonly params: RefusalParams }
  /** Our own: for the log. */
  | { readonly type: 'fault'; readonly stack: string };

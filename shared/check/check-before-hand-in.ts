import type { SourceBatch } from '#shared/records/types.ts';
import { checkBatch } from './check-batch.ts';
import { contextFromData, type OrderContextData } from './context-from-data.ts';
import { nameOtherOrder } from './name-other-order.ts';
import type { CheckResult } from './types.ts';

/** The check of a batch as far as it can be known before it is handed in; what cannot be is listed in `skipped`. */
export const checkBeforeHandIn = (source: SourceBatch, data: OrderContextData): CheckResult =>
  checkBatch(nameOtherOrder(source, data.workOrder.number), contextFromData(data));

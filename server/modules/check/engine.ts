/** Raised when the same workbook would be judged otherwise: a run belongs to the engine that made it. */
export const ENGINE = '3';
/** Version of the record schemas that values are stored by. */
export const RECORD_SCHEMA = 'v1';

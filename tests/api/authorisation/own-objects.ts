/** Ids of one contractor's objects. Each batch rests in one state and no request of the table moves it. */
export type OwnObjects = {
  readonly orderId: string;
  readonly orderNumber: string;
  /** Checked and not handed in. */
  readonly draft: BatchObjects;
  /** Handed in; no inspector has taken it. */
  readonly queued: BatchObjects;
  /** Under review by `inspector`: one finding undecided, one with a concession asked for. */
  readonly open: BatchObjects;
  /** Decided and on record, one line by concession. */
  readonly done: BatchObjects;
  readonly concessionAsked: string;
  readonly concessionGranted: string;
  readonly recordNumber: string;
  readonly transmittalId: string;
  /** The sheets of `queued`, asked for by the contractor. */
  readonly sheetFileId: string;
};

export type BatchObjects = {
  readonly id: string;
  readonly number: string;
  readonly revisionId: string;
  /** Of the first line. */
  readonly lineId: string;
  readonly recordId: string;
  readonly recordIds: readonly string[];
  /** The first that may be answered. */
  readonly findingId: string;
  readonly findingIds: readonly string[];
  readonly photoId: string;
  readonly structures: readonly string[];
};

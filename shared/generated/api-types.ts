// Written by `npm run generate` from schemas/api. Do not edit.

/**
 * A contractor's answer to a finding.
 */
export interface AnswerBody {
  text: string;
}
/**
 * A contractor's answer in writing.
 */
export interface Answer {
  text: string;
  by: string;
  at: string;
}
/**
 * What the sign-in page needs before anybody is signed in.
 */
export interface AppInfo {
  /**
   * Name of the organisation that owns the poles.
   */
  owner: string;
  demo: {
    password: string;
    accounts: {
      email: string;
      name: string;
      role: 'contractor' | 'inspector' | 'engineer' | 'clerk' | 'auditor' | 'administrator';
      organisation: string;
    }[];
  } | null;
  /**
   * Whether this browser has a session, so that asking for it does not have to fail.
   */
  signedIn: boolean;
}
/**
 * How many lines without findings were approved.
 */
export interface ApproveCleanReply {
  approved: number;
}
/**
 * The inspector who is to hold the review.
 */
export interface AssignBody {
  inspectorId: string;
  reason?: string;
}
/**
 * What the newest check changed against the one before.
 */
export interface BatchChanges {
  from: number | null;
  to: number | null;
  items: ValueChange[];
  added: string[];
  removed: string[];
  findings: {
    gone: {
      code: string;
      title: string;
      structureNumber: string | null;
    }[];
    new: {
      code: string;
      title: string;
      structureNumber: string | null;
    }[];
  };
}
/**
 * A value that differs between two checks.
 */
export interface ValueChange {
  structureNumber: string;
  kind: 'set' | 'straighten' | 'relevel';
  field: string;
  title: string;
  before: string | number | null;
  after: string | number | null;
  /**
   * Unit of a value that is a number.
   */
  unit: string | null;
  cell: string | null;
}
/**
 * One revision of a batch.
 */
export interface BatchRevision {
  id: string;
  number: number;
  status: string;
  submittedAt: string | null;
  decidedAt: string | null;
  lines: number;
  /**
   * Rules that the standard of its lines has off.
   */
  rulesOff: {
    code: string;
    title: string;
    /**
     * Versions that have it off, where another that lines were checked on has it on; null: all.
     */
    standards: number[] | null;
  }[];
}
/**
 * A contractor's batch with its newest revision.
 */
export interface Batch {
  id: string;
  number: string;
  workOrder: {
    id: string;
    number: string;
    title: string;
  };
  contractor: NamedRef;
  status: 'draft' | 'checking' | 'checked' | 'submitted' | 'in-review' | 'decided' | 'on-record';
  revision: {
    id: string;
    number: number;
    dueOn: string | null;
    submittedAt: string | null;
    takenAt: string | null;
    decidedAt: string | null;
    inspector: NamedRef | null;
    standards: number[];
  };
  input: number;
  workbook: {
    fileName: string | null;
    sha256: string | null;
  };
  counts: {
    lines: number;
    decided: number;
    nonconformity: number;
    query: number;
    note: number;
    photos: number;
    unplacedPhotos: number;
  };
  createdAt: string;
  version: number;
  can: string[];
}
/**
 * Something named, by id.
 */
export interface NamedRef {
  id: string;
  name: string;
}
/**
 * A message kept by the local capture instead of being sent.
 */
export interface CapturedMail {
  id: string;
  subject: string;
  sender: string;
  recipients: string[];
  at: string;
}
/**
 * A captured message with its two forms.
 */
export interface CapturedMessage {
  id: string;
  subject: string;
  sender: string;
  recipients: string[];
  at: string;
  messageId: string | null;
  text: string | null;
  html: string | null;
}
/**
 * What a check of a workbook for this work order knows before anything is handed in: nothing of other contractors.
 */
export interface CheckContextData {
  workOrder: {
    id: string;
    number: string;
  };
  /**
   * IANA zone of the work order's times.
   */
  zone: string;
  /**
   * The server's clock: later times have not come yet.
   */
  asOf: string;
  standards: {
    id: string;
    n: number;
    effectiveOn: string;
    body: {
      [k: string]: unknown;
    };
  }[];
  products: {
    code: string;
    n: number;
    effectiveOn: string;
    body: {
      [k: string]: unknown;
    };
  }[];
  lots: {
    product: string;
    number: string;
    expiresOn: string | null;
    status: 'in-use' | 'held' | 'recalled';
    history: {
      on: string;
      status: 'in-use' | 'held' | 'recalled';
    }[];
  }[];
  design: {
    structureNumber: string;
    kind: 'set' | 'straighten' | 'relevel';
    poleLengthFt: number | null;
    poleClass: string | null;
    poleMaterial: string | null;
    embedmentFt: number | null;
    latitude: number | null;
    longitude: number | null;
  }[];
  /**
   * GeoJSON polygon of the work order; null: it has none.
   */
  area: {
    [k: string]: unknown;
  } | null;
  /**
   * The contractor's own set records of planned structures that still stand.
   */
  register: {
    structureKey: string;
    recordNumber: string;
  }[];
  /**
   * The contractor's own structures on record near the planned ones.
   */
  neighbours: {
    structureNumber: string;
    latitude: number;
    longitude: number;
    accuracyFt: number;
  }[];
}
/**
 * How far the check of the newest upload is.
 */
export interface CheckProgress {
  input: number;
  state: 'queued' | 'running' | 'done' | 'failed';
  stage: string | null;
  done: number;
  total: number;
  problem: unknown;
}
/**
 * What closing a review did; ids are those of records, as the register takes them.
 */
export interface CloseReviewReply {
  approved: string[];
  returned: string[];
  held: string[];
  nextRevision: number | null;
}
/**
 * An engineer's answer to a concession.
 */
export interface ConcessionDecisionBody {
  decision: 'grant' | 'refuse';
  reason: string;
  condition?: string | null;
  endsOn?: string | null;
}
/**
 * A request to accept as built what does not conform.
 */
export interface Concession {
  id: string;
  number: string;
  state: 'asked' | 'granted' | 'refused' | 'withdrawn';
  findings: {
    id: string;
    recordId: string | null;
    structureNumber: string | null;
    title: string;
    message: string;
    measured: string | number | null;
    limit: string | number | null;
    margin: number | null;
    unit: string | null;
    uncertainty: number | null;
  }[];
  batch: {
    id: string;
    number: string;
  };
  contractor: NamedRef;
  askedReason: string;
  askedBy: string;
  askedAt: string;
  reason: string | null;
  condition: string | null;
  endsOn: string | null;
  answeredBy: string | null;
  answeredAt: string | null;
  version: number;
  can: string[];
}
/**
 * A new lot of a product.
 */
export interface CreateLotBody {
  productId: string;
  number: string;
  expiresOn?: string | null;
}
/**
 * A new work order with its design list.
 */
export interface CreateWorkOrderBody {
  number: string;
  title: string;
  contractorId: string;
  zone: string;
  batchPrefix?: string;
  /**
   * @minItems 1
   * @maxItems 5000
   */
  structures: {
    structureNumber: string;
    kind: 'set' | 'straighten' | 'relevel';
    design: {
      poleLengthFt?: number | null;
      poleClass?: string | null;
      poleMaterial?: string | null;
      ground?: string | null;
      embedmentFt?: number | null;
      latitude?: number | null;
      longitude?: number | null;
    };
  }[];
}
/**
 * Figures computed from a record. Null: cannot be computed from what is there.
 */
export interface Derived {
  voidFt3: number | null;
  placedFt3: number | null;
  fillRatio: number | null;
  fillRatioU: number | null;
  dueFt: number | null;
  waterWithPoleIn: number | null;
  leastAnnulusIn: number | null;
  poleTaped: boolean | null;
  worstReading: string | null;
  [k: string]: unknown;
}
/**
 * The inspector's word on one finding.
 */
export interface FindingDecisionBody {
  decision: 'approve' | 'reject';
  grounds?: 'evidence' | 'answer' | null;
  action?: 'correct' | 'rework' | 'repair' | null;
  dueOn?: string | null;
  reason?: string | null;
}
/**
 * The newest decision on a finding.
 */
export interface FindingDecision {
  decision: 'approve' | 'reject';
  grounds: 'evidence' | 'answer' | 'concession' | null;
  action: 'correct' | 'rework' | 'repair' | null;
  dueOn: string | null;
  reason: string | null;
  by: string;
  at: string;
}
/**
 * A finding with its rendered words and where it stands.
 */
export interface FindingRow {
  id: string;
  recordId: string | null;
  lineId: string | null;
  kind: 'set' | 'straighten' | 'relevel' | null;
  code: string;
  title: string;
  severity: 'nonconformity' | 'query' | 'note';
  structureNumber: string | null;
  sheet: string | null;
  row: number | null;
  cell: string | null;
  field: string | null;
  measured: string | number | null;
  limit: string | number | null;
  margin: number | null;
  unit: string | null;
  uncertainty: number | null;
  params: {
    [k: string]: unknown;
  };
  message: string;
  remedy: string;
  answer: Answer | null;
  state: 'undecided' | 'approved' | 'rejected' | 'concession-asked';
  decision: FindingDecision | null;
  concession: {
    id: string;
    number: string;
    state: 'asked' | 'granted' | 'refused';
  } | null;
  version: number;
  can: string[];
}
/**
 * One event in the life of a record.
 */
export interface HistoryEntry {
  at: string;
  by: string | null;
  title: string;
  detail: string | null;
  batchId: string | null;
  revision: number | null;
}
/**
 * What waits for the person who is signed in.
 */
export interface Home {
  items: {
    key: string;
    title: string;
    count: number;
    /**
     * Address of the list within the product.
     */
    to: string;
    detail: string | null;
  }[];
  recent: {
    at: string;
    title: string;
    detail: string | null;
    to: string | null;
  }[];
}
/**
 * One upload of a revision; every one is kept.
 */
export interface InputRow {
  id: string;
  n: number;
  kind: 'workbook' | 'photo';
  fileName: string;
  sha256: string;
  at: string;
  by: string;
  revision: number;
}
/**
 * The inspector's newest decision on a line itself.
 */
export interface LineDecision {
  decision: 'approve' | 'return';
  reason: string | null;
  by: string;
  at: string;
}
/**
 * A lot with what happened to it and every structure it went into.
 */
export interface LotDetail {
  id: string;
  number: string;
  product: {
    id: string;
    code: string;
  };
  expiresOn: string | null;
  status: 'in-use' | 'held' | 'recalled';
  receivedFt3: number;
  usedFt3: number;
  balanceFt3: number;
  structures: number;
  version: number;
  can: string[];
  events: LotEvent[];
  uses: {
    recordId: string;
    structureNumber: string;
    kind: 'set' | 'straighten' | 'relevel';
    state: 'undecided' | 'approved' | 'returned' | 'held' | 'on-record' | 'abandoned';
    workDay: string | null;
    batch: {
      id: string;
      number: string;
    };
    contractor: NamedRef;
    usedFt3: number | null;
  }[];
}
/**
 * What happened to a lot.
 */
export interface LotEvent {
  id: string;
  type: 'received' | 'held' | 'released' | 'recalled';
  kitFt3: number | null;
  quantity: number | null;
  reason: string | null;
  at: string;
  by: string;
}
/**
 * Kits received of a lot, or the lot held, released or recalled.
 */
export interface LotEventBody {
  type: 'received' | 'held' | 'released' | 'recalled';
  kitFt3?: number | null;
  quantity?: number | null;
  reason?: string | null;
}
/**
 * A maker's batch of kits.
 */
export interface Lot {
  id: string;
  number: string;
  product: {
    id: string;
    code: string;
  };
  expiresOn: string | null;
  status: 'in-use' | 'held' | 'recalled';
  receivedFt3: number;
  usedFt3: number;
  balanceFt3: number;
  structures: number;
  version: number;
  can: string[];
}
/**
 * Totals over the auditor's filter.
 */
export interface NonconformitySummary {
  findings: number;
  records: number;
  recordsChecked: number;
  byRule: {
    code: string;
    title: string;
    count: number;
    share: number;
    running: number;
  }[];
  byContractor: {
    id: string;
    name: string;
    records: number;
    nonconforming: number;
    rate: number;
    low: number;
    high: number;
  }[];
  openActions: {
    bucket: string;
    correct: number;
    rework: number;
    repair: number;
  }[];
}
/**
 * A finding on a submitted line that does not conform.
 */
export interface Nonconformity {
  id: string;
  recordId: string | null;
  lineId: string | null;
  code: string;
  title: string;
  severity: 'nonconformity' | 'query' | 'note';
  structureNumber: string | null;
  kind: 'set' | 'straighten' | 'relevel' | null;
  sheet: string | null;
  row: number | null;
  cell: string | null;
  field: string | null;
  measured: string | number | null;
  limit: string | number | null;
  margin: number | null;
  unit: string | null;
  uncertainty: number | null;
  params: {
    [k: string]: unknown;
  };
  message: string;
  remedy: string;
  state: 'undecided' | 'approved' | 'rejected' | 'concession-asked';
  decision: FindingDecision | null;
  grounds: 'evidence' | 'answer' | 'concession' | null;
  action: 'correct' | 'rework' | 'repair' | null;
  dueOn: string | null;
  concession: string | null;
  condition: string | null;
  contractor: NamedRef;
  workOrder: {
    id: string;
    number: string;
  };
  batch: {
    id: string;
    number: string;
    revision: number;
  };
  installedOn: string | null;
  lots: string[];
  decidedBy: string | null;
  recordNumber: string | null;
  version: number;
}
/**
 * A contractor to add.
 */
export interface OrganisationNew {
  name: string;
}
/**
 * The owner or a contractor.
 */
export interface Organisation {
  id: string;
  name: string;
  kind: 'owner' | 'contractor';
  people: number;
  version: number;
}
/**
 * A job whose attempts are used up.
 */
export interface ParkedJob {
  id: string;
  name: string;
  /**
   * What the job does, in words.
   */
  title: string;
  /**
   * What it means that it did not run.
   */
  meaning: string;
  /**
   * Whose work it is: a batch, a transmittal, a message and its recipient. Null for a chore.
   */
  about: string | null;
  /**
   * What its last attempt said.
   */
  problem: string;
  payload: {
    [k: string]: unknown;
  };
  attempts: number;
  createdAt: string;
  failedAt: string | null;
  can: string[];
}
/**
 * Whom a link for a new password belongs to.
 */
export interface PasswordResetLink {
  email: string;
  purpose: 'invitation' | 'password-reset';
}
/**
 * Whose password was forgotten.
 */
export interface PasswordResetRequest {
  email: string;
}
/**
 * The new password.
 */
export interface PasswordReset {
  password: string;
}
/**
 * What to change of a person; what is left out stays.
 */
export interface PersonChange {
  name?: string;
  role?: 'contractor' | 'inspector' | 'engineer' | 'clerk' | 'auditor' | 'administrator';
  active?: boolean;
}
/**
 * Whom to invite.
 */
export interface PersonNew {
  email: string;
  name: string;
  role: 'contractor' | 'inspector' | 'engineer' | 'clerk' | 'auditor' | 'administrator';
  organisationId: string;
}
/**
 * A person who may sign in.
 */
export interface Person {
  id: string;
  email: string;
  name: string;
  role: 'contractor' | 'inspector' | 'engineer' | 'clerk' | 'auditor' | 'administrator';
  organisation: {
    id: string;
    name: string;
    kind: 'owner' | 'contractor';
  };
  active: boolean;
  /**
   * An invitation was sent and no password has been chosen yet.
   */
  invited: boolean;
  lastSignInAt: string | null;
  version: number;
  can: string[];
}
/**
 * Where a photograph is placed by hand.
 */
export interface PhotoMatchBody {
  lineId: string;
  view:
    | 'bore-depth'
    | 'water'
    | 'kits'
    | 'finish'
    | 'plumb'
    | 'brand'
    | 'before'
    | 'gap'
    | 'after'
    | 'level-after'
    | 'rework'
    | 'other';
}
/**
 * A photograph handed in with a batch.
 */
export interface Photo {
  id: string;
  fileName: string;
  sha256: string;
  lineId: string | null;
  structureNumber: string | null;
  view: string | null;
  method: 'sheet' | 'name' | 'hand' | null;
  takenAt: string | null;
  latitude: number | null;
  longitude: number | null;
  distanceFt: number | null;
  width: number | null;
  height: number | null;
  state: 'stored' | 'ready' | 'unreadable';
  can: string[];
  problem: string | null;
}
/**
 * One line of a work order's design list.
 */
export interface PlannedStructure {
  id: string;
  structureNumber: string;
  kind: 'set' | 'straighten' | 'relevel';
  design: {
    poleLengthFt: number | null;
    poleClass: string | null;
    poleMaterial: string | null;
    ground: string | null;
    embedmentFt: number | null;
    latitude: number | null;
    longitude: number | null;
  };
  state: 'planned' | 'in-batch' | 'approved' | 'on-record';
  batchId: string | null;
  recordNumber: string | null;
}
/**
 * Kits of a lot by size that are left: received less used by lines that were handed in.
 */
export interface PlannerLot {
  id: string;
  number: string;
  product: string;
  expiresOn: string | null;
  status: 'in-use' | 'held' | 'recalled';
  sizes: {
    kitFt3: number;
    left: number;
  }[];
}
/**
 * One row of a pour as stored.
 */
export interface PourRow {
  pourNumber: number | null;
  event: number;
  pouredAt: string | null;
  product: string | null;
  lot: string | null;
  kitFt3: number | null;
  quantity: number | null;
  wastedQuantity: number;
  componentATempF: number | null;
  componentBTempF: number | null;
  sheet: string;
  row: number;
}
/**
 * A foam product, newest version.
 */
export interface Product {
  id: string;
  code: string;
  n: number;
  body: {
    [k: string]: unknown;
  };
}
/**
 * Planned structures of a work order by where they stand.
 */
export interface ProgressCount {
  planned: number;
  inBatch: number;
  approved: number;
  onRecord: number;
}
/**
 * A reason, which stands in the trail.
 */
export interface ReasonBody {
  reason: string;
}
/**
 * The inspector's word on a line itself.
 */
export interface RecordDecisionBody {
  decision: 'approve' | 'return';
  reason?: string | null;
}
/**
 * One line of a batch as checked.
 */
export interface RecordRow {
  id: string;
  lineId: string;
  kind: 'set' | 'straighten' | 'relevel';
  structureNumber: string;
  occurrence: number;
  sheet: string;
  row: number;
  state: 'undecided' | 'approved' | 'returned' | 'held' | 'on-record' | 'abandoned';
  values: {
    [k: string]: unknown;
  };
  derived: Derived;
  photos: {
    id: string;
    view: string;
  }[];
  counts: {
    nonconformity: number;
    query: number;
    note: number;
    undecided: number;
  };
  standard: number;
  workDay: string | null;
  decision: LineDecision | null;
  version: number;
  can: string[];
}
/**
 * Everything the record sheet shows of one line.
 */
export interface RecordSheetData {
  record: RecordRow;
  cells: {
    [k: string]: unknown;
  };
  pours: PourRow[];
  /**
   * Rework and repair, in order; as-found values stay in the record.
   */
  events: {
    event: number | null;
    values: {
      [k: string]: unknown;
    };
  }[];
  /**
   * What the uncertainty of the fill ratio comes from, the greatest part first.
   */
  uncertainty: {
    source: 'bore' | 'pole' | 'depth' | 'gap' | 'width' | 'yield';
    fields: string[];
    /**
     * Expanded uncertainty (k = 2) of one reading: inches, for the yield a share.
     */
    within: number;
    /**
     * Expanded uncertainty of the fill ratio (k = 2), if this were all.
     */
    ofRatio: number;
    /**
     * Of u squared; the shares add to 1.
     */
    share: number;
  }[];
  /**
   * Estimated share of full strength when each thing was done. Never a design value.
   */
  strength: {
    event: number;
    field: string;
    /**
     * Wall clock.
     */
    at: string;
    /**
     * Since the event's last pour.
     */
    minutes: number;
    /**
     * The coldest component of that pour.
     */
    tempF: number;
    share: number;
  }[];
  findings: FindingRow[];
  photos: Photo[];
  history: HistoryEntry[];
  batch: Batch;
  titleBlock: TitleBlock;
  registerEntry: {
    recordNumber: string;
    version: number;
  } | null;
}
/**
 * Title block of a record sheet.
 */
export interface TitleBlock {
  owner: string;
  workOrder: string;
  structure: string;
  kind: string;
  pole: string | null;
  measuredOn: string | null;
  standard: string;
  revision: string;
  decided: string;
  sheet: string;
}
/**
 * An approved line not yet on record.
 */
export interface RegisterCandidate {
  recordId: string;
  lineId: string;
  structureNumber: string;
  kind: 'set' | 'straighten' | 'relevel';
  batch: {
    id: string;
    number: string;
  };
  workOrder: {
    id: string;
    number: string;
  };
  contractor: NamedRef;
  installedOn: string | null;
  nonconforming: boolean;
  supersedes: string | null;
}
/**
 * Approved records to enter, all or nothing; a reason where a version on record is superseded.
 */
export interface RegisterEntriesBody {
  /**
   * @minItems 1
   * @maxItems 2000
   */
  recordIds: string[];
  reason?: string | null;
}
/**
 * What was entered, in the order asked for.
 */
export interface RegisterEntriesReply {
  entries: {
    id: string;
    recordId: string;
    recordNumber: string;
    version: number;
  }[];
}
/**
 * One structure on record, one version.
 */
export interface RegisterRow {
  id: string;
  recordId: string;
  recordNumber: string;
  version: number;
  current: boolean;
  structureNumber: string;
  kind: 'set' | 'straighten' | 'relevel';
  contractor: NamedRef;
  workOrder: {
    id: string;
    number: string;
  };
  installedOn: string | null;
  pole: string | null;
  embedmentFt: number | null;
  dueFt: number | null;
  fillRatio: number | null;
  fillRatioU: number | null;
  lots: string[];
  nonconforming: boolean;
  concessions: string[];
  latitude: number | null;
  longitude: number | null;
  enteredAt: string;
  enteredBy: string;
  reason: string | null;
  supersedes: number | null;
  can: string[];
}
/**
 * A foam product, or its next version, in force from a work day on.
 */
export interface SaveProductBody {
  effectiveOn: string;
  body: {
    [k: string]: unknown;
  };
}
/**
 * What the search box found, by kind of thing; each with where it opens.
 */
export interface SearchReply {
  items: {
    type: 'record' | 'batch' | 'work-order' | 'structure' | 'lot' | 'concession' | 'transmittal';
    id: string;
    label: string;
    detail: string;
  }[];
}
/**
 * Who is signed in, what they may do, and the token that every write must carry.
 */
export interface Session {
  user: {
    id: string;
    email: string;
    name: string;
    role: 'contractor' | 'inspector' | 'engineer' | 'clerk' | 'auditor' | 'administrator';
    organisation: {
      id: string;
      name: string;
      kind: 'owner' | 'contractor';
    };
  };
  /**
   * Packed rules of the permission library.
   */
  abilities: unknown[][];
  csrfToken: string;
}
/**
 * On which paper the record sheets of a batch are put.
 */
export interface SheetFileBody {
  paper: 'letter' | 'a4';
  revision?: number;
}
/**
 * The record sheets of a batch as one PDF file, ready or being made.
 */
export interface SheetFile {
  id: string;
  batchId: string;
  paper: 'letter' | 'a4';
  state: 'queued' | 'running' | 'ready' | 'failed';
  /**
   * Record sheets that it holds.
   */
  sheets: number;
  /**
   * Sheets written so far.
   */
  done: number;
  pages: number | null;
  size: number | null;
  requestedAt: string;
  finishedAt: string | null;
  problem: string | null;
}
/**
 * E-mail address and password.
 */
export interface SignIn {
  email: string;
  password: string;
}
/**
 * A draft of the next version of the construction standard.
 */
export interface StandardDraftBody {
  title?: string;
  effectiveOn: string;
  body: {};
  note?: string | null;
}
/**
 * A version of the construction standard.
 */
export interface StandardVersion {
  id: string;
  n: number;
  title: string;
  state: 'draft' | 'published';
  effectiveOn: string | null;
  body: {
    [k: string]: unknown;
  };
  /**
   * Why this version was drafted.
   */
  note: string | null;
  author: string;
  approver: string | null;
  publishedAt: string | null;
  version: number;
  can: string[];
}
/**
 * One step, in order.
 */
export interface TrailEntry {
  seq: number;
  at: string;
  actor: string | null;
  role: string | null;
  action: string;
  title: string;
  subject: {
    type: string;
    id: string;
    label: string | null;
  };
  payload: {
    [k: string]: unknown;
  };
  hash: string;
}
/**
 * Whether the chain is unbroken.
 */
export interface TrailVerification {
  ok: boolean;
  entries: number;
  head: string | null;
  brokenAt: number | null;
  problem: string | null;
}
/**
 * What an as-built is issued of: a work order, chosen records, or what a filter of the register finds; as the next revision of `supersedes`, where given.
 */
export interface TransmittalBody {
  scope:
    | {
        workOrder: string;
      }
    | {
        /**
         * @minItems 1
         * @maxItems 50000
         */
        recordNumbers: string[];
      }
    | {
        filter: {
          [k: string]: string;
        };
      };
  title?: string;
  supersedes?: string | null;
}
/**
 * An issued as-built workbook, or one being made.
 */
export interface Transmittal {
  id: string;
  number: string;
  revision: number;
  state: 'queued' | 'running' | 'issued' | 'failed';
  title: string;
  scope: {
    [k: string]: unknown;
  };
  rows: number;
  done: number;
  sha256: string | null;
  contentDigest: string | null;
  size: number | null;
  requestedBy: string;
  requestedAt: string;
  issuedAt: string | null;
  problem: string | null;
  can: string[];
}
/**
 * What an upload stored.
 */
export interface UploadReply {
  input: number;
  files: {
    id: string | null;
    fileName: string;
    sha256: string | null;
    /**
     * The same bytes were in this batch before, and are not kept twice: as what, and on which structure they lie.
     */
    already: {
      fileName: string;
      structureNumber: string | null;
    } | null;
    error: {
      code: string;
      detail: string;
    } | null;
  }[];
}
/**
 * A work order let to one contractor.
 */
export interface WorkOrder {
  id: string;
  number: string;
  title: string;
  zone: string;
  contractor: NamedRef;
  structures: number;
  progress: ProgressCount;
  openBatch: string | null;
  version: number;
  can: string[];
}

/** One fault inside a request: `pointer` is a JSON pointer into the body, or `#/query/<name>` for a query parameter. */
export type ProblemError = { readonly pointer: string; readonly code: string; readonly detail: string };
export type ProblemBody = {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly code: string;
  readonly detail: string;
  readonly errors: readonly ProblemError[];
} & Record<string, unknown>;

const TITLES: Readonly<Record<number, string>> = {
  400: 'Bad Request',
  401: 'Unauthorized',
  403: 'Forbidden',
  404: 'Not Found',
  405: 'Method Not Allowed',
  409: 'Conflict',
  412: 'Precondition Failed',
  413: 'Content Too Large',
  415: 'Unsupported Media Type',
  421: 'Misdirected Request',
  422: 'Unprocessable Content',
  428: 'Precondition Required',
  429: 'Too Many Requests',
  500: 'Internal Server Error',
  503: 'Service Unavailable',
};

type ProblemOptions = {
  errors?: readonly ProblemError[];
  /** more members of the problem body, such as `current` */
  extra?: Record<string, unknown>;
  headers?: Record<string, string>;
};

/** What a handler throws when a request is refused; `detail` is written for the person who asked. RFC 9457. */
export class Problem extends Error {
  readonly errors: readonly ProblemError[];
  readonly extra: Record<string, unknown>;
  readonly headers: Record<string, string>;

  constructor(
    readonly status: number,
    readonly code: string,
    readonly detail: string,
    options: ProblemOptions = {},
  ) {
    super(`${status} ${code}: ${detail}`);
    this.name = 'Problem';
    this.errors = options.errors ?? [];
    this.extra = options.extra ?? {};
    this.headers = options.headers ?? {};
  }

  toBody(): ProblemBody {
    const { status, code, detail, errors } = this;
    // `about:blank` says that the status tells the kind; `code` is the stable name that programs read.
    return {
      ...this.extra,
      type: 'about:blank',
      title: TITLES[status] ?? 'Error',
      status,
      code,
      detail,
      errors,
    };
  }
}

export function problem(status: number, code: string, detail: string, options?: ProblemOptions): Problem {
  return new Problem(status, code, detail, options);
}

/** Also the answer for an object that exists but belongs to another contractor: the two must look alike. */
export function notFound(): Problem {
  return problem(404, 'not-found', 'There is nothing here, or it is not yours to see.');
}

export function notSignedIn(): Problem {
  return problem(
    401,
    'session.none',
    'You are not signed in, or your session has ended. Sign in and try again.',
  );
}

export function forbidden(detail = 'Your role does not allow this.'): Problem {
  return problem(403, 'forbidden', detail);
}

export function conflict(code: string, detail: string, options?: ProblemOptions): Problem {
  return problem(409, code, detail, options);
}

/** `current` is the object as it is now, so that the person can compare it with what they changed. */
export function stale(current: unknown): Problem {
  return problem(
    412,
    'version.stale',
    'Someone changed this after you opened it. Compare your change with the newer state and try again.',
    { extra: { current } },
  );
}

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
  400: 'That cannot be read',
  401: 'You are not signed in',
  403: 'Not allowed',
  404: 'Nothing here',
  405: 'Not possible here',
  409: 'Not possible as things stand',
  410: 'No longer valid',
  412: 'Changed by someone else',
  413: 'Too large',
  415: 'Wrong kind of content',
  421: 'Wrong address',
  422: 'That cannot be used',
  428: 'Version missing',
  429: 'Too many attempts',
  500: 'Something went wrong',
  503: 'Not available just now',
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
    const title = TITLES[status] ?? 'That did not work';
    // A tag URI (RFC 4151) names the kind and promises no page; `code` is its short form, which programs read.
    return { ...this.extra, type: `tag:upstand.example,2026:${code}`, title, status, code, detail, errors };
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

export type ProblemEntry = { readonly pointer: string; readonly code: string; readonly detail: string };

export type ProblemBody = {
  readonly type?: string;
  readonly title?: string;
  readonly status: number;
  readonly code: string;
  readonly detail: string;
  readonly errors?: readonly ProblemEntry[];
  /** The newer state, on 412. */
  readonly current?: unknown;
};

/** What the server (or the lack of an answer) said. `message` is written for people; `code` is for the program. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly code: string;
  readonly title: string;
  readonly errors: readonly ProblemEntry[];
  readonly body: ProblemBody;

  constructor(body: ProblemBody) {
    super(body.detail);
    this.name = 'ApiProblem';
    this.status = body.status;
    this.code = body.code;
    this.title = body.title ?? 'That did not work';
    this.errors = body.errors ?? [];
    this.body = body;
  }
}

/** Status 0: no answer came. */
export function unreachable(): ApiProblem {
  return new ApiProblem({
    status: 0,
    code: 'unreachable',
    title: 'The server does not answer',
    detail: 'Nothing was changed and what you typed is still here. Check the connection, then try again.',
  });
}

/** Reads a problem from a reply's text; a reply that is no problem document still becomes a plain sentence. */
export function problemFrom(status: number, text: string): ApiProblem {
  try {
    const body: unknown = JSON.parse(text);
    if (isProblem(body)) return new ApiProblem({ ...body, status });
  } catch {
    // Not JSON: a proxy's page, or nothing at all.
  }
  return new ApiProblem({
    status,
    code: 'unexpected',
    title: 'The server could not do that',
    detail: `It answered with status ${status} and no explanation. Try again; if it stays so, tell the administrator.`,
  });
}

function isProblem(value: unknown): value is ProblemBody {
  return (
    typeof value === 'object' &&
    value !== null &&
    'code' in value &&
    typeof value.code === 'string' &&
    'detail' in value &&
    typeof value.detail === 'string'
  );
}

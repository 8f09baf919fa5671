/** The sentence of a job's problem, which comes as text or as `{code, detail}`. */
export function problemText(problem: unknown): string | null {
  if (typeof problem === 'string') return problem;
  if (typeof problem === 'object' && problem !== null && 'detail' in problem) {
    return typeof problem.detail === 'string' ? problem.detail : null;
  }
  return null;
}

/** The stable code of a job's problem; null where it has none. */
export function problemCode(problem: unknown): string | null {
  if (typeof problem !== 'object' || problem === null || !('code' in problem)) return null;
  return typeof problem.code === 'string' ? problem.code : null;
}

import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from '#src/lib/api/api-problem.ts';

/** A refusal is an answer: only silence and the server's own faults are tried again. */
function worthRetrying(count: number, error: Error): boolean {
  if (error instanceof ApiProblem && error.status > 0 && error.status < 500) return false;
  return count < 2;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry: worthRetrying, staleTime: 15_000, refetchOnWindowFocus: true },
      mutations: { retry: false },
    },
  });
}

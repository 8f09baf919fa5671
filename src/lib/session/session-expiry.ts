/**
 * Requests that met an ended session wait here while a sign-in dialog stands over the page,
 * so that nothing typed is lost; they go on when the same person has signed in again.
 */
type Waiter = (again: boolean) => void;

let waiters: Waiter[] = [];
const listeners = new Set<() => void>();

function tell(): void {
  for (const listener of listeners) listener();
}

/** Resolves true when the request should be sent again, false when the person left. */
export function waitForSignIn(): Promise<boolean> {
  return new Promise((resolve) => {
    waiters.push(resolve);
    tell();
  });
}

export function endWaiting(again: boolean): void {
  const current = waiters;
  waiters = [];
  for (const waiter of current) waiter(again);
  tell();
}

export function subscribeExpiry(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function isWaiting(): boolean {
  return waiters.length > 0;
}

/** The token of the current session's reply; every write carries it. It lives in memory only. */
let token: string | null = null;

export function setCsrfToken(next: string | null): void {
  token = next;
}

export function csrfToken(): string | null {
  return token;
}

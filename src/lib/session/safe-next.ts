import { paths } from '#src/config/paths.ts';

/** Where to go after signing in: an address of this site, whatever the query says. */
export function safeNext(next: string | null): string {
  const home = paths.home.to();
  if (!next || !next.startsWith('/') || /^\/[/\\]/.test(next) || next.startsWith(paths.signIn.path))
    return home;
  return next;
}

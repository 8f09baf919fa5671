import { APP_ROLE } from '#server/db/grants.ts';

/** The owner's sign-in that takes on the application's rights from its first statement. Weaker than a sign-in of the role's own, since a session can go back; better than the owner's rights. */
export function appRoleUrl(ownerUrl: string): string {
  const url = new URL(ownerUrl);
  const given = url.searchParams.get('options');
  url.searchParams.set('options', `${given === null ? '' : `${given} `}-c role=${APP_ROLE}`);
  // As %20: a plus sign in an address is read as a plus sign here.
  url.search = url.searchParams.toString().replaceAll('+', '%20');
  return url.href;
}

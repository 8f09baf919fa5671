import { rows } from '#server/db/rows.ts';
import type { RouteContext } from '#server/http/define-route.ts';
import { DEMO_ACCOUNTS } from '#server/modules/session/demo-accounts.ts';
import type { AppInfo } from '#shared/generated/api-types.ts';

type DemoAccount = NonNullable<AppInfo['demo']>['accounts'][number];

/** What the sign-in page needs before anybody is signed in. Accounts and password only in the demo. */
export async function appInfo({ em, services, visitor }: RouteContext): Promise<AppInfo> {
  const owners = await rows<{ name: string }>(
    em,
    `select name from organisations where kind = 'owner' order by created_at, id limit 1`,
  );
  const { demo, demoPassword } = services.config;
  const accounts =
    demo && demoPassword
      ? await rows<DemoAccount>(
          em,
          `select u.email, u.name, u.role, o.name as organisation
           from users u join organisations o on o.id = u.org_id
           where u.active and u.email = any($1::text[]) order by array_position($1::text[], u.email)`,
          [DEMO_ACCOUNTS],
        )
      : [];
  return {
    owner: owners[0]?.name ?? '',
    demo: demo && demoPassword ? { password: demoPassword, accounts } : null,
    signedIn: visitor !== null,
  };
}

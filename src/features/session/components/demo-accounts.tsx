import type { AppInfo, DemoAccount } from '#src/features/session/api/app-info.ts';

type Props = {
  readonly demo: NonNullable<AppInfo['demo']>;
  readonly onPick: (account: DemoAccount) => void;
};

/** Only where the demo is seeded: one line an account; a click fills the form. */
export function DemoAccounts({ demo, onPick }: Props) {
  return (
    <section aria-labelledby="demo-accounts" className="mt-8">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b-[1.5px] border-ink pb-1.5">
        <h2 id="demo-accounts" className="text-table font-semibold">
          Demo accounts
        </h2>
        <p className="text-small text-muted">
          Password: <span className="font-semibold text-ink">{demo.password}</span>
        </p>
      </div>
      <ul>
        {demo.accounts.map((account) => (
          <li key={account.email} className="border-b border-hairline">
            <button
              type="button"
              onClick={() => onPick(account)}
              className="grid w-full grid-cols-[7rem_1fr] gap-x-3 py-1 text-left text-table hover:bg-sunk sm:grid-cols-[7rem_6rem_1fr] pointer-coarse:py-3"
            >
              <span className="font-semibold">{account.role}</span>
              <span>{account.name}</span>
              <span className="truncate text-muted max-sm:col-span-2">{account.email}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

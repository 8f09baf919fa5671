import { Link, NavLink } from 'react-router-dom';
import { NAV, type NavItem } from '#src/app/nav.ts';
import { NavMenu } from '#src/app/nav-menu.tsx';
import { SearchBox } from '#src/app/search-box.tsx';
import { UserMenu } from '#src/app/user-menu.tsx';
import { Mark } from '#src/components/ui/mark.tsx';
import { paths } from '#src/config/paths.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { SessionUser } from '#src/lib/session/session.ts';

export function Header({ user }: { user: SessionUser }) {
  const items = NAV[user.role];
  return (
    <header className="sticky top-0 z-20 flex h-band items-center gap-6 border-b-[1.5px] lg:gap-4 xl:gap-6 border-ink bg-paper px-gutter print:hidden">
      <Link to={paths.home.to()} className="flex items-center gap-2.5 text-lead font-semibold">
        <Mark />
        Upstand
      </Link>
      <nav aria-label="Main" className="hidden h-full shrink-0 lg:block">
        <ul className="flex h-full gap-3.5 xl:gap-5">
          {items.map((item) => (
            <li key={item.to} className="h-full">
              <HeaderLink {...item} />
            </li>
          ))}
        </ul>
      </nav>
      <div className="ml-auto flex min-w-0 items-center gap-5 lg:gap-3 xl:gap-5">
        <SearchBox />
        <UserMenu user={user} />
        <NavMenu items={items} />
      </div>
    </header>
  );
}

function HeaderLink({ label, to }: NavItem) {
  return (
    <NavLink
      to={to}
      end={to === paths.home.to()}
      className={({ isActive }) =>
        classNames(
          'flex h-full items-center whitespace-nowrap border-b-2 pt-0.5',
          isActive
            ? 'border-accent font-semibold text-ink'
            : 'border-transparent text-ink-2 hover:border-rule hover:text-ink',
        )
      }
    >
      {label}
    </NavLink>
  );
}

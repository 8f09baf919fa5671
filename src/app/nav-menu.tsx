import { useLocation } from 'react-router-dom';
import type { NavItem } from '#src/app/nav.ts';
import { Menu, MenuLink } from '#src/components/ui/menu.tsx';
import { paths } from '#src/config/paths.ts';

/** The same places as the header's row, on a narrow screen. */
export function NavMenu({ items }: { items: readonly NavItem[] }) {
  const { pathname } = useLocation();
  return (
    <nav aria-label="Main" className="lg:hidden">
      <Menu
        trigger={
          <button
            type="button"
            aria-label="Menu"
            className="-mr-2 flex size-10 items-center justify-center pointer-coarse:size-11"
          >
            <svg viewBox="0 0 20 14" width="20" height="14" aria-hidden="true" className="stroke-ink">
              <path d="M0 1h20M0 7h20M0 13h20" strokeWidth="1.6" />
            </svg>
          </button>
        }
      >
        {items.map((item) => (
          <MenuLink
            key={item.to}
            to={item.to}
            active={item.to === paths.home.to() ? pathname === item.to : pathname.startsWith(item.to)}
          >
            {item.label}
          </MenuLink>
        ))}
        <MenuLink to={paths.search.to()} active={pathname.startsWith(paths.search.path)}>
          Search
        </MenuLink>
      </Menu>
    </nav>
  );
}

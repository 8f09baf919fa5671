import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Menu, MenuChoice, MenuItem, MenuNote, MenuRule } from '#src/components/ui/menu.tsx';
import { paths } from '#src/config/paths.ts';
import type { SessionUser } from '#src/lib/session/session.ts';
import { signOut } from '#src/lib/session/sign-out.ts';
import { useSetting } from '#src/lib/settings/setting.ts';
import { themeSetting } from '#src/lib/settings/theme.ts';
import { unitSetting } from '#src/lib/settings/unit-system.ts';

export function UserMenu({ user }: { user: SessionUser }) {
  const theme = useSetting(themeSetting);
  const units = useSetting(unitSetting);
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const leave = useMutation({
    mutationFn: () => signOut(queryClient),
    onSuccess: () => navigate(paths.signIn.to(), { replace: true }),
  });
  return (
    <>
      {leave.isError ? (
        <span role="alert" className="text-table font-semibold text-nonconform">
          Not signed out: {leave.error.message}
        </span>
      ) : null}
      <Menu
        trigger={
          <button
            type="button"
            className="min-h-9 truncate text-table hover:underline lg:shrink-0 pointer-coarse:min-h-11"
          >
            {user.name}
            {/* At laptop width the pages of a role take the room; the role stands in the menu. */}
            <span className="max-sm:hidden lg:max-xl:hidden"> · {user.role}</span>
          </button>
        }
      >
        <MenuNote>
          <span className="block font-semibold">{user.name}</span>
          <span className="block text-small text-muted">
            {user.role}, {user.organisation.name}
          </span>
          <span className="block text-small text-muted">{user.email}</span>
        </MenuNote>
        <MenuRule />
        <MenuChoice
          label="Theme"
          value={theme}
          onChange={themeSetting.set}
          options={[
            { value: 'system', label: 'As the system' },
            { value: 'light', label: 'Paper' },
            { value: 'dark', label: 'Blueprint' },
          ]}
        />
        <MenuChoice
          label="Units shown"
          value={units}
          onChange={unitSetting.set}
          options={[
            { value: 'us', label: 'Feet, inches, °F' },
            { value: 'metric', label: 'Metres, millimetres, °C' },
          ]}
        />
        <MenuRule />
        <MenuItem onSelect={() => leave.mutate()}>Sign out</MenuItem>
      </Menu>
    </>
  );
}

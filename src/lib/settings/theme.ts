import { createSetting } from '#src/lib/settings/setting.ts';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

/** The key is read by public/theme.js too, before the first paint. */
export const themeSetting = createSetting<Theme>('upstand.theme', THEMES, 'system');

function apply(): void {
  const theme = themeSetting.get();
  if (theme === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}

export function followTheme(): void {
  apply();
  themeSetting.subscribe(apply);
}

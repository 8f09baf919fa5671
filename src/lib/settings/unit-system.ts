import { createSetting, useSetting } from '#src/lib/settings/setting.ts';

export const UNIT_SYSTEMS = ['us', 'metric'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

/** Display only: what is stored and sent stays in the units of the field's name. */
export const unitSetting = createSetting<UnitSystem>('upstand.units', UNIT_SYSTEMS, 'us');

export function useUnitSystem(): UnitSystem {
  return useSetting(unitSetting);
}

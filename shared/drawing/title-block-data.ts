import { formatDay } from '#shared/dates/format-day.ts';
import { formatWallClock } from '#shared/dates/format-moment.ts';
import type { TitleBlock } from '#shared/generated/api-types.ts';
import type { TitleBlockData } from './sheet-types.ts';

/** The title block as it is printed: days and clocks in the sheet's own words. */
export function titleBlockData(block: TitleBlock): TitleBlockData {
  const { measuredOn } = block;
  return {
    ...block,
    measuredOn:
      measuredOn === null
        ? 'not written'
        : measuredOn.includes('T')
          ? formatWallClock(measuredOn)
          : formatDay(measuredOn),
  };
}

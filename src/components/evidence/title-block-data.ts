import type { TitleBlockData } from '#src/components/drawing/sheet-types.ts';
import { formatDay, formatWallClock } from '#src/lib/formats.ts';
import type { TitleBlock } from '#shared/generated/api-types.ts';

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

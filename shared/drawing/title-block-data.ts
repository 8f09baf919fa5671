import { formatDay } from '#shared/dates/format-day.ts';
import { formatWallClock } from '#shared/dates/format-moment.ts';
import { poleWords } from '#shared/units/pole-words.ts';
import type { TitleBlock } from '#shared/generated/api-types.ts';
import type { TitleBlockData } from './sheet-types.ts';

/** The title block as it is printed: days, clocks and the pole's length in the sheet's own words. */
export function titleBlockData(block: TitleBlock, { metric = false } = {}): TitleBlockData {
  const { measuredOn } = block;
  return {
    ...block,
    pole: block.pole === null ? null : poleWords(block.pole, { metric }),
    measuredOn:
      measuredOn === null
        ? 'not written'
        : measuredOn.includes('T')
          ? formatWallClock(measuredOn)
          : formatDay(measuredOn),
  };
}

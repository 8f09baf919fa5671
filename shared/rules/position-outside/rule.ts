import { isInArea } from '#shared/calc/geo-area.ts';
import { say } from '#shared/findings/say.ts';
import { statedPlace } from '../line-place.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const positionOutside: LineRule = {
  code: 'position-outside',
  title: 'Outside the area',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'latitude',
  needs: ['area'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { area }) => {
    const stated = statedPlace(line);
    if (area === null || area === 'none' || !stated || isInArea(area, stated.place)) return [];
    const { latitude, longitude } = stated.place;
    return [
      {
        measured: `${latitude}, ${longitude}`,
        limit: null,
        margin: null,
        unit: null,
        params: { latitude, longitude },
      },
    ];
  },
  message: ({ params }) =>
    `The position ${say(params['latitude'], 'deg')}, ${say(params['longitude'], 'deg')} lies outside the area of the work order.`,
  remedy: () =>
    'Check latitude and longitude, their signs too (west is negative); work outside the area needs an amendment of the order.',
};

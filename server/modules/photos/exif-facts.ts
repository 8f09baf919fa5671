import type { PictureFacts } from './picture-messages.ts';

type Taken = Pick<PictureFacts, 'takenWall' | 'takenAt'>;
type Place = Pick<PictureFacts, 'latitude' | 'longitude'>;

const WALL = /^(\d{4})[:-](\d{2})[:-](\d{2})[ T](\d{2}):(\d{2}):(\d{2})/;
const OFFSET = /^([+-])(\d{2}):(\d{2})$/;

/** Capture time from EXIF text as it stands in the file. The offset is kept apart: without it a wall clock is no instant. */
export function takenFrom(tags: Readonly<Record<string, unknown>>): Taken {
  const match = WALL.exec(text(tags['DateTimeOriginal']) ?? '');
  if (!match) return { takenWall: null, takenAt: null };
  const [, year, month, day, hour, minute, second] = match;
  const takenWall = `${year}-${month}-${day}T${hour}:${minute}:${second}`;
  const asUtc = Date.parse(`${takenWall}Z`);
  if (Number.isNaN(asUtc)) return { takenWall: null, takenAt: null };
  const offset = OFFSET.exec(text(tags['OffsetTimeOriginal']) ?? text(tags['OffsetTime']) ?? '');
  if (!offset) return { takenWall, takenAt: null };
  const minutes = (Number(offset[2]) * 60 + Number(offset[3])) * (offset[1] === '-' ? -1 : 1);
  return { takenWall, takenAt: new Date(asUtc - minutes * 60_000).toISOString() };
}

/** Position from EXIF degrees, minutes and seconds. What is out of range, or the 0/0 of a camera without a fix, is unknown. */
export function placeFrom(tags: Readonly<Record<string, unknown>>): Place {
  const latitude = degrees(tags['GPSLatitude'], tags['GPSLatitudeRef'], 'S');
  const longitude = degrees(tags['GPSLongitude'], tags['GPSLongitudeRef'], 'W');
  const known =
    latitude !== null &&
    longitude !== null &&
    Math.abs(latitude) <= 90 &&
    Math.abs(longitude) <= 180 &&
    !(latitude === 0 && longitude === 0);
  return known ? { latitude, longitude } : { latitude: null, longitude: null };
}

function degrees(value: unknown, ref: unknown, negative: string): number | null {
  if (!Array.isArray(value) || value.length === 0) return null;
  const [d = 0, m = 0, s = 0] = value.map(Number);
  const sum = d + m / 60 + s / 3600;
  if (!Number.isFinite(sum)) return null;
  return text(ref)?.toUpperCase() === negative ? -sum : sum;
}

function text(value: unknown): string | null {
  return typeof value === 'string' ? value.replaceAll('\0', '').trim() : null;
}

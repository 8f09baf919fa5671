export type Capture = {
  /** wall clock where the camera stood, `YYYY-MM-DDTHH:mm:ss` */
  readonly takenAt: string;
  /** offset from UTC then and there, `-05:00` */
  readonly offset: string;
  readonly latitude: number;
  readonly longitude: number;
};

/** EXIF blocks as sharp takes them: 0 the picture, 2 the exposure, 3 the position. */
export function exifOf({
  takenAt,
  offset,
  latitude,
  longitude,
}: Capture): Record<'IFD0' | 'IFD2' | 'IFD3', Record<string, string>> {
  const stamp = takenAt.replace(/-/g, ':').replace('T', ' ');
  return {
    IFD0: { Make: 'Larkmoor demo', Model: 'Drawn, not taken', DateTime: stamp },
    IFD2: { DateTimeOriginal: stamp, OffsetTimeOriginal: offset },
    IFD3: {
      GPSLatitudeRef: latitude >= 0 ? 'N' : 'S',
      GPSLatitude: sexagesimal(latitude),
      GPSLongitudeRef: longitude >= 0 ? 'E' : 'W',
      GPSLongitude: sexagesimal(longitude),
    },
  };
}

/** Degrees, minutes and hundred-thousandths of a second (under a hundredth of an inch on the ground), as rationals. */
function sexagesimal(degrees: number): string {
  const units = Math.round(Math.abs(degrees) * 3600 * 100_000);
  const perMinute = 60 * 100_000;
  const whole = Math.floor(units / (60 * perMinute));
  const minutes = Math.floor(units / perMinute) % 60;
  return `${whole}/1 ${minutes}/1 ${units % perMinute}/100000`;
}

export type PictureType = 'image/jpeg' | 'image/png' | 'image/webp';
export type TypeVerdict = { readonly type: PictureType } | { readonly code: string; readonly detail: string };

/** How many first bytes `pictureType` wants to see. */
export const HEAD_BYTES = 512;

const ADVICE = 'Save it as JPEG and upload it again.';
const HEIC_BRANDS = ['heic', 'heix', 'heim', 'heis', 'hevc', 'hevx', 'mif1', 'msf1'];

/** Told by the first bytes of the file, never by its name. What is not a picture that can be shown is refused with what to do. */
export function pictureType(head: Uint8Array): TypeVerdict {
  if (head.length === 0)
    return { code: 'photo.empty', detail: 'The file is empty. Take it from the camera again.' };
  if (startsWith(head, [0xff, 0xd8, 0xff])) return { type: 'image/jpeg' };
  if (startsWith(head, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return { type: 'image/png' };
  if (ascii(head, 0, 4) === 'RIFF' && ascii(head, 8, 12) === 'WEBP') return { type: 'image/webp' };
  if (ascii(head, 4, 8) === 'ftyp')
    return HEIC_BRANDS.includes(ascii(head, 8, 12))
      ? {
          code: 'photo.heic',
          detail: `This is a HEIC picture, which cannot be shown here. ${ADVICE} Set the camera to its most compatible format.`,
        }
      : {
          code: 'photo.not-a-picture',
          detail: `This is a film or another container, not a photograph. ${ADVICE}`,
        };
  const text = ascii(head, 0, head.length).trimStart().toLowerCase();
  if (text.includes('<svg'))
    return {
      code: 'photo.svg',
      detail: 'This is an SVG drawing, not a photograph. Upload the photograph itself as JPEG.',
    };
  if (
    ascii(head, 0, 4) === 'GIF8' ||
    startsWith(head, [0x49, 0x49, 0x2a, 0x00]) ||
    startsWith(head, [0x4d, 0x4d, 0x00, 0x2a]) ||
    ascii(head, 0, 2) === 'BM'
  )
    return {
      code: 'photo.type',
      detail: `This kind of picture is not taken here; JPEG, PNG and WebP are. ${ADVICE}`,
    };
  return {
    code: 'photo.not-a-picture',
    detail: `This file is not a picture, whatever its name says. ${ADVICE}`,
  };
}

function startsWith(head: Uint8Array, bytes: readonly number[]): boolean {
  return bytes.every((byte, at) => head[at] === byte);
}

function ascii(head: Uint8Array, from: number, to: number): string {
  return String.fromCharCode(...head.subarray(from, to));
}

const LONGEST = 120;

/**
 * A file's name as it is kept and shown: path parts, control and direction-changing characters taken out, other
 * scripts kept. What tells files apart is their content; the name is for people.
 */
export function safeFileName(name: string): string {
  const last = name.normalize('NFC').split(/[\\/]/u).at(-1) ?? '';
  const clean = last
    .replaceAll(/[\p{Cc}\p{Cf}\p{Cs}\p{Co}\u2028\u2029]/gu, '')
    .replaceAll(/\s+/gu, ' ')
    .trim();
  if (clean === '' || /^\.+$/u.test(clean)) return 'unnamed';
  return shorten(clean);
}

function shorten(name: string): string {
  const letters = Array.from(name);
  if (letters.length <= LONGEST) return name;
  const extension = /\.[^.\s]{1,8}$/u.exec(name)?.[0] ?? '';
  return letters.slice(0, LONGEST - extension.length).join('') + extension;
}

/** What a number format shows of a serial: nothing of a date, a day alone, or hours too. */
export type DateFormat = 'none' | 'day' | 'time';

/** Built-in number formats that show a date or a time (ECMA-376 Part 1, 18.8.30, with the East Asian ids). */
function builtIn(id: number): DateFormat {
  if ((id >= 18 && id <= 22) || (id >= 45 && id <= 47) || id === 32 || id === 33) return 'time';
  if ((id >= 14 && id <= 17) || (id >= 27 && id <= 36) || (id >= 50 && id <= 58)) return 'day';
  return 'none';
}

/** What a number format shows. `code` is the custom format code, if there is one for the id. */
export function dateFormatOf(id: number, code: string | undefined): DateFormat {
  if (code === undefined) return builtIn(id);
  // Programs write 255 characters at most.
  if (code.length > 1000) return 'none';
  const section = code
    .replace(/"[^"]*"?/g, '')
    .replace(/[\\_*]./g, '')
    .replace(/\[(?:h+|m+|s+)\]/gi, 'h')
    .replace(/\[[^\]]*\]/g, '')
    .split(';')[0];
  if (section === undefined || /^\s*general\s*$/i.test(section)) return 'none';
  if (/[hs]/i.test(section)) return 'time';
  return /[ymd]/i.test(section) ? 'day' : 'none';
}

/** Built-in number formats that show a date or a time (ECMA-376 Part 1, 18.8.30, with the East Asian ids). */
function isBuiltInDate(id: number): boolean {
  return (id >= 14 && id <= 22) || (id >= 27 && id <= 36) || (id >= 45 && id <= 47) || (id >= 50 && id <= 58);
}

/** Whether a number format shows a date or a time. `code` is the custom format code, if there is one for the id. */
export function isDateFormat(id: number, code: string | undefined): boolean {
  if (code === undefined) return isBuiltInDate(id);
  const section = code
    .replace(/"[^"]*"?/g, '')
    .replace(/[\\_*]./g, '')
    .replace(/\[(h+|m+|s+)\]/gi, 'h')
    .replace(/\[[^\]]*\]/g, '')
    .split(';')[0];
  if (section === undefined || /^\s*general\s*$/i.test(section)) return false;
  return /[ymdhs]/i.test(section);
}

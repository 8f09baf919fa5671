/** PostgreSQL refuses NUL and lone surrogates, which a cell of a workbook or a file's name can hold: they become U+FFFD. */
export function storableText(text: string): string {
  return text.replaceAll(/[\0\p{Surrogate}]/gu, '\uFFFD');
}

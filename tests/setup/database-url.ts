/** The same server and account, another database. */
export function databaseUrl(url: string, name: string): string {
  const other = new URL(url);
  other.pathname = `/${name}`;
  return other.href;
}

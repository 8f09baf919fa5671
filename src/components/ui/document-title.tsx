/** React lifts this into the head: the tab says where one is. */
export function DocumentTitle({ children }: { children: string }) {
  return <title>{`${children} · Upstand`}</title>;
}

/**
 * The message for a sandboxed frame: no scripts run in it, whatever it holds; its links open in the whole window and
 * only when pressed. `base` comes first, since the first one counts.
 */
export function framedHtml(html: string): string {
  return `<!doctype html><base target="_top">${html}`;
}

/** A text cut at its web addresses, so that they can be links. */
export function splitLinks(text: string): readonly { readonly text: string; readonly link: boolean }[] {
  return text
    .split(/(https?:\/\/[^\s<>"']+[^\s<>"'.,;:!?)\]])/)
    .filter((part) => part !== '')
    .map((part) => ({ text: part, link: /^https?:\/\//.test(part) }));
}

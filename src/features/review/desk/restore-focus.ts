/** Id of the button that heads a finding in the list. */
export function findingElementId(id: string): string {
  return `finding-${id}`;
}

/** After a form has closed the keyboard is back at its finding, unless it has gone elsewhere meanwhile. */
export function restoreFocus(findingId: string): void {
  requestAnimationFrame(() => {
    if (document.activeElement === null || document.activeElement === document.body)
      document.getElementById(findingElementId(findingId))?.focus({ preventScroll: true });
  });
}

/** Single-key shortcuts keep silent while somebody types, or while a dialog or menu has the keyboard. */
export function isTyping(event: KeyboardEvent): boolean {
  const target = event.target;
  if (!(target instanceof HTMLElement)) return false;
  return (
    target.isContentEditable ||
    target.matches('input:not([type=checkbox], [type=radio]), textarea, select') ||
    target.closest('[role=dialog], [role=alertdialog], [role=menu], [role=listbox]') !== null
  );
}

import { useEffect, useRef } from 'react';
import { isTyping } from '#src/lib/is-typing.ts';

/** Single keys for the page, by `KeyboardEvent.key` in lower case (`j`, `?`, `enter`, `shift+n`). Silent while somebody types or a dialog is open. */
export function useHotkeys(actions: Readonly<Record<string, () => void>>): void {
  const current = useRef(actions);
  useEffect(() => {
    current.current = actions;
  });
  useEffect(() => {
    function onKey(event: KeyboardEvent) {
      if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented || isTyping(event)) return;
      // A focused link or button answers Enter and Space itself.
      const own = event.key === 'Enter' || event.key === ' ';
      if (own && event.target instanceof Element && event.target.closest('a, button, summary, input')) return;
      const key = event.key.toLowerCase();
      const action = (event.shiftKey && current.current[`shift+${key}`]) || current.current[key];
      if (!action) return;
      event.preventDefault();
      action();
    }
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, []);
}

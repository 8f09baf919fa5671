import { useEffect, useRef } from 'react';
import { Form } from 'react-router-dom';
import { Kbd } from '#src/components/ui/kbd.tsx';
import { paths } from '#src/config/paths.ts';
import { isTyping } from '#src/lib/is-typing.ts';

/** `/` from anywhere puts the caret here; Enter opens the results. */
export function SearchBox() {
  const input = useRef<HTMLInputElement>(null);
  useEffect(() => {
    function onKey(event: KeyboardEvent) {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isTyping(event)) return;
      event.preventDefault();
      input.current?.focus();
      input.current?.select();
    }
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, []);
  return (
    <Form action={paths.search.path} role="search" className="relative hidden w-58 md:block">
      <input
        ref={input}
        type="search"
        name="q"
        aria-label="Search structures, batches and lots"
        aria-keyshortcuts="/"
        placeholder="Structure, batch, lot…"
        className="h-7 w-full border border-rule bg-sheet pr-9 pl-3 text-table"
      />
      <span className="pointer-events-none absolute inset-y-0 right-2 flex items-center">
        <Kbd>/</Kbd>
      </span>
    </Form>
  );
}

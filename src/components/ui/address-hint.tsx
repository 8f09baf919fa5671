import { useState } from 'react';

/** Filters stand in the address: a press copies it, so that the view can be sent to a colleague. */
export function AddressHint() {
  const [said, setSaid] = useState('');
  async function copy(): Promise<void> {
    try {
      await navigator.clipboard.writeText(location.href);
      setSaid('Address copied.');
    } catch {
      setSaid('The browser does not let it be copied; take it from the address bar.');
    }
  }
  return (
    <span className="text-muted" aria-live="polite">
      {said || 'Filters stand in the address;'}{' '}
      <button
        type="button"
        onClick={() => void copy()}
        className="text-ink-2 underline decoration-rule underline-offset-4 hover:decoration-ink"
      >
        {said ? 'Copy again' : 'copy it'}
      </button>
      {said ? '' : ' to send this view.'}
    </span>
  );
}

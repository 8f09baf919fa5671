import { useEffect } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import { readDraft, writeDraft } from '#src/lib/session/drafts.ts';

/** Gives back what was typed before the page was left, and keeps what is typed now. */
export function useDraft<T extends FieldValues>(form: UseFormReturn<T>, key: string | undefined): void {
  useEffect(() => {
    if (!key) return undefined;
    const draft = readDraft(key);
    if (typeof draft === 'object' && draft !== null) {
      form.reset({ ...form.getValues(), ...draft }, { keepDefaultValues: true });
    }
    return form.subscribe({
      formState: { values: true },
      callback: ({ values }) => writeDraft(key, values),
    });
  }, [form, key]);
}

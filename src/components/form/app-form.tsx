import type { ReactNode } from 'react';
import { FormProvider, type FieldValues, type UseFormReturn } from 'react-hook-form';
import { ErrorSummary } from '#src/components/form/error-summary.tsx';
import { placeProblem } from '#src/components/form/form-faults.ts';
import { useDraft } from '#src/components/form/use-draft.ts';
import { dropDraft } from '#src/lib/session/drafts.ts';

type Props<T extends FieldValues> = {
  readonly form: UseFormReturn<T>;
  /** Rejects with ApiProblem when the server refuses; its entries are put beside their fields. */
  readonly onSubmit: (values: T) => Promise<unknown>;
  /** Keeps what is typed for this tab under this name until it is sent. Never for passwords. */
  readonly draftKey?: string;
  readonly label?: string;
  /** A refusal that stands above the form in words of its own: not said a second time. What was typed stays. */
  readonly toldElsewhere?: (error: unknown) => boolean;
  readonly children: ReactNode;
};

/** A form with its error summary. The browser's own bubbles are off: they say less and vanish. */
export function AppForm<T extends FieldValues>({
  form,
  onSubmit,
  draftKey,
  label,
  toldElsewhere,
  children,
}: Props<T>) {
  useDraft(form, draftKey);
  const submit = form.handleSubmit(async (values) => {
    try {
      await onSubmit(values);
      if (draftKey) dropDraft(draftKey);
    } catch (error) {
      if (!toldElsewhere?.(error)) placeProblem(form, error);
    }
  });
  return (
    <FormProvider {...form}>
      <form noValidate aria-label={label} onSubmit={(event) => void submit(event)} className="grid gap-4">
        <ErrorSummary />
        {children}
      </form>
    </FormProvider>
  );
}

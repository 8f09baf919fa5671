import type { KeyboardEvent, ReactNode } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { ApiProblem } from '#src/lib/api/api-problem.ts';

export type FormFrame = {
  readonly draftKey: string;
  /** Sent and not answered: out of sight, so that it can come back with all that was typed. */
  readonly sending: boolean;
  readonly onCancel: () => void;
  /** What was refused because somebody was faster is shown above the form. */
  readonly newerIsShown?: boolean;
};

type Props<T extends FieldValues> = FormFrame & {
  readonly form: UseFormReturn<T>;
  readonly label: string;
  readonly action: string;
  readonly onSubmit: (values: T) => Promise<unknown>;
  readonly children: ReactNode;
};

/** A decision in words, beside what it decides. Ctrl + Enter sends, Escape closes; what was typed stays. */
export function DecisionForm<T extends FieldValues>(props: Props<T>) {
  const {
    form,
    label,
    action,
    draftKey,
    sending,
    onCancel,
    onSubmit,
    newerIsShown = false,
    children,
  } = props;
  function onKey(event: KeyboardEvent<HTMLDivElement>): void {
    if (event.key === 'Escape') {
      event.stopPropagation();
      onCancel();
    }
    if (event.key === 'Enter' && (event.ctrlKey || event.metaKey) && event.target instanceof HTMLElement) {
      event.preventDefault();
      event.target.closest('form')?.requestSubmit();
    }
  }
  return (
    // oxlint-disable-next-line jsx-a11y/no-static-element-interactions -- keys of the fields inside pass here
    <div hidden={sending} onKeyDown={onKey} className="mt-2 border-l-2 border-accent pl-3">
      <AppForm
        form={form}
        label={label}
        draftKey={draftKey}
        onSubmit={onSubmit}
        toldElsewhere={(error) => newerIsShown && error instanceof ApiProblem && error.status === 412}
      >
        {children}
        <div className="flex flex-wrap items-center gap-3">
          <Button type="submit" kind="primary" size="small" hotkey="Ctrl Enter">
            {action}
          </Button>
          <Button kind="quiet" size="small" onClick={onCancel}>
            Cancel
          </Button>
        </div>
      </AppForm>
    </div>
  );
}

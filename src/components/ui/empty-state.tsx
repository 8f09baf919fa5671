import type { ReactNode } from 'react';

type Props = {
  readonly title: string;
  /** What to do next, in a sentence. */
  readonly children?: ReactNode;
  readonly action?: ReactNode;
};

export function EmptyState({ title, children, action }: Props) {
  return (
    <div className="max-w-prose px-gutter py-8">
      <p className="text-lead font-semibold">{title}</p>
      {children ? <div className="mt-1 text-ink-2">{children}</div> : null}
      {action ? <div className="mt-4">{action}</div> : null}
    </div>
  );
}

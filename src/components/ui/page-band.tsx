import type { ReactNode } from 'react';

type Props = {
  readonly title: string;
  /** `Fact` elements: the circumstances of the thing, in one line. */
  readonly facts?: ReactNode;
  /** Progress and buttons at the right. */
  readonly actions?: ReactNode;
};

/** The band under the header: the thing itself in bold, its circumstances beside it. One h1 a page. */
export function PageBand({ title, facts, actions }: Props) {
  return (
    <div className="flex min-h-band flex-wrap items-center gap-x-7 gap-y-1.5 border-b border-hairline px-gutter py-2">
      <h1 className="text-title font-semibold">{title}</h1>
      {facts ? <div className="flex flex-wrap gap-x-6 gap-y-0.5 text-ink-2">{facts}</div> : null}
      {actions ? <div className="ml-auto flex flex-wrap items-center gap-3">{actions}</div> : null}
    </div>
  );
}

/** `from **Brindle**`: a muted word and the fact. */
export function Fact({ word, children }: { word?: string; children: ReactNode }) {
  return (
    <span className="whitespace-nowrap">
      {word ? <span className="text-muted">{word} </span> : null}
      <span className="text-ink">{children}</span>
    </span>
  );
}

/** Section heading inside a page: hairline below, count or note at the right. */
export function SectionHead({ title, aside, id }: { title: string; aside?: ReactNode; id?: string }) {
  return (
    <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-hairline px-gutter py-2.5">
      <h2 id={id} className="text-table font-semibold text-ink-2">
        {title}
      </h2>
      {aside ? <div className="text-table text-ink-2">{aside}</div> : null}
    </div>
  );
}

import { useEffect, useRef, type ReactNode } from 'react';
import { FindingFacts } from '#src/components/evidence/finding-facts.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { findingElementId } from '#src/features/review/desk/restore-focus.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly finding: FindingRow;
  /** Of its balloon; null for a note, which has none. */
  readonly number: number | null;
  readonly inHand: boolean;
  readonly marked: boolean;
  readonly onTake: () => void;
  readonly onHover: (on: boolean) => void;
  /** Controls and forms of the finding in hand. */
  readonly children?: ReactNode;
};

const RINGS = {
  nonconformity: 'border-nonconform text-nonconform',
  query: 'border-query text-query',
  note: 'border-rule text-ink-2',
} as const;
const SPOKEN = { nonconformity: 'Nonconformity', query: 'Query', note: 'Note' } as const;

/** A finding beside the drawing: its number is its balloon's, and each marks the other. */
export function FindingItem({ finding, number, inHand, marked, onTake, onHover, children }: Props) {
  const settled = finding.state === 'approved';
  const item = useRef<HTMLLIElement>(null);
  useEffect(() => {
    if (inHand) item.current?.scrollIntoView({ block: 'nearest' });
  }, [inHand]);
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-element-interactions -- the pointer only marks; the button inside does the same by focus
    <li
      ref={item}
      aria-current={inHand ? 'true' : undefined}
      onMouseEnter={() => onHover(true)}
      onMouseLeave={() => onHover(false)}
      className={classNames(
        'flex gap-3 border-b border-l-[3px] border-hairline py-2.5 pr-3 pl-2.5',
        inHand ? 'border-l-accent' : 'border-l-transparent',
        marked && 'bg-paper',
      )}
    >
      {number === null ? (
        <Glyph name="info" className="mx-0.75 mt-1" />
      ) : (
        <span
          className={classNames(
            'mt-0.5 flex size-5.25 shrink-0 items-center justify-center rounded-full border-[1.5px] text-small font-semibold',
            settled ? 'border-ink text-ink' : RINGS[finding.severity],
            marked && 'outline-2 outline-offset-1 outline-current',
          )}
        >
          <span className="sr-only">{SPOKEN[finding.severity]} </span>
          {number}
        </span>
      )}
      <div className="min-w-0 flex-1">
        <h3 className="font-semibold">
          <button
            type="button"
            id={findingElementId(finding.id)}
            onClick={onTake}
            onFocus={() => onHover(true)}
            onBlur={() => onHover(false)}
            className="min-h-6 text-left"
          >
            {finding.title}
            {finding.severity === 'query' ? <span className="font-normal text-query"> query</span> : null}
          </button>
        </h3>
        <FindingFacts finding={finding} remedy={inHand} />
        {children}
      </div>
    </li>
  );
}

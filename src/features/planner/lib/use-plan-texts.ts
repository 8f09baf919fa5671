import { useCallback, useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { readPlanTexts, writePlanTexts, type PlanTexts } from '#shared/planner/plan-texts.ts';

/** Typing settles this long before the router is told of the address, so that a key does not wake every reader of it. */
const SETTLE_MS = 400;
const PLACES = ['view', 'order', 'structure', 'built'] as const;
export type Place = Partial<Record<(typeof PLACES)[number], string | null>>;

const textOf = (texts: PlanTexts) => writePlanTexts(new URLSearchParams(), texts).toString();

/** A page that is closed or loaded again keeps the last key. A browser that finds it too often refuses: then the next key, or a pause, does it. */
function keepInAddress(texts: PlanTexts): void {
  try {
    const next = writePlanTexts(new URLSearchParams(location.search), texts);
    history.replaceState(history.state, '', `${location.pathname}?${next}`);
  } catch {
    // The pause writes it.
  }
}

export type PlanState = {
  /** What was typed over the design or the defaults. */
  readonly typed: PlanTexts;
  readonly type: (key: string, text: string) => void;
  /** Another view, order or structure; `texts` takes the place of what was typed. */
  readonly go: (place: Place, texts?: PlanTexts) => void;
  /** Brings the address up to date at once: a field was left, or a link is about to be copied. */
  readonly settle: () => void;
};

/** The planner's state: at hand and in the address at once, so that it can be sent and nothing typed is lost. */
export function usePlanTexts(): PlanState {
  const [search, setSearch] = useSearchParams();
  const [typed, setTyped] = useState<PlanTexts>(() => readPlanTexts(search));
  const now = useRef(typed);
  const written = useRef(textOf(typed));
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);

  const write = useCallback(
    (place: Place = {}, options: { replace: boolean } = { replace: true }) => {
      written.current = textOf(now.current);
      setSearch(
        (current) => {
          const next = writePlanTexts(current, now.current);
          for (const name of PLACES) {
            const value = place[name];
            if (value === null || value === '') next.delete(name);
            else if (value !== undefined) next.set(name, value);
          }
          return next;
        },
        { replace: options.replace, preventScrollReset: true },
      );
    },
    [setSearch],
  );
  const settle = useCallback(() => {
    if (written.current !== textOf(now.current)) write();
  }, [write]);

  // Back, forward, or a link into the planner: the address leads.
  useEffect(() => {
    const texts = readPlanTexts(search);
    const text = textOf(texts);
    if (text === written.current) return;
    written.current = text;
    now.current = texts;
    setTyped(texts);
  }, [search]);

  const type = useCallback(
    (key: string, text: string) => {
      now.current = { ...now.current, [key]: text };
      setTyped(now.current);
      keepInAddress(now.current);
      clearTimeout(timer.current);
      timer.current = setTimeout(settle, SETTLE_MS);
    },
    [settle],
  );
  useEffect(() => () => clearTimeout(timer.current), []);
  const go = useCallback(
    (place: Place, texts?: PlanTexts) => {
      if (texts) {
        now.current = texts;
        setTyped(texts);
      }
      write(place, { replace: false });
    },
    [write],
  );
  return { typed, type, go, settle };
}

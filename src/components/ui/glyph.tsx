import type { ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';

/** Six shapes that differ without colour: a state is always a shape and a word. */
export type GlyphName = 'triangle' | 'circle' | 'tick' | 'lozenge' | 'cross' | 'dotted' | 'info';

const SHAPES: Record<GlyphName, { tone: string; drawing: ReactNode }> = {
  triangle: {
    tone: 'text-nonconform',
    drawing: (
      <>
        <path d="M8 1.9 14.6 13.8H1.4Z" strokeLinejoin="round" />
        <path d="M8 6.2v3.6M8 11.3v.9" />
      </>
    ),
  },
  circle: {
    tone: 'text-query',
    drawing: (
      <>
        <circle cx="8" cy="8" r="6.4" />
        <path d="M6.1 6.4c0-1.1.8-1.8 1.9-1.8s1.9.7 1.9 1.7c0 1.3-1.9 1.4-1.9 2.8M8 10.7v.9" />
      </>
    ),
  },
  tick: { tone: 'text-conform', drawing: <path d="m2 8.6 3.9 4L14 3.8" strokeWidth="1.9" /> },
  lozenge: {
    tone: 'text-concession',
    drawing: (
      <>
        <path d="M8 1 15 8l-7 7-7-7Z" strokeLinejoin="round" />
        <path d="m5.3 8.1 2 2L10.8 6" />
      </>
    ),
  },
  cross: { tone: 'text-nonconform', drawing: <path d="m3 3 10 10M13 3 3 13" strokeWidth="1.9" /> },
  dotted: { tone: 'text-muted', drawing: <circle cx="8" cy="8" r="6.2" strokeDasharray="2.4 1.5" /> },
  info: {
    tone: 'text-ink-2',
    drawing: (
      <>
        <rect x="2" y="2" width="12" height="12" />
        <path d="M8 7v4.2M8 4.6v.9" />
      </>
    ),
  },
};

export function Glyph({ name, label, className }: { name: GlyphName; label?: string; className?: string }) {
  const shape = SHAPES[name];
  return (
    <svg
      viewBox="0 0 16 16"
      width="15"
      height="15"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.4"
      role={label ? 'img' : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
      className={classNames('shrink-0', shape.tone, className)}
    >
      {shape.drawing}
    </svg>
  );
}

import { Glyph } from '#src/components/ui/glyph.tsx';
import { WHO_DECIDES } from '#shared/drawing/who-decides.ts';

/** The cautions of the work, wherever it is planned or recorded. */
export const CAUTIONS = [
  'Components and fresh foam: isocyanate exposure. Gloves, eye protection and moving air; nobody sensitised to isocyanates mixes or pours.',
  'Never close a container in which foam is reacting: it heats and bursts.',
  'Energised lines overhead: keep the approach distance while the pole is moved.',
  'Have buried utilities located before the ground is opened; cover or guard every open bore.',
] as const;

export function Cautions() {
  return (
    <section
      aria-label="Cautions"
      className="border border-l-[3px] border-hairline border-l-query bg-sheet px-4 py-3"
    >
      <h2 className="flex items-center gap-2 text-table font-semibold text-query">
        <Glyph name="triangle" className="text-query" />
        Cautions
      </h2>
      <ul className="mt-1 grid list-disc gap-0.5 pl-5 text-table text-ink-2">
        {CAUTIONS.map((line) => (
          <li key={line}>{line}</li>
        ))}
        <li>{WHO_DECIDES}</li>
      </ul>
    </section>
  );
}

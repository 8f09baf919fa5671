import { useState } from 'react';
import { LineDrawing } from './line-drawing.tsx';
import { inOrder, wantsLook, worstOf } from '../lib/result-view.ts';
import { FindingWords } from '#src/components/evidence/finding-words.tsx';
import { lineWords } from '#src/components/evidence/line-words.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { counted } from '#src/lib/formats.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { CheckedLine } from '#src/workers/check/protocol.ts';

/** A line with its findings, and its drawing when asked for. */
export function CheckedLineItem({ line, context }: { line: CheckedLine; context: CheckContextData }) {
  const [drawn, setDrawn] = useState(false);
  const metric = useUnitSystem() === 'metric';
  const findings = inOrder(line.findings);
  const worst = wantsLook(line) ? worstOf(findings) : null;
  const name = line.structureNumber || '(no number)';
  return (
    <article
      aria-label={`Line ${name}`}
      className="border-b border-hairline px-gutter lg:grid lg:grid-cols-[15rem_minmax(0,1fr)] lg:gap-x-6"
    >
      <div className="flex flex-wrap items-baseline gap-x-2 py-2.5 lg:block lg:py-3">
        <h3 className="flex items-center gap-2 text-base">
          <Glyph name={worst ? SEVERITY_WORDS[worst].glyph : 'tick'} />
          <span>
            <span className="font-semibold">{name}</span>{' '}
            <span className="text-table text-muted">
              {lineWords(line, metric)}
              {line.occurrence > 1 ? `, entry ${line.occurrence}` : ''}
            </span>
          </span>
        </h3>
        <p className="pl-6 text-table text-ink-2">
          {findings.length === 0 ? 'no findings' : counted(findings.length, 'finding')}
          <span className="text-muted">
            {' · '}
            {line.sheet} row {line.row}
          </span>
        </p>
        <div className="lg:pl-6">
          <Button
            kind="quiet"
            size="small"
            aria-expanded={drawn}
            aria-label={`${drawn ? 'Hide' : 'Show'} the drawing of ${name}`}
            onClick={() => setDrawn(!drawn)}
          >
            {drawn ? 'Hide drawing' : 'Drawing'}
          </Button>
        </div>
      </div>
      <div className="min-w-0">
        {findings.length > 0 ? (
          <ul aria-label={`Findings on ${name}`}>
            {findings.map((finding) => (
              <FindingWords key={finding.fingerprint} finding={finding} />
            ))}
          </ul>
        ) : null}
        {drawn ? (
          <div className="max-w-4xl py-3">
            <LineDrawing line={line} context={context} />
          </div>
        ) : null}
      </div>
    </article>
  );
}

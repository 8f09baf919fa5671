import type { ReactNode } from 'react';
import { describeSet } from './describe-set.ts';
import type { Materials } from './materials.tsx';
import { SetDrawing } from './set-drawing.tsx';
import { setLayout, type LayoutInput } from './set-layout.ts';

const WOODLESS = new Set(['steel', 'concrete', 'composite']);

/** The drawing of a record by its kind, and its sentences. */
export function sheetContent(input: LayoutInput & { readonly materials: Materials }): {
  drawing: ReactNode;
  sentences: readonly string[];
} {
  const { record, findings, spec, metric, materials } = input;
  const layout = setLayout(input);
  return {
    drawing: (
      <SetDrawing
        layout={layout}
        spec={spec}
        materials={materials}
        metric={metric}
        wood={!WOODLESS.has(String(record.values['poleMaterial']))}
      />
    ),
    sentences: describeSet(record, { section: layout.section, findings, metric }),
  };
}

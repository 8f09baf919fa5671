import type { ReactNode } from 'react';
import { describeRelevel, describeStraighten } from './describe-other.ts';
import { describeSet } from './describe-set.ts';
import type { Materials } from './materials.tsx';
import { RelevelDrawing } from './relevel-drawing.tsx';
import { relevelLayout } from './relevel-layout.ts';
import { SetDrawing } from './set-drawing.tsx';
import { setLayout, type LayoutInput } from './set-layout.ts';
import { StraightenDrawing } from './straighten-drawing.tsx';
import { straightenLayout } from './straighten-layout.ts';

const WOODLESS = new Set(['steel', 'concrete', 'composite']);

type SheetContent = { readonly drawing: ReactNode; readonly sentences: readonly string[] };

/** The drawing of a record by its kind, and the same in sentences. */
export function sheetContent(input: LayoutInput & { readonly materials: Materials }): SheetContent {
  const { record, findings, spec, metric, materials } = input;
  if (record.kind === 'straighten') {
    const layout = straightenLayout(input);
    return {
      drawing: <StraightenDrawing layout={layout} spec={spec} materials={materials} metric={metric} />,
      sentences: describeStraighten(layout.section, input),
    };
  }
  if (record.kind === 'relevel') {
    const layout = relevelLayout(input);
    return {
      drawing: <RelevelDrawing layout={layout} spec={spec} materials={materials} metric={metric} />,
      sentences: describeRelevel(layout.section, input),
    };
  }
  const layout = setLayout(input);
  const wood = !WOODLESS.has(String(record.values['poleMaterial']));
  return {
    drawing: <SetDrawing layout={layout} spec={spec} materials={materials} metric={metric} wood={wood} />,
    sentences: describeSet(record, { section: layout.section, findings, metric }),
  };
}

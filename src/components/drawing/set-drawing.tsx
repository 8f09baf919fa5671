import { ColumnLabel } from './column-label.tsx';
import { AcrossLine, DownLine, DueMark } from './dimension-lines.tsx';
import type { Materials } from './materials.tsx';
import { ScaleBar } from './scale-bar.tsx';
import { SetBore } from './set-bore.tsx';
import { SetGround } from './set-ground.tsx';
import { SetPole } from './set-pole.tsx';
import type { SetLayout } from './set-layout.ts';
import type { SheetSpec } from './sheet-spec.ts';

type Props = {
  readonly layout: SetLayout;
  readonly spec: SheetSpec;
  readonly materials: Materials;
  readonly wood: boolean;
  readonly metric: boolean;
};

/** Section of a *set* record. */
export function SetDrawing({ layout, spec, materials, wood, metric }: Props) {
  const { section, geometry, dimensions, labels } = layout;
  return (
    <>
      <SetGround section={section} geometry={geometry} spec={spec} materials={materials} />
      <SetBore section={section} geometry={geometry} materials={materials} />
      <SetPole section={section} geometry={geometry} spec={spec} wood={wood} />
      {dimensions.across.map((dimension) => (
        <AcrossLine key={dimension.id} dimension={dimension} />
      ))}
      {dimensions.down.map((dimension) => (
        <DownLine key={dimension.id} dimension={dimension} />
      ))}
      {dimensions.due ? <DueMark due={dimensions.due} /> : null}
      {labels.map((label) => (
        <ColumnLabel key={label.id} label={label} />
      ))}
      <ScaleBar {...spec.scaleBar} scale={geometry.scale} metric={metric} />
    </>
  );
}

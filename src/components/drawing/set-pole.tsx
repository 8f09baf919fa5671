import { round, type SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

type Props = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly spec: SheetSpec;
  /** Wood shows its grain. */
  readonly wood: boolean;
};

/** The pole with its taper, broken off above grade, and the axis of the bore. */
export function SetPole({ section, geometry, spec, wood }: Props) {
  const { pole } = geometry;
  const axis = round(pole ? (pole.left + pole.right) / 2 : geometry.x(0));
  const bottom = Math.max(geometry.y(section.deepestFt), pole?.buttY ?? 0) + 26;
  return (
    <g>
      {pole ? (
        <path
          d={`${brokenTop(pole.topLeft, pole.topRight, spec.poleTopY)}L${round(pole.buttRight)} ${round(pole.buttY)}H${round(pole.buttLeft)}Z`}
          className="fill-pole-fill stroke-pole"
          strokeWidth="1.5"
          strokeLinejoin="round"
        />
      ) : null}
      {pole && wood ? <Grain pole={pole} topY={spec.poleTopY + 14} /> : null}
      {pole && section.pole?.openWallIn ? (
        <OpenInside section={section} pole={pole} scale={geometry.scale} />
      ) : null}
      <path
        d={`M${axis} ${spec.poleTopY - 26}V${bottom}`}
        className="stroke-ink-2"
        strokeWidth="1"
        strokeDasharray="14 4 3 4"
      />
    </g>
  );
}

type Pole = NonNullable<SetGeometry['pole']>;

/** A long break line, as drawn where a part goes on beyond the sheet. */
export function brokenTop(left: number, right: number, y: number): string {
  const step = (right - left) / 4;
  const rise = Math.min(6, step * 0.5);
  return `M${round(left)} ${y}q${round(step / 2)} ${round(rise * 1.6)} ${round(step)} ${round(rise * 0.6)}t${round(step)} ${round(-rise * 0.4)}t${round(step)} ${round(rise * 0.4)}t${round(step)} ${round(-rise * 0.6)}`;
}

function Grain({ pole, topY }: { pole: Pole; topY: number }) {
  const lines = [0.32, 0.64, 0.93].map((share) => {
    const top = pole.topLeft + (pole.topRight - pole.topLeft) * share;
    const butt = pole.buttLeft + (pole.buttRight - pole.buttLeft) * share;
    return `M${round(top)} ${topY}L${round(butt)} ${round(pole.buttY - 6)}`;
  });
  return <path d={lines.join('')} className="stroke-pole" strokeWidth="1" strokeOpacity="0.5" />;
}

/** The hidden inside of an open butt, dashed over the lowest part, where foam and water can enter. */
function OpenInside({ section, pole, scale }: { section: SetSection; pole: Pole; scale: number }) {
  const wall = ((section.pole?.openWallIn ?? 0) / 12) * scale;
  const topY = round(pole.buttY - 120);
  const left = `M${round(pole.buttLeft + wall)} ${topY}V${round(pole.buttY)}`;
  const right = `M${round(pole.buttRight - wall)} ${topY}V${round(pole.buttY)}`;
  return <path d={left + right} className="stroke-pole" strokeWidth="1" strokeDasharray="5 3" />;
}

/** Names of the fill patterns of one sheet; ids differ from sheet to sheet on a page. */
export type Materials = Readonly<Record<'soil' | 'rock' | 'foam' | 'stone', string>>;

export function materialsOf(id: string): Materials {
  const name = id.replaceAll(/[^\w-]/g, '');
  return { soil: `${name}-soil`, rock: `${name}-rock`, foam: `${name}-foam`, stone: `${name}-stone` };
}

export function MaterialPatterns({ names }: { names: Materials }) {
  return (
    <defs>
      <pattern
        id={names.soil}
        width="9"
        height="9"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d="M0 0V9" className="stroke-soil" strokeWidth="0.8" strokeOpacity="0.75" />
      </pattern>
      <pattern id={names.rock} width="26" height="22" patternUnits="userSpaceOnUse">
        <path
          d="M0 4 7 0M0 4l6 8-6 10M6 12l11-3 9-5M17 9l-3-9M17 9l4 10-7 3M21 19l5 3"
          className="fill-none stroke-rock"
          strokeWidth="0.8"
          strokeOpacity="0.6"
        />
      </pattern>
      <pattern id={names.foam} width="15" height="15" patternUnits="userSpaceOnUse">
        <rect width="15" height="15" className="fill-foam" />
        <circle cx="4" cy="4" r="2.1" className="fill-none stroke-foam-cell" strokeWidth="1.1" />
        <circle cx="11.5" cy="11.5" r="1.3" className="fill-foam-cell" fillOpacity="0.7" />
        <circle cx="11" cy="3.5" r="0.9" className="fill-foam-cell" fillOpacity="0.7" />
        <circle cx="4" cy="11" r="1" className="fill-foam-cell" fillOpacity="0.5" />
      </pattern>
      <pattern id={names.stone} width="13" height="11" patternUnits="userSpaceOnUse">
        <rect width="13" height="11" className="fill-sunk" />
        <path
          d="m1 3 2.5-2 3 .5L7 5 4 6.5 1.5 5.5ZM8 7.5l2-2 2.5 1V10L9 10.5Z"
          className="fill-none stroke-rock"
          strokeWidth="0.9"
        />
      </pattern>
    </defs>
  );
}

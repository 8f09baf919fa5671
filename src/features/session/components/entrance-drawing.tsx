import { Mark } from '#src/components/ui/mark.tsx';

/** The product's mark drawn large, as the section it is. Decoration: it says nothing that the words beside it do not. */
export function EntranceDrawing() {
  return (
    <div className="flex h-full flex-col overflow-hidden">
      <div className="flex items-center gap-3.5 px-8 pt-7">
        <Mark className="h-9 w-7.5" />
        <p className="text-display font-semibold">Upstand</p>
      </div>
      <p className="mt-2 max-w-md px-8 text-ink-2">
        The proof of how each pole was set in foam: handed in, checked, decided and kept.
      </p>
      <svg
        viewBox="0 0 600 620"
        preserveAspectRatio="xMidYMax meet"
        className="min-h-0 w-full flex-1 overflow-visible"
        aria-hidden="true"
      >
        <defs>
          <pattern
            id="entrance-soil"
            width="14"
            height="14"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path d="M0 0V14" className="stroke-soil" strokeWidth="1" opacity="0.55" />
          </pattern>
          <pattern id="entrance-foam" width="16" height="16" patternUnits="userSpaceOnUse">
            <rect width="16" height="16" className="fill-foam" />
            <circle cx="4" cy="4" r="2.4" className="fill-none stroke-foam-cell" />
            <circle cx="12" cy="12" r="1.5" className="fill-foam-cell" opacity="0.7" />
          </pattern>
        </defs>
        <path d="M-500 250H228L242 640H-500ZM372 250H1100V640H358Z" fill="url(#entrance-soil)" />
        <path d="M228 250C236 226 364 226 372 250L359 600H241Z" fill="url(#entrance-foam)" />
        <path d="M242.3 566H357.7L359 600H241Z" className="fill-water-fill" />
        <path
          d="M264 52c6 7 12 8 18 4s12-8 18-3 12 6 18 2 12-7 18-3L342 600H258Z"
          className="fill-pole-fill stroke-pole"
          strokeWidth="1.6"
        />
        <path
          d="M282 64 279 596M300 60V598M319 64l3 532"
          className="stroke-pole"
          strokeWidth="1"
          opacity="0.45"
        />
        <path d="M300 14V618" className="stroke-ink" strokeWidth="1" strokeDasharray="22 5 4 5" />
        <path d="M-500 250H228M372 250H1100" className="stroke-ink" strokeWidth="2.6" />
        <path d="M228 250 241 600H359L372 250" className="fill-none stroke-ink" strokeWidth="1.8" />
        <path d="M84 250V600M70 600H236" className="stroke-ink-2" strokeWidth="1" />
        <path d="M84 250l-3.2 10h6.4ZM84 600l-3.2-10h6.4Z" className="fill-ink" />
        <path d="M228 150V238M372 150V238M228 160H260M340 160H372" className="stroke-ink-2" strokeWidth="1" />
        <path d="M228 160l10-3.2v6.4ZM372 160l-10-3.2v6.4Z" className="fill-ink" />
      </svg>
    </div>
  );
}

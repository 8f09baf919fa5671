import { FindingItem, type FindingActions } from './finding-item.tsx';
import { describeLine } from '../lib/describe-line.ts';
import { wantsLook, worstSeverity, type LineView } from '../lib/line-view.ts';
import { DrawingButton } from '#src/components/drawing/drawing-button.tsx';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';
import { LINE_WORDS, SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { classNames } from '#src/lib/class-names.ts';
import { counted } from '#src/lib/formats.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';

type Props = FindingActions & {
  readonly line: LineView;
  readonly active: boolean;
  readonly onActive: () => void;
  /** Submitted: each line has a state of its own. */
  readonly decided: boolean;
};

/** A line with its findings: beside each other where there is room, one under the other on a phone. */
export function LineItem({ line, active, onActive, decided, ...actions }: Props) {
  const { record, findings } = line;
  const metric = useUnitSystem() === 'metric';
  return (
    <article
      aria-label={`Line ${record.structureNumber}`}
      className={classNames(
        'border-b border-l-[3px] border-hairline pr-gutter pl-[calc(1.125rem-3px)]',
        'lg:grid lg:grid-cols-[15rem_minmax(0,1fr)] lg:gap-x-6',
        active ? 'border-l-accent bg-sheet' : 'border-l-transparent',
      )}
    >
      <div
        className={classNames(
          'flex flex-wrap items-baseline gap-x-2 lg:block lg:py-3',
          findings.length > 0 ? 'pt-2.5' : 'py-2.5',
          // On a phone the head of each finding names the line already.
          findings.length > 0 && !decided && 'max-lg:hidden',
        )}
      >
        <h3 className="flex items-center gap-2 text-base">
          <Glyph name={lineGlyph(line, decided)} />
          <span>
            <TextLink
              to={paths.record.to(record.id)}
              onFocus={onActive}
              className="font-semibold no-underline hover:underline pointer-coarse:inline-block pointer-coarse:py-1.5"
            >
              {record.structureNumber}
            </TextLink>{' '}
            <span className="text-table text-muted">{describeLine(record, metric)}</span>
          </span>
        </h3>
        <p className="ml-auto text-table text-ink-2 lg:ml-6">
          {decided
            ? LINE_WORDS[record.state].word
            : findings.length === 0
              ? 'no findings'
              : counted(findings.length, 'finding')}
          <span className="text-muted max-lg:hidden">
            {decided ? ' · ' : <br />}
            {counted(record.photos.length, 'photograph')}, row {record.row}
          </span>
        </p>
        <span className="lg:ml-6">
          <DrawingButton recordId={record.id} structureNumber={record.structureNumber} />
        </span>
        {decided && record.decision?.reason ? (
          <p className="w-full text-table text-ink-2 lg:ml-6">“{record.decision.reason}”</p>
        ) : null}
      </div>
      {findings.length > 0 ? (
        <ul aria-label={`Findings on ${record.structureNumber}`}>
          {findings.map((finding) => (
            <FindingItem key={finding.id} finding={finding} line={line} named={!decided} {...actions} />
          ))}
        </ul>
      ) : null}
    </article>
  );
}

function lineGlyph(line: LineView, decided: boolean): GlyphName {
  if (decided && line.record.state !== 'undecided') return LINE_WORDS[line.record.state].glyph;
  if (!wantsLook(line)) return 'tick';
  const worst = worstSeverity(line.findings);
  return worst ? SEVERITY_WORDS[worst].glyph : 'tick';
}

import { lineState, lineWords } from '#src/components/evidence/line-words.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { counted } from '#src/lib/formats.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

const LOOK =
  'flex min-h-8.25 w-full items-center gap-2 border-b border-l-[3px] border-hairline pr-3 pl-2 text-left text-table pointer-coarse:min-h-11';
const look = (current: boolean) =>
  classNames(LOOK, current ? 'border-l-accent bg-paper' : 'border-l-transparent hover:bg-paper');

type Props = { readonly line: RecordRow; readonly current: boolean; readonly onSelect: () => void };

export function LineButton({ line, current, onSelect }: Props) {
  const metric = useUnitSystem() === 'metric';
  const state = lineState(line);
  return (
    <button
      type="button"
      aria-current={current ? 'true' : undefined}
      onClick={onSelect}
      className={look(current)}
    >
      <Glyph name={state.glyph} />
      <span className="min-w-0 flex-1 truncate" title={lineWords(line, metric)}>
        <span className="font-semibold">{line.structureNumber}</span>
        {line.occurrence > 1 ? ` (${line.occurrence})` : ''}{' '}
        <span className="text-small text-ink-2">{lineWords(line, metric)}</span>
      </span>
      <span className="shrink-0 text-small text-ink-2">{state.word}</span>
    </button>
  );
}

type WholeProps = {
  readonly findings: readonly FindingRow[];
  readonly current: boolean;
  readonly onSelect: () => void;
};

export function WholeBatchButton({ findings, current, onSelect }: WholeProps) {
  const due = findings.filter((finding) => finding.severity !== 'note');
  const open = due.filter((finding) => finding.state === 'undecided').length;
  return (
    <button
      type="button"
      aria-current={current ? 'true' : undefined}
      onClick={onSelect}
      className={classNames(look(current), 'shrink-0 border-b-ink')}
    >
      <Glyph name={open > 0 ? 'triangle' : due.length > 0 ? 'tick' : 'info'} />
      <span className="min-w-0 flex-1 truncate font-semibold">The batch itself</span>
      <span className="shrink-0 text-small text-ink-2">
        {open > 0 ? `${open} open` : counted(findings.length, due.length > 0 ? 'finding' : 'note')}
      </span>
    </button>
  );
}

import { AnswerBox } from './answer-box.tsx';
import { FindingDecision } from './finding-decision.tsx';
import { FileButton } from './file-button.tsx';
import { missingPhotographs } from '../lib/next-photograph.ts';
import type { LineView } from '../lib/line-view.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

export type FindingActions = {
  readonly batchId: string;
  readonly open: boolean;
  /** A photograph just taken, under the name that places it. */
  readonly onPhotograph: (file: File, name: string) => void;
};

type Props = FindingActions & {
  readonly finding: FindingRow;
  /** Absent: it belongs to the workbook as a whole. */
  readonly line?: LineView;
  /** On a phone its head names the line. */
  readonly named?: boolean;
};

/** One finding in full: what, how far from the limit, where it stands in the workbook, what puts it right. */
export function FindingItem({ finding, line, named, batchId, open, onPhotograph }: Props) {
  const severity = SEVERITY_WORDS[finding.severity];
  const [missing] = line ? missingPhotographs([{ ...line, findings: [finding] }]) : [];
  return (
    <li className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-2 border-b border-hairline py-3 last:border-b-0">
      <Glyph name={severity.glyph} className="mt-1" label={severity.word} />
      <div>
        <h3 className="text-base font-semibold">
          {line && named ? (
            <span className="lg:hidden">
              <TextLink
                to={paths.record.to(line.record.id)}
                className="no-underline hover:underline pointer-coarse:inline-block pointer-coarse:py-1"
              >
                {line.record.structureNumber}
              </TextLink>
              {' · '}
            </span>
          ) : null}
          {finding.title}
        </h3>
        <p className="text-ink-2">{finding.message}</p>
        {finding.margin === null && typeof finding.measured !== 'number' ? null : (
          <MeasuredAgainst {...finding} />
        )}
        <p className="text-table text-ink-2">
          {finding.sheet && finding.cell ? (
            <span className="font-semibold text-ink">
              {finding.sheet}!{finding.cell}
              {'. '}
            </span>
          ) : null}
          {finding.remedy}
        </p>
        <div className="mt-1 flex flex-wrap gap-x-4 gap-y-1 empty:hidden">
          {open && missing ? (
            <FileButton
              kind="quiet"
              size="small"
              camera
              accept="image/jpeg,image/png,image/webp"
              label={`Photograph ${missing.label}`}
              onFiles={([file]) => file && onPhotograph(file, missing.fileName)}
            >
              Photograph it
            </FileButton>
          ) : null}
          <AnswerBox finding={finding} batchId={batchId} />
        </div>
        <FindingDecision finding={finding} className="mt-1" />
      </div>
    </li>
  );
}

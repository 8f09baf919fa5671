import { AnswerBox } from './answer-box.tsx';
import { FindingDecision } from './finding-decision.tsx';
import { FileButton } from './file-button.tsx';
import { missingPhotographs } from '../lib/next-photograph.ts';
import type { LineView } from '../lib/line-view.ts';
import { FindingWords } from '#src/components/evidence/finding-words.tsx';
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

/** One finding in full, with what its contractor can do about it. */
export function FindingItem({ finding, line, named, batchId, open, onPhotograph }: Props) {
  const [missing] = line ? missingPhotographs([{ ...line, findings: [finding] }]) : [];
  return (
    <FindingWords
      finding={finding}
      lead={
        line && named ? (
          <span className="lg:hidden">
            <TextLink
              to={paths.record.to(line.record.id)}
              className="no-underline hover:underline pointer-coarse:inline-block pointer-coarse:py-1"
            >
              {line.record.structureNumber}
            </TextLink>
            {' · '}
          </span>
        ) : null
      }
    >
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
    </FindingWords>
  );
}

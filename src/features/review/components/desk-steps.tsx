import type { DeskModel } from '#src/features/review/desk/use-desk.ts';
import type { DeskStep } from '#src/features/review/desk/use-place.ts';
import { classNames } from '#src/lib/class-names.ts';

/** On a narrow screen: which of the three is shown, and the lines before and after. */
export function DeskSteps({ desk, lines }: { desk: DeskModel; lines: number }) {
  const { place } = desk;
  const name = desk.whole ? 'The batch itself' : (desk.record?.structureNumber ?? '');
  const steps: readonly { step: DeskStep; word: string }[] = [
    { step: 'lines', word: `Lines ${lines}` },
    { step: 'sheet', word: 'Sheet' },
    { step: 'evidence', word: `Evidence ${desk.due.length}` },
  ];
  return (
    <div className="border-b-[1.5px] border-ink lg:hidden">
      <div role="group" aria-label="Parts of the desk" className="grid grid-cols-3">
        {steps.map(({ step, word }) => (
          <button
            key={step}
            type="button"
            aria-pressed={place.step === step}
            onClick={() => place.setStep(step)}
            className={classNames(
              'min-h-11 border-b-2 text-table',
              place.step === step ? 'border-accent font-semibold' : 'border-transparent text-ink-2',
            )}
          >
            {word}
          </button>
        ))}
      </div>
      {place.step === 'lines' ? null : (
        <div className="flex items-center justify-between border-t border-hairline px-2">
          <button
            type="button"
            className="min-h-11 px-2 text-table underline underline-offset-4"
            onClick={() => desk.moveLine(-1)}
          >
            Line before
          </button>
          <span className="font-semibold">{name}</span>
          <button
            type="button"
            className="min-h-11 px-2 text-table underline underline-offset-4"
            onClick={() => desk.moveLine(1)}
          >
            Next line
          </button>
        </div>
      )}
    </div>
  );
}

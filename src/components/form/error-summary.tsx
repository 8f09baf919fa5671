import { useEffect, useRef } from 'react';
import { useFormContext, useFormState } from 'react-hook-form';
import { faultsOf, type Fault } from '#src/components/form/form-faults.ts';

/** The same words as beside the fields, at the top; takes focus after each failed attempt and leads to each field. */
export function ErrorSummary() {
  const { setFocus } = useFormContext();
  const { errors, submitCount } = useFormState();
  const faults = faultsOf(errors);
  if (faults.length === 0 || submitCount === 0) return null;
  return <SummaryBox key={submitCount} faults={faults} onPick={setFocus} />;
}

function SummaryBox({ faults, onPick }: { faults: readonly Fault[]; onPick: (name: string) => void }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), []);
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      aria-labelledby="error-summary"
      className="border-2 border-nonconform bg-sheet px-4 py-3"
    >
      <h2 id="error-summary" className="font-semibold text-nonconform">
        {faults.length === 1 ? 'One thing stands in the way' : `${faults.length} things stand in the way`}
      </h2>
      <ul className="mt-1 grid gap-1">
        {faults.map(({ name, message }) => (
          <li key={`${name} ${message}`}>
            {name === null ? (
              message
            ) : (
              <button
                type="button"
                className="text-left underline underline-offset-4"
                onClick={() => onPick(name)}
              >
                {message}
              </button>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

import { inputId, typedWord, type TypedField } from '../lib/typed-fields.ts';
import type { PlacedFinding } from '../lib/place-findings.ts';
import { CONTROL } from '#src/components/form/field-frame.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';

type Props = {
  readonly field: TypedField;
  readonly pour: number | null;
  readonly value: string;
  readonly findings: readonly PlacedFinding[];
  readonly onChange: (value: string) => void;
  readonly onLeave: () => void;
};

const NUMBERS = new Set(['length-ft', 'length-in', 'number', 'integer', 'temperature-f', 'degrees']);

/** One field as the workbook has it: its title with the unit, its hint, and what the check says of it. */
export function TypedInput({ field, pour, value, findings, onChange, onLeave }: Props) {
  const id = inputId(pour, field.key);
  const wrong = findings.some(({ finding }) => finding.severity !== 'note');
  const words = field.words.map(typedWord);
  const common = {
    id,
    value,
    'aria-invalid': wrong || undefined,
    'aria-required': field.required || undefined,
    'aria-describedby': `${id}-hint${findings.length > 0 ? ` ${id}-findings` : ''}`,
    className: CONTROL,
    onBlur: onLeave,
  };
  return (
    <div className={wrong ? 'border-l-[3px] border-nonconform pl-3' : undefined}>
      <label htmlFor={id} className="block text-table font-semibold">
        {field.label}
        {field.required ? null : <span className="font-normal text-muted"> (may stay blank)</span>}
      </label>
      <p id={`${id}-hint`} className="text-small text-muted">
        {field.description}
      </p>
      <div className="mt-1">
        {field.allowed ? (
          <select {...common} onChange={(event) => onChange(event.target.value)}>
            <option value="">–</option>
            {field.allowed.map((code) => (
              <option key={code} value={code}>
                {code}
              </option>
            ))}
          </select>
        ) : (
          <input
            {...common}
            type="text"
            autoComplete="off"
            inputMode={NUMBERS.has(field.read) && words.length === 0 ? 'decimal' : undefined}
            list={words.length > 0 ? `${id}-words` : undefined}
            onChange={(event) => onChange(event.target.value)}
          />
        )}
        {words.length > 0 ? (
          <datalist id={`${id}-words`}>
            {words.map((word) => (
              <option key={word} value={word}>
                {word}
              </option>
            ))}
          </datalist>
        ) : null}
      </div>
      {findings.length > 0 ? (
        <ul id={`${id}-findings`} className="mt-1 grid gap-1 text-table">
          {findings.map(({ finding }) => (
            <li key={finding.fingerprint} className="flex items-start gap-1.5">
              <Glyph
                name={SEVERITY_WORDS[finding.severity].glyph}
                label={SEVERITY_WORDS[finding.severity].word}
                className="mt-0.5"
              />
              <span>
                {finding.message} <span className="text-muted">{finding.remedy}</span>
              </span>
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}

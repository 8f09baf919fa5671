import { useField } from '#src/components/form/use-field.ts';
import { unitWord } from '#shared/units/format-quantity.ts';
import { limitFault } from './draft-values.ts';
import type { RuleLimit, RuleRow } from './rule-table.ts';

const CONTROL =
  'min-h-8 border border-rule bg-sheet px-2 text-table aria-invalid:border-2 aria-invalid:border-nonconform pointer-coarse:min-h-11';

/** One rule of a draft: on or off, severity, its limits in the units of the standard (ft, in, °F), bounds beside them. */
export function RuleFields({ row }: { row: RuleRow }) {
  const base = `rules.${row.code}`;
  const on = useField({ name: `${base}.on` });
  const severity = useField({ name: `${base}.severity` });
  return (
    <fieldset className="grid items-start gap-x-6 gap-y-1.5 border-b border-hairline px-gutter py-2 md:grid-cols-[15rem_10rem_minmax(0,1fr)]">
      <legend className="sr-only">{row.title}</legend>
      <label htmlFor={on.id} className="flex min-h-8 items-center gap-2.5 text-table font-semibold">
        <input type="checkbox" {...on.control} className="size-4 accent-ink" />
        {row.title}
      </label>
      <label className="block">
        <span className="sr-only">Severity of {row.title}</span>
        <select {...severity.control} className={`${CONTROL} w-full`}>
          <option value="nonconformity">nonconformity</option>
          <option value="query">query</option>
          <option value="note">note</option>
        </select>
      </label>
      <div className="grid gap-1.5">
        {row.limits.map((limit) => (
          <LimitField key={limit.key} name={`${base}.params.${limit.key}`} rule={row.title} limit={limit} />
        ))}
      </div>
    </fieldset>
  );
}

function LimitField({ name, rule, limit }: { name: string; rule: string; limit: RuleLimit }) {
  const { id, error, control } = useField({
    name,
    rules: {
      validate: (text: string) => {
        const fault = limitFault(text, limit);
        return fault === null || `${rule}, ${limit.title.toLowerCase()}: ${fault}`;
      },
    },
  });
  return (
    <div>
      <div className="flex flex-wrap items-center gap-x-2.5 gap-y-1">
        <label htmlFor={id} className="min-w-56 text-table">
          {limit.title}
        </label>
        <input inputMode="decimal" {...control} className={`${CONTROL} w-24 text-right`} />
        <span className="text-table text-muted">
          {unitWord(limit.unit)}{' '}
          <span className="text-small">
            ({limit.minimum} to {limit.maximum})
          </span>
        </span>
      </div>
      {error ? (
        <p id={`${id}-error`} className="text-table font-semibold text-nonconform">
          {error}
        </p>
      ) : null}
    </div>
  );
}

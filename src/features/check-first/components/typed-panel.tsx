import { useMemo, useState } from 'react';
import { LineDrawing } from './line-drawing.tsx';
import { NotRun } from './not-run.tsx';
import { TypedFieldset } from './typed-fieldset.tsx';
import { TypedSummary } from './typed-summary.tsx';
import { placeFindings, type PlacedFinding } from '../lib/place-findings.ts';
import { groupsOf, POUR_FIELDS } from '../lib/typed-fields.ts';
import { useTypedCheck } from '../lib/use-typed-check.ts';
import { NEW_POUR, useTypedDraft } from '../lib/use-typed-draft.ts';
import { Cautions } from '#src/components/ui/caution.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { KINDS, type Kind } from '#shared/records/types.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { CheckContextData, WorkOrder } from '#shared/generated/api-types.ts';

const KIND_WORDS: Readonly<Record<Kind, string>> = {
  set: 'Set',
  straighten: 'Straighten',
  relevel: 'Re-level',
};
const MOST_POURS = 20;

type Props = { readonly order: WorkOrder; readonly context: CheckContextData };

/** One line typed in, checked as it is typed. */
export function TypedPanel({ order, context }: Props) {
  const user = useUser();
  const { draft, setDraft, clear, isEmpty } = useTypedDraft(user.id, order.id);
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  const line = useMemo(
    () => ({
      ...draft,
      batch: { workOrder: order.number, contractor: order.contractor.name, foreman: user.name },
    }),
    [draft, order, user.name],
  );
  const { result, fault } = useTypedCheck(line, context);
  const groups = useMemo(() => groupsOf(draft.kind), [draft.kind]);
  const findings = useMemo(() => {
    const fields = new Set(groups.flatMap((group) => group.fields.map(({ key }) => key)));
    return isEmpty || result === null ? [] : placeFindings(result, { draft, fields });
  }, [groups, result, draft, isEmpty]);
  // What is still blank is drawn as lacking; a balloon for each would hide the rest.
  const drawn = useMemo(() => {
    const line = result?.line ?? null;
    const said = new Set(findings.flatMap((one) => (one.blank ? [] : [one.finding])));
    return line && { ...line, findings: line.findings.filter((finding) => said.has(finding)) };
  }, [result, findings]);
  const placed = useMemo(() => byInput(findings), [findings]);
  const shared = {
    placed,
    left,
    onLeave: (input: string) => setLeft((before) => new Set(before).add(input)),
  };
  const setPour = (index: number, key: string, value: string): void =>
    setDraft({
      ...draft,
      pours: draft.pours.map((pour, at) => (at === index ? { ...pour, [key]: value } : pour)),
    });
  return (
    <div className="grid flex-1 content-start lg:grid-cols-[minmax(0,1fr)_27rem] lg:content-stretch">
      <form aria-label="A line" className="min-w-0" onSubmit={(event) => event.preventDefault()}>
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-hairline px-gutter py-2 text-table">
          <label htmlFor="typed-kind" className="font-semibold">
            Kind of work
          </label>
          <select
            id="typed-kind"
            value={draft.kind}
            className="min-h-8.5 border border-rule bg-sheet px-3 pointer-coarse:min-h-11"
            onChange={(event) =>
              setDraft({ ...draft, kind: KINDS.find((one) => one === event.target.value) ?? 'set' })
            }
          >
            {KINDS.map((kind) => (
              <option key={kind} value={kind}>
                {KIND_WORDS[kind]}
              </option>
            ))}
          </select>
          <span className="text-muted">Kept on this device until you clear it; nothing is uploaded.</span>
          <Button
            kind="quiet"
            size="small"
            className="ml-auto"
            disabled={isEmpty}
            onClick={() => {
              clear();
              setLeft(new Set());
            }}
          >
            Clear the line
          </Button>
        </div>
        <TypedSummary placed={findings} checked={!isEmpty && result !== null} />
        {fault ? (
          <p role="alert" className="border-b border-hairline px-gutter py-2 text-nonconform">
            {fault}
          </p>
        ) : null}
        {groups.map(({ title, fields }) => (
          <TypedFieldset
            key={title}
            title={title}
            fields={fields}
            pour={null}
            values={draft.values}
            onChange={(key, value) => setDraft({ ...draft, values: { ...draft.values, [key]: value } })}
            {...shared}
          />
        ))}
        {draft.pours.map((pour, index) => (
          <TypedFieldset
            // oxlint-disable-next-line react/no-array-index-key -- a row of pours is known by its place alone
            key={index}
            title={`Pour row ${index + 1}: one kit size and lot`}
            fields={POUR_FIELDS}
            pour={index}
            values={pour}
            onChange={(key, value) => setPour(index, key, value)}
            {...shared}
          >
            <Button
              kind="quiet"
              size="small"
              className="mt-3"
              onClick={() => setDraft({ ...draft, pours: draft.pours.filter((_, at) => at !== index) })}
            >
              Remove this row
            </Button>
          </TypedFieldset>
        ))}
        <div className="px-gutter py-4">
          <Button
            disabled={draft.pours.length >= MOST_POURS}
            onClick={() =>
              // The next size or lot of the same pour: what differs is typed over.
              setDraft({ ...draft, pours: [...draft.pours, draft.pours.at(-1) ?? NEW_POUR] })
            }
          >
            Add a pour row
          </Button>
        </div>
      </form>
      <aside aria-label="Drawing" className="min-w-0 border-hairline lg:border-l">
        <div className="lg:sticky lg:top-band">
          {drawn && !isEmpty ? (
            <div className="px-3 py-3">
              <LineDrawing line={drawn} context={context} />
            </div>
          ) : (
            <p className="px-gutter py-3 text-table text-muted">
              The drawing appears here, to scale, as the line is typed.
            </p>
          )}
          {result && !isEmpty ? <NotRun notRun={result.notRun} /> : null}
          <div className="px-gutter py-3">
            <Cautions />
          </div>
        </div>
      </aside>
    </div>
  );
}

function byInput(findings: readonly PlacedFinding[]): ReadonlyMap<string, readonly PlacedFinding[]> {
  const map = new Map<string, PlacedFinding[]>();
  for (const placed of findings) {
    if (placed.input === null) continue;
    const known = map.get(placed.input);
    if (known) known.push(placed);
    else map.set(placed.input, [placed]);
  }
  return map;
}

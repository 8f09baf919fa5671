/** The switch that the instrumented comparisons ask. One mutant at most is on; `hits` counts what was asked. */
export type MutantSwitch = {
  active: number;
  hits: Map<number, number>;
  /** How many more comparisons may be made before the run counts as a loop without end. */
  budget: number;
};

type Operator = (left: never, right: never) => boolean;
type Compared = { readonly measured: number; readonly limit: number };
type Named = (...args: readonly never[]) => unknown;

const OPERATORS: Readonly<Record<string, Operator>> = {
  '<': (left, right) => left < right,
  '<=': (left, right) => left <= right,
  '>': (left, right) => left > right,
  '>=': (left, right) => left >= right,
  '===': (left, right) => left === right,
  '!==': (left, right) => left !== right,
};

const SLACK = 1e-9;
const above = (measured: number, limit: number) => measured > limit + SLACK;
const below = (measured: number, limit: number) => measured < limit - SLACK;
const judge = (meets: (measured: number, limit: number) => boolean) => (compared: Compared) =>
  Number.isFinite(compared.measured) && !meets(compared.measured, compared.limit)
    ? [{ ...compared, margin: -Math.abs(compared.measured - compared.limit) }]
    : [];
/** As the named comparisons, but the limit itself does not meet them. */
const STRICT: Readonly<Record<string, Named>> = {
  atLeast: above,
  atMost: below,
  belowLimit: judge(above),
  aboveLimit: judge(below),
};

export class Runaway extends Error {}

/** What the instrumented code calls; `mutants` by number, each with its operators before and after. */
export function switchCalls(state: MutantSwitch, mutants: readonly { from: string; to: string }[]) {
  const ask = (id: number): boolean => {
    if (state.active === -1) state.hits.set(id, (state.hits.get(id) ?? 0) + 1);
    state.budget -= 1;
    if (state.budget < 0) throw new Runaway('a loop that does not end');
    return state.active === id;
  };
  const operatorOf = (id: number, flipped: boolean): Operator => {
    const operator = OPERATORS[mutants[id]?.[flipped ? 'to' : 'from'] ?? ''];
    if (!operator) throw new Error(`comparison ${id} is not known`);
    return operator;
  };
  return {
    __compare: (id: number, left: never, right: never) => operatorOf(id, ask(id))(left, right),
    __named: (id: number, named: Named): Named =>
      ask(id) ? (STRICT[mutants[id]?.from ?? ''] ?? named) : named,
  };
}

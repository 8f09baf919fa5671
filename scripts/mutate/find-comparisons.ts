import { parseSync } from 'vite';

/** One place where a comparison can be flipped. `start` and `end` count characters of the source. */
export type Comparison = {
  readonly start: number;
  readonly end: number;
  /** 1-based. */
  readonly line: number;
  /** The comparison as written, white space made single. */
  readonly code: string;
  readonly from: string;
  readonly to: string;
  /** Of a comparison by operator: where the operator stands. Null: a call of a named comparison. */
  readonly operatorAt: number | null;
};

const FLIPS: Readonly<Record<string, string>> = {
  '<': '<=',
  '<=': '<',
  '>': '>=',
  '>=': '>',
  '===': '!==',
  '!==': '===',
};
/** The named comparisons that most rules use; flipped, the limit itself no longer meets them. */
const NAMED: ReadonlySet<string> = new Set(['atLeast', 'atMost', 'belowLimit', 'aboveLimit']);

type Node = { readonly type: string; readonly start: number; readonly end: number };

const isNode = (value: unknown): value is Node =>
  typeof value === 'object' && value !== null && 'type' in value && typeof value.type === 'string';

function* nodesOf(node: Node): Generator<Node & Readonly<Record<string, unknown>>> {
  yield node as Node & Readonly<Record<string, unknown>>;
  for (const value of Object.values(node)) {
    for (const one of Array.isArray(value) ? (value as readonly unknown[]) : [value]) {
      if (isNode(one)) yield* nodesOf(one);
    }
  }
}

/** Where `operator` stands between two operands, comments passed over. */
function operatorBetween(
  source: string,
  { from, to }: { from: number; to: number },
  operator: string,
): number {
  const bare = source
    .slice(from, to)
    .replaceAll(/\/\*[^]*?\*\/|\/\/[^\n]*/g, (comment) => ' '.repeat(comment.length));
  return from + bare.indexOf(operator);
}

/** Every comparison of a TypeScript source, outer ones before those inside them. Throws what the parser found wrong. */
export function findComparisons(file: string, source: string): readonly Comparison[] {
  const { program, errors } = parseSync(file, source);
  if (errors.length > 0) throw new Error(`${file}: ${errors.map(({ message }) => message).join('; ')}`);
  const placed = ({ start, end }: Node) => ({
    start,
    end,
    line: source.slice(0, start).split('\n').length,
    code: source.slice(start, end).replaceAll(/\s+/g, ' '),
  });
  return [...nodesOf(program)].flatMap((node): readonly Comparison[] => {
    if (node.type === 'BinaryExpression') {
      const from = String(node['operator']);
      const to = FLIPS[from];
      if (to === undefined || !isNode(node['left']) || !isNode(node['right'])) return [];
      const gap = { from: node['left'].end, to: node['right'].start };
      return [{ ...placed(node), from, to, operatorAt: operatorBetween(source, gap, from) }];
    }
    if (node.type === 'CallExpression' && isNode(node['callee']) && node['callee'].type === 'Identifier') {
      const callee = node['callee'];
      const from = source.slice(callee.start, callee.end);
      if (NAMED.has(from))
        return [{ ...placed(node), end: callee.end, from, to: `strict ${from}`, operatorAt: null }];
    }
    return [];
  });
}

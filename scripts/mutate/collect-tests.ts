type Body = (...row: readonly unknown[]) => unknown;
/** A body, before or after options (a time limit), which are of no account here. */
type Rest = readonly unknown[];
export type CollectedTest = { readonly name: string; readonly run: () => unknown };

const bodyOf = (rest: Rest): Body => {
  const body = rest.find((one) => typeof one === 'function');
  if (!body) throw new Error('a test without a body');
  return body as Body;
};

/**
 * The part of vitest that pure unit tests use, as a list: describe, it, test and their `each`. The bundles get this in
 * vitest's place (with vitest's own `expect`), since starting its runner once a mutant would take hours.
 */
export function testCollector() {
  const tests: CollectedTest[] = [];
  const names: string[] = [];
  const add = (name: string, body: Body, row: readonly unknown[]): void => {
    tests.push({ name: [...names, name].join(' > '), run: () => body(...row) });
  };
  const group = (name: string, body: Body, row: readonly unknown[]): void => {
    names.push(name);
    body(...row);
    names.pop();
  };
  const withEach = (enter: typeof add) =>
    Object.assign((name: string, ...rest: Rest) => enter(name, bodyOf(rest), []), {
      each:
        (rows: readonly unknown[]) =>
        (name: string, ...rest: Rest) => {
          rows.forEach((row, index) =>
            enter(`${name} [${index}]`, bodyOf(rest), Array.isArray(row) ? row : [row]),
          );
        },
    });
  const test = withEach(add);
  return { tests, api: { describe: withEach(group), test, it: test } };
}

import { createRequire } from 'node:module';
import { expect } from 'vitest';
import type { Bundle } from './bundle-tests.ts';
import { testCollector } from './collect-tests.ts';
import type { switchCalls } from './mutant-switch.ts';

type Main = (...args: readonly unknown[]) => void;
const fromRoot = createRequire(import.meta.url);

// One seed, so that a second run says the same; the first failure is enough. On the copy that the bundles get.
const fc = fromRoot('fast-check') as { configureGlobal: (options: object) => void };
fc.configureGlobal({ seed: 20260414, endOnFailure: true });

/** Runs a bundle's tests, its modules evaluated anew. The first failing test with its error; null when all pass. */
export async function runBundle(
  { script }: Bundle,
  calls: ReturnType<typeof switchCalls>,
): Promise<{ readonly test: string; readonly error: unknown } | null> {
  const { tests, api } = testCollector();
  const load = (name: string): unknown => (name === 'vitest' ? { ...api, expect } : fromRoot(name));
  let test = 'while loading';
  try {
    const module = { exports: {} };
    (script.runInThisContext() as Main)(load, module, module.exports, calls.__compare, calls.__named);
    if (tests.length === 0) throw new Error('no tests were found');
    for (const one of tests) {
      test = one.name;
      await one.run();
    }
    return null;
  } catch (error) {
    return { test, error };
  }
}

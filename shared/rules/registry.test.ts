import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, it } from 'vitest';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { ruleSetting } from '#shared/standard/rule-setting.ts';
import { RULES } from './registry.ts';

const HERE = new URL('.', import.meta.url);
const folders = readdirSync(HERE, { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .map((entry) => entry.name);
const ajv = new Ajv2020({ strict: false });

type Property = { readonly default: unknown; readonly title: string; readonly 'x-unit': string };

describe('registry', () => {
  it('has every folder once, under its code', () => {
    expect(RULES.map((rule) => rule.code).toSorted()).toEqual(folders.toSorted());
  });

  it('is all that the demo standard sets, and no more', () => {
    expect(Object.keys(DEMO_STANDARD.rules).toSorted()).toEqual(folders.toSorted());
  });

  it.each(folders)('%s has rule, test and README', (folder) => {
    const files = ['rule.ts', 'rule.test.ts', 'README.md'];
    expect(files.filter((file) => !existsSync(new URL(`${folder}/${file}`, HERE)))).toEqual([]);
    const readme = readFileSync(new URL(`${folder}/README.md`, HERE), 'utf8');
    for (const part of ['## What', '## Why', '## Source']) expect(readme).toContain(part);
  });

  it.each(RULES)('$code is in the demo standard with its severity and defaults', (rule) => {
    const setting = ruleSetting(DEMO_STANDARD, rule.code);
    const properties = (rule.paramsSchema['properties'] ?? {}) as Readonly<Record<string, Property>>;
    const defaults = Object.fromEntries(
      Object.entries(properties).map(([name, property]) => [name, property.default]),
    );
    expect(setting?.severity).toBe(rule.severity);
    expect(setting?.params).toEqual(defaults);
    expect(ajv.validate(rule.paramsSchema, defaults)).toBe(true);
    for (const property of Object.values(properties)) {
      expect(property.title).not.toBe('');
      expect(property['x-unit']).not.toBe('');
    }
  });
});

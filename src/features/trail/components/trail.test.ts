import { describe, expect, it } from 'vitest';
import { payloadLines, plainLines } from './payload-lines.ts';
import { subjectLink } from './subject-link.ts';

it('what a step wrote down is read name by name', () => {
  expect(
    payloadLines({
      contentDigest: 'abc',
      rows: 5,
      reason: null,
      after: { role: 'clerk', active: false },
      recordNumbers: ['R-1', 'R-2'],
    }),
  ).toEqual([
    { name: 'content digest', text: 'abc' },
    { name: 'rows', text: '5' },
    { name: 'after: role', text: 'clerk' },
    { name: 'after: active', text: 'no' },
    { name: 'record numbers', text: 'R-1, R-2' },
  ]);
});

describe('the page of what a step concerned', () => {
  it.each([
    [{ type: 'batch', id: 'b1', label: '17-06' }, '/batches/b1'],
    [{ type: 'register', id: 'v1', label: 'R-000005' }, '/register/R-000005'],
    [{ type: 'standard', id: 's1', label: 'Standard 3' }, '/standard/3'],
    [{ type: 'person', id: 'p1', label: 'Ana' }, null],
  ])('%j', (subject, to) => expect(subjectLink(subject)).toBe(to));
});

it('leaves digests and inner names to the entry itself', () => {
  const digest = '957359d06a210a0dad15799da31407e1de3516c12a89a06577ab67c8fa4ede4c';
  const id = '42423d80-a70f-4e8a-8955-f3697d88ad5c';
  expect(plainLines({ rows: 13, contentDigest: digest, scope: { workOrder: id }, lines: [id, id] })).toEqual([
    { name: 'rows', text: '13' },
  ]);
});

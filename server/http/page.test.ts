import { describe, expect, it } from 'vitest';
import { decodeCursor, encodeCursor, parsePage, toPage } from '#server/http/page.ts';
import { Problem } from '#server/http/problem.ts';

const ID = '0b0f4e1c-7a55-4a39-9a86-0a8f3f3c2f11';

function refusal(work: () => unknown): Problem {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error;
  }
  throw new Error('was not refused');
}

describe('cursors', () => {
  it('come back as they went out', () => {
    const parts = ['2026-03-04T05:06:07.123Z', ID, 15, null];
    expect(decodeCursor(encodeCursor(parts), ['instant', 'uuid', 'number', 'string?'])).toEqual(parts);
  });

  it.each([
    ['', 'of nothing'],
    ['!!!', 'no base64'],
    ['bm90IGpzb24', 'no JSON'],
    [encodeCursor([ID]), 'too few parts'],
    [encodeCursor(['2026-13-04T05:06:07Z', ID]), 'an impossible month'],
    [encodeCursor(["x'; drop table users", ID]), 'a text for an instant'],
    [encodeCursor(['2026-03-04T05:06:07Z', 'not-a-uuid']), 'a text for an id'],
    [encodeCursor([null, ID]), 'nothing where something must be'],
    [Buffer.from('{"0":"a"}').toString('base64url'), 'an object'],
  ])('refuse %j (%s), naming the field', (cursor) => {
    const found = refusal(() => decodeCursor(cursor, ['instant', 'uuid']));
    expect(found.status).toBe(400);
    expect(found.errors[0]?.pointer).toBe('#/query/cursor');
  });
});

describe('pages', () => {
  const item = (row: { name: string }) => row.name;
  const key = (row: { name: string }) => [row.name];

  it('know the last one without asking again', () => {
    const rows = [{ name: 'a' }, { name: 'b' }, { name: 'c' }];
    const first = toPage({ rows, limit: 2, key, item });
    expect(first.items).toEqual(['a', 'b']);
    expect(parsePage({ cursor: first.nextCursor ?? '' }, ['string'])).toEqual({ limit: 50, after: ['b'] });
    expect(toPage({ rows: rows.slice(2), limit: 2, total: 3, key, item })).toEqual({
      items: ['c'],
      nextCursor: null,
      total: 3,
    });
  });
});

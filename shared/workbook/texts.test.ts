import { expect, it } from 'vitest';
import { NOTICE_SEVERITY } from './notices.ts';
import { noticeText } from './notice-text.ts';
import { refusalText } from './refusal-text.ts';
import { REFUSAL_CODES } from './workbook-refused.ts';

it.each(REFUSAL_CODES)('says in a sentence why a file is refused: %s', (code) => {
  const text = refusalText({ code, params: {} });
  expect(text).toMatch(/^[A-Z“].{20,}\.$/s);
});

it('says where a damaged cell stands', () => {
  expect(refusalText({ code: 'cell-twice', params: { sheet: 'Set', address: 'C9' } })).toContain(
    ' at C9 of sheet “Set”.',
  );
  expect(refusalText({ code: 'part-missing', params: { sheet: 'Set' } })).toContain(
    'missing in sheet “Set”.',
  );
});

it.each(Object.keys(NOTICE_SEVERITY))('has words for the notice %s', (code) => {
  const said = noticeText({ code, params: {}, sheet: 'Set' });
  expect(said?.title).toMatch(/^[A-Z]/);
  expect(said?.message).toMatch(/\.$/);
  expect(said?.remedy).toMatch(/\.$/);
});

it('has no words for another code', () => {
  expect(noticeText({ code: 'constructor', params: {}, sheet: null })).toBeNull();
});

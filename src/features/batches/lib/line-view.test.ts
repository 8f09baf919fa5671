import { describe, expect, it } from 'vitest';
import { filterLines, rulesOf, shownOf } from './filter-lines.ts';
import { isIncomplete, joinFindings, wantsLook, worstSeverity } from './line-view.ts';
import { missingPhotographs } from './next-photograph.ts';
import { whyNotSubmit } from './why-not-submit.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

const record = (number: string, state: RecordRow['state'] = 'undecided') =>
  ({ id: `r-${number}`, lineId: `l-${number}`, structureNumber: number, state, kind: 'set' }) as RecordRow;
const finding = (of: string | null, code: string, more: Partial<FindingRow> = {}) =>
  ({
    id: `${of} ${code}`,
    recordId: of === null ? null : `r-${of}`,
    code,
    title: code,
    severity: 'nonconformity',
    params: {},
    answer: null,
    ...more,
  }) as FindingRow;

const VIEW = joinFindings(
  [record('A-1'), record('A-2'), record('A-3', 'returned')],
  [
    finding('A-1', 'fill-short'),
    finding('A-1', 'photo-missing', { params: { view: 'bore-depth' } }),
    finding('A-2', 'unproved', { severity: 'note' }),
    finding('A-3', 'record-missing'),
    finding(null, 'workbook-old', { severity: 'query' }),
  ],
);
const shown = (values: Record<string, string>) =>
  filterLines(VIEW, values).lines.map((line) => [line.record.structureNumber, line.findings.length]);

describe('lines with their findings', () => {
  it('join findings to their lines, the rest to the workbook', () => {
    expect(VIEW.lines.map((line) => line.findings.length)).toEqual([2, 1, 1]);
    expect(VIEW.loose.map((one) => one.code)).toEqual(['workbook-old']);
  });

  it('want a look for nonconformities and queries, not for notes', () => {
    expect(VIEW.lines.map(wantsLook)).toEqual([true, false, true]);
  });

  it('are marked by their worst finding', () => {
    expect(VIEW.lines.map((line) => worstSeverity(line.findings))).toEqual([
      'nonconformity',
      'note',
      'nonconformity',
    ]);
    expect(worstSeverity([])).toBeNull();
  });

  it('keep a batch from being taken only by record nonconformities', () => {
    expect(isIncomplete(finding('A-1', 'record-unreadable'))).toBe(true);
    expect(isIncomplete(finding('A-1', 'record-unknown', { severity: 'note' }))).toBe(false);
    expect(isIncomplete(finding('A-1', 'fill-short'))).toBe(false);
  });
});

describe('filters of lines', () => {
  it('show what wants a look when nothing is chosen, all lines where nothing does', () => {
    expect(shown({})).toEqual([
      ['A-1', 2],
      ['A-3', 1],
    ]);
    expect(shownOf({}, { lines: VIEW.lines.slice(1, 2), loose: [] })).toBe('all');
    expect(shownOf({ show: 'nonsense' }, VIEW)).toBe('want');
  });

  it.each([
    [{ show: 'clean' }, [['A-2', 1]]],
    [{ show: 'incomplete' }, [['A-3', 1]]],
    [{ rule: 'photo-missing' }, [['A-1', 1]]],
    [{ show: 'all', severity: 'note' }, [['A-2', 1]]],
    [{ state: 'returned' }, [['A-3', 1]]],
    [{ structure: 'a-1' }, [['A-1', 2]]],
  ])('%j', (values, expected) => {
    expect(shown(values as Record<string, string>)).toEqual(expected);
  });

  it('leave findings of the workbook out where lines are asked for', () => {
    expect(filterLines(VIEW, {}).loose).toHaveLength(1);
    expect(filterLines(VIEW, { structure: 'A' }).loose).toHaveLength(0);
  });

  it('offer the rules that found anything, most often first', () => {
    expect(rulesOf(VIEW)[0]).toEqual({ code: 'fill-short', title: 'fill-short', count: 1 });
    expect(rulesOf(VIEW)).toHaveLength(5);
  });
});

describe('the next photograph', () => {
  it('is the first view that the check misses, under the name that places it', () => {
    expect(missingPhotographs(VIEW.lines)).toEqual([
      {
        structureNumber: 'A-1',
        view: 'bore-depth',
        fileName: 'A-1 bore-depth.jpg',
        label: 'A-1, bore depth',
      },
    ]);
    expect(missingPhotographs(VIEW.lines, new Set(['A-1 bore-depth.jpg']))).toEqual([]);
  });
});

describe('what keeps a batch from being submitted', () => {
  const counts = { lines: 3, decided: 0, nonconformity: 3, query: 1, note: 1, photos: 0, unplacedPhotos: 0 };
  const idle = { busy: false, failed: 0 };
  const codes = (status: 'checked' | 'checking' | 'draft', lines: number, uploads = idle) =>
    whyNotSubmit({ status, counts: { ...counts, lines } }, VIEW, uploads).map((one) => one.code);

  it('names each hindrance', () => {
    expect(codes('checked', 3)).toEqual(['incomplete']);
    expect(codes('checking', 3)).toEqual(['checking']);
    expect(codes('draft', 0)).toEqual(['empty']);
    expect(codes('checked', 3, { busy: true, failed: 0 })).toEqual(['uploads', 'incomplete']);
    expect(codes('checked', 3, { busy: false, failed: 2 })).toEqual(['uploads', 'incomplete']);
  });

  it('finds none on a complete batch, whatever else stands', () => {
    const complete = { ...VIEW, lines: VIEW.lines.slice(0, 2) };
    expect(whyNotSubmit({ status: 'checked', counts }, complete, idle)).toEqual([]);
  });
});

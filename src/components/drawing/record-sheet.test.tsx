import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { RecordSheet } from './record-sheet.tsx';
import type { SheetFinding, SheetRecord, TitleBlockData } from '#shared/drawing/sheet-types.ts';

const titleBlock: TitleBlockData = {
  owner: 'Larkmoor Electric Cooperative',
  workOrder: '17',
  structure: '17-0417',
  kind: 'Set, soil',
  pole: '40 ft class 4, southern pine',
  measuredOn: '14 Apr 2026, 10:42',
  standard: '3',
  revision: '1',
  decided: 'not yet',
  sheet: '6 of 38',
};

const record: SheetRecord = {
  kind: 'set',
  structureNumber: '17-0417',
  values: {
    ground: 'soil',
    boreTopIn: 20,
    boreBottomIn: 18.5,
    boreDepthFt: 5.8,
    embedmentFt: 5.8,
    diameterGroundLineIn: 10.8,
    diameterButtIn: 12.4,
    foamTopBelowGradeIn: 0,
    waterIn: 0,
  },
  derived: {
    voidFt3: 8.7,
    placedFt3: 9.5,
    fillRatio: 1.09,
    fillRatioU: 0.08,
    dueFt: 6,
    waterWithPoleIn: 0,
    leastAnnulusIn: 3.05,
    poleTaped: true,
    worstReading: null,
  },
};

const short: SheetFinding = {
  id: 'f1',
  number: 1,
  code: 'embedment-short',
  title: 'Embedment short',
  severity: 'nonconformity',
  field: 'embedmentFt',
  measured: 5.8,
  limit: 6,
  margin: -0.2,
  unit: 'ft',
};

beforeAll(() => {
  // jsdom lays nothing out: the sheet keeps its wide form.
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      disconnect() {}
    },
  );
});
afterEach(cleanup);

describe('RecordSheet', () => {
  it('says in sentences what it draws', () => {
    render(<RecordSheet record={record} findings={[short]} titleBlock={titleBlock} />);
    const described = document.querySelector('figcaption')?.textContent?.replaceAll('\u00a0', ' ');
    expect(described).toBe(
      'Section through structure 17-0417, a pole set in soil. ' +
        'The bore is 5.80 ft deep, 20.0 in wide at the top and 18.5 in at the bottom. ' +
        'The pole is 10.8 in thick at the ground line and 12.4 in at the butt. ' +
        'It stands 5.80 ft deep; 6.00 ft is due. ' +
        'The space between bore and pole is at least 3.1 in. ' +
        '9.5 ft³ of foam were placed in a void of 8.7 ft³: a fill ratio of 1.09. ' +
        'The foam ends at grade. No water stood in the bore. ' +
        'Finding 1: Embedment short; measured 5.8 ft, limit 6 ft, margin −0.2 ft.',
    );
  });

  it('marks the row of a balloon on hover and focus and goes to it on Enter', async () => {
    const user = userEvent.setup();
    const onActive = vi.fn<(id: string | null) => void>();
    const onPick = vi.fn<(id: string) => void>();
    render(
      <RecordSheet
        record={record}
        findings={[short]}
        titleBlock={titleBlock}
        onActive={onActive}
        onPick={onPick}
      />,
    );
    await user.tab();
    expect(onActive).toHaveBeenLastCalledWith('f1');
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Finding 1: Embedment short' }));
    await user.keyboard('{Enter}');
    expect(onPick).toHaveBeenCalledWith('f1');
    await user.hover(screen.getByRole('button', { name: 'Finding 1: Embedment short' }));
    expect(onActive).toHaveBeenLastCalledWith('f1');
  });

  it('only shows where nobody listens', () => {
    render(<RecordSheet record={record} findings={[short]} titleBlock={titleBlock} />);
    expect(screen.queryByRole('button')).toBeNull();
  });
});

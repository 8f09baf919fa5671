import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider, useLocation, useSearchParams } from 'react-router-dom';
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { usePlanTexts } from '../lib/use-plan-texts.ts';
import { OneView } from './one-view.tsx';
import { TableView } from './table-view.tsx';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { PLAN_DEFAULTS } from '#shared/planner/plan-fields.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };

function Page() {
  const { typed, type, settle } = usePlanTexts();
  const [search] = useSearchParams();
  const View = search.get('view') === 'table' ? TableView : OneView;
  const texts = { ...PLAN_DEFAULTS, ...typed };
  return (
    <>
      <View {...{ texts, type, settle }} context={CONTEXT} products={[DEMO_PRODUCT]} />
      <output aria-label="address">{useLocation().search}</output>
    </>
  );
}

function open(address: string) {
  render(
    <RouterProvider
      router={createMemoryRouter([{ path: '/', Component: Page }], { initialEntries: [address] })}
    />,
  );
}

const kits = () => within(screen.getByRole('region', { name: 'Kits' }));
const address = () => screen.getByLabelText('address').textContent;

beforeAll(() => {
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      disconnect() {}
    },
  );
});
afterEach(cleanup);

describe('planning one structure', () => {
  it('answers for what the address says', () => {
    // Worked records WR-02 and WK2: void 9.1185 ft³, need 10.0304 ft³, kits 8 + 2.5, surplus 0.4696 ft³.
    open('/?boreIn=20');
    expect(kits().getAllByText('8 + 2.5').length).toBeGreaterThan(0);
    expect(kits().getAllByText('10.03 ft³').length).toBe(1);
    expect(screen.getByLabelText<HTMLInputElement>('Bore to be used').value).toBe('20');
    expect(screen.getByRole('region', { name: 'Cautions' })).toBeTruthy();
  });

  it('answers as one types, and the address follows', async () => {
    const user = userEvent.setup();
    open('/');
    await user.type(screen.getByLabelText('Bore to be used'), '20');
    expect(kits().getAllByText('8 + 2.5').length).toBeGreaterThan(0);
    await user.tab();
    await waitFor(() => expect(address()).toBe('?boreIn=20'));
  });

  it('says beside a field what is wrong with it, and goes on with the rest', async () => {
    const user = userEvent.setup();
    open('/?boreIn=20');
    await user.clear(screen.getByLabelText('Components at'));
    await user.type(screen.getByLabelText('Components at'), 'cold');
    const field = screen.getByLabelText('Components at');
    expect(field.getAttribute('aria-invalid')).toBe('true');
    const said = document.getElementById(field.getAttribute('aria-describedby') ?? '');
    expect(said?.textContent).toContain('“cold” is no number.');
    expect(kits().getAllByText('8 + 2.5').length).toBeGreaterThan(0);
  });

  it('tells of a pole that does not go into its bore', () => {
    open('/?boreIn=11');
    expect(screen.getByText('The pole is wider than the bore: 11.4 in in 11 in.')).toBeTruthy();
    expect(kits().getByText(/The void is not known yet/)).toBeTruthy();
    expect(screen.getByText('6 ft', { selector: '.font-semibold' })).toBeTruthy();
  });

  it('says what to do about water', async () => {
    // WR-08: 18 in bore, 12 in butt, 1.2 in open stands at 2.16 in with the pole in; 2 in ÷ 1.8 = 1.1 in may stand.
    open('/?boreIn=18&diameterGroundLineIn=12&diameterButtIn=12&waterIn=1.2');
    const water = within(screen.getByRole('region', { name: 'Water in the bore' }));
    expect(water.getByText('2.16 in')).toBeTruthy();
    expect(water.getByText(/Bail or pump to/).textContent).toContain('1.1 in or less');
  });

  it('counts the cost where every kit of the set has its price', async () => {
    const user = userEvent.setup();
    open('/?boreIn=20&price-8=90');
    expect(kits().queryByText(/Cost/)).toBeNull();
    await user.type(screen.getByLabelText('2.5 ft³'), '40.50');
    expect(kits().getAllByText('130.50').length).toBeGreaterThan(0);
  });

  it('plans the other kinds of work', async () => {
    // WR-19: 2.2917 ft³; two kits of 1.5 stay within 0.5 ft³ over the need.
    open(
      '/?kind=relevel&padLengthIn=48&padWidthIn=42&openingLengthIn=24&openingWidthIn=18&gap1In=1&gap2In=3&gap3In=4&gap4In=2',
    );
    expect(kits().getAllByText('2 × 1.5').length).toBeGreaterThan(0);
  });
});

it('has a table for the truck with a cell for each bore and depth', () => {
  open('/?view=table&augersIn=18,20&fromFt=6&toFt=6');
  const table = within(screen.getByRole('table', { name: 'Kits and void by depth and bore diameter' }));
  expect(table.getByRole('columnheader', { name: '20 in' })).toBeTruthy();
  expect(table.getByText('9.12')).toBeTruthy();
  expect(table.getByText('8 + 2.5')).toBeTruthy();
});

import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useFilters } from '#src/lib/filters/use-filters.ts';

const NAMES = ['severity', 'lot'] as const;
const DEFINE: readonly FilterDefinition[] = [
  { name: 'severity', label: 'Severity', options: [{ value: 'query', label: 'query' }] },
  { name: 'lot', label: 'Lot', any: 'all' },
];

function Page() {
  const filters = useFilters(NAMES);
  return (
    <>
      <FilterBar filters={filters} define={DEFINE} />
      <output>{useLocation().search}</output>
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

afterEach(cleanup);

describe('FilterBar', () => {
  it('shows what the address says', () => {
    open('/?lot=LK-2291');
    expect(screen.getByRole('button', { name: 'Lot LK-2291' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Severity any' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Clear 1 filter' })).toBeTruthy();
  });

  it('puts a typed value into the address and takes it out again', async () => {
    const user = userEvent.setup();
    open('/');
    await user.click(screen.getByRole('button', { name: 'Lot all' }));
    await user.type(screen.getByRole('textbox', { name: 'Lot' }), 'LK-2204{Enter}');
    expect(screen.getByRole('status').textContent).toBe('?lot=LK-2204');
    await user.click(screen.getByRole('button', { name: 'Clear 1 filter' }));
    expect(screen.getByRole('status').textContent).toBe('');
  });

  it('goes to the first filter by its key', async () => {
    const user = userEvent.setup();
    open('/');
    await user.keyboard('f');
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Severity any' }));
  });
});

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it, vi } from 'vitest';
import { ParkedJobItem } from './parked-job-item.tsx';
import type { ParkedJob } from '#shared/generated/api-types.ts';

const JOB: ParkedJob = {
  id: '00000000-0000-4000-8000-000000000001',
  name: 'check-revision',
  title: 'Check a batch',
  meaning: 'The contractor sees that the check failed and cannot submit.',
  about: '17-02, revision 1',
  problem: 'The process that worked on it died.',
  payload: {},
  attempts: 5,
  createdAt: '2026-04-14T10:00:00Z',
  failedAt: '2026-04-14T10:02:00Z',
  can: ['retry'],
};

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = (job: ParkedJob) =>
  render(
    <QueryClientProvider client={new QueryClient()}>
      <ul>
        <ParkedJobItem job={job} />
      </ul>
    </QueryClientProvider>,
  );

it('says what stands still, whose work it is, why, and how often it was tried', () => {
  show(JOB);
  expect(screen.getByRole('heading').textContent).toBe('Check a batch: 17-02, revision 1');
  const text = screen.getByRole('listitem').textContent;
  expect(text).toContain('Last attempt said: The process that worked on it died.');
  expect(text).toContain('5 attempts');
});

it('asks for one more attempt', async () => {
  const asked = vi.fn<typeof fetch>(async () => new Response(null, { status: 204 }));
  vi.stubGlobal('fetch', asked);
  show(JOB);
  await userEvent.setup().click(screen.getByRole('button', { name: /^Try again/ }));
  const [address, options] = asked.mock.calls[0] ?? [];
  expect([address, options?.method]).toEqual([`/api/jobs/parked/${JOB.id}/retry`, 'POST']);
});

it('offers nothing to whom may not', () => {
  show({ ...JOB, can: [] });
  expect(screen.queryByRole('button')).toBeNull();
});

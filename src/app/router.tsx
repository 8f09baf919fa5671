import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { ErrorInShell, ErrorPage } from '#src/app/error-page.tsx';
import { NotFound } from '#src/app/not-found.tsx';
import { SessionGate } from '#src/app/session-gate.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';

/** Pages that need nobody signed in. */
const OPEN: RouteObject[] = [
  { path: paths.signIn.path, lazy: () => import('#src/features/session/routes/sign-in.tsx') },
  { path: paths.requestReset.path, lazy: () => import('#src/features/session/routes/request-reset.tsx') },
  { path: paths.setPassword.path, lazy: () => import('#src/features/session/routes/set-password.tsx') },
];

/** Pages inside the shell; each route module exports `Component` and is fetched when first visited. */
const SIGNED_IN: RouteObject[] = [
  { path: paths.home.path, lazy: () => import('#src/features/home/routes/home.tsx') },
  { path: paths.review.path, lazy: () => import('#src/features/review/routes/review-queue.tsx') },
  { path: paths.reviewBatch.path, lazy: () => import('#src/features/review/routes/review-batch.tsx') },
  { path: paths.workOrders.path, lazy: () => import('#src/features/work-orders/routes/work-orders.tsx') },
  { path: paths.workOrder.path, lazy: () => import('#src/features/work-orders/routes/work-order.tsx') },
  { path: paths.planner.path, lazy: () => import('#src/features/planner/routes/planner.tsx') },
  {
    path: paths.checkFirstOrders.path,
    lazy: () => import('#src/features/check-first/routes/choose-order.tsx'),
  },
  { path: paths.checkFirst.path, lazy: () => import('#src/features/check-first/routes/check-first.tsx') },
  { path: paths.batches.path, lazy: () => import('#src/features/batches/routes/batches.tsx') },
  { path: paths.batch.path, lazy: () => import('#src/features/batches/routes/batch.tsx') },
  { path: paths.record.path, lazy: () => import('#src/features/records/routes/record.tsx') },
  { path: paths.concessions.path, lazy: () => import('#src/features/concessions/routes/concessions.tsx') },
  { path: paths.concession.path, lazy: () => import('#src/features/concessions/routes/concession.tsx') },
  { path: paths.register.path, lazy: () => import('#src/features/register/routes/register.tsx') },
  { path: paths.registerEnter.path, lazy: () => import('#src/features/register/routes/enter-records.tsx') },
  {
    path: paths.registerRecord.path,
    lazy: () => import('#src/features/register/routes/register-record.tsx'),
  },
  {
    path: paths.nonconformities.path,
    lazy: () => import('#src/features/nonconformities/routes/nonconformities.tsx'),
  },
  { path: paths.search.path, lazy: () => import('#src/features/search/routes/search.tsx') },
  {
    path: paths.transmittals.path,
    lazy: () => import('#src/features/transmittals/routes/transmittals.tsx'),
  },
  { path: paths.transmittal.path, lazy: () => import('#src/features/transmittals/routes/transmittal.tsx') },
  { path: paths.lots.path, lazy: () => import('#src/features/lots/routes/lots.tsx') },
  { path: paths.lot.path, lazy: () => import('#src/features/lots/routes/lot.tsx') },
  { path: paths.standard.path, lazy: () => import('#src/features/standard/routes/standard.tsx') },
  {
    path: paths.standardVersion.path,
    lazy: () => import('#src/features/standard/routes/standard-version.tsx'),
  },
  { path: paths.trail.path, lazy: () => import('#src/features/trail/routes/trail.tsx') },
  { path: paths.people.path, lazy: () => import('#src/features/people/routes/people.tsx') },
  { path: paths.mail.path, lazy: () => import('#src/features/mail/routes/mail.tsx') },
  { path: paths.mailMessage.path, lazy: () => import('#src/features/mail/routes/message.tsx') },
  { path: paths.jobs.path, lazy: () => import('#src/features/jobs/routes/jobs.tsx') },
  { path: '*', Component: NotFound },
];

export function createRouter() {
  return createBrowserRouter([
    {
      ErrorBoundary: ErrorPage,
      HydrateFallback: Skeleton,
      children: [
        ...OPEN,
        {
          Component: SessionGate,
          // A page that fails leaves the header standing.
          children: [{ ErrorBoundary: ErrorInShell, children: SIGNED_IN }],
        },
      ],
    },
  ]);
}

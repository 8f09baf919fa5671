import type { Route } from '#server/http/define-route.ts';
import { batchRoutes } from '#server/modules/batches/routes.ts';
import { checkContextRoutes } from '#server/modules/check-context/routes.ts';
import { eventRoutes } from '#server/modules/events/routes.ts';
import { healthRoutes } from '#server/modules/health/routes.ts';
import { homeRoutes } from '#server/modules/home/routes.ts';
import { jobRoutes } from '#server/modules/jobs/routes.ts';
import { lotRoutes } from '#server/modules/lots/routes.ts';
import { mailCaptureRoutes } from '#server/modules/mail-capture/routes.ts';
import { openapiRoutes } from '#server/modules/openapi/routes.ts';
import { organisationRoutes } from '#server/modules/organisations/routes.ts';
import { peopleRoutes } from '#server/modules/people/routes.ts';
import { photoRoutes } from '#server/modules/photos/routes.ts';
import { plannerRoutes } from '#server/modules/planner/routes.ts';
import { productRoutes } from '#server/modules/products/routes.ts';
import { recordRoutes } from '#server/modules/records/routes.ts';
import { searchRoutes } from '#server/modules/search/routes.ts';
import { sessionRoutes } from '#server/modules/session/routes.ts';
import { concessionRoutes } from '#server/modules/concessions/routes.ts';
import { nonconformityRoutes } from '#server/modules/nonconformities/routes.ts';
import { registerRoutes } from '#server/modules/register/routes.ts';
import { reviewRoutes } from '#server/modules/review/routes.ts';
import { sheetRoutes } from '#server/modules/sheets/routes.ts';
import { standardRoutes } from '#server/modules/standard/routes.ts';
import { trailRoutes } from '#server/modules/trail/routes.ts';
import { transmittalRoutes } from '#server/modules/transmittals/routes.ts';
import { workOrderRoutes } from '#server/modules/work-orders/routes.ts';

/** Every route of the server. A module adds one line. */
export const ROUTES: readonly Route[] = [
  ...healthRoutes,
  ...sessionRoutes,
  ...homeRoutes,
  ...peopleRoutes,
  ...organisationRoutes,
  ...workOrderRoutes,
  ...checkContextRoutes,
  ...batchRoutes,
  ...photoRoutes,
  ...recordRoutes,
  ...sheetRoutes,
  ...eventRoutes,
  ...lotRoutes,
  ...productRoutes,
  ...plannerRoutes,
  ...reviewRoutes,
  ...concessionRoutes,
  ...registerRoutes,
  ...transmittalRoutes,
  ...nonconformityRoutes,
  ...standardRoutes,
  ...trailRoutes,
  ...searchRoutes,
  ...mailCaptureRoutes,
  ...jobRoutes,
  ...openapiRoutes(() => ROUTES),
];

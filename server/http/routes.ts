import type { Route } from '#server/http/define-route.ts';
import { batchRoutes } from '#server/modules/batches/routes.ts';
import { healthRoutes } from '#server/modules/health/routes.ts';
import { homeRoutes } from '#server/modules/home/routes.ts';
import { openapiRoutes } from '#server/modules/openapi/routes.ts';
import { organisationRoutes } from '#server/modules/organisations/routes.ts';
import { peopleRoutes } from '#server/modules/people/routes.ts';
import { photoRoutes } from '#server/modules/photos/routes.ts';
import { recordRoutes } from '#server/modules/records/routes.ts';
import { sessionRoutes } from '#server/modules/session/routes.ts';

/** Every route of the server. A module adds one line. */
export const ROUTES: readonly Route[] = [
  ...healthRoutes,
  ...sessionRoutes,
  ...homeRoutes,
  ...peopleRoutes,
  ...organisationRoutes,
  ...batchRoutes,
  ...photoRoutes,
  ...recordRoutes,
  ...openapiRoutes(() => ROUTES),
];

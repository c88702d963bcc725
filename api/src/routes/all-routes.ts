import type { Sessions } from '../auth/sessions.ts';
import type { SurveyEvents } from '../http/survey-events.ts';
import type { Route } from '../http/define-route.ts';
import type { Services } from '../services/services.ts';
import { buildingRoutes } from './building-routes.ts';
import { catalogueRoutes } from './catalogue-routes.ts';
import { cautionRoutes } from './caution-routes.ts';
import { descriptionRoutes } from './description-routes.ts';
import { estimateRoutes } from './estimate-routes.ts';
import { exportRoutes } from './export-routes.ts';
import { fileRoutes } from './file-routes.ts';
import { healthRoutes } from './health-routes.ts';
import { limitRoutes } from './limit-routes.ts';
import { ownMaterialRoutes } from './own-material-routes.ts';
import { organisationRoutes } from './organisation-routes.ts';
import { sessionRoutes } from './session-routes.ts';
import { siteRoutes } from './site-routes.ts';
import { surveyRoutes } from './survey-routes.ts';

export interface RouteParts {
  readonly services: Services;
  readonly sessions: Sessions;
  readonly events: SurveyEvents;
}

/** Every operation of the API; what is not listed here does not exist. */
export function allRoutes({ services, sessions, events }: RouteParts): Route[] {
  const routes = [
    ...healthRoutes(services.health),
    ...organisationRoutes(services.accounts),
    ...sessionRoutes(services.accounts, sessions),
    ...siteRoutes(services.sites, services.siteRoles, services.history),
    ...buildingRoutes(services.buildings),
    ...limitRoutes(services.limits),
    ...surveyRoutes({ ...services, events }),
    ...exportRoutes(services.exports),
    ...fileRoutes(services.files),
    ...estimateRoutes(services.estimates),
    ...catalogueRoutes(services.materials),
    ...ownMaterialRoutes(services.ownMaterials, services.versionStates),
    ...cautionRoutes(),
  ];
  return [...routes, ...descriptionRoutes(routes.map((route) => route.contract))];
}

import compression from 'compression';
import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { Sessions } from './auth/sessions.ts';
import type { Clock } from './clock.ts';
import { Fault } from './fault.ts';
import { accessLog } from './http/access-log.ts';
import { errorResponse, sendFault } from './http/error-response.ts';
import { mountRoutes } from './http/mount-routes.ts';
import { requestId } from './http/request-id.ts';
import { RequestRate } from './http/request-rate.ts';
import { securityHeaders } from './http/security-headers.ts';
import type { SurveyEvents } from './http/survey-events.ts';
import { serveWebFiles } from './http/web-files.ts';
import { allRoutes } from './routes/all-routes.ts';
import type { Services } from './services/services.ts';

export interface AppParts {
  readonly services: Services;
  readonly sessions: Sessions;
  readonly events: SurveyEvents;
  readonly clock: Clock;
  readonly log: Logger;
  readonly baseUrl: URL;
  readonly trustProxy: number;
  readonly webDist: string;
  readonly checkAnswers: boolean;
}

/** Fast rather than small: the document is large and read often. */
const GZIP_LEVEL = 4;

/** The whole HTTP side: headers, routes, the web client, and one way to say no. Opens nothing. */
export function createApp(parts: AppParts): Express {
  const app = express();
  app.set('trust proxy', parts.trustProxy);
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.set('case sensitive routing', true);
  app.use(requestId, accessLog(parts.log), securityHeaders());
  app.use(
    compression({
      level: GZIP_LEVEL,
      filter: (request, response) =>
        response.getHeader('Content-Type') !== 'text/event-stream; charset=utf-8' &&
        compression.filter(request, response),
    }),
  );
  app.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  mountRoutes(app, allRoutes(parts), {
    sessions: parts.sessions,
    access: parts.services.access,
    rate: new RequestRate(parts.clock),
    baseUrl: parts.baseUrl,
    checkAnswers: parts.checkAnswers,
  });
  app.use('/api', (_request, response) => sendFault(response, Fault.notFound()));
  serveWebFiles(app, parts.webDist);
  app.use((_request, response) => sendFault(response, Fault.notFound()));
  app.use(errorResponse(parts.log));
  return app;
}

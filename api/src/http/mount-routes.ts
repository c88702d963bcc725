import type { Express } from 'express';
import type { Route } from './define-route.ts';
import { sendMethodNotAllowed } from './error-response.ts';
import { serveRoute, type Gate } from './serve-route.ts';

/** Puts every route on its path; a method that a path does not take is answered 405 with those it does. */
export function mountRoutes(app: Express, routes: readonly Route[], gate: Gate): void {
  const byPath = new Map<string, Route[]>();
  for (const route of routes) byPath.set(route.contract.path, [...(byPath.get(route.contract.path) ?? []), route]);
  for (const [path, onPath] of byPath) {
    const place = app.route(path);
    for (const route of onPath) {
      const serve = serveRoute(route, gate);
      switch (route.contract.method) {
        case 'GET':
          place.get(serve);
          break;
        case 'POST':
          place.post(serve);
          break;
        case 'PATCH':
          place.patch(serve);
          break;
        case 'PUT':
          place.put(serve);
          break;
        case 'DELETE':
          place.delete(serve);
          break;
      }
    }
    const allowed = onPath.flatMap((route) =>
      route.contract.method === 'GET' ? ['GET', 'HEAD'] : [route.contract.method],
    );
    place.all((_request, response) => sendMethodNotAllowed(response, allowed));
  }
}

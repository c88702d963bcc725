import { createEstimate } from '@embertally/shared/contracts/estimates';
import { defineRoute, type Route } from '../http/define-route.ts';
import { estimateOnce } from '../services/estimate-service.ts';

export function estimateRoutes(): Route[] {
  return [
    defineRoute(createEstimate, ({ body, query }) =>
      Promise.resolve({ kind: 'json', body: { ...estimateOnce(body, query.workings === '1') } }),
    ),
  ];
}

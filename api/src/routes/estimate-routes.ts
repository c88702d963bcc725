import { createEstimate } from '@embertally/shared/contracts/estimates';
import { defineRoute, type Route } from '../http/define-route.ts';
import { leftSignal } from '../http/left-signal.ts';
import { EstimateStoppedError } from '../services/estimate-maker.ts';
import type { EstimateService } from '../services/estimate-service.ts';

export function estimateRoutes(estimates: EstimateService): Route[] {
  return [
    defineRoute(createEstimate, async ({ body, query, request }) => {
      try {
        return { kind: 'text', text: await estimates.make(body, query.workings === '1', leftSignal(request)) };
      } catch (error) {
        // Who asked has left: there is nobody to answer and nothing went wrong.
        if (error instanceof EstimateStoppedError) return { kind: 'nothing' };
        throw error;
      }
    }),
  ];
}

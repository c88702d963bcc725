import { CAUTIONS } from '@embertally/shared/cautions/cautions';
import { listCautions } from '@embertally/shared/contracts/cautions';
import { defineRoute, type Route } from '../http/define-route.ts';

export function cautionRoutes(): Route[] {
  return [
    defineRoute(listCautions, () =>
      Promise.resolve({ kind: 'json', body: { items: CAUTIONS.map(({ id, title, text }) => ({ id, title, text })) } }),
    ),
  ];
}

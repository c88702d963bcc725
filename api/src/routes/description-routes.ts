import type { Contract } from '@embertally/shared/contracts/contract';
import { readDocs, readOpenapi } from '@embertally/shared/contracts/description';
import { describeApi } from '../http/describe-api.ts';
import { describeInWords } from '../http/describe-in-words.ts';
import { defineRoute, type Route } from '../http/define-route.ts';

/** @param others the contracts of every other route; these two describe themselves too */
export function descriptionRoutes(others: readonly Contract[]): Route[] {
  const contracts = [...others, readOpenapi, readDocs];
  const openapi = describeApi(contracts);
  const page = describeInWords(contracts);
  return [
    defineRoute(readOpenapi, () => Promise.resolve({ kind: 'json', body: openapi })),
    defineRoute(readDocs, () =>
      Promise.resolve({
        kind: 'stream',
        write: async (_request, response) => {
          response.type('text/html').send(page);
          await Promise.resolve();
        },
      }),
    ),
  ];
}

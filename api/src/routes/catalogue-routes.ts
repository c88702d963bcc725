import { KINDS } from '@embertally/shared/catalogue/kinds';
import { LININGS } from '@embertally/shared/catalogue/linings';
import { USES } from '@embertally/shared/catalogue/uses';
import { listKinds, listLinings, listUses } from '@embertally/shared/contracts/catalogue';
import type { Contract } from '@embertally/shared/contracts/contract';
import { listMaterials } from '@embertally/shared/contracts/materials';
import { defineRoute, type Route } from '../http/define-route.ts';
import type { MaterialService } from '../services/material-service.ts';

/** Rows of the catalogue as plain JSON values. */
function listRoute(contract: Contract, rows: readonly object[]): Route {
  const text = JSON.stringify({ items: rows });
  return defineRoute(contract, () => Promise.resolve({ kind: 'text', text }));
}

export function catalogueRoutes(materials: MaterialService): Route[] {
  return [
    defineRoute(listMaterials, async ({ actor, query }) => ({
      kind: 'text',
      text: await materials.listText(actor, query.of),
    })),
    listRoute(listKinds, KINDS),
    listRoute(listLinings, LININGS),
    listRoute(listUses, USES),
  ];
}

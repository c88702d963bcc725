import { createBuilding as contract } from '@embertally/shared/contracts/buildings';
import type { BuildingSummary } from '@embertally/shared/contracts/sites';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { siteQuery } from './site.ts';

export interface CreateBuildingInput {
  readonly id: string;
  readonly survey_id: string;
  readonly storey_id: string;
  readonly name: string;
  readonly storey_name: string;
}

/** Makes a building with its working survey and first storey. */
export async function createBuilding(
  client: QueryClient,
  siteId: string,
  input: CreateBuildingInput,
): Promise<BuildingSummary> {
  const building = await call(contract, { params: { siteId }, body: input });
  await client.invalidateQueries({ queryKey: siteQuery(siteId).queryKey });
  await client.invalidateQueries({ queryKey: ['sites'] });
  return building;
}

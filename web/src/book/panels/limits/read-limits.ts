import { listLimits } from '@embertally/shared/contracts/limits';
import { call } from '../../../lib/api-client.ts';
import type { BookSession } from '../../session/book-session.ts';

/** Reads the building's limits anew, after somebody else was found to have changed one. */
export async function readLimits(session: BookSession): Promise<void> {
  const { items } = await call(listLimits, { params: { buildingId: session.state.survey.building.id } });
  session.setLimits(items);
}

import type { Limit } from '@embertally/shared/contracts/limits';
import type { Survey } from '@embertally/shared/contracts/surveys';
import { canOnSite } from '@embertally/shared/policy/policy';

/** Whether the reader may set, change and take away limits of a source on this survey's building. */
export function maySetLimit(survey: Pick<Survey, 'my_role' | 'of_keeper'>, source: Limit['source']): boolean {
  const standing = { role: survey.my_role, ofKeeper: survey.of_keeper };
  return canOnSite(standing, source === 'house-rule' ? 'house-rule.set' : 'limit.set');
}

import type { Done, Refusal } from '../command.ts';
import { finish } from './finish.ts';
import { rehangOpenings } from './rehang-openings.ts';
import { settleCorners } from './settle-corners.ts';
import type { SurveyDraft } from './survey-draft.ts';
import { sweepUnused } from './sweep-unused.ts';

/** Ends a command that drew, moved or removed walls: shares corners, hangs openings, sweeps, then checks the rules. */
export function finishPlan(draft: SurveyDraft, storeyId: string): Done | Refusal {
  settleCorners(draft, storeyId);
  const hangs = rehangOpenings(draft, storeyId);
  if (hangs !== null) return hangs;
  sweepUnused(draft, storeyId);
  return finish(draft, [storeyId]);
}

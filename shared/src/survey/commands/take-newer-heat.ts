import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { newerPart, type NewerHeat } from '../newer-heat.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';

export interface TakeNewerHeatInput {
  readonly entry_ids: readonly string[];
  /** The versions in force of the materials in question. */
  readonly newer: readonly NewerHeat[];
}

/**
 * Takes the heat of a material's newer version into entries that were tallied with an older one: heat, low, high, source and
 * version of each part. Masses, names and a measured curve stay. Entries that have nothing to take are left as they are;
 * all of the others or none.
 */
export const takeNewerHeat: Command<TakeNewerHeatInput> = (document, { entry_ids, newer }) => {
  const draft = new SurveyDraft(document);
  const byMaterial = new Map(newer.map((one) => [one.material, one]));
  const edited: Entry[] = [];
  for (const id of entry_ids) {
    const entry = document.entries.get(id);
    if (entry === undefined) return refuse('ENTRY_GONE', 'The entry is not in the survey any more.', { ids: [id] });
    const parts = entry.parts.map((part) => newerPart(part, byMaterial) ?? part);
    if (parts.every((part, index) => part === entry.parts[index])) continue;
    const row = { ...entry, parts };
    const fault = rowRefusal('entry', row);
    if (fault !== null) return fault;
    draft.put('entry', row);
    edited.push(row);
  }
  if (edited.length === 0) return refuse('HEAT_NOT_NEWER', 'These entries have the newest heats already.');
  return finish(draft, [], (outcome) => entryViolations(outcome, edited));
};

import type { CountedPart } from './entry-heats.ts';

/** Whether more than half of the heat is in liquids or gases, which burn at their peak from the start. */
export function mostlyFluid(parts: readonly CountedPart[]): boolean {
  let fluid = 0;
  let all = 0;
  for (const { part, counted } of parts) {
    all += counted;
    if (part.material?.hazards.some((hazard) => hazard === 'liquid' || hazard === 'gas')) fluid += counted;
  }
  return fluid > all / 2;
}

import { describe, expect, it } from 'vitest';
import { roomHeightLever } from '@embertally/shared/questions/height-lever';
import { howManyMore } from '@embertally/shared/questions/how-many-more';
import { openingLever } from '@embertally/shared/questions/opening-lever';
import { whatChanges } from '@embertally/shared/questions/what-changes';
import { SCENERY_DOCK } from '../shared/tally/scenery-dock.ts';
import { HOW_MANY_ROWS, WHAT_CHANGES_ROWS, type WhatChangesRow } from './rows/question-rows.ts';

function leverOf(lever: WhatChangesRow['lever']) {
  if (lever === 'room-height') return roomHeightLever(SCENERY_DOCK);
  const varied = ({ 'opening-width': 'width', 'opening-height': 'height', 'opening-number': 'number' } as const)[lever];
  const found = openingLever(SCENERY_DOCK, 0, varied);
  if (!found) throw new Error('The worked example has one opening.');
  return found;
}

describe('questions against answers worked out by hand', () => {
  it.each(HOW_MANY_ROWS.map((row) => [`${row.id} (${row.source})`, row] as const))('%s', (_title, row) => {
    const { estimate } = howManyMore(SCENERY_DOCK, row);
    expect(estimate.value).not.toBeNull();
    expect(Math.abs((estimate.value ?? 0) - row.expected)).toBeLessThanOrEqual(row.tolerance);
  });

  it.each(WHAT_CHANGES_ROWS.map((row) => [`${row.id} (${row.source})`, row] as const))('%s', (_title, row) => {
    const { estimate } = whatChanges(leverOf(row.lever), row.reading, row.direction);
    expect(estimate.value).not.toBeNull();
    expect(Math.abs((estimate.value ?? 0) - row.expected)).toBeLessThanOrEqual(row.tolerance);
  });
});

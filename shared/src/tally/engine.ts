/**
 * Names the engine whose numbers are kept with stored summaries. Rises when the same room gives another tally, so that
 * summaries are recomputed and a changed standing can say that the method changed.
 */
export const ENGINE = 'tally@2';

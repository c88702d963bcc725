/** How a room is sampled where nobody asks for anything else: on the screen and in reports the same. */
export const USUAL_SAMPLING = { samples: 20_000, seed: 1 } as const;

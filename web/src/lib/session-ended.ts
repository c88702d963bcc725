import { createValue } from './create-value.ts';

/** True from the moment the server no longer knows the session until the person has signed in again. */
export const sessionEnded = createValue(false);

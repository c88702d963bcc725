import type { Command, Done, Refusal } from '@embertally/shared/survey/command';
import { useCallback } from 'react';
import { useBookSession } from '../session/use-book-session.ts';

/** Gives a function that does one gesture and hands a refusal back, so that it can stand at the field it belongs to. */
export function useRunBack(): <Input>(command: Command<Input>, input: Input, label: string) => Done | Refusal {
  const session = useBookSession();
  return useCallback((command, input, label) => session.run(command, input, label, { refusal: 'returned' }), [session]);
}

import type { Done, Refusal } from '@embertally/shared/survey/command';
import { useState } from 'react';
import { TextAreaField } from '../../components/text-area-field.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useAttempt } from './use-attempt.ts';

interface CommandTextProps {
  readonly label: string;
  readonly labelUnseen?: boolean;
  readonly hint?: string;
  readonly optional?: boolean;
  readonly value: string;
  readonly compact?: boolean;
  readonly width?: 'short' | 'medium' | 'full';
  readonly lines?: 'one' | 'several';
  readonly run: (next: string) => Done | Refusal;
}

/** A text of the survey: written through a command when the field is left; Escape gives back what stood there. */
export function CommandText({ value, run, lines = 'one', width, compact, ...field }: CommandTextProps) {
  const attempt = useAttempt(value, run);
  const [typed, setTyped] = useState<string | null>(null);
  const leave = (): void => {
    if (typed === null) return;
    setTyped(null);
    attempt.commit(typed);
  };
  const shared = { ...field, value: typed ?? attempt.value, error: attempt.error, onChange: setTyped, onBlur: leave };
  if (lines === 'several') return <TextAreaField {...shared} />;
  return (
    <TextField
      {...shared}
      {...(width === undefined ? {} : { width })}
      {...(compact === undefined ? {} : { compact })}
      onKeyDown={(event) => {
        if (event.key === 'Enter') leave();
        if (event.key === 'Escape') setTyped(null);
      }}
    />
  );
}

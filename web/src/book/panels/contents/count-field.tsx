import type { Done, Refusal } from '@embertally/shared/survey/command';
import { useState } from 'react';
import { TextField } from '../../../components/text-field.tsx';
import { readCount } from '../../plan/read-count.ts';
import { useAttempt } from '../use-attempt.ts';

interface CountFieldProps {
  readonly label: string;
  readonly labelUnseen?: boolean;
  readonly compact?: boolean;
  readonly value: number;
  readonly run: (next: number) => Done | Refusal;
}

/** How many pieces an entry has; what cannot be read stays as typed beside the reason. */
export function CountField({ label, value, run, ...look }: CountFieldProps) {
  const attempt = useAttempt(value, run);
  const [typing, setTyping] = useState<{ readonly text: string; readonly message: string | undefined } | null>(null);
  const leave = (): void => {
    if (typing === null) return;
    const read = readCount(typing.text);
    if (read.ok) {
      setTyping(null);
      attempt.commit(read.value);
    } else setTyping({ text: typing.text, message: read.message });
  };
  return (
    <TextField
      {...look}
      label={label}
      inputMode="text"
      autoComplete="off"
      width="short"
      value={typing?.text ?? String(attempt.value)}
      error={typing?.message ?? attempt.error}
      onChange={(text) => {
        setTyping({ text, message: undefined });
      }}
      onBlur={leave}
      onKeyDown={(event) => {
        if (event.key === 'Enter') leave();
        if (event.key === 'Escape') setTyping(null);
      }}
    />
  );
}

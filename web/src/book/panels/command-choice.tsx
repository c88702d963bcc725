import type { Done, Refusal } from '@embertally/shared/survey/command';
import { SelectField, type SelectOption } from '../../components/select-field.tsx';
import { useAttempt } from './use-attempt.ts';

interface CommandChoiceProps<T extends string> {
  readonly label: string;
  readonly labelUnseen?: boolean;
  readonly hint?: string;
  readonly value: T;
  readonly options: readonly SelectOption<T>[];
  readonly compact?: boolean;
  readonly width?: 'short' | 'medium' | 'full';
  readonly run: (next: T) => Done | Refusal;
}

/** One of a few answers, written through a command at once. */
export function CommandChoice<T extends string>({ value, run, ...field }: CommandChoiceProps<T>) {
  const attempt = useAttempt(value, run);
  return <SelectField {...field} value={attempt.value} error={attempt.error} onChange={attempt.commit} />;
}

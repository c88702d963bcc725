import type { Done, Refusal } from '@embertally/shared/survey/command';
import { QuantityField } from '../../components/quantity-field.tsx';
import { useAttempt } from './use-attempt.ts';

interface CommandQuantityProps<V extends number | null> {
  readonly label: string;
  readonly labelUnseen?: boolean;
  readonly hint?: string;
  readonly unit: string;
  readonly value: V;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly compact?: boolean;
  readonly optional?: boolean;
  readonly run: (next: V) => Done | Refusal;
}

/** A quantity of the survey: written through a command when the field is left; a refusal stands at the field. */
export function CommandQuantity<V extends number | null>({ value, run, ...field }: CommandQuantityProps<V>) {
  const attempt = useAttempt<number | null>(value, (next) => run(next as V));
  return <QuantityField {...field} value={attempt.value} error={attempt.error} onCommit={attempt.commit} />;
}

import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { parseQuantity, type QuantityChoice } from '@embertally/shared/units/parse-quantity';
import { useState } from 'react';
import { useUnits, type UnitSystem } from '../lib/units-context.ts';
import { Button } from './button.tsx';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';

interface QuantityFieldProps extends FieldTexts {
  readonly id?: string;
  /** The unit the value is kept in: `m`, `kg`, `MJ/kg`. */
  readonly unit: string;
  /** In `unit`; null: nothing said yet. */
  readonly value: number | null;
  /** Called on leaving the field or Enter with what was read; null when an optional field was emptied. */
  readonly onCommit: (value: number | null) => void;
  /** Bounds in `unit`, both admitted. */
  readonly minimum?: number;
  readonly maximum?: number;
  readonly compact?: boolean;
}

interface Typing {
  readonly text: string;
  readonly message: string | undefined;
  readonly choices: readonly QuantityChoice[];
}

function echo(value: number | null, unit: string, system: UnitSystem): string {
  return value === null ? '' : formatQuantity(value, unit, system, { figures: 'as entered' }).text;
}

/**
 * One quantity as a person writes it: "2.4 m", "2400mm", "7 ft 10 in", "12,5", or a plain number in the person's own
 * unit. Read when the field is left and echoed in that unit; what cannot be read stays exactly as typed beside the
 * reason. Changing units changes what is shown and leaves the value kept bit for bit as it was.
 */
export function QuantityField(props: QuantityFieldProps) {
  const { unit, value, onCommit, minimum, maximum, compact, error, label, ...frame } = props;
  const system = useUnits();
  const [typing, setTyping] = useState<Typing | null>(null);
  const symbol = displayUnit(unit, system)?.symbol ?? unit;

  const commit = (text: string, decimal?: 'point' | 'comma') => {
    if (text.trim() === '' && props.optional) {
      setTyping(null);
      onCommit(null);
      return;
    }
    const read = parseQuantity(text, {
      unit,
      system,
      name: label,
      ...(minimum === undefined ? {} : { minimum }),
      ...(maximum === undefined ? {} : { maximum }),
      ...(decimal === undefined ? {} : { decimal }),
    });
    if (read.ok) {
      setTyping(null);
      onCommit(read.value);
    } else {
      setTyping({ text, message: read.message, choices: read.choices ?? [] });
    }
  };

  return (
    <FieldFrame {...frame} label={symbol === '' ? label : `${label} (${symbol})`} error={typing?.message ?? error}>
      {(ties) => (
        <>
          <div className="field-box max-w-40" data-compact={compact ? 'yes' : undefined}>
            <input
              {...ties}
              type="text"
              autoComplete="off"
              className="figure"
              value={typing?.text ?? echo(value, unit, system)}
              onChange={(event) => {
                setTyping({ text: event.target.value, message: undefined, choices: [] });
              }}
              onBlur={() => {
                if (typing !== null) commit(typing.text);
              }}
              onKeyDown={(event) => {
                if (event.key === 'Enter' && typing !== null) commit(typing.text);
              }}
            />
            <span className="field-unit" aria-hidden="true">
              {symbol}
            </span>
          </div>
          {typing === null || typing.choices.length === 0 ? null : (
            <div role="group" aria-label={`What ${label.toLowerCase()} is meant`} className="flex flex-wrap gap-2">
              {typing.choices.map((choice) => (
                <Button
                  key={choice.decimal}
                  size="small"
                  onClick={() => {
                    commit(typing.text, choice.decimal);
                  }}
                >
                  {choice.text}
                </Button>
              ))}
            </div>
          )}
        </>
      )}
    </FieldFrame>
  );
}

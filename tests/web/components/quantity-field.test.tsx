import { QuantityField } from '@embertally/web/src/components/quantity-field.tsx';
import { UnitsContext, type UnitSystem } from '@embertally/web/src/lib/units-context.ts';
import { fireEvent, render, screen, within } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';

interface Shown {
  readonly committed: (number | null)[];
  readonly input: () => HTMLInputElement;
  readonly type: (text: string) => void;
  readonly setUnits: (units: UnitSystem) => void;
}

function show(start: number | null, props: { optional?: boolean; minimum?: number; maximum?: number } = {}): Shown {
  const committed: (number | null)[] = [];
  function Field() {
    const [value, setValue] = useState(start);
    return (
      <QuantityField
        label="Width"
        unit="m"
        value={value}
        onCommit={(next) => {
          committed.push(next);
          setValue(next);
        }}
        {...props}
      />
    );
  }
  const tree = (units: UnitSystem) => (
    <UnitsContext value={units}>
      <Field />
    </UnitsContext>
  );
  const { rerender } = render(tree('SI'));
  const input = () => screen.getByRole<HTMLInputElement>('textbox');
  return {
    committed,
    input,
    type: (text) => {
      fireEvent.change(input(), { target: { value: text } });
      fireEvent.blur(input());
    },
    setUnits: (units) => {
      rerender(tree(units));
    },
  };
}

describe('a quantity', () => {
  // Expected metres: 1 ft = 0.3048 m and 1 in = 0.0254 m exactly (international yard and pound agreement, 1959).
  it.each([
    ['2.4 m', 2.4],
    ['2400mm', 2.4],
    ['7 ft 10 in', 7 * 0.3048 + 10 * 0.0254],
    ['12,5', 12.5],
    ['3', 3],
  ])('“%s” is read as written', (text, metres) => {
    const { type, committed } = show(null);
    type(text);
    expect(committed).toHaveLength(1);
    expect(committed[0]).toBeCloseTo(metres, 12);
  });

  it('is echoed in the person’s unit once it is read', () => {
    const { type, input } = show(null);
    type('2400 mm');
    expect(input().value).toBe('2.4');
    expect(screen.getByLabelText('Width (m)')).toBe(input());
  });

  it('that cannot be read stays exactly as typed, with the reason tied to the field', () => {
    const { type, input, committed } = show(2);
    type('wide');
    expect(input().value).toBe('wide');
    expect(committed).toEqual([]);
    expect(input().getAttribute('aria-invalid')).toBe('true');
    const described = document.getElementById(input().getAttribute('aria-describedby') ?? '');
    expect(described?.textContent).toContain('Width must be a number, like 12.5');
  });

  it('outside its bounds is refused with the bounds', () => {
    const { type, committed } = show(2, { minimum: 0.05, maximum: 10 });
    type('11 m');
    expect(committed).toEqual([]);
    expect(screen.getByText('Width must be between 0.05 m and 10 m')).toBeTruthy();
  });

  it('that may mean two things is asked about, and the answer is taken', () => {
    const { type, committed } = show(null);
    type('1,234');
    expect(committed).toEqual([]);
    const choices = within(screen.getByRole('group', { name: 'What width is meant' })).getAllByRole('button');
    expect(choices).toHaveLength(2);
    fireEvent.click(choices[1] as HTMLElement);
    expect(committed).toEqual([1.234]);
    expect(screen.queryByRole('group')).toBeNull();
  });

  it('may be emptied only where it is optional', () => {
    const needed = show(2);
    needed.type('');
    expect(needed.committed).toEqual([]);
    expect(screen.getByText('Enter the width')).toBeTruthy();
  });

  it('that is optional is emptied to nothing, not to zero', () => {
    const { type, committed } = show(2, { optional: true });
    type(' ');
    expect(committed).toEqual([null]);
  });

  it('is only shown differently when units change: what is kept is not touched', () => {
    const { setUnits, input, committed } = show(0.1 + 0.2);
    setUnits('US');
    expect(screen.getByLabelText('Width (ft)')).toBe(input());
    // 0.3 m ÷ 0.3048 m/ft
    expect(Number(input().value)).toBeCloseTo(0.984252, 5);
    fireEvent.blur(input());
    expect(committed).toEqual([]);
  });
});

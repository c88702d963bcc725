import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { FurtherPart } from '@embertally/web/src/book/tally/further/further-part.tsx';
import { UnitsContext } from '@embertally/web/src/lib/units-context.ts';
import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { uid } from '../../support/survey-builder.ts';
import { dock, press, write } from './render-book-part.tsx';

function show(): void {
  const input = roomInput(dock(), uid('Dock'), []);
  render(
    <UnitsContext value="SI">
      <FurtherPart input={input} tally={estimateRoom(input, { spread: false })} />
    </UnitsContext>,
  );
}
const reading = (name: string) => screen.getByRole('article', { name });

describe('further readings', () => {
  it('say that they are not used in the tally, and why some do not apply', () => {
    show();
    expect(screen.getByText(/variant, not used in the tally/)).toBeTruthy();
    expect(screen.getByText('What does not apply here, and why')).toBeTruthy();
    expect(screen.getByText('The room is not large: the tally covers it with one hot layer.')).toBeTruthy();
  });

  it('follow what is said, and hold it to its range with the reason at the field', () => {
    show();
    // ISO 834: 842 °C after 30 min, 945 °C after 60.
    expect(reading('Nominal curves after 30 min').textContent).toMatch(/Standard curve842 °C/);
    write(/^Time on nominal curves/, '60');
    expect(reading('Nominal curves after 60 min').textContent).toMatch(/Standard curve945 °C/);
    write(/^Time on nominal curves/, '0');
    expect(screen.getByLabelText(/^Time on nominal curves/).getAttribute('aria-invalid')).toBe('true');
    expect(reading('Nominal curves after 60 min')).toBeTruthy();
  });

  it('open their workings, all at once before printing', () => {
    show();
    const curves = reading('Nominal curves after 30 min');
    expect(within(curves).queryByText('The relation')).toBeNull();
    press('Unfold all workings, to print');
    expect(within(curves).getAllByText('The relation')).toHaveLength(3);
    expect(within(curves).getAllByText('taken by default')).toHaveLength(3);
    press('Fold the workings');
    expect(within(curves).queryByText('The relation')).toBeNull();
  });
});

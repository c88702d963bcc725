import { Combobox, type ComboboxItem } from '@embertally/web/src/components/combobox.tsx';
import { act, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';

const ALL: readonly ComboboxItem[] = [
  { id: 'a', label: 'Armchair', detail: '1 500 kW' },
  { id: 'b', label: 'Archive box' },
  { id: 'c', label: 'Pallet stack' },
];

function show() {
  const picked: string[] = [];
  function Field() {
    const [text, setText] = useState('');
    const items = ALL.filter((item) => item.label.toLowerCase().startsWith(text.toLowerCase()));
    return (
      <Combobox
        label="Find a kind"
        hint="Two letters are enough."
        value={text}
        onChange={setText}
        items={items}
        onPick={(item) => picked.push(item.id)}
        nothing="Nothing is called so."
      />
    );
  }
  render(<Field />);
  return { picked, box: screen.getByRole<HTMLInputElement>('combobox', { name: 'Find a kind' }) };
}

async function type(box: HTMLInputElement, text: string) {
  act(() => {
    box.focus();
  });
  fireEvent.change(box, { target: { value: text } });
  return screen.findByRole('listbox');
}

describe('a box with a list', () => {
  it('shows what fits what is typed, with its hint tied to the box', async () => {
    const { box } = show();
    const list = await type(box, 'ar');
    expect(
      within(list)
        .getAllByRole('option')
        .map((option) => option.textContent),
    ).toEqual(['Armchair1 500 kW', 'Archive box']);
    expect(box.getAttribute('aria-expanded')).toBe('true');
    const hints = (box.getAttribute('aria-describedby') ?? '').split(' ');
    expect(hints.map((id) => document.getElementById(id)?.textContent)).toContain('Two letters are enough.');
  });

  it('takes what is pressed', async () => {
    const { box, picked } = show();
    const list = await type(box, 'ar');
    fireEvent.click(within(list).getByRole('option', { name: 'Archive box' }));
    expect(picked).toEqual(['b']);
  });

  it('takes the first with Enter', async () => {
    const { box, picked } = show();
    await type(box, 'pal');
    await waitFor(() => {
      expect(screen.getByRole('option').hasAttribute('data-active-item')).toBe(true);
    });
    fireEvent.keyDown(box, { key: 'Enter' });
    await waitFor(() => {
      expect(picked).toEqual(['c']);
    });
  });

  it('says when nothing fits', async () => {
    const { box } = show();
    await type(box, 'zz');
    expect(screen.getByText('Nothing is called so.')).toBeTruthy();
  });
});

import { ToolOptions } from '@embertally/web/src/book/plan/tool-options.tsx';
import { act, fireEvent, screen } from '@testing-library/react';
import { expect, test, vi } from 'vitest';
import { dock, renderBookPart } from '../../tally/render-book-part.tsx';

test('what is typed before the catalogue has arrived is in the picker when it is there', async () => {
  const session = renderBookPart(<ToolOptions focusPlan={() => undefined} leave={() => undefined} />, dock());
  act(() => {
    session.setTool('contents');
  });
  const early = await screen.findByLabelText('Kind or material');
  expect(screen.getByText('Opening the catalogue…')).toBeTruthy();
  expect(document.activeElement).toBe(early);
  fireEvent.change(early, { target: { value: 'pall' } });
  const picker = await screen.findByRole<HTMLInputElement>(
    'combobox',
    { name: 'Kind or material' },
    { timeout: 10_000 },
  );
  expect(picker.value).toBe('pall');
  // The list settles on where it stands.
  await act(() => Promise.resolve());
  expect(document.activeElement).toBe(picker);
  expect(screen.getByRole('option', { name: /Stack of wooden pallets/ })).toBeTruthy();
  await act(async () => {
    fireEvent.keyDown(picker, { key: 'Enter' });
    await Promise.resolve();
  });
  expect(session.state.placing.entry?.label).toBe('Stack of wooden pallets, empty');
});

test('Escape puts the tool down', async () => {
  const leave = vi.fn();
  const session = renderBookPart(<ToolOptions focusPlan={() => undefined} leave={leave} />, dock());
  act(() => {
    session.setTool('contents');
  });
  fireEvent.keyDown(await screen.findByLabelText('Kind or material'), { key: 'Escape' });
  expect(leave).toHaveBeenCalledOnce();
});

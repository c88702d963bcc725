import { StatusRegion, useStatus } from '@embertally/web/src/components/status-region.tsx';
import { act, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';

function Sayer() {
  const say = useStatus();
  return (
    <button type="button" onClick={() => say('Saved.')}>
      Say
    </button>
  );
}

afterEach(() => {
  vi.useRealTimers();
});

describe('what was done', () => {
  it('is said in a live region that was there before', () => {
    render(
      <StatusRegion>
        <Sayer />
      </StatusRegion>,
    );
    const region = screen.getByRole('status');
    fireEvent.click(screen.getByRole('button', { name: 'Say' }));
    expect(within(region).getByText('Saved.')).toBeTruthy();
  });

  it('stays at least six seconds and goes by itself', () => {
    vi.useFakeTimers();
    render(
      <StatusRegion>
        <Sayer />
      </StatusRegion>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Say' }));
    act(() => {
      vi.advanceTimersByTime(6000);
    });
    expect(screen.getByText('Saved.')).toBeTruthy();
    act(() => {
      vi.advanceTimersByTime(6000);
    });
    expect(screen.queryByText('Saved.')).toBeNull();
  });

  it('goes when it is dismissed', () => {
    render(
      <StatusRegion>
        <Sayer />
      </StatusRegion>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Say' }));
    fireEvent.click(screen.getByRole('button', { name: 'Dismiss' }));
    expect(screen.queryByText('Saved.')).toBeNull();
  });
});

import { usePlanSize } from '@embertally/web/src/book/plan/use-plan-size.ts';
import { useBookSession } from '@embertally/web/src/book/session/use-book-session.ts';
import { act } from '@testing-library/react';
import { useRef } from 'react';
import { afterEach, expect, test, vi } from 'vitest';
import { dock, renderBookPart } from '../../tally/render-book-part.tsx';

const size = { width: 800, height: 600 };
let resized: () => void = () => undefined;

class FakeResizeObserver {
  constructor(heard: () => void) {
    resized = heard;
  }
  observe(): void {
    Object.assign(size, { width: 800, height: 600 });
  }
  disconnect(): void {
    resized = () => undefined;
  }
}

function Surface() {
  const session = useBookSession();
  const element = useRef<HTMLDivElement>(null);
  usePlanSize(element, session);
  return <div ref={element} data-testid="plan" />;
}

function open() {
  vi.stubGlobal('ResizeObserver', FakeResizeObserver);
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockImplementation(() => size.width);
  vi.spyOn(HTMLElement.prototype, 'clientHeight', 'get').mockImplementation(() => size.height);
  return renderBookPart(<Surface />, dock());
}

afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

function resizeTo(width: number, height: number): void {
  Object.assign(size, { width, height });
  act(() => {
    resized();
  });
}

test('the storey is shown whole at first, on a narrow screen too, and again when a page beside it arrives', () => {
  const session = open();
  // 6 × 4 m in 800 × 600 px with 56 px on every side.
  expect(session.state.camera).toEqual({ x_m: 3, y_m: 2, pxPerM: (800 - 112) / 6 });
  resizeTo(390, 600);
  expect(session.state.camera.pxPerM).toBeCloseTo((390 * 0.84) / 6, 9);
});

test('once a person has moved the plan it stays as they left it', () => {
  const session = open();
  const own = { x_m: 1, y_m: 1, pxPerM: 90 };
  act(() => {
    session.setCamera(own);
  });
  resizeTo(500, 700);
  expect(session.state.camera).toBe(own);
});

test('a plan somebody has pressed on does not move under their hand', () => {
  const session = open();
  const before = session.state.camera;
  document.querySelector('[data-testid="plan"]')?.dispatchEvent(new Event('pointerdown', { bubbles: true }));
  resizeTo(700, 540);
  expect(session.state.camera).toBe(before);
});

test('a row of options that takes height from the plan does not move it', () => {
  const session = open();
  const before = session.state.camera;
  resizeTo(800, 540);
  expect(session.state.camera).toBe(before);
});

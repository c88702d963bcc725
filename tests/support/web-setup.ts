import { cleanup, configure } from '@testing-library/react';
import { afterEach, beforeEach, expect, vi } from 'vitest';
import { consoleMessages } from './console-messages.ts';

// Ceilings, not waits: the first test of a file also fetches and compiles the pages it opens, on a busy machine.
configure({ asyncUtilTimeout: 10_000 });
vi.setConfig({ testTimeout: 30_000 });

// React is told that its updates are wrapped by the testing library; it warns otherwise.
Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });

// What browsers have and jsdom has not. Only the shape: nothing is laid out or observed in these tests.
if (window.matchMedia === undefined) {
  window.matchMedia = (media: string): MediaQueryList =>
    Object.assign(new EventTarget(), {
      media,
      matches: false,
      onchange: null,
      addListener: () => undefined,
      removeListener: () => undefined,
    });
}
class NothingObserved {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
  takeRecords(): [] {
    return [];
  }
}
const missing: Record<string, unknown> = {};
if (!('ResizeObserver' in globalThis)) missing.ResizeObserver = NothingObserved;
if (!('IntersectionObserver' in globalThis)) missing.IntersectionObserver = NothingObserved;
Object.assign(globalThis, missing);
if (!('hidePopover' in HTMLElement.prototype)) {
  Object.assign(HTMLElement.prototype, {
    showPopover(this: HTMLElement) {
      this.style.display = 'block';
    },
    hidePopover(this: HTMLElement) {
      this.style.display = '';
    },
  });
}
if (!('scrollIntoView' in Element.prototype)) Object.assign(Element.prototype, { scrollIntoView: () => undefined });
if (!('showModal' in HTMLDialogElement.prototype)) {
  Object.assign(HTMLDialogElement.prototype, {
    showModal(this: HTMLDialogElement) {
      this.open = true;
    },
    close(this: HTMLDialogElement) {
      this.open = false;
    },
  });
}
window.scrollTo = () => undefined;
// Nothing is laid out, so nothing would count as visible; focus goes only to what is.
Element.prototype.getClientRects = function (this: Element): DOMRectList {
  const rects = this.isConnected ? [this.getBoundingClientRect()] : [];
  return Object.assign(rects, { item: (index: number) => rects[index] ?? null });
};

beforeEach(() => {
  window.localStorage.clear();
  window.sessionStorage.clear();
  consoleMessages.start();
});

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  document.documentElement.removeAttribute('data-theme');
  // A warning nobody expected is a failure: most of them are a real fault seen early.
  expect(consoleMessages.stop(), 'messages in the console').toEqual([]);
});

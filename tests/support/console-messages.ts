import { format } from 'node:util';

let messages: string[] = [];
let expected: RegExp[] = [];
const original = { error: globalThis.console.error, warn: globalThis.console.warn };

/** Watches the console of a test; what a test expects it names with `expect`, everything else is a failure. */
export const consoleMessages = {
  start(): void {
    messages = [];
    expected = [];
    const note = (...parts: unknown[]) => {
      messages.push(format(...parts));
    };
    Object.assign(globalThis.console, { error: note, warn: note });
  },
  expect(pattern: RegExp): void {
    expected.push(pattern);
  },
  stop(): readonly string[] {
    Object.assign(globalThis.console, original);
    return messages.filter((message) => !expected.some((pattern) => pattern.test(message)));
  },
};

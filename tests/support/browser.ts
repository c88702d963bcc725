import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { expect } from 'vitest';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** Debian's Chromium; the flags keep it from looking for hosts that are not ours. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export const WIDTHS = {
  narrow: { width: 390, height: 844 },
  medium: { width: 1024, height: 768 },
  wide: { width: 1440, height: 900 },
} as const;

export interface Watched {
  readonly context: BrowserContext;
  readonly page: Page;
  /** Fails when the console showed an error or a warning, a script threw, or the security policy was broken. */
  readonly expectQuiet: () => void;
}

/** A page whose console is watched: one warning is a failure, unless the test caused it and names it. */
export async function openPage(
  browser: Browser,
  options: {
    viewport?: { width: number; height: number };
    colorScheme?: 'light' | 'dark';
    hasTouch?: boolean;
    expected?: RegExp;
  } = {},
): Promise<Watched> {
  const context = await browser.newContext({
    viewport: options.viewport ?? WIDTHS.wide,
    colorScheme: options.colorScheme ?? 'light',
    hasTouch: options.hasTouch ?? false,
    reducedMotion: 'reduce',
    acceptDownloads: true,
  });
  const page = await context.newPage();
  const loud: string[] = [];
  page.on('console', (message) => {
    const text = message.text();
    if (['error', 'warning'].includes(message.type()) && !(options.expected?.test(text) ?? false))
      loud.push(`${message.type()}: ${text} (${message.location().url})`);
  });
  page.on('pageerror', (error) => loud.push(`thrown: ${error.message}`));
  return { context, page, expectQuiet: () => expect(loud, 'messages in the browser console').toEqual([]) };
}

interface AxeResult {
  readonly violations: readonly {
    id: string;
    help: string;
    nodes: readonly { target: readonly string[]; failureSummary?: string }[];
  }[];
}

/** Fails with rule, element and reason for every breach of WCAG 2.2 A and AA that axe can see. */
export async function expectAccessible(page: Page, where: string): Promise<void> {
  await page.evaluate(axeSource);
  const result = await page.evaluate<AxeResult>(
    'axe.run(document, { runOnly: { type: "tag", values: ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"] } })',
  );
  const told = result.violations.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help} at ${node.target.join(' ')} — ${node.failureSummary ?? ''}`),
  );
  expect(told, `axe on ${where}`).toEqual([]);
}

import { reloadOnce } from '@embertally/web/src/lib/reload-once.ts';
import { describe, expect, it } from 'vitest';

function browser() {
  let reloads = 0;
  return {
    ports: { storage: window.sessionStorage, reload: () => void (reloads += 1) },
    reloads: () => reloads,
  };
}

describe('a page whose script is gone', () => {
  it('reloads once and not again within half a minute', () => {
    const { ports, reloads } = browser();
    expect(reloadOnce(ports, 1_000_000)).toBe(true);
    expect(reloadOnce(ports, 1_010_000)).toBe(false);
    expect(reloadOnce(ports, 1_029_999)).toBe(false);
    expect(reloads()).toBe(1);
  });

  it('reloads again when a later version is put in place', () => {
    const { ports, reloads } = browser();
    reloadOnce(ports, 1_000_000);
    expect(reloadOnce(ports, 1_030_000)).toBe(true);
    expect(reloads()).toBe(2);
  });
});

import { describe, expect, it } from 'vitest';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { CONTRACT_PATHS } from './contract-paths.ts';
import { expectFinite } from './expect-finite.ts';
import { ODD_ROOMS } from './odd-rooms.ts';

const known = new Set([...METHODS, ...MODELS].map(({ ref }) => ref));

function at(tally: RoomTally, path: string): unknown {
  return path.split('.').reduce<unknown>((value, key) => (value as Record<string, unknown> | undefined)?.[key], tally);
}

describe.each(Object.entries(ODD_ROOMS))('%s', (_name, input) => {
  const tally = estimateRoom(input);
  const missing = tally.missing.map(({ path }) => path);

  it('has every path of the contract, or says which input it lacks', () => {
    const lost = CONTRACT_PATHS.filter(
      (path) => at(tally, path) === undefined && !missing.some((one) => path === one || path.startsWith(`${one}.`)),
    );
    expect(lost).toEqual([]);
  });

  it('lists nothing as missing that is there', () => {
    const both = missing.filter((path) => !path.includes('[') && at(tally, path) !== undefined);
    expect(both).toEqual([]);
  });

  it('says why and which input for everything missing', () => {
    for (const { path, section, input: wanted, why } of tally.missing) {
      expect(path.startsWith(section)).toBe(true);
      expect(wanted.length).toBeGreaterThan(0);
      expect(why).toMatch(/\.$/);
    }
  });

  it('has no NaN and no Infinity, with workings or without', () => {
    expectFinite(tally);
    expectFinite(estimateRoom(input, { workings: true }));
  });

  it('gives the same numbers with workings', () => {
    expect(estimateRoom(input, { workings: true })).toMatchObject(JSON.parse(JSON.stringify(tally)) as object);
  });

  it('names a listed method beside every number, and a source in every working', () => {
    const walk = (value: unknown): void => {
      if (value === null || typeof value !== 'object') return;
      if ('method' in value) {
        expect(known).toContain(value.method);
        expect((value as { sources?: unknown[] }).sources?.length).toBeGreaterThan(0);
        expect((value as { steps?: unknown[] }).steps?.length).toBeGreaterThan(1);
      }
      Object.values(value).forEach(walk);
    };
    walk(estimateRoom(input, { workings: true }));
  });
});

import { nextAfterSignIn, paths, patterns } from '@embertally/web/src/lib/paths.ts';
import { describe, expect, it } from 'vitest';

describe('paths', () => {
  it('fill in what their pattern names', () => {
    expect(paths.workings('s 1', 'r/2')).toBe('/surveys/s%201/rooms/r%2F2/workings');
    expect(Object.keys(paths)).toEqual(expect.arrayContaining(Object.keys(patterns)));
    expect(paths.nextVersion('a/b', 2)).toBe(`${patterns.newMaterial}?of=a%2Fb&from=2`);
  });
});

describe('where to go after signing in', () => {
  it.each([
    ['?next=%2Fsites%2F1%3Fsort%3Dname', '/sites/1?sort=name'],
    ['', '/'],
    ['?next=', '/'],
  ])('%s leads to %s', (search, to) => {
    expect(nextAfterSignIn(search)).toBe(to);
  });

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'javascript:alert(1)',
    '/sign-in',
  ])('never leads to %s', (next) => {
    expect(nextAfterSignIn(`?${new URLSearchParams({ next }).toString()}`)).toBe('/');
  });
});

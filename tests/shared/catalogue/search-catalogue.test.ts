import { searchCatalogue } from '@embertally/shared/catalogue/search-catalogue';
import { describe, expect, it } from 'vitest';

const keys = (query: string, recent: readonly string[] = []) =>
  searchCatalogue(query, { recent }).map((hit) => hit.row.key);

describe('searchCatalogue', () => {
  it('answers two letters, labels that begin so first', () => {
    const hits = searchCatalogue('pa');
    expect(hits.length).toBeGreaterThan(5);
    const labels = hits.map((hit) => hit.row.label.toLowerCase());
    const lastPrefix = labels.findLastIndex((label) => label.startsWith('pa'));
    expect(labels.slice(0, lastPrefix + 1).every((label) => label.startsWith('pa'))).toBe(true);
  });

  it.each([
    ['armchair', 'upholstered-chair'],
    ['gasoline', 'petrol'],
    ['plasterboard', undefined],
    ['christmas', 'dry-tree'],
    ['turps', 'turpentine'],
    ['fridge', 'refrigerator'],
    ['pallet wood', 'pallet-stack'],
    ['MDF', 'mdf'],
  ])('finds “%s” by label or synonym', (query, key) => {
    if (key === undefined) expect(keys(query)).toEqual([]);
    else expect(keys(query)).toContain(key);
  });

  it('wants every word, in any order', () => {
    expect(keys('rack cotton')[0]).toBe('costume-rack-cotton');
    expect(keys('cotton rack')).toContain('costume-rack-cotton');
    expect(keys('cotton submarine')).toEqual([]);
  });

  it('takes no notice of capitals, diacritics and punctuation', () => {
    expect(keys('SOFÁ')[0]).toBe('sofa');
    expect(keys('lever arch')).toEqual(keys('Lever-arch'));
    expect(keys('lever arch')[0]).toBe('lever-arch-shelving');
  });

  it('looks inside words from three letters on', () => {
    expect(keys('styrene')).toContain('polystyrene');
    expect(keys('yr')).not.toContain('polystyrene');
  });

  it('puts what was used last before its equals, and never before a better match', () => {
    expect(keys('shelving of', ['magazines', 'paperbacks']).slice(0, 2)).toEqual(['magazines', 'paperbacks']);
    expect(keys('sofa', ['magazines'])[0]).toBe('sofa');
  });

  it('offers what was used last, newest first, before anything is typed', () => {
    expect(keys('', ['sofa', 'paper'])).toEqual(['sofa', 'paper']);
    expect(keys('  ')).toEqual([]);
    expect(keys('', ['no-longer-there'])).toEqual([]);
  });

  it('gives kinds before materials among equals, and no more than asked for', () => {
    const hits = searchCatalogue('cot', { limit: 4 });
    expect(hits.length).toBeLessThanOrEqual(4);
    expect(searchCatalogue('s', { limit: 3 })).toHaveLength(3);
    const types = searchCatalogue('timber').map((hit) => hit.type);
    expect(types).toContain('kind');
    expect(types).toContain('material');
  });
});

import { historySentence } from '@embertally/web/src/features/sites/history-sentence.ts';
import { describe, expect, it } from 'vitest';

const reader = {
  units: 'SI' as const,
  memberName: (id: string) => (id === 'm1' ? 'Bram Lindholm' : undefined),
};
const by = { name: 'Ines Okoro', organisation_name: 'Harbourwell Fire Office' };

function sentence(
  action: string,
  facts: Record<string, string | number | null> = {},
  id = 'm1',
  who: typeof by | null = by,
) {
  return historySentence({ action, by: who, facts, object: { kind: 'x', id } }, reader);
}

describe('one line of a history', () => {
  it.each([
    ['site-role.given', { role: 'reviewer' }, 'Ines Okoro gave Bram Lindholm the role reviewer'],
    ['building.made', { name: 'Main building' }, 'Ines Okoro made the building “Main building”'],
    [
      'limit.set',
      { quantity: 'load_per_floor_MJ_m2', bound: 680, source: 'permit' },
      'Ines Okoro set a limit on fire load density, 680 MJ/m²',
    ],
    ['access.refused', { wanted: 'site-role.give' }, 'Ines Okoro was refused: site role give'],
  ])('of %s reads as a sentence', (action, facts, words) => {
    expect(sentence(action, facts)).toBe(words);
  });

  it('names somebody who has left by what is known', () => {
    expect(sentence('site-role.taken', { role: 'viewer' }, 'gone')).toBe(
      'Ines Okoro took the role viewer from somebody who has no role here now',
    );
  });

  it('of something not yet put into words is still told', () => {
    expect(sentence('trial.offered')).toBe('Ines Okoro: trial offered');
  });

  it('without a person is the system’s', () => {
    expect(sentence('site.edited', {}, 'm1', null)).toBe('The system changed the site’s name, address or time zone');
  });

  it('with a quantity it does not know keeps its sense', () => {
    expect(sentence('limit.set', { quantity: 'smoke', bound: 3 })).toBe('Ines Okoro set a limit on a room');
  });
});

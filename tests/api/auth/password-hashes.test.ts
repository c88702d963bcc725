import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PasswordHashes } from '../../../api/src/auth/password-hashes.ts';
import { Fault } from '../../../api/src/fault.ts';
import { TestApp } from '../../support/test-app.ts';

const FLOOR = { memory_KiB: 19_456, passes: 2 };

describe('a crowd at the door', () => {
  it('is served four at once with fifty waiting; the rest is asked to come back', async () => {
    const hashes = new PasswordHashes(FLOOR);
    // The hash for accounts nobody has takes its turn first.
    await hashes.check('x', null);
    const outcomes = await Promise.allSettled(Array.from({ length: 70 }, () => hashes.make('seven lanterns')));
    const refused = outcomes.filter((outcome) => outcome.status === 'rejected');
    expect(refused).toHaveLength(70 - 54);
    for (const outcome of refused) {
      expect(outcome.reason).toBeInstanceOf(Fault);
      expect(outcome.reason).toMatchObject({ kind: 'too-many', retryAfter_s: 5 });
    }
    // The door opens again.
    expect(await hashes.make('seven lanterns')).toMatch(/^\$argon2id\$/);
  });

  describe('of the whole product', () => {
    let app: TestApp;
    beforeAll(async () => {
      app = await TestApp.open();
    });
    afterAll(() => app.close());

    it('leaves the process answering meanwhile', async () => {
      let done = false;
      const crowd = Promise.all(
        Array.from({ length: 40 }, (_, one) =>
          app.visitor().post('/api/sessions', { email: `a${one}@b.example`, password: 'seven lanterns' }),
        ),
      ).finally(() => (done = true));
      for (let look = 0; look < 5; look += 1) {
        await app.visitor().get('/api/health/live').expect(200);
        expect(done, 'the process answered while the crowd was waiting').toBe(false);
      }
      for (const answer of await crowd) expect([401, 429]).toContain(answer.status);
    });
  });
});

describe('a stored hash', () => {
  it('is known to be weak when it took less work than is asked now', async () => {
    const cheap = await new PasswordHashes(FLOOR).make('seven lanterns');
    expect(new PasswordHashes(FLOOR).isWeak(cheap)).toBe(false);
    expect(new PasswordHashes({ memory_KiB: 65_536, passes: 3 }).isWeak(cheap)).toBe(true);
  });
});

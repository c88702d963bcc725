import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import { TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
});
afterAll(() => app.close());

const input = (more: object = {}, room: object = {}) => ({
  room: {
    name: 'Dock',
    use: null,
    ring_m: [
      [0, 0],
      [12, 0],
      [12, 8],
      [0, 8],
    ],
    height_m: 3.6,
    ...room,
  },
  contents: [{ id: 'a', label: 'Flats', count: 40, parts: [{ net_heat_MJ_kg: 17.5, label: 'board', mass_kg: 18 }] }],
  ...more,
});

describe('an estimate', () => {
  it('is the tally of the room, with workings when they are asked for', async () => {
    // 40 × 18 kg × 17.5 MJ/kg = 12,600 MJ on 12 × 8 = 96 m².
    const plain = await person.visitor.post('/api/estimates', input()).expect(200);
    expect(plain.body).toMatchObject({
      load: { total: { value: 12_600, unit: 'MJ' }, perFloor: { value: 131.25, unit: 'MJ/m2' } },
    });
    expect(plain.text).not.toContain('"steps"');
    const worked = await person.visitor.post('/api/estimates?workings=1', input()).expect(200);
    const total = (worked.body as { load: { total: Record<string, unknown> } }).load.total;
    expect(total).toMatchObject({
      value: 12_600,
      inputs: expect.any(Array) as unknown[],
      steps: expect.any(Array) as unknown[],
      sources: expect.any(Array) as unknown[],
    });
    expect(plain.text).not.toMatch(/NaN|Infinity/);
  });

  it('of a room without openings or contents says what is missing and divides by nothing', async () => {
    const answer = await person.visitor.post('/api/estimates', input({ contents: [] })).expect(200);
    expect((answer.body as { missing: object[] }).missing.length).toBeGreaterThan(0);
    expect(answer.text).not.toMatch(/NaN|Infinity/);
  });

  it('with faults lists every one, and computes nothing', async () => {
    const answer = await person.visitor
      .post(
        '/api/estimates',
        input({ extra: 1, contents: [{ id: 'a', count: -1, parts: [{ mass_kg: 'x' }] }] }, { height_m: 0 }),
      )
      .expect(422);
    const pointers = (answer.body as { errors: { pointer: string }[] }).errors.map((error) => error.pointer);
    expect(pointers).toEqual(
      expect.arrayContaining(['/extra', '/contents/0/count', '/contents/0/parts/0/mass_kg', '/room/height_m']),
    );
  });

  it.each([
    [
      'a room that crosses itself',
      input(
        {},
        {
          ring_m: [
            [0, 0],
            [4, 4],
            [4, 0],
            [0, 4],
          ],
        },
      ),
    ],
    [
      'a material nobody knows',
      input({ contents: [{ id: 'a', count: 1, parts: [{ material: 'unobtainium', mass_kg: 1 }] }] }),
    ],
    [
      'more than 1,000 t in an entry',
      input({ contents: [{ id: 'a', count: 2000, parts: [{ net_heat_MJ_kg: 17, mass_kg: 1000 }] }] }),
    ],
    ['more samples than are drawn here', input({ options: { samples: 100_001 } })],
    ['nothing', {}],
  ])('of %s is refused', async (_name, body) => {
    const answer = await person.visitor.post('/api/estimates', body).expect(422);
    expect((answer.body as { errors: object[] }).errors.length).toBeGreaterThan(0);
  });

  it('with samples is what the same process would have computed, band and all', async () => {
    const sampled = input({ options: { samples: 2000, seed: 9 } });
    const parsed = parseRoomInput(sampled);
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
    const answer = await person.visitor.post('/api/estimates?workings=1', sampled).expect(200);
    expect(answer.text).toBe(JSON.stringify(estimateRoom(parsed.value, { workings: true })));
    expect(answer.body).toMatchObject({
      load: { band: { p95: { method: 'uncertainty.monte-carlo@1' } } },
      uncertainty: { samples: 2000, seed: 9 },
    });
    expect(answer.text).not.toMatch(/NaN|Infinity/);
  });

  it('with entries on the plan says which ignites which, as the same process would', async () => {
    const [flats] = input().contents;
    const placed = input({
      contents: [1, 2].map((x_m) => ({
        ...flats,
        id: `at ${x_m}`,
        x_m,
        y_m: 1,
        width_m: 0.5,
        depth_m: 0.5,
        height_m: 1,
      })),
    });
    const parsed = parseRoomInput(placed);
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
    const answer = await person.visitor.post('/api/estimates', placed).expect(200);
    expect(answer.text).toBe(JSON.stringify(estimateRoom(parsed.value)));
  });

  it('asked for very often is held back, and another person is not', async () => {
    const other = await app.person();
    const answers = await Promise.all(Array.from({ length: 150 }, () => person.visitor.post('/api/estimates', {})));
    const held = answers.filter((answer) => answer.status === 429);
    expect(held.length).toBeGreaterThan(0);
    for (const answer of held) expect(answer.headers['retry-after']).toBe('1');
    await other.visitor.post('/api/estimates', input()).expect(200);
  });
});

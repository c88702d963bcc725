import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { OwnMaterialSummary } from '@embertally/shared/contracts/own-materials';
import { seedDemo } from '../../../api/scripts/seed.ts';
import { TestApp } from '../../support/test-app.ts';

let app: TestApp;
let dataDir: string;
beforeAll(async () => {
  app = await TestApp.open();
  dataDir = mkdtempSync(join(tmpdir(), 'embertally-demo-'));
});
afterAll(async () => {
  await app.close();
  rmSync(dataDir, { recursive: true, force: true });
});

interface Demo {
  complete: boolean;
  people: { email: string; password: string; role: string }[];
}
const demo = (): Demo => JSON.parse(readFileSync(join(dataDir, 'demo.json'), 'utf8')) as Demo;
const seed = (): Promise<void> => {
  const { services, database } = app.house;
  return seedDemo({ services, database, clock: app.clock, dataDir });
};

describe('the demo book', () => {
  it('has materials of its own, made by two people: two in use, one waiting for the second', async () => {
    await seed();
    const manager = demo().people.find(({ role }) => role === 'manager');
    const visitor = app.visitor();
    await visitor.post('/api/sessions', { email: manager?.email, password: manager?.password }).expect(201);
    const { items } = (await visitor.get('/api/own-materials').expect(200)).body as { items: OwnMaterialSummary[] };
    expect(items.map(({ label, in_force, latest }) => [label, in_force, latest.state, latest.mine])).toEqual([
      ['Grey carving foam', 1, 'approved', true],
      ['Painted canvas flat', 1, 'approved', true],
      ['Wool serge for drapes', null, 'put-forward', false],
    ]);
    for (const { latest } of items) expect(latest.author).not.toBe(latest.decided_by);
    const foam = await visitor.get(`/api/own-materials/${items[0]?.id ?? ''}/versions/1`).expect(200);
    expect(foam.body).toMatchObject({ evidence: [{ name: 'Report 31, table 2.csv' }] });
    // Handbooks have flexible polyurethane foams between 23 and 28 MJ/kg net (from memory).
    expect(items[0]?.latest.net_MJ_kg).toBeGreaterThan(23);
    expect(items[0]?.latest.net_MJ_kg).toBeLessThan(28);
  }, 60_000);

  it('is finished by the next start when one was cut short, and no thing is made twice', async () => {
    const count = async (): Promise<string> =>
      JSON.stringify(
        (
          await app.owner.query(
            'SELECT m.tag, v.version, v.state FROM own_material m JOIN own_material_version v ON v.material_id = m.id ORDER BY m.label',
          )
        ).rows,
      );
    const before = await count();
    writeFileSync(join(dataDir, 'demo.json'), JSON.stringify({ ...demo(), complete: false }));
    await seed();
    expect(await count()).toBe(before);
    expect(demo().complete).toBe(true);
  }, 60_000);
});

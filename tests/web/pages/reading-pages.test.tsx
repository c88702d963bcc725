import { kindSchema, listKinds } from '@embertally/shared/contracts/catalogue';
import { listMaterials, materialSchema } from '@embertally/shared/contracts/materials';
import { listCautions } from '@embertally/shared/contracts/cautions';
import { readCurrentSession } from '@embertally/shared/contracts/sessions';
import { fireEvent, screen, within } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import type { z } from 'zod/mini';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleMe } from '../../support/web-samples.ts';

type Material = z.input<typeof materialSchema>;
type Kind = z.input<typeof kindSchema>;

const SOURCE = { title: 'A handbook', locator: 'table 3', fromMemory: true };

function material(key: string, label: string, heat: number, change: Partial<Material> = {}): Material {
  return materialSchema.parse({
    key,
    label,
    synonyms: [],
    group: 'foams',
    net_heat_MJ_kg: heat,
    low_MJ_kg: heat - 2,
    high_MJ_kg: heat + 2,
    gross_heat_MJ_kg: null,
    formula: null,
    cellulosic: false,
    combustion_factor: 1,
    ignition_class: 'easy',
    radiative_fraction: 0.35,
    soot_yield: null,
    co_yield: null,
    bulk_density_kg_m3: null,
    moisture_pct_dry: null,
    hazards: [],
    source: SOURCE,
    own: null,
    ...change,
  });
}

const CHAIR: Kind = kindSchema.parse({
  key: 'chair',
  label: 'Upholstered chair',
  synonyms: ['armchair'],
  group: 'furniture',
  parts: [
    { material: 'pu', mass_kg: 6 },
    { material: 'wood', mass_kg: 14 },
  ],
  mass_low_kg: 15,
  mass_high_kg: 30,
  width_m: 0.8,
  depth_m: 0.8,
  height_m: 0.9,
  growth: 'fast',
  peak_kW: 1500,
  radiative_fraction: null,
  ignition_class: 'normal',
  enclosure: 'open',
  keeping: 'stored',
  measure: { by: 'pieces', quantity: 1 },
  hazards: [],
  source: SOURCE,
});

let server: FakeServer;
beforeEach(() => {
  server = fakeServer();
  server.answer(readCurrentSession, {}, sampleMe());
  server.answer(
    listMaterials,
    {},
    {
      items: [
        material('pu', 'Polyurethane foam', 25, { synonyms: ['PUR', 'sponge'] }),
        material('ps', 'Polystyrène foam', 39.5),
        material('wool', 'Wool', 21, { group: 'textiles', hazards: ['smouldering'] }),
      ],
    },
  );
  server.answer(listKinds, {}, { items: [CHAIR] });
});

const labels = () => screen.getAllByRole('rowheader').map((cell) => cell.firstChild?.textContent);

describe('the catalogue', () => {
  it('shows each heat with its range, its unit and its source', async () => {
    renderApp('/catalogue');
    const wool = (await screen.findByRole('rowheader', { name: /^Wool/ })).closest('tr') as HTMLElement;
    const cells = within(wool)
      .getAllByRole('cell')
      .map((cell) => cell.textContent);
    expect(cells).toEqual(['textiles', '21.0 MJ/kg', '19.0 – 23.0 MJ/kg', '–', 'A handbook; table 3 (from memory)']);
  });

  it.each([
    ['poly', ['Polyurethane foam', 'Polystyrène foam']],
    ['POLYSTYRENE', ['Polystyrène foam']],
    ['spon', ['Polyurethane foam']],
    ['text smould', ['Wool']],
    ['oam', []],
  ])('“%s” finds what has a word beginning so', async (typed, found) => {
    const app = renderApp('/catalogue');
    await screen.findByText('3 materials');
    fireEvent.change(screen.getByLabelText('Find a material or kind'), { target: { value: typed } });
    if (found.length === 0) await screen.findByText(`No materials fit “${typed}”`);
    else {
      await screen.findByText(`${found.length} of 3 materials`);
      expect(labels()).toEqual(found);
    }
    expect(new URLSearchParams(app.path().split('?')[1]).get('find')).toBe(typed);
  });

  it('shows kinds with the mass of their parts, reached by its tab', async () => {
    const app = renderApp('/catalogue');
    fireEvent.click(await screen.findByRole('tab', { name: 'Kinds' }));
    const chair = (await screen.findByRole('rowheader', { name: /^Upholstered chair/ })).closest('tr') as HTMLElement;
    expect(within(chair).getAllByRole('cell')[0]?.textContent).toBe('20.0 kg');
    expect(app.path()).toBe('/catalogue?list=kinds');
  });

  it('says when a list cannot be read', async () => {
    server.refuse(listMaterials, {}, 403, 'Not for this role.');
    renderApp('/catalogue');
    expect((await screen.findByRole('alert')).textContent).toContain('The materials could not be read');
  });
});

describe('the cautions', () => {
  const CAUTIONS = [
    { id: 'a', title: 'Figures for planning', text: 'They approve no use.' },
    { id: 'b', title: 'A survey ages', text: 'Survey again.' },
  ];

  it('are read in full by anybody, signed in or not', async () => {
    server.answer(listCautions, {}, { items: CAUTIONS });
    renderApp('/cautions', { signedIn: false });
    await screen.findByRole('heading', { name: 'Figures for planning', level: 2 });
    expect(screen.getByText('They approve no use.')).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Sign in' }).getAttribute('href')).toBe('/sign-in?next=%2Fcautions');
  });

  it('missing is itself said to be wrong', async () => {
    server.answer(listCautions, {}, { items: [] });
    renderApp('/cautions');
    expect(await screen.findByText(/Do not rely on results/)).toBeTruthy();
  });
});

describe('an address that leads nowhere', () => {
  it('says so and offers a way on', async () => {
    renderApp('/no/such/page');
    await screen.findByRole('heading', { name: 'There is no such page', level: 1 });
    expect(screen.getByRole('link', { name: 'Go to Today' })).toBeTruthy();
  });
});

import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { findCycle, importsOf, root, sourceFiles } from './support/import-graph.ts';
import { methodsTable } from './support/methods-table.ts';

const files = sourceFiles('shared/src', 'api/src', 'api/scripts', 'web/src');
const imports = new Map(files.map((file) => [file, importsOf(file)]));

/** Layers from the bottom up: a file may import its own layer (unless `closed`) and the layers it names. */
const LAYERS: readonly { readonly prefix: string; readonly may: readonly string[]; readonly closed?: true }[] = [
  { prefix: 'shared/src/units/', may: ['shared/src/units/'] },
  { prefix: 'shared/src/geometry/', may: ['shared/src/geometry/'] },
  { prefix: 'shared/src/policy/', may: ['shared/src/policy/'] },
  {
    prefix: 'shared/src/catalogue/',
    may: ['shared/src/catalogue/', 'shared/src/units/', 'shared/src/chemistry/', 'shared/src/survey/versions/'],
  },
  {
    prefix: 'shared/src/methods/',
    may: ['shared/src/methods/', 'shared/src/units/', 'shared/src/geometry/', 'shared/src/chemistry/'],
  },
  { prefix: 'shared/src/', may: ['shared/src/'] },
  { prefix: 'api/src/entities/', may: ['api/src/entities/', 'shared/src/'] },
  { prefix: 'api/src/migrations/', may: ['api/src/migrations/'] },
  {
    prefix: 'api/src/repositories/',
    may: ['api/src/repositories/', 'api/src/entities/', 'api/src/actor.ts', 'shared/src/'],
  },
  { prefix: 'api/', may: ['api/', 'shared/src/'] },
  { prefix: 'web/src/lib/', may: ['web/src/lib/', 'shared/src/'] },
  { prefix: 'web/src/components/', may: ['web/src/components/', 'web/src/lib/', 'shared/src/'] },
  { prefix: 'web/src/book/', may: ['web/src/book/', 'web/src/components/', 'web/src/lib/', 'shared/src/'] },
  { prefix: 'web/src/styles/', may: ['web/src/styles/'] },
  { prefix: 'web/', may: ['web/', 'shared/src/'] },
];

/** Packages that one place wraps. */
const WRAPPED: readonly { readonly name: RegExp; readonly where: readonly RegExp[] }[] = [
  {
    name: /^typeorm$/,
    where: [
      /^api\/src\/(entities|migrations|repositories)\//,
      /^api\/src\/data-source\.ts$/,
      /^api\/src\/migrate\.ts$/,
    ],
  },
  { name: /^lucia$/, where: [/^api\/src\/auth\/sessions\.ts$/] },
  { name: /^(pdf-lib|@pdf-lib\/fontkit)$/, where: [/^api\/src\/reports\/pdf\//] },
  { name: /^(konva|react-konva)$/, where: [/^web\/src\/book\/canvas\//] },
  { name: /^pg-boss$/, where: [/^api\/src\/jobs\//] },
];

describe('the tree', () => {
  it('holds only what it may at the top level', () => {
    const tracked = execFileSync('git', ['ls-files'], { cwd: root, encoding: 'utf8' }).split('\n').filter(Boolean);
    const top = [...new Set(tracked.map((path) => path.split('/')[0] ?? ''))];
    const odd = top.filter(
      (name) =>
        !/^(package\.json|package-lock\.json|web|api|shared|tests|README\.md|DEVELOPERS\.md|SAFETY\.md|\..+|[\w.-]+\.config\.\w+|tsconfig[\w.-]*\.json)$/.test(
          name,
        ),
    );
    expect(odd).toEqual([]);
  });

  it('imports only downwards', () => {
    const wrong: string[] = [];
    for (const [file, { files: targets }] of imports) {
      const layer = LAYERS.find(({ prefix }) => file.startsWith(prefix));
      if (!layer) continue;
      for (const target of targets)
        if (!layer.may.some((prefix) => target.startsWith(prefix))) wrong.push(`${file} → ${target}`);
    }
    expect(wrong).toEqual([]);
  });

  it('keeps features apart and routes away from repositories of rows', () => {
    const wrong: string[] = [];
    for (const [file, { files: targets }] of imports) {
      const feature = /^web\/src\/features\/([^/]+)\//.exec(file)?.[1];
      for (const target of targets) {
        const other = /^web\/src\/features\/([^/]+)\//.exec(target)?.[1];
        if (feature !== undefined && other !== undefined && other !== feature) wrong.push(`${file} → ${target}`);
        if (feature !== undefined && /^web\/src\/(pages|book)\//.test(target)) wrong.push(`${file} → ${target}`);
        if (file.startsWith('api/src/routes/') && /^api\/src\/(entities|repositories)\//.test(target))
          wrong.push(`${file} → ${target}`);
        if (file.startsWith('api/src/services/') && target.startsWith('api/src/routes/'))
          wrong.push(`${file} → ${target}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('has no import cycle, types included', () => {
    expect(findCycle(new Map([...imports].map(([file, { files: targets }]) => [file, targets])))).toBeNull();
  });

  it('imports only files that are there', () => {
    const missing = [...imports].flatMap(([file, { files: targets }]) =>
      targets.filter((target) => !existsSync(join(root, target))).map((target) => `${file} → ${target}`),
    );
    expect(missing).toEqual([]);
  });

  it('has no barrel files and no drawer for odds and ends', () => {
    const odd = files.filter(
      (file) => /(^|\/)(index|utils|helpers|common|misc)\.(ts|tsx)$/.test(file) && file !== 'api/src/index.ts',
    );
    expect(odd).toEqual([]);
  });

  it('wraps each given library in one place', () => {
    const wrong: string[] = [];
    for (const [file, { packages }] of imports)
      for (const { name, where } of WRAPPED)
        for (const found of packages.filter((pkg) => name.test(pkg)))
          if (!where.some((place) => place.test(file))) wrong.push(`${file} → ${found}`);
    expect(wrong).toEqual([]);
  });

  it('reads the environment where the process starts and nowhere else', () => {
    const readers = sourceFiles('api/src').filter((file) =>
      readFileSync(join(root, file), 'utf8').includes('process.env'),
    );
    expect(readers).toEqual(['api/src/index.ts']);
  });

  it('draws chance only from seeds that come in', () => {
    const using = files.filter((file) => readFileSync(join(root, file), 'utf8').includes('Math.random'));
    expect(using).toEqual([]);
  });

  it('writes no URL of the client outside its one list', () => {
    const pages = readdirSync(join(root, 'web/src'), { recursive: true, encoding: 'utf8' }).filter((name) =>
      /\.tsx?$/.test(name),
    );
    const wrong = pages.filter(
      (name) =>
        !/^(lib\/paths|routes)\.tsx?$/.test(name) &&
        /\b(to|href)=("|\{`)\/(?!assets|api)/.test(readFileSync(join(root, 'web/src', name), 'utf8')),
    );
    expect(wrong).toEqual([]);
  });
});

describe('the methods', () => {
  it('stand in the table of SAFETY.md as they are declared and held (npm run safety writes it)', async () => {
    expect(readFileSync(join(root, 'SAFETY.md'), 'utf8')).toContain(await methodsTable());
  });

  it('are each held to at least one value from outside', async () => {
    const table = await methodsTable();
    const loose = [...METHODS, ...MODELS].filter(
      ({ id }) => !new RegExp(`\\| \`${id}\` \\|.*\\| \\d+ (published|independently|invariant)`).test(table),
    );
    expect(loose.map(({ id }) => id)).toEqual([]);
  });
});

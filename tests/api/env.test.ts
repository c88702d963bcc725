import { describe, expect, it } from 'vitest';
import { EnvError, readEnv } from '../../api/src/env.ts';

const DATABASE_URL = 'postgres://embertally_app:x@127.0.0.1:5432/embertally';
const read = (more: Record<string, string>) => () => readEnv({ DATABASE_URL, ...more });

describe('the settings', () => {
  it('have defaults for a machine of one’s own', () => {
    const env = readEnv({ DATABASE_URL });
    expect(env).toMatchObject({ mode: 'production', port: 3000, host: '127.0.0.1', demo: false, trustProxy: 0 });
    expect(env.baseUrl.href).toBe('http://127.0.0.1:3000/');
    expect(env).toMatchObject({ hashMemory_KiB: 65_536, hashPasses: 3, migrationDatabaseUrl: null });
  });

  it.each([
    ['a public address without its https name', { HOST: '0.0.0.0' }],
    ['a public address under http', { HOST: '0.0.0.0', BASE_URL: 'http://fire.example' }],
    [
      'a public address while developing',
      { HOST: '0.0.0.0', BASE_URL: 'https://fire.example', NODE_ENV: 'development' },
    ],
    ['a port that is none', { PORT: '70000' }],
    ['a hash below the floor', { HASH_MEMORY_KIB: '1024' }],
    ['a hash of one pass', { HASH_PASSES: '1' }],
    ['a database that is none', { DATABASE_URL: 'mysql://x' }],
    ['a base address that is none', { BASE_URL: 'javascript:alert(1)' }],
  ])('refuse %s in one sentence', (_name, more) => {
    expect(read(more)).toThrow(EnvError);
    expect(read(more)).toThrow(/^[^\n]+\.$/);
  });

  it('take a public address under https', () => {
    expect(read({ HOST: '0.0.0.0', BASE_URL: 'https://fire.example' })()).toMatchObject({ host: '0.0.0.0' });
  });

  it('need a database', () => {
    expect(() => readEnv({})).toThrow(/DATABASE_URL/);
  });
});

import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { passwordFault } from '../../../api/src/auth/password-rules.ts';
import { TestApp } from '../../support/test-app.ts';

const about = { email: 'bridget.harrow@millpond.example', name: 'Bridget Harrow', organisation: 'Millpond Carpets' };
const codeOf = (password: string): string | null => passwordFault(password, about, '/password')?.code ?? null;

describe('a new password', () => {
  it.each([
    ['fourteen chars', 'PASSWORD_TOO_SHORT'],
    ['aaaaaaaaaaaaaaaaaaaa', 'PASSWORD_COMMON'],
    ['passwordpassword', 'PASSWORD_COMMON'],
    ['Password1!Password1!', 'PASSWORD_COMMON'],
    ['iloveyou!!!!!!!!!!', 'PASSWORD_COMMON'],
    ['bridget.harrow@millpond.example', 'PASSWORD_ABOUT_YOU'],
    ['Millpond Carpets 1987', 'PASSWORD_ABOUT_YOU'],
    ['embertally number 1', 'PASSWORD_ABOUT_YOU'],
    ['x'.repeat(7) + 'seven lanterns ö'.repeat(20), 'PASSWORD_TOO_LONG'],
  ])('%s is refused as %s', (password, code) => {
    expect(codeOf(password)).toBe(code);
  });

  it.each([
    'seven lanterns over the harbour',
    '      two owls, six gulls',
    'ключ под третьим камнем',
    '🔥🧯🚒 fifteen code points',
    `${'correct horse '.repeat(4)}battery`,
  ])('%s will do', (password) => {
    expect(codeOf(password)).toBeNull();
  });

  it('may be as long as 256 bytes and no longer', () => {
    const words = 'harbour lantern seven over tide wind quay rope salt mast gull ';
    const long = words.repeat(5).slice(0, 256);
    expect(codeOf(long)).toBeNull();
    expect(codeOf(`${long}x`)).toBe('PASSWORD_TOO_LONG');
  });
});

describe('signing up', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await TestApp.open();
  });
  afterAll(() => app.close());

  const signUp = (email: string, password: string) =>
    app
      .visitor()
      .post('/api/organisations', { id: randomUUID(), organisation_name: 'Millpond', name: 'Bea', email, password });

  it('keeps every character of the password: the last one counts', async () => {
    const password = ' 𝔉our wörds — and a 🔥 ';
    await signUp('bea@millpond.example', password).expect(202);
    const tryIn = (tried: string) =>
      app.visitor().post('/api/sessions', { email: 'bea@millpond.example', password: tried });
    await tryIn(password).expect(201);
    await tryIn(password.trimEnd()).expect(401);
    await tryIn(password.toUpperCase()).expect(401);
  });

  it('answers the same for an address that has an account, and changes nothing of it', async () => {
    await signUp('cy@millpond.example', 'seven lanterns over the harbour').expect(202, { accepted: true });
    await signUp('CY@millpond.example ', 'another set of long words here').expect(202, { accepted: true });
    const tryIn = (password: string) => app.visitor().post('/api/sessions', { email: 'cy@millpond.example', password });
    await tryIn('another set of long words here').expect(401);
    await tryIn('seven lanterns over the harbour').expect(201);
    const rows = await app.owner.query("SELECT 1 FROM person WHERE email = 'cy@millpond.example'");
    expect(rows.rowCount).toBe(1);
  });

  it('says why a password will not do, at its field', async () => {
    const answer = await signUp('di@millpond.example', 'short').expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/password', code: 'PASSWORD_TOO_SHORT' }] });
  });

  it('stores argon2id and never the password', async () => {
    await signUp('ed@millpond.example', 'seven lanterns over the harbour').expect(202);
    const rows = await app.owner.query<{ password_hash: string }>(
      "SELECT password_hash FROM person WHERE email = 'ed@millpond.example'",
    );
    expect(rows.rows[0]?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });
});

describe('adding a colleague', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await TestApp.open();
  });
  afterAll(() => app.close());

  it('is an admin’s to do, and gives an account in the same organisation', async () => {
    const admin = await app.person('Ada Fell', 'Millpond Carpets');
    const colleague = await app.colleague(admin);
    expect(colleague).toMatchObject({ organisationId: admin.organisationId, organisationRole: 'member' });
    await expect(app.colleague(colleague)).rejects.toMatchObject({ kind: 'forbidden' });
  });
});

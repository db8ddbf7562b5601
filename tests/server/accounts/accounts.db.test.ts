import { createHash, randomUUID } from 'node:crypto';
import request from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { createApp } from '../../../server/app.ts';
import { signIn, signUp, whoAmI } from '../../../shared/contracts/accounts.ts';
import { cookieOf } from '../../support/server-cookies.ts';
import { emailOf, openTestServer, password, type TestServer } from '../../support/server.ts';

let server: TestServer;
/** with counters of its own for each test */
let app: TestServer['app'];

beforeAll(async () => {
  server = await openTestServer();
});

beforeEach(() => {
  app = createApp(server.deps).app;
});

afterAll(() => server.close());

const post = (path: string, body: object, cookie = '') =>
  request(app).post(path).set('Cookie', cookie).send(body);

const me = async (cookie: string) => {
  const { body } = await request(app).get('/api/me').set('Cookie', cookie);
  return whoAmI.response.parse(body).signedIn;
};

const signInAs = (name: string, cookie = '') =>
  post('/api/sign-in', { email: emailOf(name), password }, cookie);

describe('signing in', () => {
  test('says who is signed in, where, in which role, and sets a cookie that scripts cannot read', async () => {
    const response = await signInAs('tom');
    expect(response.status).toBe(200);
    const { signedIn } = signIn.response.parse(response.body);
    const organisation = { id: server.organisations.school, name: 'North School' };
    expect(signedIn).toEqual({
      person: { id: await server.personId('tom'), name: 'tom', email: 'tom@school.example' },
      organisation,
      role: 'trainee',
      memberships: [{ organisation, role: 'trainee' }],
    });
    const [cookie = ''] = response.get('Set-Cookie') ?? [];
    expect(cookie).toMatch(/^coldbench_session=[^;]{30,};/);
    expect(cookie.split('; ').slice(1)).toEqual(
      expect.arrayContaining(['HttpOnly', 'SameSite=Lax', 'Path=/', 'Max-Age=2592000']),
    );
    expect(cookie).not.toContain('Secure');
    expect(await me(cookieOf(response))).toEqual(signedIn);
  });

  test('over https, as a trusted proxy says, the cookie is Secure and the browser told to stay', async () => {
    app = createApp({ ...server.deps, trustedProxies: 1 }).app;
    const response = await signInAs('tom').set('X-Forwarded-Proto', 'https');
    expect(response.get('Set-Cookie')?.[0]).toContain('Secure');
    expect(response.get('Strict-Transport-Security')).toContain('max-age=31536000');
  });

  test('what an untrusted caller says about https is not believed', async () => {
    const response = await signInAs('tom').set('X-Forwarded-Proto', 'https');
    expect(response.get('Set-Cookie')?.[0]).not.toContain('Secure');
    expect(response.get('Strict-Transport-Security')).toBeUndefined();
  });

  test('the address may be written in any case, with blanks around it', async () => {
    const response = await post('/api/sign-in', { email: '  TOM@School.Example ', password });
    expect(response.status).toBe(200);
  });

  test('a wrong password and an unknown address get the same answer', async () => {
    const wrong = await post('/api/sign-in', { email: emailOf('tom'), password: 'wrong' });
    const unknown = await post('/api/sign-in', { email: emailOf('who'), password });
    expect(wrong.status).toBe(401);
    expect(wrong.body.code).toBe('wrong-credentials');
    expect(unknown.body).toEqual(wrong.body);
    expect(wrong.get('Set-Cookie')).toBeUndefined();
  });

  test('each sign-in opens a new session and ends the one the browser came with', async () => {
    const first = cookieOf(await signInAs('tom'));
    const second = cookieOf(await signInAs('tom', first));
    expect(second).not.toBe(first);
    expect(await me(first)).toBeNull();
    expect(await me(second)).not.toBeNull();
  });

  test('a session id that somebody plants is not taken up', async () => {
    const planted = 'coldbench_session=chosenbytheattacker';
    const cookie = cookieOf(await signInAs('tom', planted));
    expect(cookie).not.toBe(planted);
    expect(await me(planted)).toBeNull();
  });

  test('ten mistakes lock this address out for a while, from here, and nobody else', async () => {
    for (let count = 0; count < 10; count += 1) {
      const { status } = await post('/api/sign-in', { email: emailOf('mina'), password: 'no' });
      expect(status).toBe(401);
    }
    const locked = await signInAs('mina');
    expect(locked.status).toBe(429);
    expect(locked.body.code).toBe('too-many-requests');
    expect(Number(locked.get('Retry-After'))).toBeGreaterThan(0);
    expect((await signInAs('tom')).status).toBe(200);
  });

  test('thirty people of a school behind one address all get in, again and again', async () => {
    for (let count = 0; count < 30; count += 1) {
      expect((await signInAs('tom')).status).toBe(200);
    }
  });
});

describe('sessions', () => {
  test('the database holds a hash of the session id and not the id', async () => {
    const cookie = cookieOf(await signInAs('tom'));
    const id = cookie.split('=')[1] ?? '';
    const hash = createHash('sha256').update(id).digest('hex');
    const rows = await server.raw.sql('SELECT id FROM session WHERE id IN ($1, $2)', [id, hash]);
    expect(rows).toEqual([{ id: hash }]);
    expect(await me(`coldbench_session=${hash}`)).toBeNull();
  });

  test('an expired one is nobody’s, and is deleted', async () => {
    const cookie = cookieOf(await signInAs('tom'));
    const id = createHash('sha256')
      .update(cookie.split('=')[1] ?? '')
      .digest('hex');
    await server.raw.sql(`UPDATE session SET expires_at = now() - interval '1 s' WHERE id = $1`, [
      id,
    ]);
    const response = await request(app).get('/api/jobs').set('Cookie', cookie);
    expect(response.status).toBe(401);
    expect(response.body.code).toBe('not-signed-in');
    expect(await server.raw.sql('SELECT 1 FROM session WHERE id = $1', [id])).toEqual([]);
  });

  test('one in use lasts on, and its cookie with it', async () => {
    const cookie = cookieOf(await signInAs('tom'));
    const id = createHash('sha256')
      .update(cookie.split('=')[1] ?? '')
      .digest('hex');
    await server.raw.sql(`UPDATE session SET expires_at = now() + interval '1 d' WHERE id = $1`, [
      id,
    ]);
    const response = await request(app).get('/api/me').set('Cookie', cookie);
    expect(cookieOf(response)).toBe(cookie);
    const [row] = await server.raw.sql(
      `SELECT expires_at > now() + interval '29 d' AS "isLong" FROM session WHERE id = $1`,
      [id],
    );
    expect(row).toEqual({ isLong: true });
  });

  test('signing out ends it here and takes the cookie away; again is no fault', async () => {
    const cookie = cookieOf(await signInAs('tom'));
    const response = await post('/api/sign-out', {}, cookie);
    expect(response.status).toBe(200);
    expect(response.get('Set-Cookie')?.at(-1)).toMatch(
      /^coldbench_session=;.*Expires=Thu, 01 Jan 1970/,
    );
    expect(await me(cookie)).toBeNull();
    expect((await post('/api/sign-out', {}, cookie)).status).toBe(200);
  });

  test('a role that is changed holds from the next request on', async () => {
    const cookie = cookieOf(await signInAs('mina'));
    const person = await server.personId('mina');
    await server.as('ada', 'patch', `/api/people/${person}`).send({ role: 'instructor' });
    const response = await request(app).get('/api/scenarios').set('Cookie', cookie);
    expect(response.status).toBe(200);
    await server.as('ada', 'patch', `/api/people/${person}`).send({ role: 'trainee' });
  });

  test('a person of two organisations works in one at a time, with its role and data', async () => {
    const person = await server.personId('nils');
    const { school, foreign } = server.organisations;
    await server.raw.sql(
      `INSERT INTO membership VALUES ($1, $2, 'instructor', '2026-02-01T00:00:00Z')`,
      [person, school],
    );
    const cookie = cookieOf(await signInAs('nils'));
    expect(await me(cookie)).toMatchObject({ organisation: { id: foreign }, role: 'trainee' });
    const refused = await request(app).get('/api/scenarios').set('Cookie', cookie);
    expect(refused.status).toBe(403);
    const moved = await post('/api/me/organisation', { organisation: school }, cookie);
    expect(moved.body.signedIn).toMatchObject({ organisation: { id: school }, role: 'instructor' });
    expect(await me(cookie)).toEqual(moved.body.signedIn);
    const allowed = await request(app).get('/api/scenarios').set('Cookie', cookie);
    expect(allowed.status).toBe(200);
    const nowhere = await post('/api/me/organisation', { organisation: randomUUID() }, cookie);
    expect(nowhere.status).toBe(404);
  });
});

describe('signing up', () => {
  const fields = () => ({
    name: 'Vera Lind',
    email: `Vera.${randomUUID()}@Home.example`,
    password: 'ten letters',
  });

  test('makes a person with a bench of their own, signed in, who sees the practice jobs', async () => {
    const sent = fields();
    const response = await post('/api/sign-up', sent);
    expect(response.status).toBe(200);
    const { signedIn, keptAttempt } = signUp.response.parse(response.body);
    expect(signedIn).toMatchObject({
      person: { name: 'Vera Lind', email: sent.email.toLowerCase() },
      organisation: { name: `Vera Lind's bench` },
      role: 'trainee',
    });
    expect(keptAttempt).toBeNull();
    const jobs = await request(app).get('/api/jobs').set('Cookie', cookieOf(response));
    expect(jobs.body.jobs).toHaveLength(1);
    const again = await post('/api/sign-in', { email: sent.email, password: sent.password });
    expect(again.status).toBe(200);
  });

  test('keeps what the visitor began, and the browser is no visitor any more', async () => {
    const visit = await post('/api/try', {});
    const visitor = cookieOf(visit);
    const { id } = visit.body.attempt;
    const response = await post('/api/sign-up', fields(), visitor);
    expect(response.body.keptAttempt).toBe(id);
    expect(response.get('Set-Cookie')).toEqual(
      expect.arrayContaining([expect.stringMatching(/^coldbench_visitor=;/)]),
    );
    const mine = await request(app).get('/api/attempts').set('Cookie', cookieOf(response));
    expect(mine.body.attempts).toMatchObject([{ id, person: { name: 'Vera Lind' } }]);
    const stale = await request(app).get(`/api/attempts/${id}`).set('Cookie', visitor);
    expect(stale.status).toBe(404);
  });

  test('an address that has an account is refused by name, in any spelling', async () => {
    const response = await post('/api/sign-up', { ...fields(), email: 'Tom@SCHOOL.example' });
    expect(response.status).toBe(409);
    expect(response.body).toMatchObject({ code: 'email-taken', errors: [{ path: 'email' }] });
  });

  test('of two at once with one address exactly one gets the account', async () => {
    const sent = fields();
    const both = await Promise.all([post('/api/sign-up', sent), post('/api/sign-up', sent)]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  test('the password is kept as argon2id with 46 MiB', async () => {
    const sent = fields();
    await post('/api/sign-up', sent);
    const [row] = await server.raw.sql('SELECT password_hash FROM person WHERE email = $1', [
      sent.email.toLowerCase(),
    ]);
    expect(row?.['password_hash']).toMatch(/^\$argon2id\$v=19\$m=47104,t=1,p=1\$/);
  });

  test.each([
    ['a short password', { password: 'too short' }, 'password'],
    ['a long one', { password: 'x'.repeat(129) }, 'password'],
    ['no name', { name: '  ' }, 'name'],
    ['a long name', { name: 'x'.repeat(81) }, 'name'],
    ['no address', { email: 'vera' }, 'email'],
    ['a field too many', { role: 'administrator' }, 'role'],
    ['a number as name', { name: 7 }, 'name'],
    ['a NUL in the name', { name: 'Ve\u0000ra' }, 'name'],
  ])('refuses %s by its path', async (_, odd, path) => {
    const response = await post('/api/sign-up', { ...fields(), ...odd });
    expect(response.status).toBe(422);
    expect(response.body).toMatchObject({ code: 'invalid-fields', errors: [{ path }] });
  });
});

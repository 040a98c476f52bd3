import { NextRequest } from 'next/server';
import { encode } from 'next-auth/jwt';
import { describe, expect, test } from 'vitest';
import { proxy } from '@/proxy';
import { setEnvironment } from '@/tests/fixtures/environment';

setEnvironment({ NEXTAUTH_URL: 'http://localhost:3000' });
const secret = process.env.NEXTAUTH_SECRET ?? '';

const ask = (path: string, headers: Record<string, string> = {}) => proxy(new NextRequest(`http://localhost:3000${path}`, { headers }));
/** Where it leads, or null when the request goes on. */
const target = (answer: Response) => answer.headers.get('location');
const session = async (maxAge: number, key = secret) => ({ cookie: `next-auth.session-token=${await encode({ token: { sub: 'p1', signedInAt: 1 }, secret: key, maxAge })}` });

describe('whoever is signed out', () => {
  test.each(['/homes', '/homes/h1/walls/w1?turn=90', '/work', '/operator/mailbox', '/account'])('is sent from %s to sign-in, which keeps the path', async (path) => {
    const to = new URL(target(await ask(path)) ?? 'none:');
    expect([to.origin, to.pathname]).toEqual(['http://localhost:3000', '/sign-in']);
    expect(to.searchParams.get('callbackUrl')).toBe(path);
  });

  test.each(['/', '/sources', '/sign-in', '/workshop', '/homestead', '/api/homes/h1/plan', '/verify/x'])('may ask for %s', async (path) => expect(target(await ask(path))).toBeNull());

  test('an expired session, or one signed with another secret, is none', async () => {
    expect(target(await ask('/homes', await session(-60)))).toContain('/sign-in');
    expect(target(await ask('/homes', await session(60, 'another secret, also 32 characters long')))).toContain('/sign-in');
  });
});

test('a session goes on to the page', async () => expect(target(await ask('/homes', await session(60)))).toBeNull());

test('each request gets its own id, whatever the client claims', async () => {
  const ids = await Promise.all([1, 2].map(async () => (await ask('/', { 'x-request-id': 'claimed' })).headers.get('x-middleware-request-x-request-id')));
  expect(new Set(ids).size).toBe(2);
  for (const id of ids) expect(id).toMatch(/^[0-9a-f]{8}$/);
});

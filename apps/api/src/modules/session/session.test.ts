import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Person } from '../people/person.entity.ts';
import { startTestShop, testPassword } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop({ SIGN_IN_LIMIT: '3' });
});

afterAll(async () => {
  await shop.close();
});

const signIn = (email: string, password = testPassword) => ({ email, password });

describe('signing in', () => {
  it('tells who is signed in, and where', async () => {
    const { body } = await shop.as('maker').get('/api/session').expect(200);
    expect(body).toMatchObject({
      person: { email: 'maker@example.com', role: 'maker' },
      workshop: { name: 'A Test Shop' },
    });
  });

  it('tells nobody while nobody is signed in', async () => {
    const { body } = await shop.nobody().get('/api/session').expect(200);
    expect(body).toMatchObject({ person: null });
  });

  it('[S7] says the same of an unknown person as of a wrong password', async () => {
    const unknown = await shop
      .nobody()
      .post('/api/session')
      .send(signIn('nobody@example.com'))
      .expect(401);
    const wrong = await shop
      .nobody()
      .post('/api/session')
      .send(signIn('bookkeeper@example.com', 'wrong'))
      .expect(401);
    expect(unknown.body.detail).toBe(wrong.body.detail);
  });

  it('[S1] gives a new session id at sign-in', async () => {
    const agent = shop.nobody();
    const first = await agent.post('/api/session').send(signIn('owner@example.com'));
    const second = await agent.post('/api/session').send(signIn('owner@example.com'));
    const cookies = [first, second].map(
      (reply) => String(reply.headers['set-cookie']).split(';')[0],
    );
    expect(cookies[0]).toMatch(/^hidewright=/);
    expect(cookies[0]).not.toBe(cookies[1]);
  });

  it('[S2] keeps the cookie from scripts and other sites', async () => {
    const reply = await shop.nobody().post('/api/session').send(signIn('owner@example.com'));
    expect(String(reply.headers['set-cookie'])).toMatch(/HttpOnly.*SameSite=Lax/i);
  });

  it('[S3] ends the session on the server', async () => {
    const agent = shop.nobody();
    const reply = await agent.post('/api/session').send(signIn('owner@example.com'));
    const cookie = String(reply.headers['set-cookie']).split(';')[0] ?? '';
    await agent.delete('/api/session').expect(200);
    await shop.nobody().get('/api/leathers').set('Cookie', cookie).expect(401);
  });

  it('[S4] acts on the next request when somebody’s access ends', async () => {
    const agent = shop.nobody();
    await agent.post('/api/session').send(signIn('bookkeeper@example.com')).expect(200);
    const em = shop.context.orm.em.fork();
    await em.nativeUpdate(Person, { email: 'bookkeeper@example.com' }, { active: false });
    await agent.get('/api/leathers').expect(401);
    await em.nativeUpdate(Person, { email: 'bookkeeper@example.com' }, { active: true });
  });

  it('[S7] refuses further tries for an account, with when to try again', async () => {
    for (const _ of [1, 2, 3])
      await shop
        .nobody()
        .post('/api/session')
        .send(signIn('tried@example.com', 'wrong'))
        .expect(401);
    const reply = await shop
      .nobody()
      .post('/api/session')
      .send(signIn('tried@example.com', 'wrong'))
      .expect(429);
    expect(reply.headers['retry-after']).toBe('900');
  });

  it('[S10] takes no change from another site', async () => {
    await shop
      .as('owner')
      .post('/api/leathers')
      .set('Origin', 'http://elsewhere.example')
      .send({})
      .expect(403);
    await shop
      .as('owner')
      .post('/api/leathers')
      .set('Sec-Fetch-Site', 'cross-site')
      .send({})
      .expect(403);
  });
});

describe('opening a shop', () => {
  it('is refused once there is an owner', async () => {
    const asked = {
      workshopName: 'Another',
      ownerName: 'Another',
      email: 'x@example.com',
      password: testPassword,
    };
    const { body } = await shop.nobody().post('/api/first-run').send(asked).expect(409);
    expect(body.detail).toContain('Sign in instead');
  });
});

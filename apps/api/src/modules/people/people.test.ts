import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

const newcomer = {
  name: 'A newcomer',
  email: 'New.Comer@example.com',
  role: 'maker',
  password: 'five words in a row',
};

async function personNamed(email: string): Promise<{ id: number; version: number; name: string }> {
  const { body } = await shop.as('owner').get('/api/people').expect(200);
  const found = (body.items as { id: number; email: string; version: number; name: string }[]).find(
    (person) => person.email === email,
  );
  if (found === undefined) throw new Error(`nobody signs in as ${email}`);
  return found;
}

const change = (person: { id: number; version: number }, body: object) =>
  shop
    .as('owner')
    .patch(`/api/people/${person.id}`)
    .set('If-Match', `"${person.version}"`)
    .send(body);

describe('letting people in', () => {
  it('lets somebody sign in, whatever the case of their address', async () => {
    await shop.as('owner').post('/api/people').send(newcomer).expect(201);
    const signIn = { email: 'new.comer@EXAMPLE.com', password: newcomer.password };
    const { body } = await shop.nobody().post('/api/session').send(signIn).expect(200);
    expect(body.person).toMatchObject({ name: 'A newcomer', role: 'maker' });
  });

  it('never sends a password or its hash', async () => {
    const { text } = await shop.as('owner').get('/api/people').expect(200);
    expect(text).not.toMatch(/password|argon2/i);
  });

  it('refuses an address that somebody has', async () => {
    const { body } = await shop
      .as('owner')
      .post('/api/people')
      .send({ ...newcomer, email: 'MAKER@example.com' })
      .expect(422);
    expect(body.errors[0].field).toBe('email');
  });

  it('[S5] refuses a short password, and takes a long one of any characters', async () => {
    const asked = { ...newcomer, email: 'other@example.com' };
    await shop
      .as('owner')
      .post('/api/people')
      .send({ ...asked, password: 'fourteen chars' })
      .expect(422);
    await shop
      .as('owner')
      .post('/api/people')
      .send({ ...asked, password: 'žluťoučký kůň úpěl' })
      .expect(201);
  });

  it('[S4] ends somebody’s sessions with their access', async () => {
    const agent = shop.nobody();
    await agent
      .post('/api/session')
      .send({ email: newcomer.email, password: newcomer.password })
      .expect(200);
    await change(await personNamed('new.comer@example.com'), { active: false }).expect(200);
    await agent.get('/api/leathers').expect(401);
  });

  it('keeps an owner in the shop', async () => {
    const { body } = await change(await personNamed('owner@example.com'), { role: 'maker' }).expect(
      422,
    );
    expect(body.detail).toContain('at least one owner');
    expect(await personNamed('owner@example.com')).toMatchObject({ name: 'The owner' });
  });
});

import { expect } from 'vitest';

interface Answer {
  status: number;
  body: Record<string, unknown>;
}

interface RackedLot {
  id: number;
  measuredAreaMm2: string;
}

/** A shop with a job for each of so many people, who are all signed in. */
export interface RackedShop {
  jobIds: number[];
  /** So many lots of a foot each, new on the rack. */
  receiveLots(count: number): Promise<RackedLot[]>;
  /** Posts as one of the people. */
  send(person: number, path: string, body: object): Promise<Answer>;
}

const owner = { email: 'owner@example.com', password: 'a-long-password-for-drills' };
const maker = { email: 'maker@example.com', password: 'another-long-password-for-drills' };

export async function openRackedShop(url: string, people: number): Promise<RackedShop> {
  const opened = await post(url, '', '/first-run', {
    workshopName: 'A drilled shop',
    ownerName: 'The owner',
    ...owner,
  });
  const cookie = opened.cookie;
  const make = async (path: string, body: object) => {
    const { status, body: made } = await post(url, cookie, path, body);
    expect(status, `${path}: ${JSON.stringify(made)}`).toBeLessThan(300);
    return made as { id: number };
  };
  const leather = await make('/leathers', { name: 'Oak tan', pricePerFt2: '9.50' });
  const quoted = {
    patternId: (await make('/patterns', { name: 'Coaster', definition: coaster(leather.id) })).id,
    customerId: (await make('/customers', { name: 'Brambling Brewery' })).id,
    breaks: [{ quantity: 20 }],
  };
  await make('/people', { name: 'The maker', role: 'maker', ...maker });
  const jobIds: number[] = [];
  const cookies: string[] = [];
  for (let at = 0; at < people; at += 1) {
    const { id: quoteId } = await make('/quotes', quoted);
    await make(`/quotes/${quoteId}/agreements`, { quantity: 20, how: 'phone' });
    const taken = { quoteId, promisedOn: inAMonth(), evenIfShort: true };
    jobIds.push(((await make('/orders', taken)) as unknown as { job: { id: number } }).job.id);
    cookies.push((await post(url, '', '/session', maker)).cookie);
  }
  const lot = { leatherId: leather.id, form: 'panel', measuredAreaMm2: '92903.04', cost: '9.50' };
  return {
    jobIds,
    receiveLots: async (count) => {
      const made = await make('/receipts', { lots: Array.from({ length: count }, () => lot) });
      return (made as unknown as { lots: RackedLot[] }).lots;
    },
    send: (person, path, body) => post(url, cookies[person] ?? '', path, body),
  };
}

const inAMonth = (): string => new Date(Date.now() + 30 * 86_400_000).toISOString().slice(0, 10);

const coaster = (leatherId: number) => ({
  layoutBy: 'hand count',
  outline: null,
  handCount: { pieces: 9, widthMm: '304.8', heightMm: '304.8' },
  container: null,
  turns: 'quarter turns',
  spacingMm: '2',
  trimMm: '3',
  leatherId,
  hardware: [],
  work: { kind: 'minutesPer100', minutes: '60', rejectPercent: '5' },
  needsDie: false,
  needsPlate: false,
});

async function post(
  url: string,
  cookie: string,
  path: string,
  body: object,
): Promise<Answer & { cookie: string }> {
  const reply = await fetch(`${url}/api${path}`, {
    method: 'POST',
    headers: {
      'Content-Type': 'application/json',
      'Idempotency-Key': crypto.randomUUID(),
      Cookie: cookie,
    },
    body: JSON.stringify(body),
  });
  return {
    status: reply.status,
    body: (await reply.json()) as Record<string, unknown>,
    cookie: reply.headers.get('set-cookie')?.split(';')[0] ?? '',
  };
}

import fc from 'fast-check';
import highsOf from 'highs';
import { beforeAll, describe, expect, it } from 'vitest';
import { lpText, type LinearSolver, readLpAnswer } from './linear-programme.ts';
import type { KindOfWork, Week } from './week.ts';
import { weekMix } from './week-mix.ts';

let solve: LinearSolver;
beforeAll(async () => {
  // The types describe the CommonJS build, whose loader is one step further in.
  const load = highsOf as unknown as typeof highsOf.default;
  const highs = await load();
  solve = (programme) =>
    readLpAnswer(programme, highs.solve(lpText(programme), { output_flag: false }));
});

const coasters: KindOfWork = {
  name: 'Coasters',
  kind: 'run',
  benchMinutes: '180',
  deskMinutes: '60',
  left: '240',
  mostPerWeek: '4',
  leastPerWeek: '0',
};
const tags: KindOfWork = {
  ...coasters,
  name: 'Luggage tags',
  benchMinutes: '270',
  deskMinutes: '30',
  left: '250',
  mostPerWeek: '3',
  leastPerWeek: '1',
};
const bag: KindOfWork = {
  ...coasters,
  name: 'Weekend bag',
  kind: 'large piece',
  benchMinutes: '900',
  deskMinutes: '60',
  left: '480',
  mostPerWeek: null,
};
const week: Week = {
  hoursPerWeek: '40',
  deskHoursPerWeek: '4',
  incomeNeeded: '1500',
  kinds: [coasters, tags, bag],
};

describe('a week’s mix', () => {
  it('takes the work that leaves most per hour first, worked out by hand', () => {
    // 36 h: 4 coaster runs (16 h, 60 an hour), 3 tag runs (15 h, 50 an hour), 5 h of a bag (30 an hour).
    const mix = weekMix(week, solve);
    expect(mix.kinds).toMatchObject([
      { units: '4', benchHours: '12', deskHours: '4', left: '960.00', leftPerHour: '60.00' },
      { units: '3', left: '750.00', leftPerHour: '50.00', at: 'most' },
      { units: '0.31', benchHours: '4.69', left: '150.00', leftPerHour: '30.00', at: null },
    ]);
    expect(mix.hours).toEqual({ all: '40', deskFirst: '4', free: '0' });
    expect(mix.left).toBe('1860.00');
    // 1,860 by all 40 hours; one hour more only makes more of the bag.
    expect(mix.averagePerHour).toBe('46.50');
    expect(mix.oneMoreHour).toEqual({ left: '30.00', into: ['Weekend bag'] });
  });

  it('says how many hours can stay for large pieces while the income is reached', () => {
    // 1,500 with the fewest hours of runs: r hours of runs at 60 and 50, 36 − r of bags at 30:
    // 960 + 50 (r − 16) + 30 (36 − r) = 1,500 gives r = 13 < 16, so all of it are coasters:
    // 250 for the promised tags (5 h), 60 c + 30 (31 − c) = 1,250, c = 10.67 h; 36 − 5 − 10.67.
    const { income, largePieces } = weekMix(week, solve);
    expect(income).toEqual({ needed: '1500.00', reached: true, short: '0.00', hoursShort: null });
    expect(largePieces).toEqual({ hours: '5', atMost: '20.33' });
  });

  it('says by how much the income is short, and how many hours would bring it', () => {
    const { income, largePieces } = weekMix({ ...week, incomeNeeded: '2160' }, solve);
    // 300 more at 30 an hour.
    expect(income).toMatchObject({ reached: false, short: '300.00', hoursShort: '10' });
    expect(largePieces.atMost).toBeNull();
  });

  it('says that no hours would reach the income where no more can be sold', () => {
    const mix = weekMix({ ...week, incomeNeeded: '2000', kinds: [coasters, tags] }, solve);
    expect(mix.income).toMatchObject({ short: '290.00', hoursShort: null });
    expect(mix.hours.free).toBe('5');
    expect(mix.oneMoreHour).toEqual({ left: '0.00', into: [] });
  });

  it('stands on a corner without promising an hour more than it brings', () => {
    // Exactly 31 hours: runs fill them, and only the bag could take one more.
    const mix = weekMix({ ...week, hoursPerWeek: '35' }, solve);
    expect(mix.hours.free).toBe('0');
    expect(mix.oneMoreHour).toEqual({ left: '30.00', into: ['Weekend bag'] });
    const alone = weekMix({ ...week, hoursPerWeek: '35', kinds: [coasters, tags] }, solve);
    expect(alone.oneMoreHour).toEqual({ left: '0.00', into: [] });
  });

  it('makes what is promised even where it loses', () => {
    const loss = { ...tags, left: '-20', leastPerWeek: '2' };
    const mix = weekMix({ ...week, kinds: [loss] }, solve);
    expect(mix.kinds[0]).toMatchObject({ units: '2', left: '-40.00', at: 'least' });
    expect(mix.income).toMatchObject({ short: '1540.00', hoursShort: null });
  });

  it.each([
    [{ hoursPerWeek: '10', kinds: [{ ...bag, leastPerWeek: '1' }, tags] }, 'hoursPerWeek'],
    [{ deskHoursPerWeek: '40' }, 'deskHoursPerWeek'],
    [{ kinds: [] }, 'kinds'],
    [{ kinds: [coasters, { ...tags, mostPerWeek: '0.5' }] }, 'kinds.1.leastPerWeek'],
    [{ kinds: [{ ...coasters, benchMinutes: '0' }] }, 'kinds.0.benchMinutes'],
    [{ kinds: [{ ...coasters, left: 'much' }] }, 'kinds.0.left'],
    [{ incomeNeeded: '-1' }, 'incomeNeeded'],
  ])('refuses %j at %s', (change, field) => {
    expect(() => weekMix({ ...week, ...change }, solve)).toThrow(
      expect.objectContaining({ field }),
    );
  });

  it('names what to promise less of where more is promised than there are hours for', () => {
    const kinds = [
      { ...bag, leastPerWeek: '2' },
      { ...tags, leastPerWeek: '2' },
    ];
    expect(() => weekMix({ ...week, kinds }, solve)).toThrow(
      'What is promised takes 42 h a week, and 36 h are there. Promise less, first of all Weekend bag (32 h), or find 6 h more.',
    );
  });
});

describe('the solver’s mix, against a second opinion', () => {
  const kind = fc
    .record({
      bench: fc.integer({ min: 5, max: 1200 }),
      desk: fc.integer({ min: 0, max: 120 }),
      left: fc.integer({ min: -50, max: 900 }),
      least: fc.integer({ min: 0, max: 2 }),
      room: fc.option(fc.integer({ min: 0, max: 6 })),
    })
    .map(({ bench, desk, left, least, room }, at = 0) => ({
      name: `Work ${at}`,
      kind: 'run' as const,
      benchMinutes: String(bench),
      deskMinutes: String(desk),
      left: String(left),
      leastPerWeek: String(least),
      mostPerWeek: room === null ? null : String(least + room),
    }));
  const anyWeek = fc.record({
    hoursPerWeek: fc.integer({ min: 20, max: 160 }).map(String),
    deskHoursPerWeek: fc.integer({ min: 0, max: 10 }).map(String),
    incomeNeeded: fc.integer({ min: 0, max: 6000 }).map(String),
    kinds: fc.array(kind, { minLength: 1, maxLength: 8 }),
  });
  const hoursOf = (each: KindOfWork) => (Number(each.benchMinutes) + Number(each.deskMinutes)) / 60;
  const hoursFor = (each: Week) => Number(each.hoursPerWeek) - Number(each.deskHoursPerWeek);
  const promised = (each: Week) =>
    each.kinds.reduce((sum, one) => sum + Number(one.leastPerWeek) * hoursOf(one), 0);

  /** With hours as the one limit, the best mix is what is promised, then by what an hour leaves. */
  function byTheHour(each: Week, hours: number): number {
    let free = hours - promised(each);
    let left = each.kinds.reduce(
      (sum, one) => sum + Number(one.leastPerWeek) * Number(one.left),
      0,
    );
    const perHour = (one: KindOfWork) => Number(one.left) / hoursOf(one);
    for (const one of [...each.kinds].sort((a, b) => perHour(b) - perHour(a))) {
      if (perHour(one) <= 0) break;
      const most = one.mostPerWeek === null ? Infinity : Number(one.mostPerWeek);
      const units = Math.min(most - Number(one.leastPerWeek), free / hoursOf(one));
      free -= units * hoursOf(one);
      left += units * Number(one.left);
    }
    return left;
  }

  it('leaves as much as the greedy mix by the hour, and one more hour as much more', () => {
    fc.assert(
      fc.property(anyWeek, (each) => {
        fc.pre(promised(each) <= hoursFor(each));
        const mix = weekMix(each, solve);
        const now = byTheHour(each, hoursFor(each));
        expect(Number(mix.left)).toBeCloseTo(now, 1);
        const more = byTheHour(each, hoursFor(each) + 1) - now;
        expect(Number(mix.oneMoreHour.left)).toBeCloseTo(more, 1);
      }),
    );
  });

  it('never uses more hours than there are, nor sells more or less than it may', () => {
    fc.assert(
      fc.property(anyWeek, (each) => {
        fc.pre(promised(each) <= hoursFor(each));
        const { kinds, hours, income, left } = weekMix(each, solve);
        const used = kinds.reduce(
          (sum, one) => sum + Number(one.benchHours) + Number(one.deskHours),
          0,
        );
        expect(used + Number(hours.free)).toBeCloseTo(hoursFor(each), 0);
        kinds.forEach(({ units }, at) => {
          const { leastPerWeek, mostPerWeek } = each.kinds[at] as KindOfWork;
          expect(Number(units)).toBeGreaterThanOrEqual(Number(leastPerWeek));
          expect(Number(units)).toBeLessThanOrEqual(Number(mostPerWeek ?? Infinity));
        });
        expect(Number(left) + Number(income.short)).toBeGreaterThanOrEqual(
          Number(income.needed) - 0.01,
        );
        expect(income.reached).toBe(Number(income.short) === 0);
      }),
    );
  });
});

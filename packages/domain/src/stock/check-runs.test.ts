import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays } from '../promise/day.ts';
import { checkRuns } from './check-runs.ts';
import type {
  Sourcing,
  ItemStock,
  LeatherStock,
  RackLot,
  RunNeeds,
  ShopStock,
} from './check-stock.ts';
import {
  hardwareWords,
  hoursWords,
  leatherWords,
  lotWords,
  type Say,
  toolWords,
} from './check-words.ts';

const today = '2026-12-01';
const say: Say = { area: (area) => `${area.toFixed()} mm²`, day: (day) => day };
const inHundreds = { minimum: null, multiple: '100', breaks: [{ from: '0', price: '0.20' }] };
const fittings: Sourcing = {
  supplierId: 5,
  supplier: 'Fennbridge Fittings',
  arrivesOn: '2026-12-04',
  terms: inHundreds,
  drafted: 0,
  drafts: [],
};
const nobody: Sourcing = {
  supplierId: null,
  supplier: null,
  arrivesOn: null,
  terms: { ...inHundreds, multiple: null },
  drafted: 0,
  drafts: [],
};

const lot = (lotId: number, panels: number, change: Partial<RackLot> = {}): RackLot => ({
  lotId,
  tag: `L-${lotId}`,
  place: 'rack 1',
  shade: '',
  receivedOn: addDays('2026-01-01', lotId),
  freeArea: panels * 120_000_000,
  measuredArea: panels * 120_000_000,
  usablePercent: 100,
  panel: null,
  drawnArea: null,
  ...change,
});

const rivets = (free: number, change: Partial<ItemStock> = {}): ItemStock => ({
  hardwareId: 7,
  name: 'Rivet',
  kind: 'hardware',
  pool: { free, receipts: [], promised: [] },
  buying: fittings,
  ...change,
});

const russet = (lots: RackLot[], change: Partial<LeatherStock> = {}): LeatherStock => ({
  leatherId: 1,
  name: 'Russet',
  lots,
  owed: 0,
  pool: { free: 0, receipts: [], promised: [] },
  whole: null,
  usablePercent: '85',
  buying: nobody,
  ...change,
});

const shop = (change: Partial<ShopStock> = {}): ShopStock => ({
  today,
  bench: { today, perDay: 36_000, loggedToday: 0 },
  held: [],
  leathers: [russet([lot(1, 10)])],
  items: [rivets(300)],
  tools: [{ toolId: 3, name: 'Cutting die 7', strikesLeft: 5_000, piecesPerStrike: 1 }],
  ...change,
});

const run = (pieces: number, by = '2026-12-10', change: Partial<RunNeeds> = {}): RunNeeds => ({
  by,
  pieces,
  leather: {
    leatherId: 1,
    cut: { pieces: 12, areaMm2: '120000', sides: null },
    laid: new Map(),
    likeShade: null,
  },
  hardware: [{ hardwareId: 7, quantity: pieces }],
  tools: [{ word: 'Cutting die', choices: [3], otherwise: 'Order a cutting die.' }],
  minutes: 12_000,
  parts: [{ minutes: 12_000, waitAfter: 0 }],
  ...change,
});

describe('Can we make it?', () => {
  it('says yes where everything is there, and what to take', () => {
    const [facts] = checkRuns(shop(), [run(60)]);
    expect(facts).toMatchObject({ ok: true, earliest: today, startBy: '2026-12-10', turn: 1 });
    expect(leatherWords(facts!.leather, say)).toBe('Russet: take 600000 mm² from L-1.');
    expect(lotWords(facts!.leather.takes[0]!)).toBe(
      '5 panels for 60 pieces, by its usable share; 5 more fit',
    );
    expect(hardwareWords(facts!.items[0]!, say)).toBe('Rivet: take 60 of 300 free.');
    expect(toolWords(facts!.tools[0]!)).toBe('Cutting die 7: ready, 5,000 strikes left in it.');
    expect(hoursWords(facts!.hours, say)).toBe('Bench hours: 2 of the 48 free by 2026-12-10.');
  });

  it('names the lots that are too small for the panels, and counts nothing of them', () => {
    const sides = { widthMm: 300, heightMm: 400 };
    const narrow = { panel: { widthMm: 3000, heightMm: 100 }, offcuts: 1 };
    const lots = [2, 3, 4, 5, 6].map((id) => lot(id, 3, narrow));
    const asked = run(24);
    const leather = { ...asked.leather, cut: { ...asked.leather.cut, sides } };
    const stock = shop({ leathers: [russet([lot(1, 1), ...lots])] });
    const [facts] = checkRuns(stock, [{ ...asked, leather }]);
    expect(facts!.leather.takes.map(({ lot: { tag } }) => tag)).toEqual(['L-1']);
    expect(leatherWords(facts!.leather, say)).toContain(
      '120000 mm² free in whole panels, 120000 mm² short. Too small for its panels: L-2, L-3, L-4 and 2 more. Buy',
    );
  });

  it('names the lots of which too little is left for a panel', () => {
    // 85 % of 10 panels' area is usable, and 8.4 panels are gone of it: what hangs there still is mostly waste.
    const rest = lot(2, 1.6, { measuredArea: 1_200_000_000, usablePercent: 85 });
    const stock = shop({ leathers: [russet([lot(1, 1), rest])] });
    const [facts] = checkRuns(stock, [run(24)]);
    expect(leatherWords(facts!.leather, say)).toContain(
      '120000 mm² short. Too little left for a panel: L-2. Buy',
    );
  });

  it('leaves other jobs their leather where this run has the least of it, and keeps its layouts', () => {
    // Seventeen panels are usable, of which a layout makes 230 pieces in place of 204; one panel is owed.
    const drawn = lot(1, 20, { usablePercent: 85 });
    const owing = (lots: RackLot[]) => shop({ leathers: [{ ...russet(lots), owed: 120_000_000 }] });
    const asked = run(218);
    const leather = { ...asked.leather, laid: new Map([[1, 230]]) };
    const [alone] = checkRuns(owing([drawn]), [{ ...asked, leather }]);
    expect(alone!.leather).toMatchObject({
      piecesShort: 0,
      takes: [{ pieces: 218, by: 'layout' }],
    });
    // A lot of which no panel can be cut for this run is the others' first.
    const crumbs = lot(2, 1.9, { usablePercent: 52 });
    const whole = { ...asked, pieces: 230, leather };
    const [beside] = checkRuns(owing([drawn, crumbs]), [whole]);
    expect(beside!.leather.piecesShort).toBeLessThanOrEqual(1);
    const [short] = checkRuns(owing([drawn]), [whole]);
    expect(short!.leather.piecesShort).toBe(12);
  });

  it('names what is short, what mends it, and by when the run can be had', () => {
    const poor = shop({ items: [rivets(40)], tools: [] });
    const [facts] = checkRuns(poor, [run(150, '2026-12-03')]);
    expect(facts).toMatchObject({ ok: false, earliest: null });
    expect(hardwareWords(facts!.items[0]!, say)).toBe(
      'Rivet: 150 needed, 40 free, 110 short. Buy 2 packs of 100, or receive them if they are here. Ordered from Fennbridge Fittings today, it is here by 2026-12-04.',
    );
    expect(leatherWords(facts!.leather, say)).toBe(
      'Russet: 1560000 mm² needed, 1200000 mm² free in whole panels, 360000 mm² short. Buy about 423529.412 mm² more, or receive it if it is here. Say who sells it, and the day can be told.',
    );
    const { leather } = facts!;
    const whole = { form: 'side', areaMm2: '200000' };
    const buying = { ...nobody, terms: { ...nobody.terms, multiple: '200000' } };
    const bySide = { ...leather, leather: { ...leather.leather, whole, buying } };
    expect(leatherWords(bySide, say)).toContain(
      ' Buy 3 more sides, or receive them if they are here. ',
    );
    expect(toolWords(facts!.tools[0]!)).toBe(
      'Cutting die: not in the shop yet. Order a cutting die.',
    );
    const [withLeather] = checkRuns({ ...poor, leathers: [russet([lot(1, 20)])] }, [
      run(150, '2026-12-03'),
    ]);
    expect(withLeather?.earliest).toBe('2026-12-04');
  });

  it('counts on what comes in time for the work to begin, and not on what comes too late', () => {
    const receipts = [{ day: '2026-12-08', quantity: 200, paper: 'P-0007' }];
    const stock = shop({ items: [rivets(40, { pool: { free: 40, receipts, promised: [] } })] });
    const [early, late] = ['2026-12-07', '2026-12-10'].map(
      (by) => checkRuns(stock, [run(100, by)])[0]!,
    );
    expect(late).toMatchObject({ ok: true, earliest: '2026-12-08' });
    expect(hardwareWords(late!.items[0]!, say)).toBe(
      'Rivet: 40 of 100 are free now. The rest comes with P-0007 by 2026-12-08, in time.',
    );
    // Buying is sooner here than waiting.
    expect(early).toMatchObject({ ok: false, earliest: '2026-12-04' });
    const slow = { ...fittings, arrivesOn: '2026-12-20' };
    const waiting = shop({
      items: [rivets(40, { pool: { free: 40, receipts, promised: [] }, buying: slow })],
    });
    const [waits] = checkRuns(waiting, [run(100, '2026-12-07')]);
    expect(waits).toMatchObject({ ok: false, earliest: '2026-12-08' });
    expect(waits!.items[0]).toMatchObject({ buy: 0, short: 60 });
    expect(hardwareWords(waits!.items[0]!, say)).toBe(
      'Rivet: 100 needed, 40 free, 60 short. The rest comes with P-0007 by 2026-12-08.',
    );
  });

  it('says how much of what is needed is for losses', () => {
    const hardware = [{ hardwareId: 7, quantity: 64, ordered: 60 }];
    const [facts] = checkRuns(shop(), [run(60, '2026-12-10', { hardware })]);
    expect(hardwareWords(facts!.items[0]!, say)).toBe(
      'Rivet: take 64 of 300 free. 4 of the 64 are for losses.',
    );
    const theirs = shop({ items: [rivets(63, { fromCustomer: true, buying: nobody })] });
    const one = [{ hardwareId: 7, quantity: 64, ordered: 63 }];
    const [asked] = checkRuns(theirs, [run(60, '2026-12-10', { hardware: one })]);
    expect(hardwareWords(asked!.items[0]!, say)).toBe(
      'Rivet, from the customer: 64 needed, 63 here, 1 missing. 1 of the 64 is for losses. Ask the customer for it, and receive it here.',
    );
  });

  it('keeps what is promised to other jobs', () => {
    const promised = [{ day: '2026-12-15', quantity: 250 }];
    const stock = shop({ items: [rivets(300, { pool: { free: 300, receipts: [], promised } })] });
    expect(checkRuns(stock, [run(60)])[0]!.items[0]).toMatchObject({ free: 50, short: 10 });
  });

  it('buys for what was promised before as well, once, since it comes first', () => {
    const promised = [{ day: '2026-12-05', quantity: 50, paper: 'J-0026 Snap tags' }];
    const stock = shop({ items: [rivets(0, { pool: { free: 0, receipts: [], promised } })] });
    const [first, second] = checkRuns(stock, [run(90), run(30)]);
    expect(first!.items[0]).toMatchObject({ short: 90, buy: 140, forOthers: 50 });
    expect(second!.items[0]).toMatchObject({ short: 30, buy: 30, forOthers: 0 });
    expect(hardwareWords(first!.items[0]!, say)).toBe(
      'Rivet: 90 needed, 0 free, 90 short. 50 more are lacking for what was promised before. Buy 2 packs of 100, or receive them if they are here. Ordered from Fennbridge Fittings today, it is here by 2026-12-04.',
    );
    const receipts = [{ day: '2026-12-04', quantity: 140 }];
    const bought = shop({ items: [rivets(0, { pool: { free: 0, receipts, promised } })] });
    expect(checkRuns(bought, [run(90)])[0]!.items[0]).toMatchObject({ short: 0, buy: 0 });
  });

  it('says which draft holds what is short', () => {
    const drafted = { ...fittings, drafted: 100, drafts: ['P-0012'] };
    const [facts] = checkRuns(shop({ items: [rivets(0, { buying: drafted })] }), [run(90)]);
    expect(hardwareWords(facts!.items[0]!, say)).toBe(
      'Rivet: 90 needed, 0 free, 90 short. P-0012 is drafted for it and still to be sent. Ordered from Fennbridge Fittings today, it is here by 2026-12-04.',
    );
  });

  it('warns where shades would mix, and keeps a reorder in its shade', () => {
    const lots = [
      lot(1, 2, { shade: 'red-brown' }),
      lot(2, 2, { shade: 'lighter' }),
      lot(3, 3, { shade: 'lighter' }),
    ];
    const like = (likeShade: string | null, pieces: number) => {
      const base = run(pieces);
      const needs = { ...base, leather: { ...base.leather, likeShade } };
      const { leather } = checkRuns(shop({ leathers: [russet(lots)] }), [needs])[0]!;
      return leatherWords(leather, say).replace(/^.*L-\d\. ?/, '');
    };
    expect(like(null, 80)).toMatch(/Shades would mix: red-brown and lighter/);
    expect(like('lighter', 24)).toBe('');
    expect(like('dark', 24)).toBe('The earlier run’s leather is dark, this would be red-brown.');
  });

  it('gives the second run what the first leaves, by their days and then as they were chosen', () => {
    const runs = [run(200, '2026-12-11'), run(200, '2026-12-10'), run(200, '2026-12-10')];
    const facts = checkRuns(shop({ leathers: [russet([lot(1, 99)])] }), runs);
    expect(facts.map(({ turn }) => turn)).toEqual([3, 1, 2]);
    expect(facts.map(({ items }) => items[0]!.short)).toEqual([200, 0, 100]);
    expect(facts.map(({ hours }) => hours.free)).toEqual([300_000, 288_000, 276_000]);
  });

  it('says that pieces must lie longer than there are days', () => {
    const parts = [
      { minutes: 6_000, waitAfter: 24 * 6_000 },
      { minutes: 6_000, waitAfter: 0 },
    ];
    const [facts] = checkRuns(shop(), [run(60, today, { parts })]);
    expect(facts).toMatchObject({ ok: false, earliest: '2026-12-02' });
    expect(hoursWords(facts!.hours, say)).toBe(
      'Bench hours: 2 of the 6 free by 2026-12-01, but its pieces must lie between steps. Promise 2026-12-02 or later, or move another job.',
    );
  });

  it('says what can stand in for what is short, and decides nothing', () => {
    const ring: ItemStock = { ...rivets(12), hardwareId: 8, name: 'Brass ring' };
    const cap: ItemStock = { ...rivets(9), hardwareId: 9, name: 'Cap' };
    const short = rivets(40, {
      standIns: [
        { name: 'Brass ring', parts: [{ hardwareId: 8, quantity: 1 }] },
        { name: 'Capped set', parts: [{ hardwareId: 9, quantity: 2 }] },
      ],
    });
    const stock = shop({ items: [short, ring, cap] });
    const [few] = checkRuns(stock, [run(48)]);
    expect(few).toMatchObject({ ok: false });
    expect(hardwareWords(few!.items[0]!, say)).toMatch(
      /8 short\..* 8 of Brass ring can stand in for the 8 that are short, if you choose so\.$/,
    );
    const [many] = checkRuns(stock, [run(60)]);
    expect(hardwareWords(many!.items[0]!, say)).toMatch(
      / 12 of Brass ring and 4 of Capped set can stand in for 16 of the 20 that are short, if you choose so\.$/,
    );
    expect(many!.items[0]).toMatchObject({ buy: 20 });
  });

  it('asks the customer for what is theirs, and buys none of it', () => {
    const theirs = (free: number) =>
      shop({ items: [rivets(free, { fromCustomer: true, buying: nobody })] });
    const [short, enough] = [theirs(40), theirs(60)].map(
      (stock) => checkRuns(stock, [run(60)])[0]!,
    );
    expect(short!.items[0]).toMatchObject({ short: 20, buy: 0 });
    expect(short).toMatchObject({ ok: false, earliest: null });
    expect(hardwareWords(short!.items[0]!, say)).toBe(
      'Rivet, from the customer: 60 needed, 40 here, 20 missing. Ask the customer for them, and receive them here.',
    );
    expect(hardwareWords(enough!.items[0]!, say)).toBe(
      'Rivet, from the customer: 60 of theirs are here.',
    );
  });

  it('refuses a run of a leather or hardware that is not there', () => {
    expect(() => checkRuns(shop({ items: [] }), [run(1)])).toThrow(
      expect.objectContaining({ field: 'hardware' }),
    );
    expect(() => checkRuns(shop({ leathers: [] }), [run(1)])).toThrow(
      expect.objectContaining({ field: 'leather' }),
    );
  });
});

const someRuns = fc.array(
  fc.record({ pieces: fc.integer({ min: 1, max: 200 }), days: fc.integer({ min: 0, max: 20 }) }),
  { minLength: 1, maxLength: 5 },
);
const asRuns = (all: { pieces: number; days: number }[]) =>
  all.map(({ pieces, days }) => run(pieces, addDays(today, days)));
const someLots = fc.array(fc.integer({ min: 0, max: 12 }), { maxLength: 5 });
const receipts = fc.array(
  fc.record({
    day: fc.integer({ min: 0, max: 20 }).map((days) => addDays(today, days)),
    quantity: fc.integer({ min: 1, max: 300 }),
  }),
  { maxLength: 3 },
);
const stockOf = (lots: number[], free: number, comes: { day: string; quantity: number }[]) =>
  shop({
    leathers: [russet(lots.map((panels, at) => lot(at + 1, panels, { usablePercent: 85 })))],
    items: [rivets(free, { pool: { free, receipts: comes, promised: [] } })],
  });

describe('over all runs', () => {
  it('nothing is given out twice: leather, hardware, strikes and hours', () => {
    fc.assert(
      fc.property(someRuns, someLots, fc.nat(400), receipts, (all, lots, free, comes) => {
        const facts = checkRuns(stockOf(lots, free, comes), asRuns(all));
        lots.forEach((panels, at) => {
          const taken = facts.flatMap(({ leather }) =>
            leather.takes.filter(({ lot: each }) => each.lotId === at + 1),
          );
          const area = taken.reduce((sum, take) => sum + take.area, 0);
          expect(area).toBeLessThanOrEqual(panels * 120_000 * 1000 * 0.85);
        });
        const rivetsNow = facts.reduce((sum, { items }) => sum + items[0]!.now, 0);
        expect(rivetsNow).toBeLessThanOrEqual(free);
        const given = facts.reduce((sum, { items }) => sum + items[0]!.needed - items[0]!.buy, 0);
        expect(given).toBeLessThanOrEqual(
          free + comes.reduce((sum, { quantity }) => sum + quantity, 0),
        );
      }),
    );
  });

  it('a stand-in is never given out twice, nor what a run takes for itself', () => {
    fc.assert(
      fc.property(someRuns, fc.nat(200), fc.nat(200), (all, free, freeRings) => {
        const part = [{ hardwareId: 8, quantity: 1 }];
        const standIns = [{ name: 'Ring', parts: part }];
        const ring: ItemStock = { ...rivets(freeRings), hardwareId: 8, name: 'Ring' };
        const items = [rivets(free, { standIns }), ring, rivets(0, { hardwareId: 9, standIns })];
        const runs = asRuns(all).map((each, at) => ({
          ...each,
          hardware: [7, 9, ...(at % 2 ? [8] : [])].map((hardwareId) => ({
            hardwareId,
            quantity: each.pieces,
          })),
        }));
        const facts = checkRuns(shop({ items }), runs).flatMap((each) => each.items);
        const offered = facts.flatMap(({ couldStandIn }) => couldStandIn);
        const given = offered.reduce((sum, { quantity }) => sum + quantity, 0);
        const taken = facts.reduce(
          (sum, { item, now }) => (item.hardwareId === 8 ? sum + now : sum),
          0,
        );
        expect(given + taken).toBeLessThanOrEqual(freeRings);
        for (const { short, couldStandIn } of facts) {
          const sum = couldStandIn.reduce((total, { quantity }) => total + quantity, 0);
          expect(sum).toBeLessThanOrEqual(short);
        }
      }),
    );
  });

  it('more stock never turns a yes into a no', () => {
    fc.assert(
      fc.property(
        someRuns,
        someLots,
        fc.nat(400),
        receipts,
        fc.nat(300),
        fc.nat(8),
        (all, lots, free, comes, more, panels) => {
          const before = checkRuns(stockOf(lots, free, comes), asRuns(all));
          const after = checkRuns(stockOf([...lots, panels], free + more, comes), asRuns(all));
          before.forEach(({ ok }, at) => ok && expect(after[at]?.ok).toBe(true));
        },
      ),
    );
  });

  it('a run alone gets no less than among others, and runs of one day come as chosen', () => {
    fc.assert(
      fc.property(someRuns, someLots, fc.nat(400), (all, lots, free) => {
        const sameDay = all.map(({ pieces }) => run(pieces, '2026-12-15'));
        const facts = checkRuns(stockOf(lots, free, []), sameDay);
        expect(facts.map(({ turn }) => turn)).toEqual(sameDay.map((_, at) => at + 1));
        sameDay.forEach((each, at) => {
          const [alone] = checkRuns(stockOf(lots, free, []), [each]);
          expect(alone!.items[0]!.now).toBeGreaterThanOrEqual(facts[at]!.items[0]!.now);
          if (facts[at]!.ok) expect(alone!.ok).toBe(true);
        });
      }),
    );
  });

  it('an earliest day is one by which it can be packed once what is short is there', () => {
    fc.assert(
      fc.property(someRuns, fc.nat(400), (all, free) => {
        const [first] = asRuns(all);
        const stock = stockOf([99], free, []);
        const [facts] = checkRuns(stock, [first!]);
        expect(facts!.earliest).not.toBeNull();
        const bought = shop({
          ...stock,
          items: [
            rivets(free, {
              pool: { free, receipts: [{ day: '2026-12-04', quantity: 1000 }], promised: [] },
            }),
          ],
        });
        expect(checkRuns(bought, [{ ...first!, by: facts!.earliest! }])[0]!.ok).toBe(true);
      }),
    );
  });
});

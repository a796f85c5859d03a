import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Machine, machinePays } from './machine-pays.ts';

const press: Machine = {
  price: '600',
  minutesSavedPerRun: '50',
  runsPerMonth: '5',
  hourWorth: '24',
  upkeepPerYear: '60',
  years: 5,
  interestPercent: '6',
};

describe('whether a machine pays', () => {
  it('is worked out by hand for a press of 600', () => {
    // 250 min a month at 24 an hour are 100; less 5 of upkeep, 95 a month: back after 6.3 months.
    expect(machinePays(press)).toMatchObject({
      minutesSavedPerMonth: '250',
      savedPerMonth: '100.00',
      upkeepPerMonth: '5.00',
      paybackMonths: 6.3,
    });
    // 1,140 a year for five years at 6 % (factor 4.212364), less 600.
    expect(machinePays(press).presentValue).toBe('4202.09');
    // 600 / 4.212364 + 60 = 202.44 a year, over 240 that one run a month saves.
    expect(machinePays(press).runsToPay).toBe('0.9');
  });

  it('never pays where its upkeep eats what it saves, or where it saves nothing', () => {
    const dear = machinePays({ ...press, upkeepPerYear: '1300' });
    expect(dear.paybackMonths).toBeNull();
    expect(Number(dear.presentValue)).toBeLessThan(-600);
    const idle = machinePays({ ...press, minutesSavedPerRun: '0' });
    expect(idle).toMatchObject({ savedPerMonth: '0.00', paybackMonths: null, runsToPay: null });
    expect(machinePays({ ...press, hourWorth: '0' }).runsToPay).toBeNull();
  });

  it('does not come back where its life is over first', () => {
    const slow = { ...press, runsPerMonth: '1', upkeepPerYear: '0', interestPercent: '0' };
    expect(machinePays({ ...slow, years: 2 }).paybackMonths).toBeNull();
    expect(machinePays({ ...slow, years: 3 }).paybackMonths).toBe(30);
  });

  it('begins to pay at the runs it names, and not a tenth of a run before', () => {
    const text = (max: number) => fc.integer({ min: 1, max }).map(String);
    const machine = fc.record({
      price: text(20_000),
      minutesSavedPerRun: text(300),
      runsPerMonth: fc.constant('1'),
      hourWorth: text(150),
      upkeepPerYear: text(900),
      years: fc.integer({ min: 1, max: 40 }),
      interestPercent: fc.integer({ min: 0, max: 40 }).map(String),
    });
    fc.assert(
      fc.property(machine, (each) => {
        const from = Number(machinePays(each).runsToPay);
        fc.pre(from <= 10_000);
        const worth = (runs: number) =>
          Number(machinePays({ ...each, runsPerMonth: runs.toFixed(1) }).presentValue);
        expect(worth(from)).toBeGreaterThanOrEqual(0);
        // Within half a cent the present value rounds to 0.00.
        if (from > 0.1) expect(worth(from - 0.1)).toBeLessThanOrEqual(0);
      }),
    );
  });

  it.each([
    ['price', '0'],
    ['price', '-20'],
    ['minutesSavedPerRun', 'some'],
    ['runsPerMonth', ''],
    ['hourWorth', '1e3'],
    ['upkeepPerYear', '-1'],
    ['interestPercent', '101'],
  ])('refuses %s of “%s” and says what to enter', (field, value) => {
    expect(() => machinePays({ ...press, [field]: value })).toThrow(
      expect.objectContaining({ field, message: expect.stringMatching(/^Enter /) as string }),
    );
  });

  it.each([0, 2.5, 41, Number.NaN])('refuses a life of %s years', (years) => {
    expect(() => machinePays({ ...press, years })).toThrow(
      expect.objectContaining({ field: 'years' }),
    );
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { matchSteps } from './match-steps.ts';
import { poolLeather } from './pool-leather.ts';
import { poolLosses } from './pool-losses.ts';
import { minutesPer100, poolMinutes } from './pool-minutes.ts';
import { poolRejects } from './pool-shares.ts';
import { benchMinutes, practiceFactor } from '../work/bench-minutes.ts';
import { poolStepTime } from './pool-step-time.ts';
import { unusualRuns } from './unusual-runs.ts';

const aRun = fc.record({
  minutes: fc.integer({ min: 0, max: 100_000 }).map((hundredths) => String(hundredths / 100)),
  pieces: fc.integer({ min: 1, max: 5000 }),
});
const someRuns = fc.array(aRun, { minLength: 1, maxLength: 8 });
const someCounts = fc.array(
  fc
    .tuple(fc.nat(500), fc.nat(500))
    .map(([good, rejected]) => ({ rejected, reached: good + rejected })),
  { minLength: 1, maxLength: 8 },
);

describe('poolRejects', () => {
  it('weighs runs by their pieces', () => {
    expect(
      poolRejects([
        { rejected: 5, reached: 50 },
        { rejected: 5, reached: 450 },
      ]),
    ).toEqual({
      rejected: 10,
      reached: 500,
      percent: '2',
      lowPercent: '1.09',
      highPercent: '3.64',
    });
  });

  it('has no rate where no piece was counted', () => {
    expect(poolRejects([])).toBeNull();
    expect(poolRejects([{ rejected: 0, reached: 0 }])).toBeNull();
  });

  it('lies between the lowest and the highest run, within its interval, and loses no piece', () => {
    fc.assert(
      fc.property(someCounts, (runs) => {
        const pooled = poolRejects(runs);
        if (pooled === null) return;
        const shares = runs
          .filter(({ reached }) => reached > 0)
          .map(({ rejected, reached }) => (100 * rejected) / reached);
        const percent = Number(pooled.percent);
        expect(percent).toBeGreaterThanOrEqual(Math.min(...shares) - 0.005);
        expect(percent).toBeLessThanOrEqual(Math.max(...shares) + 0.005);
        expect(percent).toBeGreaterThanOrEqual(Number(pooled.lowPercent));
        expect(percent).toBeLessThanOrEqual(Number(pooled.highPercent));
        expect(pooled.reached).toBe(runs.reduce((sum, { reached }) => sum + reached, 0));
        expect(pooled.rejected).toBe(runs.reduce((sum, { rejected }) => sum + rejected, 0));
      }),
    );
  });

  it('refuses more rejects than pieces', () => {
    expect(() => poolRejects([{ rejected: 3, reached: 2 }])).toThrow('correct the counts');
  });
});

describe('poolMinutes', () => {
  it('weighs minutes per 100 by pieces and says how far the runs lie apart', () => {
    const runs = [
      { minutes: '100', pieces: 100 },
      { minutes: '120', pieces: 100 },
    ];
    expect(poolMinutes(runs)).toEqual({ per100: '110', sd: '14.14', pieces: 200, runs: 2 });
  });

  it('says no spread of a single run, and nothing of none', () => {
    expect(poolMinutes([{ minutes: '90', pieces: 60 }])).toMatchObject({ per100: '150', sd: null });
    expect(poolMinutes([])).toBeNull();
  });

  it('lies between the quickest and the slowest run, and loses no piece', () => {
    fc.assert(
      fc.property(someRuns, (runs) => {
        const pooled = poolMinutes(runs);
        const each = runs.map((run) => minutesPer100(run).toNumber());
        expect(Number(pooled?.per100)).toBeGreaterThanOrEqual(Math.min(...each) - 0.005);
        expect(Number(pooled?.per100)).toBeLessThanOrEqual(Math.max(...each) + 0.005);
        expect(pooled?.pieces).toBe(runs.reduce((sum, { pieces }) => sum + pieces, 0));
      }),
    );
  });
});

describe('poolStepTime', () => {
  const said = { setupMinutes: '5', secondsPerUnit: '30' };

  it('keeps the setup and takes the seconds that the logged minutes leave', () => {
    const logged = [
      { minutes: '45', units: 60 },
      { minutes: '35', units: 40 },
    ];
    expect(poolStepTime(said, logged)).toEqual({
      setupMinutes: '5',
      secondsPerUnit: '42',
      units: 100,
      runs: 2,
    });
  });

  it('shrinks both where the setup alone would be more than was logged', () => {
    expect(poolStepTime(said, [{ minutes: '4', units: 6 }])).toEqual({
      setupMinutes: '2.5',
      secondsPerUnit: '15',
      units: 6,
      runs: 1,
    });
  });

  it('says nothing where nothing was logged', () => expect(poolStepTime(said, [])).toBeNull());

  const step = { name: 'Rivet', per: 'piece' as const, rejectPercent: '0' };
  const curve = { model: 'unit' as const, curvePercent: '90', measuredAt: 50 };
  it.each([
    ['two at it', { people: 2 }, '0', null],
    ['with rest', {}, '8', null],
    ['left alone while it runs', { unattended: true }, '12', null],
    ['with practice', {}, '0', curve],
    ['all of it', { people: 3 }, '10', curve],
  ])(
    'learns from an estimate that came true what was said: %s',
    (_, over, restPercent, learning) => {
      const kept = { setupMinutes: '12', secondsPerUnit: '45', ...over };
      const plan = { kind: 'steps' as const, steps: [{ ...step, ...kept }], learning };
      const logged = [80, 200, 35].map((pieces) => ({
        minutes: benchMinutes(plan, { pieces, containers: 1, restPercent }).total,
        units: pieces,
        practice: practiceFactor(learning, pieces),
      }));
      expect(poolStepTime(kept, logged, restPercent)).toMatchObject({
        setupMinutes: '12',
        secondsPerUnit: '45',
      });
    },
  );

  it('takes as long for the same runs as was logged, but for the rounding of a hundredth', () => {
    fc.assert(
      fc.property(
        someRuns,
        fc.nat(60),
        fc.integer({ min: 1, max: 600 }),
        (runs, setup, seconds) => {
          const logged = runs.map(({ minutes, pieces }) => ({ minutes, units: pieces }));
          const pooled = poolStepTime(
            { setupMinutes: String(setup), secondsPerUnit: String(seconds) },
            logged,
          );
          const was = logged.reduce((sum, { minutes }) => sum + Number(minutes), 0);
          const again =
            runs.length * Number(pooled?.setupMinutes) +
            (Number(pooled?.secondsPerUnit) * (pooled?.units ?? 0)) / 60;
          const rounding = 0.0051 * runs.length + (0.0051 * (pooled?.units ?? 0)) / 60;
          expect(Math.abs(again - was)).toBeLessThanOrEqual(rounding);
        },
      ),
    );
  });
});

describe('poolLeather', () => {
  it('weighs runs by what their layouts say', () => {
    const runs = [
      { layoutAreaMm2: '100000', usedAreaMm2: '120000' },
      { layoutAreaMm2: '300000', usedAreaMm2: '300000' },
    ];
    expect(poolLeather(runs)).toEqual({
      ...{ extraPercent: '5', leastPercent: '0', mostPercent: '20', runs: 2 },
    });
  });

  it('asks for no less than the layout, and says nothing of no run', () => {
    const thrifty = poolLeather([{ layoutAreaMm2: '1000', usedAreaMm2: '900' }]);
    expect(thrifty).toMatchObject({ extraPercent: '0', leastPercent: '-10' });
    expect(poolLeather([])).toBeNull();
    expect(() => poolLeather([{ layoutAreaMm2: '0', usedAreaMm2: '1' }])).toThrow('layoutAreaMm2');
  });
});

describe('poolLosses', () => {
  it('is the share of what was taken that no piece needed', () => {
    const runs = [
      { needed: 100, taken: 110 },
      { needed: 200, taken: 205 },
    ];
    expect(poolLosses(runs)).toEqual({ percent: '4.76', needed: 300, taken: 315, runs: 2 });
    expect(poolLosses([{ needed: 4, taken: 2 }])?.percent).toBe('0');
    expect(poolLosses([])).toBeNull();
  });

  it('is reckoned so that the pattern asks again for what was taken', () => {
    const counts = fc.tuple(fc.integer({ min: 1, max: 3000 }), fc.nat(900));
    fc.assert(
      fc.property(counts, ([needed, lost]) => {
        const found = poolLosses([{ needed, taken: needed + lost }]);
        const again = needed / (1 - Number(found?.percent) / 100);
        expect(Math.abs(again - needed - lost)).toBeLessThanOrEqual(
          (0.0001 * (needed + lost) ** 2) / needed,
        );
      }),
    );
  });
});

describe('matchSteps', () => {
  const step = (name: string, per = 'piece') => ({ name, per });

  it('goes by name, unit and, where a name comes twice, by order', () => {
    const now = [step('Case', 'panel'), step('Rivet'), step('Cut'), step('Rivet'), step('Pack')];
    const then = [step('rivet '), step('Cut'), step('Rivet'), step('Case', 'piece')];
    expect(matchSteps(now, then)).toEqual([null, 0, 1, 2, null]);
  });
});

describe('unusualRuns', () => {
  const run = (minutesPer100: number | null, rejected: number | null = 3, reached = 100) => ({
    minutesPer100,
    rejected,
    reached,
  });

  it('names a run of more than twice or less than half the median', () => {
    expect(unusualRuns([run(100), run(110), run(225), run(40)])).toEqual([
      null,
      null,
      'slow',
      'quick',
    ]);
  });

  it('names a run beyond three deviations of the others, once there are enough', () => {
    const four = [run(100), run(104), run(98), run(102)];
    expect(unusualRuns([...four, run(140)]).at(-1)).toBe('slow');
    expect(unusualRuns([...four.slice(1), run(140)]).at(-1)).toBeNull();
  });

  it('names a run with far more rejects than the others’ rate', () => {
    expect(unusualRuns([run(100, 3), run(100, 4), run(100, 20)])).toEqual([
      null,
      null,
      'many rejects',
    ]);
  });

  it('says nothing of what was not logged, nor of two runs alone', () => {
    expect(unusualRuns([run(null, null), run(100), run(300)])).toEqual([null, null, null]);
  });
});

import { describe, expect, it } from 'vitest';
import { costRun } from './cost-run.ts';
import { hardwareOrdered, lossesUnsaid } from './hardware-counts.ts';
import type { RunInput } from './run-input.ts';

const step = (name: string, secondsPerUnit: string, rejectPercent: string, more = {}) => ({
  name,
  setupMinutes: '0',
  secondsPerUnit,
  per: 'piece' as const,
  rejectPercent,
  ...more,
});

const run: RunInput = {
  breaks: [{ quantity: 100, typedPrice: null }],
  confidencePercent: '95',
  layout: { form: 'panel', pieces: 20, containerAreaMm2: '92903.04' },
  leather: { name: 'Oak tan', pricePerFt2: '10.00' },
  hardware: [],
  tooling: [],
  work: { kind: 'steps', steps: [step('Strike', '18', '10'), step('Rivet', '36', '0')] },
  wagePerHour: '20.00',
  deskMinutesPerOrder: '30',
  packingPerOrder: '5.00',
  targetPerHour: '60.00',
  priceStep: '0.05',
  minorDigits: 2,
};
const rivet = { name: 'Rivet', unitPrice: '0.17', perPiece: 2 };
const amounts = (input: RunInput) =>
  Object.fromEntries(costRun(input, 100).costLines.map(({ name, amount }) => [name, amount]));

describe('what a run costs', () => {
  it('needs hardware for the pieces ordered, unless it is needed from a step on', () => {
    const atRiveting = { ...rivet, fromStep: 1 };
    const atStriking = { ...rivet, fromStep: 0, lossPercent: '4' };
    const { cutCount, hardwareCounts } = costRun(
      { ...run, hardware: [rivet, atRiveting, atStriking] },
      100,
    );
    expect(hardwareCounts).toEqual([
      200,
      Math.ceil(cutCount * 0.9) * 2,
      Math.ceil((cutCount * 2) / 0.96),
    ]);
    expect(hardwareOrdered({ ...run, hardware: [rivet, atRiveting, atStriking] }, 100)).toEqual([
      200, 200, 200,
    ]);
    const spoiled = { ...rivet, lossPercent: '4' };
    expect(
      [rivet, atStriking, spoiled, { ...rivet, per: 'run' as const }].map(lossesUnsaid),
    ).toEqual([true, false, false, false]);
  });

  it('counts what is kept in stock by the hundred and for the run too, in whole units', () => {
    const hardware = [
      { name: 'Edge dye', unitPrice: '0.04', perPiece: 45, per: 'hundred' as const },
      { name: 'Thread', unitPrice: '6.10', perPiece: 1, per: 'hundred' as const, fromStep: 0 },
      { name: 'Carton', unitPrice: '1.20', perPiece: 3, per: 'run' as const },
      { name: 'Glue', unitPrice: '0.02', perPiece: 9, per: 'run' as const, lossPercent: '10' },
    ];
    const { cutCount, hardwareCounts } = costRun({ ...run, hardware }, 150);
    // 150 pieces at 45 ml for 100 are 67.5 ml; more than 100 pieces are cut, and a second spool is begun.
    expect(cutCount).toBeGreaterThan(150);
    expect(hardwareCounts).toEqual([68, Math.ceil(cutCount / 100), 3, 10]);
    expect(amounts({ ...run, hardware })).toMatchObject({ 'Edge dye': '1.80', Carton: '3.60' });
  });

  it('counts supplies for each piece, for a hundred, and for the run', () => {
    const supplies = [
      { name: 'Thread', unitPrice: '0.04', per: 'piece' as const, quantity: '1.5' },
      { name: 'Edge dye', unitPrice: '3.00', per: 'hundred' as const, quantity: '0.5' },
      { name: 'Glue', unitPrice: '2.20', per: 'run' as const, quantity: '1' },
    ];
    expect(amounts({ ...run, supplies })).toMatchObject({
      Thread: '6.00',
      'Edge dye': '1.50',
      Glue: '2.20',
    });
  });

  it('pays wages by the step or in one line, to the same sum', () => {
    const byStep = amounts({ ...run, wagesByStep: true });
    const inOne = amounts(run);
    expect(Number(byStep['Strike']) + Number(byStep['Rivet'])).toBeCloseTo(
      Number(inOne['Bench hours']),
      2,
    );
  });

  it('counts everybody who works at a step, none where nobody stands by, and rest on top', () => {
    const minutes = (more: object, rest = '0') =>
      Number(
        costRun(
          {
            ...run,
            restPercent: rest,
            work: { kind: 'steps', steps: [step('Press', '60', '0', more)] },
          },
          100,
        ).benchMinutes,
      );
    expect(minutes({})).toBe(100);
    expect(minutes({ people: 2 })).toBe(200);
    expect(minutes({ unattended: true, setupMinutes: '12' })).toBe(12);
    expect(minutes({}, '15')).toBe(115);
  });

  it('shortens the time of a longer run where there is practice', () => {
    const minutes = (measuredAt: number) =>
      Number(
        costRun(
          {
            ...run,
            work: {
              kind: 'minutesPer100',
              minutes: '100',
              rejectPercent: '0',
              learning: { model: 'cumulative', curvePercent: '80', measuredAt },
            },
          },
          100,
        ).benchMinutes,
      );
    expect(minutes(100)).toBe(100);
    // one doubling on the running average: 80 %
    expect(minutes(50)).toBeCloseTo(80, 3);
    expect(minutes(200)).toBeCloseTo(125, 3);
  });

  it('adds overhead by the bench hour, packing by the piece, and carriage', () => {
    const lines = amounts({
      ...run,
      work: { kind: 'minutesPer100', minutes: '120', rejectPercent: '0' },
      overheadPerHour: '4.00',
      packingPerPiece: '0.05',
      carriage: { cost: '7.10', charge: '0' },
    });
    expect(lines).toMatchObject({ Overhead: '8.00', Packing: '10.00', Carriage: '7.10' });
  });

  it('says what must be bought whole beside what the run takes', () => {
    const whole = { form: 'side', areaMm2: '929030.4', usablePercent: '50' };
    const cost = costRun({ ...run, leather: { ...run.leather, whole } }, 100);
    // 6 panels of a square foot from sides of 10 ft² of which half can be used
    expect(cost.containers).toBe(6);
    expect(cost.boughtWhole).toEqual({
      count: 2,
      form: 'side',
      areaMm2: '1858060.8',
      amount: '200.00',
    });
  });

  it('expects seconds, and cuts more because they are not good ones', () => {
    const plain = costRun(run, 100);
    const cost = costRun({ ...run, work: { ...run.work, secondsPercent: '5' } }, 100);
    expect(cost.cutCount).toBeGreaterThan(plain.cutCount);
    expect(cost.seconds).toBe(Math.round(cost.cutCount * 0.05));
  });
});

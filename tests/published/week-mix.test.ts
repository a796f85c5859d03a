import { lpText, readLpAnswer, weekMix, type LinearSolver } from '@hidewright/domain';
import highs from 'highs';
import { beforeAll, describe, expect, it } from 'vitest';

let solve: LinearSolver;
beforeAll(async () => {
  // The types describe the CommonJS build, whose loader is one step further in.
  const load = highs as unknown as typeof highs.default;
  const solver = await load();
  solve = (programme) =>
    readLpAnswer(programme, solver.solve(lpText(programme), { output_flag: false }));
});

const made = (name: string, left: string, hours: number, mostPerWeek: string | null) => ({
  name,
  kind: 'run' as const,
  left,
  benchMinutes: String(hours * 60),
  deskMinutes: '0',
  leastPerWeek: '0',
  mostPerWeek,
});

describe('what to make of the hours there are', () => {
  // OpenStax, Principles of Accounting 2, §10.6: desks, chairs and bookcases leave 185, 55 and 48 each
  // and take 1, ½ and ¼ machine hours, so 185, 110 and 192 an hour; 60,000 desks and 40,000 bookcases
  // can be sold, and there are 80,000 hours. The dual value is that of chairs, since they come last.
  it('is bookcases first, then desks, then what chairs the hours still give', () => {
    const mix = weekMix(
      {
        hoursPerWeek: '80000',
        deskHoursPerWeek: '0',
        incomeNeeded: '0',
        kinds: [
          made('desks', '185', 1, '60000'),
          made('chairs', '55', 0.5, null),
          made('bookcases', '48', 0.25, '40000'),
        ],
      },
      solve,
    );
    expect(mix.kinds.map(({ name, units, leftPerHour }) => [name, units, leftPerHour])).toEqual([
      ['desks', '60000', '185.00'],
      ['chairs', '20000', '110.00'],
      ['bookcases', '40000', '192.00'],
    ]);
    expect(mix.left).toBe('14120000.00');
    expect(mix.hours.free).toBe('0');
    expect(mix.oneMoreHour).toEqual({ left: '110.00', into: ['chairs'] });
  });
});

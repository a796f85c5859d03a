import { describe, expect, it } from 'vitest';
import {
  enoughWords,
  lapped,
  readTyped,
  started,
  stopped,
  stoppedWatch,
  studyOf,
  withoutLap,
} from './time-study.ts';

describe('the stopwatch', () => {
  it('keeps a lap for each press, and not what was under way when it stopped', () => {
    const running = started(stoppedWatch, 10_000);
    const two = lapped(lapped(running, 22_340), 35_000);
    expect(two).toEqual({ laps: ['12.34', '12.66'], lapFrom: 35_000 });
    expect(stopped(two)).toEqual({ laps: ['12.34', '12.66'], lapFrom: null });
    expect(withoutLap(two, 0).laps).toEqual(['12.66']);
  });

  it('takes a trembling thumb for one press', () => {
    const running = started(stoppedWatch, 0);
    expect(lapped(running, 60)).toEqual(running);
  });

  it('takes no lap while it stands', () => {
    expect(lapped(stoppedWatch, 5000)).toEqual(stoppedWatch);
  });
});

describe('typed readings', () => {
  it('may have spaces, lines, semicolons or commas between', () => {
    expect(readTyped(' 12.4 13\n11,8; 9, 10.50 ')).toEqual({
      readings: ['12.4', '13', '11.8', '9', '10.5'],
    });
  });

  it.each([
    ['12 abc 3', 'abc'],
    ['4 -2', '-2'],
    ['0', '0'],
    ['1.234', '1.234'],
    ['1e3', '1e3'],
  ])('of %j do not hold %j', (text, wrong) => expect(readTyped(text)).toEqual({ wrong }));
});

describe('what the readings say', () => {
  it('is how many are missing', () => {
    expect(studyOf([])).toBeNull();
    expect(enoughWords(studyOf(['9'])!)).toBe('take a second one to see the spread');
    expect(enoughWords(studyOf(['10', '12', '14'])!)).toBe('40 more for ±5 %');
    expect(enoughWords(studyOf(['10', '10.1', '9.9'])!)).toBe('enough readings for ±5 %');
  });
});

import {
  chanceOfEnough,
  compute,
  goodShareInterval,
  normalLoss,
  plainAllowance,
} from '@hidewright/domain';
import jstat from 'jstat';
import { describe, expect, it } from 'vitest';

const ofMethod = (method: 'wilson' | 'jeffreys', good: number, total: number) =>
  goodShareInterval({ good, total, confidence: 0.95, method });

describe('the interval of a share', () => {
  // Newcombe, Statistics in Medicine 17 (1998) 857–872, table I (from memory), and recomputed with
  // SciPy 1.17.1; 23/60 is the worked example of VassarStats, recomputed; the last three recomputed.
  it.each([
    [81, 263, 0.2552885198782742, 0.36620957698280004],
    [15, 148, 0.0623863995307363, 0.16048724172330803],
    [0, 20, 0, 0.16112515805281938],
    [1, 29, 0.006113214292762653, 0.17175521879320288],
    [23, 60, 0.27088272374082023, 0.5098240417590008],
    [47, 50, 0.8378290831116182, 0.979385029651026],
    [95, 100, 0.8882495307680808, 0.9784563208456319],
    [50, 50, 0.9286524008666414, 1],
  ])('by Wilson, of %i in %i, is from %f to %f', (good, total, low, high) => {
    const answer = ofMethod('wilson', good, total);
    expect(answer.low).toBeCloseTo(low, 12);
    expect(answer.high).toBeCloseTo(high, 12);
  });

  // Brown, Cai and DasGupta, Statistical Science 16 (2001), table 5 (from memory) for n = 7 and 10;
  // all recomputed with SciPy 1.17.1 (beta.ppf).
  it.each([
    [0, 7, 0, 0.29243617366230984],
    [1, 7, 0.0158765242127468, 0.5007974616190776],
    [2, 7, 0.06472826694948343, 0.647661654959421],
    [3, 7, 0.13886421910489025, 0.7654987507479062],
    [0, 10, 0, 0.21719626750921053],
    [1, 10, 0.011011673763161133, 0.3813147710666164],
    [5, 10, 0.22352867025270517, 0.7764713297472947],
    [1, 29, 0.003746173649057073, 0.15007768600223173],
    [0, 20, 0, 0.11663898290487539],
    [47, 50, 0.8484674369723397, 0.9828133509288488],
  ])('by Jeffreys, of %i in %i, is from %f to %f', (good, total, low, high) => {
    const answer = ofMethod('jeffreys', good, total);
    expect(answer.low).toBeCloseTo(low, 12);
    expect(answer.high).toBeCloseTo(high, 12);
  });

  // Second opinion: jstat 1.9.6.
  it('agrees with a statistics library, on other values than the tables', () => {
    for (const [good, total] of [
      [3, 11],
      [61, 64],
      [240, 300],
      [1999, 2400],
    ] as const) {
      for (const confidence of [0.8, 0.9, 0.99]) {
        const { low, high } = goodShareInterval({ good, total, confidence, method: 'jeffreys' });
        const [alpha, beta, tail] = [good + 0.5, total - good + 0.5, (1 - confidence) / 2];
        expect(low).toBeCloseTo(jstat.beta.inv(tail, alpha, beta), 7);
        expect(high).toBeCloseTo(jstat.beta.inv(1 - tail, alpha, beta), 7);
      }
    }
  });

  it('comes from the command as well', () => {
    const input = { good: 81, total: 263, confidence: 0.95, method: 'wilson' };
    expect(compute('interval', input)).toEqual(ofMethod('wilson', 81, 263));
  });
});

describe('the plain allowance', () => {
  // Recomputed with SciPy 1.17.1: 100 / 0.95, rounded up, is enough in 72 cases of 100.
  it('of 106 for 100 at 5 % rejects falls short more than one time in four', () => {
    expect(plainAllowance(100, 0.95)).toBe(106);
    expect(chanceOfEnough(106, 100, 0.95)).toBeCloseTo(0.72, 4);
  });
});

describe('the unit normal loss', () => {
  // G(z) = φ(z) − z (1 − Φ(z)), recomputed with SciPy 1.17.1; such tables stand in any textbook.
  it.each([
    [0, 0.3989422804014327],
    [0.5, 0.19779655740130603],
    [0.85, 0.10997172447670797],
    [1, 0.08331547058768629],
    [1.28, 0.04749854331597653],
    [1.5, 0.029306793762604644],
    [1.65, 0.020637002308458677],
    [2, 0.008490702616829673],
    [2.33, 0.0033523194444090333],
    [3, 0.0003821543170477275],
    [-1, 1.0833154705876864],
    [-3, 3.0003821543170477],
  ])('at %f is %f', (z, loss) => {
    expect(normalLoss(z)).toBeCloseTo(loss, 14);
  });
});

import { describe, expect, it } from 'vitest';
import { cautionFor } from './cautions.ts';

const levelOf = (name: string, per = 'piece') => cautionFor({ name, per })?.level;

describe('cautionFor', () => {
  it.each(['Cut', 'Stamp crest', 'Punch holes', 'Dye edges', 'Glue the fold', 'Skive the neck'])(
    'warns at %s',
    (name) => expect(levelOf(name)).toBe('WARNING'),
  );
  it.each(['Fold and rivet', 'Hot foil', 'Set snaps'])('cautions at %s', (name) =>
    expect(levelOf(name)).toBe('CAUTION'),
  );
  it.each(['Case panels', 'Inspect, pack', 'Reset counters and count'])('is silent at %s', (name) =>
    expect(levelOf(name)).toBeUndefined(),
  );
  it('warns at whatever is counted by strikes', () =>
    expect(levelOf('Crest', 'strike')).toBe('WARNING'));

  it('defers to the manual, or for what is in a tin to its data sheet', () => {
    expect(cautionFor({ name: 'Cut', per: 'piece' })?.text).toContain(
      'maker’s manual and the local rules come first',
    );
    expect(cautionFor({ name: 'Dye edges', per: 'piece' })?.text).toContain(
      'safety data sheet and the local rules come first',
    );
  });
});

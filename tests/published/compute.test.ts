import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const script = fileURLToPath(new URL('../../scripts/compute.mjs', import.meta.url));

function run(name: string, input: string) {
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, name], {
    input,
    encoding: 'utf8',
  });
  return { status, stdout, stderr };
}

// Values: sources in cut-count.test.ts, units.test.ts and stockroom.test.ts.
describe('the compute command', { timeout: 60_000 }, () => {
  it('prints one JSON object', () => {
    const { status, stdout } = run('cut-count', '{"good":100,"rate":0.95,"confidence":0.95}');
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ pieces: 109 });
    expect(JSON.parse(run('convert', '{"value":8,"from":"oz","to":"mm"}').stdout)).toEqual({
      value: 3.175,
    });
    const asked = '{"demand":1000,"orderCost":"10.00","holdingCost":"0.50"}';
    expect(JSON.parse(run('eoq', asked).stdout)).toEqual({ quantity: 200, annualCost: '100.00' });
  });

  it.each([
    ['no-such', '{}'],
    ['round', '{"value":"NaN","places":2,"mode":"halfUp"}'],
    ['round', 'not JSON'],
    ['cut-count', '{"good":100,"rate":0,"confidence":0.95}'],
    ['eoq', '{"demand":-1,"orderCost":"10.00","holdingCost":"0.50"}'],
    ['two-machine', '{"jobs":[]}'],
    ['creditor-reference', '{"text":"RF262320","country":"any"}'],
  ])('ends with 2 and a sentence for %s %s', (name, input) => {
    const { status, stdout, stderr } = run(name, input);
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toMatch(/^[A-Z][^\n]+\.\n$/);
  });
});

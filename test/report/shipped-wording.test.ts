import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, test } from 'vitest';
import { render } from '../../src/report/render.ts';
import { runStudy } from '../../src/run/run-study.ts';

const pageOf = async (pipeline: string): Promise<string> => {
  const path = fileURLToPath(new URL(`../../pipelines/${pipeline}/study.yaml`, import.meta.url));
  const { record } = await runStudy(path);
  return render(record!, { formats: ['html'] }, () => {}).html!;
};

describe('what the shipped studies’ pages say', () => {
  let store = '';
  let workshop = '';
  beforeAll(async () => {
    store = await pageOf('cold-store-electricity');
    workshop = await pageOf('workshop-repairs');
  });

  test('below a bend there is no difference, and no figure of zero', () => {
    expect(store).toContain('goes with no difference near 2.55');
    expect(store).not.toContain('0.000 kWh/d');
  });

  test('the relation of neighbours in time has one figure', () => {
    expect(store).toContain('correlation about 0.48');
    expect(store).toContain('Neighbours in time resemble each other.');
  });

  test('on the log scale it is the response that lies some per cent off, not its logarithm', () => {
    expect(workshop).toContain('Hours booked as observed lies typically');
    expect(workshop).not.toContain('logarithm of hours booked as observed');
  });

  test('a reason that took no row is not in the way of those that did', () => {
    expect(workshop).toContain('Missing parts');
    expect(workshop).not.toContain('Missing log_parts');
  });
});

import type { Column } from '../data/table.ts';
import type { Report } from '../problem.ts';
import { declaredScales } from '../study/declared-terms.ts';
import type { Scale, Study } from '../study/study.ts';
import { lineList, rowCountText } from './line-list.ts';

/**
 * Reports every response scale of the candidates that some value of the response cannot be put on:
 * logarithm, Box–Cox and reciprocal need values above 0 (the reciprocal would not be monotone across 0), the
 * square root 0 or above. True where all can be.
 */
export function checkScales(
  study: Study,
  response: Column,
  lines: Uint32Array,
  file: string,
  report: Report,
): boolean {
  if (response.kind === 'category' || response.kind === 'text') return true;
  const scales = new Map<Scale['kind'], Scale>();
  for (const scale of declaredScales(study)) scales.set(scale.kind, scale);
  let good = true;
  for (const kind of scales.keys()) {
    if (kind === 'natural') continue;
    const zeroToo = kind === 'sqrt';
    const faulty: number[] = [];
    response.values.forEach((value, row) => {
      if (!(zeroToo ? value >= 0 : value > 0)) faulty.push(lines[row]!);
    });
    if (faulty.length === 0) continue;
    good = false;
    const { variable } = study.response;
    const wanted = zeroToo ? 'of 0 or above' : 'above 0';
    report({
      code: 'scale_undefined',
      severity: 'error',
      place: { kind: 'cell', file, row: faulty[0]!, variable },
      message: `The ${SCALE_NAMES[kind]} needs values ${wanted}, and "${variable}" is not so in ${rowCountText(faulty.length)}: ${lineList(faulty)}.`,
      hint: 'Leave these rows out with a reason, correct them, or choose another scale.',
    });
  }
  return good;
}

const SCALE_NAMES: Readonly<Record<Exclude<Scale['kind'], 'natural'>, string>> = {
  log: 'log scale',
  sqrt: 'square-root scale',
  reciprocal: 'reciprocal scale',
  box_cox: 'Box–Cox scale',
};

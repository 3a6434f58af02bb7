import { scaleName } from '../../model/response-scale.ts';
import { decimalNumber, THIN } from '../../numerals.ts';
import { boxCoxProfile } from '../box-cox.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** Scales that a study can declare by name, with their λ. */
const NAMED: readonly (readonly [number, string])[] = [
  [1, 'natural'],
  [0.5, 'square-root'],
  [0, 'log'],
  [-1, 'reciprocal'],
];

/** The power λ of the response under which these columns fit it best, with its interval. */
export const responseScale: Diagnostic = {
  name: 'response_scale',
  topic: 'shape',
  question: 'Would another scale of the response suit better?',
  statisticName: 'best power λ of the response',
  source: 'Box & Cox 1964',
  find(chosen, second) {
    if (second === null) return notPossible('The model fits these rows exactly, so no scale fits better.');
    const found = boxCoxProfile(chosen);
    if (typeof found === 'string') return notPossible(found);
    const { lambda, lower, upper, current } = found;
    const inside = current >= lower && current <= upper;
    const confidence = `${Number((100 * chosen.study.inference.confidence).toPrecision(6))}${THIN}%`;
    const interval = `λ ${shown(lambda)}, ${confidence} interval ${shown(lower)} to ${shown(upper)}`;
    const declared = scaleName(chosen.fit.candidate.response.scale);
    const fitting = NAMED.filter(([power]) => power >= lower && power <= upper).map(([, name]) => name);
    const better = fitting.length === 0 ? '' : ` The ${fitting.join(' or ')} scale would do.`;
    const end = found.atEdge ? ' Powers beyond −2 and 2 were not tried.' : '';
    return {
      statistic: lambda,
      df: [],
      p_value: null,
      mark: 'the interval for λ holds the declared scale (natural 1, square root 0.5, log 0, reciprocal −1)',
      verdict: inside
        ? `The declared scale (${declared}) is among those that suit these rows (${interval}).${end}`
        : `These columns fit the response better on another scale than the declared one, ${declared} (${interval}).${better}${end}`,
      // A scale is chosen for its meaning as well, so a misfit is worth a look and no more.
      concern: inside ? 0 : 1,
      advice: inside
        ? null
        : 'Declare a candidate on that scale beside this one and rank them by aic, aicc or bic; keep the scale on which the question is asked if the difference does not matter.',
      figures: [
        { name: 'lower end of the interval for λ', value: lower },
        { name: 'upper end of the interval for λ', value: upper },
        { name: 'λ of the declared scale', value: current },
      ],
    };
  },
};

function shown(lambda: number): string {
  return decimalNumber(lambda, 2);
}

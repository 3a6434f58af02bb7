import { chiSquaredUpper } from '../../stats/distributions.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';

/** Below these in size, skewness and excess of the fourth moment hardly matter. */
const SLIGHT_SKEWNESS = 0.3;
const SLIGHT_EXCESS = 0.6;

/** n (S²/6 + (K − 3)²/24) of the residuals about their mean, χ² on 2 in many rows. */
export const skewnessAndTails: Diagnostic = {
  name: 'skewness_and_tails',
  topic: 'normality',
  question: 'Are the errors lopsided, or extreme ones too frequent?',
  statisticName: 'Jarque–Bera statistic',
  source: 'Jarque & Bera 1980',
  find({ residuals, s }) {
    if (s === null) return notPossible('The model fits these rows exactly, so it has no errors to judge.');
    const n = residuals.length;
    let mean = 0;
    for (const e of residuals) mean += e / s / n;
    let second = 0;
    let third = 0;
    let fourth = 0;
    for (const e of residuals) {
      const away = e / s - mean;
      const square = away * away;
      second += square / n;
      third += (square * away) / n;
      fourth += (square * square) / n;
    }
    if (!(second > 0)) return notPossible('The residuals are all equal, so they have no shape.');
    const skewness = third / second ** 1.5;
    const excess = fourth / second ** 2 - 3;
    const statistic = n * (skewness ** 2 / 6 + excess ** 2 / 24);
    const p = chiSquaredUpper(statistic, 2);
    const slight = Math.abs(skewness) < SLIGHT_SKEWNESS && Math.abs(excess) < SLIGHT_EXCESS;
    const concern = concernOf(p, slight);
    return {
      statistic,
      df: [2],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? 'The residuals are neither visibly lopsided nor rich in extremes.'
          : told(skewness, excess),
      concern,
      advice:
        concern === 0
          ? null
          : 'Look whether a few rows cause it; if not, try the response on another scale, or ask for bootstrap intervals.',
      figures: [
        { name: 'skewness', value: skewness },
        { name: 'excess kurtosis', value: excess },
      ],
    };
  },
};

function told(skewness: number, excess: number): string {
  const parts = [
    ...(Math.abs(skewness) >= SLIGHT_SKEWNESS
      ? [
          `large errors lie more often ${skewness > 0 ? 'above' : 'below'} the model than ${skewness > 0 ? 'below' : 'above'} it`,
        ]
      : []),
    ...(excess >= SLIGHT_EXCESS
      ? ['extreme errors are more frequent than a normal distribution has them']
      : []),
    ...(excess <= -SLIGHT_EXCESS ? ['extreme errors are rarer than a normal distribution has them'] : []),
  ];
  const text =
    parts.length === 0 ? 'the errors differ a little from a normal distribution' : parts.join(', and ');
  return `${text[0]!.toUpperCase()}${text.slice(1)}.`;
}

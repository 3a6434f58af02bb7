import { count, fixed, percent, rounded, roundingFor, THIN, withUnit } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted, type Lexicon, listed, stopped } from './lexicon.ts';
import { partsPhrase } from './validation.ts';

type Selection = StudyRecord['selection'];
type Honest = NonNullable<Selection['honest_error']>;
type HoldOut = NonNullable<Selection['hold_out']>;

/** Candidates named of those that the choice fell on. */
const NAMED = 3;

/** An error on the response's own scale, with its unit. */
export function errorText({ response }: Lexicon, error: number): string {
  return withUnit(rounded(error, roundingFor(error, error)), response.unit);
}

/** Whether the whole procedure predicts no better than the mean, by one standard error of the difference. */
export function noBetterThanMean({ gain }: Honest): boolean {
  return gain.value <= (gain.standard_error ?? 0);
}

/** How choosing, fitting and predicting does on rows that it has not seen; empty where the study does not ask. */
export function unseenSentences({ selection }: StudyRecord, lexicon: Lexicon): string[] {
  return [
    ...(selection.honest_error === undefined ? [] : honestSentences(selection.honest_error, lexicon)),
    ...(selection.hold_out === undefined ? [] : holdOutSentences(selection.hold_out, lexicon)),
  ];
}

function honestSentences(honest: Honest, lexicon: Lexicon): string[] {
  const { procedure, mean, winner, choices } = honest;
  const error = errorText(lexicon, procedure.root_mean_squared_error);
  const alone = errorText(lexicon, mean.root_mean_squared_error);
  const verdict = noBetterThanMean(honest)
    ? `On rows that it has not seen, the whole procedure misses by ${error} and the mean alone by ${alone}: choosing and fitting a model is no better than saying the mean.`
    : `On rows that it has not seen, the whole procedure misses by ${error}, the mean alone by ${alone}.`;
  const flattered =
    winner === null
      ? ''
      : ` The chosen candidate, held against the same rows, misses by ${errorText(lexicon, winner.root_mean_squared_error)}; it was chosen with their help.`;
  return [
    verdict,
    `For this the choice was made anew without ${partsPhrase(honest)}, and what it chose was held against what was left out.${flattered} ${choicesSentence(choices)}`,
  ];
}

/** "Of 10 choices 8 fell on By vessel and 2 on With wind." */
function choicesSentence(choices: Honest['choices']): string {
  const all = choices.reduce((sum, { folds }) => sum + folds, 0);
  const [first] = choices;
  if (first !== undefined && choices.length === 1)
    return first.candidate === null
      ? `In none of the ${counted(all, 'choice')} was a candidate admitted.`
      : `All ${counted(all, 'choice')} fell on ${first.candidate}.`;
  const shown = choices
    .slice(0, NAMED)
    .map(({ candidate, folds }) =>
      candidate === null
        ? `${count(folds)} on the mean, no candidate being admitted`
        : `${count(folds)} on ${candidate}`,
    );
  const more = choices.length - shown.length;
  return `Of ${counted(all, 'choice')}, ${listed([...shown, ...(more > 0 ? [`the rest on ${counted(more, 'other')}`] : [])])}.`;
}

/** Whether fewer of the rows set aside lie inside their intervals than chance among so many explains. */
export function intervalsTooShort({ inside_upper: upper, interval }: HoldOut): boolean {
  return upper !== null && upper < interval;
}

function holdOutSentences(held: HoldOut, lexicon: Lexicon): string[] {
  const aside = `${counted(held.rows, 'row was', 'rows were', count)} set aside before anything was fitted (${held.rule})`;
  const error = held.root_mean_squared_error;
  if (error === null) return [`${aside}; none of them could be predicted.`];
  const bias = held.mean_error ?? 0;
  const side =
    bias === 0
      ? 'neither too high nor too low'
      : `${errorText(lexicon, Math.abs(bias))} too ${bias > 0 ? 'low' : 'high'}`;
  const relative =
    held.cv_rmse_percent === null
      ? ''
      : ` (CV(RMSE) ${fixed(held.cv_rmse_percent, 1)}${THIN}%${held.mean_bias_percent === null ? '' : `, normalised mean bias ${fixed(held.mean_bias_percent, 1)}${THIN}%`})`;
  const lost =
    held.rows_not_predicted === null || held.rows_not_predicted === 0
      ? ''
      : ` ${counted(held.rows_not_predicted, 'of them', 'of them', count)} could not be predicted.`;
  return [
    `${aside}. On them the model misses by ${errorText(lexicon, error)}, on average ${side}${relative}.${lost}`,
    ...insideSentence(held),
  ];
}

function insideSentence(held: HoldOut): string[] {
  const { inside, with_interval: all, inside_lower: lower, inside_upper: upper, interval } = held;
  if (inside === null || all === null || all === 0 || lower === null || upper === null) return [];
  const short = intervalsTooShort(held);
  return [
    stopped(
      `${count(inside)} of ${count(all)} lie inside their ${percent(interval)} intervals; with so many rows that speaks for a share between ${percent(lower)} and ${percent(upper)}${short ? ', so the intervals are too short' : ''}`,
    ),
  ];
}

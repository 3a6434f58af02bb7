import { type ErrorMark, errorsChart } from '../chart/errors.ts';
import type { StudyRecord } from '../record-type.ts';
import type { UnseenView } from '../view.ts';
import type { Lexicon } from '../words/lexicon.ts';
import { unseenSentences } from '../words/unseen.ts';

/** How the model does on rows that it has not seen; null where the study does not ask. */
export function unseenView(record: StudyRecord, lexicon: Lexicon): UnseenView | null {
  const [finding, ...sentences] = unseenSentences(record, lexicon);
  if (finding === undefined) return null;
  const { label, unit } = lexicon.response;
  return {
    finding,
    sentences,
    chart: errorsChart(
      errorMarks(record),
      `root mean squared error of ${label}${unit === null ? '' : `, ${unit}`}`,
      'How far predictions of rows not seen typically lie off; the line is one standard error to either side.',
    ),
  };
}

function errorMarks({ selection }: StudyRecord): ErrorMark[] {
  const { honest_error: honest, hold_out: held } = selection;
  const mark = (
    name: string,
    { mean_squared_error: square, standard_error: error }: NonNullable<typeof honest>['mean'],
    strong = false,
  ): ErrorMark => ({
    name,
    error: Math.sqrt(square),
    low: error === null ? null : Math.sqrt(Math.max(0, square - error)),
    high: error === null ? null : Math.sqrt(square + error),
    strong,
  });
  const aside = held?.root_mean_squared_error ?? null;
  return [
    ...(honest === undefined
      ? []
      : [
          mark('The mean alone', honest.mean),
          mark('Choosing and fitting anew', honest.procedure, true),
          ...(honest.winner === null ? [] : [mark('The chosen candidate, fitted anew', honest.winner)]),
        ]),
    ...(aside === null
      ? []
      : [{ name: 'The model, on the rows set aside', error: aside, low: null, high: null, strong: true }]),
  ];
}

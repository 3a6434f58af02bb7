import { count, percent } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { missedSentences } from './acceptance.ts';
import { type Lexicon, raised, stopped } from './lexicon.ts';
import { modelsLookedAt, modelsPhrase } from './models.ts';
import { fittedUnit } from './scale.ts';
import { stabilitySentences, unsettled } from './stability.ts';
import { intervalsTooShort } from './unseen.ts';

/** At least this many lines stand on the first screen, and at most that many. */
const FEWEST = 3;
const MOST = 5;
/** From this weight on, what the examination found comes before the warnings; concern alone weighs less. */
const GRAVE = 0.55;

/**
 * "Before you rely on this": most important first. What was missed or found comes before what is always
 * true; the standing cautions fill the list up to three.
 */
export function bewareLines(record: StudyRecord, lexicon: Lexicon): string[] {
  const found = toKnow(record);
  const lines = [
    ...missedSentences(record.acceptance, fittedUnit(lexicon.response)),
    ...choiceLines(record),
    ...found.filter(({ weight }) => weight >= GRAVE).map(({ text }) => text),
    ...record.warnings.map((w) => raised(stopped(w.text))),
    ...found.filter(({ weight }) => weight < GRAVE).map(({ text }) => text),
    ...lossLine(record),
  ];
  const standing = standingLines(record);
  // Without a model that is what a reader has to know before anything else.
  const unique = [...new Set(record.model === null ? [...standing.splice(0, 1), ...lines] : lines)];
  const room = Math.max(0, Math.min(MOST, FEWEST) - unique.length);
  const shown = [
    ...unique.slice(0, MOST),
    ...standing.slice(0, Math.max(room, unique.length < MOST ? 1 : 0)),
  ];
  const hidden = unique.length - Math.min(unique.length, MOST);
  if (hidden > 0) shown[MOST - 1] = `${shown[MOST - 1]} (${hidden} more under “What to be careful about”.)`;
  return shown;
}

/**
 * What the examination lists, weightiest first, without what to do about it, which stands beside the question; from a record
 * without that list, the findings by concern.
 */
function toKnow({ examination }: StudyRecord): readonly { readonly text: string; readonly weight: number }[] {
  if (examination === null) return [];
  const { findings, before_you_rely: listed } = examination;
  if (listed !== undefined)
    return listed.map(({ text, weight, finding }) => {
      const verdict = stopped(findings.find(({ name }) => name === finding)?.verdict ?? '');
      return { text: verdict !== '' && text.startsWith(verdict) ? verdict : stopped(text), weight };
    });
  return [2, 1].flatMap((concern) =>
    findings
      .filter((finding) => finding.concern === concern)
      .map(({ verdict }) => ({ text: stopped(verdict), weight: concern === 2 ? 1 : 0 })),
  );
}

/** What rows not seen, and rows drawn anew, say against relying on the choice. */
function choiceLines({ selection }: StudyRecord): string[] {
  const { stability, hold_out: held, chosen } = selection;
  return [
    ...(held !== undefined && intervalsTooShort(held)
      ? [
          `Of the rows set aside, only ${count(held.inside ?? 0)} of ${count(held.with_interval ?? 0)} lie inside their ${percent(held.interval)} intervals: the intervals are too short.`,
        ]
      : []),
    ...(stability !== undefined && unsettled(stability, chosen)
      ? [`${stabilitySentences(stability, chosen)[0]!} The choice is not settled by these rows.`]
      : []),
  ];
}

function lossLine(record: StudyRecord): string[] {
  const { rows_read: read, rows_used: used } = record.data;
  const lost = read - used;
  return read > 0 && lost / read > 0.1
    ? [`${percent(lost / read)} of the rows read (${count(lost)} of ${count(read)}) were not used.`]
    : [];
}

function standingLines(record: StudyRecord): string[] {
  if (record.model === null) {
    return [
      'No model was chosen, so nothing here should be used as a prediction.',
      'Loosening an admission rule after seeing this result is a decision to be written down and defended, not a repair.',
      'What follows describes the data and what was tried.',
    ];
  }
  return [
    'The terms go with the response in these rows; that does not show that changing one would change the response.',
    choiceCaution(record),
    'The model speaks for conditions like those in the data and for no others.',
  ];
}

/** What the choice does to the figures of what was chosen. */
function choiceCaution(record: StudyRecord): string {
  if (record.selection.split_sample !== undefined)
    return 'The model was chosen on one part of the rows and estimated on the other, so its intervals and p-values owe nothing to the choice.';
  const looked = modelsLookedAt(record);
  if (looked.count < 2)
    return 'The model was judged on the same rows that it was fitted on; new rows may follow it less closely.';
  const among = looked.searched ? modelsPhrase(looked) : count(looked.count);
  return `The model was chosen among ${among} on these same rows, so its intervals and p-values look somewhat surer than they are.`;
}

import { wholeNumber } from '../numerals.ts';
import { listed } from '../select/words.ts';
import type { Finding, Topic } from './diagnostic.ts';
import { DIAGNOSTICS } from './examine.ts';

/** One thing to know before the model is relied on. */
export interface BeforeYouRely {
  /** What was found and what to do about it, as sentences. */
  readonly text: string;
  readonly about: Topic | 'outside';
  /** The finding it comes from; null where it comes from the predictions. */
  readonly finding: string | null;
  /** 1 worth a look, 2 take care. */
  readonly concern: 1 | 2;
  /** How much it matters for the declared question, between 0 and 1: the list is in this order. */
  readonly weight: number;
}

type Predictions = readonly { readonly label: string; readonly outside: readonly string[] }[];

type Importance = Readonly<Record<BeforeYouRely['about'], number>>;

/**
 * How much each thing matters to who predicts: first of all being where the data are, then a relation that holds
 * there and still, then how wide intervals are; which of two related variables it is hardly matters. Our judgement,
 * no source.
 */
const TO_PREDICT: Importance = {
  outside: 1,
  shape: 0.95,
  constancy: 0.95,
  independence: 0.9,
  spread: 0.85,
  rows: 0.8,
  influence: 0.75,
  outliers: 0.7,
  normality: 0.7,
  collinearity: 0.4,
};

/**
 * How much each thing matters to who asks what goes with what: whether effects can be told apart and hang on single
 * rows; the shape of the errors least, since coefficients average over many. Our judgement, no source.
 */
const TO_EXPLAIN: Importance = {
  collinearity: 0.95,
  influence: 0.95,
  shape: 0.9,
  constancy: 0.9,
  independence: 0.9,
  rows: 0.85,
  spread: 0.75,
  outliers: 0.7,
  normality: 0.4,
  outside: 0.4,
};

const BY_CONCERN = { 1: 0.45, 2: 1 } as const;

/**
 * What to know before relying on the model, weightiest first: of each thing that findings are about the one of most
 * concern, and predictions outside the data. What matters depends on whether the study predicts. Empty where nothing
 * calls for a word.
 */
export function beforeYouRely(findings: readonly Finding[], predictions: Predictions): BeforeYouRely[] {
  const importance = predictions.length > 0 ? TO_PREDICT : TO_EXPLAIN;
  const worst = new Map<Topic, Finding>();
  for (const finding of findings) {
    const topic = DIAGNOSTICS.find(({ name }) => name === finding.name)?.topic;
    if (topic === undefined || finding.concern === 0) continue;
    if (finding.concern > (worst.get(topic)?.concern ?? 0)) worst.set(topic, finding);
  }
  const items = [
    ...outside(predictions),
    ...[...worst].map(([about, { name, verdict, advice, concern }]) => ({
      text: advice === null ? verdict : `${verdict} ${advice}`,
      about,
      finding: name,
      concern: concern as 1 | 2,
    })),
  ];
  return items
    .map((item) => ({ ...item, weight: importance[item.about] * BY_CONCERN[item.concern] }))
    .sort((a, b) => b.weight - a.weight);
}

type Unweighted = Omit<BeforeYouRely, 'weight'>;

function outside(predictions: Predictions): Unweighted[] {
  const far = predictions.filter((one) => one.outside.length > 0);
  const [only] = far;
  if (only === undefined) return [];
  const item = { about: 'outside', finding: null, concern: 2 } as const;
  if (far.length === 1) {
    const why = listed(only.outside.map((sentence) => sentence.replace(/\.$/, '')));
    return [{ ...item, text: `The prediction for ${only.label} lies outside the data: ${why}.` }];
  }
  const names = far.slice(0, 3).map(({ label }) => label);
  const more = far.length - names.length;
  const which = more > 0 ? `${names.join(', ')} and ${wholeNumber(more)} more` : listed(names);
  return [
    {
      ...item,
      text: `${wholeNumber(far.length)} of ${wholeNumber(predictions.length)} predictions lie outside the data: ${which}.`,
    },
  ];
}

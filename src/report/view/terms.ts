import { differenceTitle } from '../chart/effects.ts';
import { levelsChart } from '../chart/levels.ts';
import { partialChart } from '../chart/partial.ts';
import type { Figure } from '../chart/svg.ts';
import {
  count,
  pPhrase,
  range,
  rounded,
  roundingOfInterval,
  significant,
  value,
  withUnit,
} from '../numbers.ts';
import type { RecordCoefficient, RecordExamination, RecordModel, RecordTerm } from '../record-type.ts';
import type { TermView } from '../view.ts';
import { effectOf, shortEffect } from '../words/effect.ts';
import { type Lexicon, labelOf, raised, termLabel, unitOf } from '../words/lexicon.ts';
import { ownScaleSentences } from '../words/own-scale.ts';
import { pairsSentence } from '../words/pairs.ts';
import { fittedUnit, scaleKind } from '../words/scale.ts';
import { slopesAlongSentences } from '../words/slopes.ts';
import {
  baselineMoved,
  movesSeveral,
  partners,
  partnersHeld,
  placeText,
  slopeName,
  slopeSubject,
  stepRange,
  termSentences,
} from '../words/term.ts';

import { levelsView } from './levels.ts';

type Points = RecordExamination['points'] | null;

/** Levels or slopes from this many on get a table, since sentences no longer list them. */
const ROWS_FROM = 5;

export function termViews(
  lexicon: Lexicon,
  model: RecordModel,
  coefficients: readonly RecordCoefficient[],
  points: Points,
): TermView[] {
  const drawn = new Set<string>();
  return model.terms.map((term, i) => {
    const variable = term.variables[0] ?? term.name;
    // Terms of one variable share its curve: it is drawn with the first of them.
    const fresh = term.kind === 'interaction' || !drawn.has(variable);
    if (term.kind !== 'interaction') drawn.add(variable);
    const pairs = pairsSentence(lexicon, term);
    return {
      heading: raised(termLabel(lexicon, term)),
      sentences: [
        ...termSentences(lexicon, term, model, coefficients),
        ...slopesAlongSentences(lexicon, term, model),
        ...ownScaleSentences(lexicon, term),
        ...(pairs === null ? [] : [pairs]),
      ],
      test: testSentence(term),
      levels: levelsView(lexicon, term),
      chart: fresh ? termChart(lexicon, term, model, `term-${i + 1}`, points) : null,
      rows: termRows(lexicon, term),
    };
  });
}

function testSentence({ joint_f: f }: RecordTerm): string | null {
  if (f === null || f.statistic === null || f.p_value === null) return null;
  const columns =
    f.df1 === 1
      ? 'With against without this term'
      : `With against without this term’s ${count(f.df1)}\u00a0columns`;
  return `${columns}: F\u00a0=\u00a0${significant(f.statistic, 3)} on ${count(f.df1)} and ${count(f.df2)}\u00a0degrees of freedom, ${pPhrase(f.p_value)}.`;
}

function termChart(
  lexicon: Lexicon,
  term: RecordTerm,
  model: RecordModel,
  name: string,
  points: Points,
): Figure | null {
  const heading = raised(termLabel(lexicon, term));
  if (term.kind === 'interaction') {
    const [first] = term.slopes;
    if (first === undefined) return null;
    const sorted = [...term.slopes].sort((a, b) => a.estimate - b.estimate);
    const low = sorted[0]!;
    const high = sorted.at(-1)!;
    const several = movesSeveral(term);
    const subject = several
      ? `differences from ${baselineMoved(lexicon, first)}`
      : slopeSubject(lexicon, first);
    const caption = several
      ? `${raised(subject)}: from ${shortEffect(lexicon, low)} (${slopeName(lexicon, low, term)}) to ${shortEffect(lexicon, high)} (${slopeName(lexicon, high, term)}).`
      : `${raised(subject)} goes with ${shortEffect(lexicon, low)} at ${placeText(lexicon, low.at)}, ${shortEffect(lexicon, high)} at ${placeText(lexicon, high.at)}.`;
    return levelsChart(
      lexicon,
      name,
      `${heading}: ${subject}`,
      term.slopes.map((s) => ({ name: slopeName(lexicon, s, term), difference: s })),
      caption,
      slopeAxis(lexicon, first),
    );
  }
  if (term.kind === 'category' || term.kind === 'flag') {
    const [first] = term.typical_steps;
    if (first === undefined) return null;
    const largest = [...term.typical_steps].sort((a, b) => Math.abs(b.estimate) - Math.abs(a.estimate))[0]!;
    const caption = `Against ${first.from} (hollow, at the plumb line), ${largest.to} differs most: ${effectOf(lexicon, largest)}.`;
    const marks = [
      { name: first.from, difference: null },
      ...term.typical_steps.map((s) => ({ name: s.to, difference: s })),
    ];
    return levelsChart(lexicon, name, heading, marks, caption);
  }
  if (term.curve === null) return null;
  return partialChart(lexicon, name, term.curve, points, curveCaption(lexicon, term, model));
}

function curveCaption(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string {
  const variable = term.variables[0] ?? term.name;
  const [step] = term.typical_steps;
  const others = partners(term, model);
  const label = raised(labelOf(lexicon, variable));
  if (others.length > 0) {
    return `${label}, ${partnersHeld(lexicon, others)}; the interaction tells the rest. Dots: the line plus each row’s residual.`;
  }
  const finding =
    step === undefined
      ? `${label} and ${lexicon.response.label}`
      : `${label} ${stepRange(lexicon, variable, step)}: ${effectOf(lexicon, step)}`;
  return `${finding}. Dots: the line plus each row’s residual.`;
}

function termRows(lexicon: Lexicon, term: RecordTerm): TermView['rows'] {
  const along = term.slopes_along;
  const slopeUnit = along ? unitOf(lexicon, along.variable) : null;
  const rows =
    term.kind === 'interaction'
      ? term.slopes.map((s) => ({ ...s, name: slopeName(lexicon, s, term) }))
      : term.kind === 'category'
        ? term.typical_steps.map((s) => ({ ...s, name: s.to }))
        : along?.declared
          ? along.places.map((place) => ({ ...place, name: withUnit(value(place.at, 4), slopeUnit) }))
          : [];
  if (rows.length < ROWS_FROM) return [];
  const log = scaleKind(lexicon.response.scale) === 'log';
  const unit = fittedUnit(lexicon.response);
  return rows.map((row) => {
    const back = (x: number | null): number | null => (x === null ? null : log ? Math.expm1(x) * 100 : x);
    const estimate = back(row.estimate) as number;
    const lower = back(row.lower);
    const upper = back(row.upper);
    const rounding = roundingOfInterval(estimate, lower, upper);
    const mark = log ? '\u202f%' : unit ? `\u00a0${unit}` : '';
    return {
      name: row.name,
      estimate: rounded(estimate, rounding) + mark,
      interval: range(lower, upper, rounding) + mark,
    };
  });
}

/** "difference in fuel burned, L per t". */
function slopeAxis(lexicon: Lexicon, slope: RecordTerm['slopes'][number]): string {
  const unit = slope.per === null ? null : unitOf(lexicon, slope.of);
  return `${differenceTitle(lexicon)}${slope.per === null ? '' : ` per ${unit ?? '1'}`}`;
}

import { influenceChart } from '../chart/influence.ts';
import { quantilesChart } from '../chart/quantiles.ts';
import { residualsFittedChart, residualsPredictorChart, residualsTimeChart } from '../chart/residuals.ts';
import { residualsEachChart } from '../chart/residuals-each.ts';
import { responsePowerChart } from '../chart/response-power.ts';
import type { Figure } from '../chart/svg.ts';
import type { RecordExamination, RecordFinding } from '../record-type.ts';
import type { FindingView, QuietView, TrustView } from '../view.ts';
import { concernWord, evidence } from '../words/finding.ts';
import { type Lexicon, stopped } from '../words/lexicon.ts';

interface Drawing {
  /** Names of the findings that it answers; it stands beside the first of them that found something. */
  readonly answers: readonly string[];
  /** Draws it; a drawing that is not shown is not made. */
  readonly figure: () => Figure | null;
  /** Whether it is worth a look where nothing was found too. */
  readonly always: boolean;
}

/** What was found in full with its drawings, what was asked in vain in brief, and the drawings that are left. */
export function findingViews(
  lexicon: Lexicon,
  examination: RecordExamination,
): Pick<TrustView, 'findings' | 'quiet' | 'pictures'> {
  const drawings = drawingsOf(lexicon, examination);
  const used = new Set<Drawing>();
  const loud = examination.findings.filter(({ concern }) => concern > 0);
  const findings = [2, 1].flatMap((concern) =>
    loud
      .filter((finding) => finding.concern === concern)
      .map((finding) => {
        const own = drawings.filter((one) => one.answers.includes(finding.name) && !used.has(one));
        for (const one of own) used.add(one);
        return findingView(
          finding,
          own.flatMap(({ figure }) => figure() ?? []),
        );
      }),
  );
  return {
    findings,
    quiet: examination.findings.filter(({ concern }) => concern === 0).map(quietView),
    pictures: drawings.flatMap((one) => (one.always && !used.has(one) ? (one.figure() ?? []) : [])),
  };
}

function drawingsOf(lexicon: Lexicon, examination: RecordExamination): Drawing[] {
  const { points, findings } = examination;
  const each = residualsEachChart(lexicon, points);
  const scale = findings.find(({ name }) => name === 'response_scale');
  return [
    { answers: ['shape', 'lack_of_fit', 'equal_spread', 'uneven_spread'], figure: () => each, always: true },
    {
      answers: ['equal_spread', 'uneven_spread', 'response_scale'],
      figure: () => residualsFittedChart(lexicon, points),
      always: true,
    },
    {
      answers: ['equal_spread', 'uneven_spread'],
      figure: () => residualsPredictorChart(lexicon, points),
      // Where each variable has a panel of its own, this one only adds what was found.
      always: each === null,
    },
    {
      answers: ['response_scale'],
      figure: () => (scale === undefined ? null : responsePowerChart(scale)),
      always: false,
    },
    {
      answers: ['independence', 'serial_correlation', 'drift', 'same_in_both_parts'],
      figure: () => residualsTimeChart(lexicon, points),
      always: true,
    },
    {
      answers: ['normality', 'skewness_and_tails', 'outlying_rows'],
      figure: () => quantilesChart(examination),
      always: true,
    },
    {
      answers: ['influence', 'choice_without_a_row'],
      figure: () => influenceChart(examination),
      always: true,
    },
  ];
}

function findingView(finding: RecordFinding, charts: readonly Figure[]): FindingView {
  return {
    name: finding.name,
    question: finding.question,
    word: concernWord(finding.concern),
    concern: finding.concern,
    verdict: stopped(finding.verdict),
    evidence: evidence(finding),
    advice: finding.advice === null ? null : stopped(finding.advice),
    charts,
  };
}

function quietView(finding: RecordFinding): QuietView {
  return {
    name: finding.name,
    question: finding.question,
    verdict: stopped(finding.verdict),
    evidence: evidence(finding, true),
  };
}

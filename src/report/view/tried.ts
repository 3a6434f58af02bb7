import { candidatesChart } from '../chart/candidates.ts';
import { count, fixed, NONE, percent, pValue, rounded, share, significant } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { CandidateView, PairView, TriedView } from '../view.ts';
import { counted, type Lexicon, lexiconOf, stopped } from '../words/lexicon.ts';
import { scaleName } from '../words/scale.ts';
import { criterionName, criterionRounding, ruleSentences } from '../words/selection.ts';
import { errorText } from '../words/unseen.ts';
import { validationSentences } from '../words/validation.ts';
import { familyViews } from './families.ts';
import { stabilityView } from './stability.ts';

/** At most so many nested pairs are shown. */
const PAIRS = 12;
/** Of a search the pairs are many, and only those about the choice say something. */
const PAIRS_OF_SEARCHED = 6;
/** Reasons told of a refused candidate. */
const REASONS = 2;
/** So many candidates are shown whole. */
const CANDIDATES = 16;
/** Of more than that, the best ranked; the machine-readable table has them all. */
const BEST = 10;

export function triedView(record: StudyRecord): TriedView {
  const { selection } = record;
  const lexicon = lexiconOf(record);
  const families = familyViews(record);
  const candidates = candidateViews(record, lexicon);
  const more = record.candidates.length - candidates.length;
  return {
    rule: [...ruleSentences(record), ...validationSentences(selection)],
    families,
    stability: stabilityView(record),
    admission: selection.admission.map(stopped),
    because: stopped(selection.because),
    criterion: criterionName(selection.rank_by),
    ranked: selection.ranking.some((r) => r.value !== null),
    hasEvidence: selection.ranking.length > 1 && selection.ranking.some((r) => r.evidence != null),
    hasError: record.candidates.some((c) => c.validation != null),
    candidates,
    candidatesMore:
      more > 0
        ? `${counted(more, 'further candidate is', 'further candidates are', count)} in tables/candidates.csv.`
        : null,
    // Where a drawing of the best of each size stands above, the same dots again say nothing new.
    chart: families.some(({ chart }) => chart !== null) ? null : candidatesChart(record),
    ...pairs(record),
  };
}

function candidateViews(record: StudyRecord, lexicon: Lexicon): CandidateView[] {
  const { selection } = record;
  const rounding = criterionRounding(selection);
  const ordered =
    selection.ranking.length > 0
      ? selection.ranking
      : record.candidates.map((c, i) => ({
          rank: i + 1,
          candidate: c.name,
          value: null,
          difference: null,
          evidence: null,
        }));
  const most = ordered.length > CANDIDATES ? BEST : CANDIDATES;
  const shown = ordered.filter((r, i) => i < most || r.candidate === selection.chosen);
  return shown.flatMap((r) => {
    const c = record.candidates.find((candidate) => candidate.name === r.candidate);
    if (c === undefined) return [];
    const chosen = c.name === selection.chosen;
    return [
      {
        rank: count(r.rank),
        name: c.name,
        terms: c.terms.length === 0 ? 'no terms: the mean alone' : c.terms.join('; '),
        scale: c.scale === record.response.scale ? null : scaleName(c.scale),
        value: rounded(r.value, rounding),
        difference: r.difference === null ? NONE : fixed(r.difference, rounding.decimals),
        coefficients: count(c.coefficient_count),
        adjustedRSquared: share(c.adjusted_r_squared),
        evidence: r.evidence == null ? NONE : percent(r.evidence),
        error: c.validation == null ? NONE : errorText(lexicon, c.validation.root_mean_squared_error),
        admitted: c.admitted,
        chosen,
        verdict: chosen ? 'chosen' : c.admitted ? 'admitted' : refusal(c.refused_because),
        dropped: c.dropped.map((d) => stopped(d.sentence)),
      },
    ];
  });
}

/** The first reasons in full, the others counted. */
function refusal(reasons: readonly string[]): string {
  if (reasons.length === 0) return 'not admitted';
  const more = reasons.length - REASONS;
  const rest = more > 0 ? [`${counted(more, 'more reason is', 'more reasons are')} in the tables.`] : [];
  return [...reasons.slice(0, REASONS).map(stopped), ...rest].join(' ');
}

function pairs(record: StudyRecord): { pairs: PairView[]; pairsDecided: boolean; pairsNote: string | null } {
  const all = record.partial_f;
  const { chosen } = record.selection;
  // Those that decided come first, then those that hold the chosen model against its neighbours.
  const shown = [
    ...all.filter((pair) => pair.decided),
    ...all
      .filter((pair) => !pair.decided && (pair.smaller === chosen || pair.larger === chosen))
      .sort((a, b) => (record.families === undefined ? 0 : a.df1 - b.df1)),
  ].slice(0, record.families === undefined ? PAIRS : PAIRS_OF_SEARCHED);
  const hidden = all.length - shown.length;
  const notes = [
    ...(hidden > 0 && shown.length > 0
      ? [`${counted(hidden, 'further nested pair is', 'further nested pairs are', count)} in the record.`]
      : []),
    ...(record.partial_f_omitted === null ? [] : [stopped(record.partial_f_omitted)]),
  ];
  return {
    pairs: shown.map((pair) => ({
      smaller: pair.smaller,
      larger: pair.larger,
      statistic: significant(pair.statistic, 3),
      freedom: `${count(pair.df1)} and ${count(pair.df2)}`,
      pValue: pValue(pair.p_value),
      decided: pair.decided,
    })),
    pairsDecided: shown.some((pair) => pair.decided),
    pairsNote: notes.length === 0 ? null : notes.join(' '),
  };
}

import { candidatesChart } from '../chart/candidates.ts';
import { count, fixed, NONE, pValue, rounded, share, significant } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { CandidateView, PairView, TriedView } from '../view.ts';
import { counted, stopped } from '../words/lexicon.ts';
import { scaleName } from '../words/scale.ts';
import { criterionName, criterionRounding, ruleSentences } from '../words/selection.ts';

/** At most so many nested pairs are shown. */
const PAIRS = 12;
/** More candidates than this are cut in the table; the machine-readable table has them all. */
const CANDIDATES = 60;

export function triedView(record: StudyRecord): TriedView {
  const { selection } = record;
  return {
    rule: ruleSentences(selection, record.candidates.length),
    admission: selection.admission.map(stopped),
    because: stopped(selection.because),
    criterion: criterionName(selection.rank_by),
    ranked: selection.ranking.some((r) => r.value !== null),
    candidates: candidateViews(record),
    chart: candidatesChart(record),
    ...pairs(record),
  };
}

function candidateViews(record: StudyRecord): CandidateView[] {
  const { selection } = record;
  const rounding = criterionRounding(selection);
  const ordered =
    selection.ranking.length > 0
      ? selection.ranking
      : record.candidates.map((c, i) => ({ rank: i + 1, candidate: c.name, value: null, difference: null }));
  const shown = ordered.filter((r, i) => i < CANDIDATES || r.candidate === selection.chosen);
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
        admitted: c.admitted,
        chosen,
        verdict: chosen
          ? 'chosen'
          : c.admitted
            ? 'admitted'
            : c.refused_because.map(stopped).join(' ') || 'not admitted',
        dropped: c.dropped.map((d) => stopped(d.sentence)),
      },
    ];
  });
}

function pairs(record: StudyRecord): { pairs: PairView[]; pairsDecided: boolean; pairsNote: string | null } {
  const all = record.partial_f;
  const { chosen } = record.selection;
  // Those that decided come first, then those that hold the chosen model against its neighbours.
  const shown = [
    ...all.filter((pair) => pair.decided),
    ...all.filter((pair) => !pair.decided && (pair.smaller === chosen || pair.larger === chosen)),
  ].slice(0, PAIRS);
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

import type { FitContext } from '../engine/fit.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { checkSignNames } from './admission/signs.ts';
import { type Admission, admissionSentences, admit } from './admission.ts';
import { chooseByPartialF } from './choose-by-partial-f.ts';
import { chooseByValue } from './choose-by-value.ts';
import { CRITERIA, criterionNamed } from './criteria.ts';
import type { Criterion } from './criterion.ts';
import { type NestedPair, type PartialFRow, partialFTable } from './partial-f.ts';
import { type Ranked, rank } from './rank.ts';
import { listed, named } from './words.ts';

/** What the declared rule made of the fits. Candidates are meant by index, in the order of declaration. */
export interface Choice {
  /** Every candidate, admitted or not, best first. */
  readonly ranking: readonly Ranked[];
  /** By candidate. */
  readonly admissions: readonly Admission[];
  /** The declared admission rules, one sentence each. */
  readonly rules: readonly string[];
  /** Null where no candidate was admitted. */
  readonly chosen: number | null;
  /** Why that one, or none, in sentences. */
  readonly because: string;
  readonly partialF: readonly PartialFRow[];
  /** Why not every nested pair is listed, as a sentence; null where all are. */
  readonly partialFOmitted: string | null;
}

/**
 * Holds every candidate against the admission rules, ranks all of them by the declared criterion, and chooses
 * among the admitted ones. Reports a criterion that cannot do this and names of sign rules that no candidate
 * has; the choice is then of no use.
 */
export function choose(study: Study, context: FitContext, report: Report): Choice {
  const { selection } = study;
  const criterion = criterionNamed(selection.rankBy);
  checkScales(study, criterion, context, report);
  checkDefined(study, criterion, context, report);
  checkSignNames(study, context, report);

  const { fits } = context;
  const admissions = fits.map((_, index) => admit(selection, criterion, index, context));
  const admitted = [...fits.keys()].filter((index) => admissions[index]!.admitted);
  const pick = pickOf();
  const table = partialFTable(fits, pick.chosen, pick.decisive);
  return {
    ranking: pick.ranking,
    admissions,
    rules: admissionSentences(selection.admit),
    chosen: pick.chosen,
    because: (pick.chosen === null ? noneAdmitted(context, admissions) : pick.because).join(' '),
    partialF: table.rows,
    partialFOmitted: table.omitted,
  };

  function pickOf(): Outcome {
    if (criterion.name === 'partial_f') {
      const picked = chooseByPartialF(selection, fits, admitted);
      return selection.preferSmallerWithin === 0
        ? picked
        : {
            ...picked,
            because: [...picked.because, 'prefer_smaller_within plays no part where partial F chooses.'],
          };
    }
    const ranking = rank(criterion, context);
    if (admitted.length === 0) return { ranking, chosen: null, because: [], decisive: [] };
    return {
      ranking,
      ...chooseByValue(selection, criterion, context, ranking, admissions, admitted),
      decisive: [],
    };
  }
}

interface Outcome {
  readonly ranking: readonly Ranked[];
  readonly chosen: number | null;
  readonly because: readonly string[];
  readonly decisive: readonly NestedPair[];
}

/** Candidates whose reasons are told when none was admitted; the table of candidates has all. */
const MOST_TOLD = 3;

function noneAdmitted({ fits }: FitContext, admissions: readonly Admission[]): string[] {
  const told = fits
    .slice(0, MOST_TOLD)
    .map((fit, index) => `${named(fit.candidate.name)}: ${admissions[index]!.refusedBecause.join(' ')}`);
  if (fits.length === 1) return ['The only candidate was not admitted.', ...told];
  const rest = fits.length - told.length;
  const more =
    rest === 0
      ? []
      : [
          `The reasons for the other ${rest === 1 ? 'one stand' : `${rest} stand`} in the table of candidates.`,
        ];
  return [`None of the ${fits.length} candidates was admitted.`, ...told, ...more];
}

/** The study's own check comes first; this one also holds where a study was not read from a file. */
function checkScales(study: Study, criterion: Criterion, { fits }: FitContext, report: Report): void {
  if (criterion.acrossScales || new Set(fits.map((fit) => fit.candidate.responseColumn)).size < 2) return;
  const able = CRITERIA.filter((each) => each.acrossScales).map(({ name }) => name);
  report({
    code: 'criterion_across_scales',
    severity: 'error',
    place: study.placeOf(['selection', 'rank_by']),
    message: `selection.rank_by is ${criterion.name}, which cannot rank candidates across response scales.`,
    hint: `Rank by ${listed(able, 'or')}, or give all candidates one scale.`,
  });
}

function checkDefined(study: Study, criterion: Criterion, context: FitContext, report: Report): void {
  const all = [...context.fits.keys()];
  const isDefined = (each: Criterion) => all.some((index) => each.value(index, context) !== null);
  if (criterion.name === 'partial_f' || all.length === 0 || isDefined(criterion)) return;
  const across = new Set(context.fits.map((fit) => fit.candidate.responseColumn)).size > 1;
  const others = CRITERIA.filter((each) => isDefined(each) && (each.acrossScales || !across)).map(
    ({ name }) => name,
  );
  const first = named(context.fits[0]!.candidate.name);
  report({
    code: 'criterion_undefined',
    severity: 'error',
    place: study.placeOf(['selection', 'rank_by']),
    message: `selection.rank_by is ${criterion.name}, which is not defined for any candidate. For ${first}: ${criterion.whyUndefined(0, context)}.`,
    ...(others.length === 0 ? {} : { hint: `Defined here: ${listed(others)}.` }),
  });
}

import { didYouMean, lookUp, type Names, TYPE_WORDS } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { fault, type Loose, type Reading, warning } from './reading.ts';
import type {
  EqualityPlan,
  HypothesisPlan,
  InferencePlan,
  StandardErrorsPlan,
  VariableType,
} from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';
import type { EqualityInFile } from './study-file.generated.ts';

/**
 * How the coefficients are judged. Names of coefficients are not known before the data is, so they are looked up
 * later (`checkHypotheses`).
 * @param time the variable that orders the rows, or null
 * @param inTerms variables of all candidates' terms
 */
export function resolveInference(
  reading: Reading,
  names: Names,
  time: string | null,
  inTerms: readonly string[],
): InferencePlan {
  const written = reading.file.inference;
  return {
    confidence: written?.confidence ?? STUDY_DEFAULTS['inference.confidence'],
    dependentColumns: written?.dependent_columns ?? STUDY_DEFAULTS['inference.dependent_columns'],
    standardErrors: resolveStandardErrors(reading, names, time),
    hypotheses: resolveHypotheses(reading),
    levelComparisons: written?.level_comparisons ?? STUDY_DEFAULTS['inference.level_comparisons'],
    simultaneous: written?.simultaneous ?? STUDY_DEFAULTS['inference.simultaneous'],
    slopesAt: resolveSlopes(reading, names, inTerms),
  };
}

const TELLS_CLUSTERS: readonly VariableType[] = ['category', 'identifier', 'text', 'integer', 'date'];

function resolveStandardErrors(reading: Reading, names: Names, time: string | null): StandardErrorsPlan {
  const written = reading.file.inference?.standard_errors;
  const path = ['inference', 'standard_errors'];
  const classical = { kind: STUDY_DEFAULTS['inference.standard_errors'] };
  if (written === undefined) return classical;
  if (typeof written === 'string') return { kind: written };
  if ('clustered_by' in written) {
    const name = written.clustered_by;
    if (name === undefined) return classical;
    const at = [...path, 'clustered_by'];
    const named = lookUp(reading, names, name, at);
    if (named === null || named.type === null) return classical;
    // A number that is worked out is usually a label of the writer's making, such as a year or a week.
    if (!TELLS_CLUSTERS.includes(named.type) && !(named.derived && named.type === 'number')) {
      const message = `${showPath(at)} names ${name}, which is ${TYPE_WORDS[named.type]}; clusters are named by a category, an identifier, a text, an integer, a date or a derived number.`;
      fault(reading, 'type_unsuited', at, message);
    }
    return { kind: 'clustered', by: name };
  }
  if ('hac_lags' in written) {
    const lags = written.hac_lags;
    if (lags === undefined) return classical;
    if (time === null) {
      const at = [...path, 'hac_lags'];
      const message = `${showPath(at)} needs rows in time order, but data.time is not declared.`;
      fault(
        reading,
        'key_missing',
        at,
        message,
        'Declare under data.time the variable that orders the rows.',
      );
    }
    return { kind: 'hac', lags: typeof lags === 'number' ? lags : 'auto' };
  }
  return classical;
}

function resolveHypotheses(reading: Reading): HypothesisPlan[] {
  const plans: HypothesisPlan[] = [];
  reading.file.inference?.hypotheses?.forEach((written, index) => {
    if (written === undefined) return;
    const path = ['inference', 'hypotheses', index];
    const { name } = written;
    const equalities =
      'all_of' in written
        ? (written.all_of ?? []).flatMap((each, k) =>
            each === undefined ? [] : resolveEquality(reading, each, [...path, 'all_of', k]),
          )
        : 'combination' in written
          ? resolveEquality(reading, written, path)
          : [];
    if (name === undefined) return;
    const earlier = plans.findIndex((plan) => plan.name === name);
    if (earlier >= 0) {
      const message = `${showPath([...path, 'name'])} is ${quote(name)}, the name of inference.hypotheses[${earlier}] already.`;
      fault(reading, 'name_twice', [...path, 'name'], message);
    }
    const follows = dependentEquality(equalities);
    if (follows !== null) {
      const at = equalities[follows]!.path;
      const message = `${showPath(at)} says of the coefficients what the equalities before it say, or contradicts them.`;
      fault(reading, 'limit_nonsense', at, message, 'Leave it out.');
    }
    plans.push({ name, equalities });
  });
  return plans;
}

function resolveEquality(reading: Reading, written: Loose<EqualityInFile>, path: Path): EqualityPlan[] {
  const at = [...path, 'combination'];
  const combination = new Map<string, number>();
  for (const name of reading.written.keysAt(at)) {
    const multiplier = written.combination?.[name];
    if (multiplier !== undefined) combination.set(name, multiplier);
  }
  if (combination.size === 0) return [];
  if ([...combination.values()].every((multiplier) => multiplier === 0)) {
    const message = `${showPath(at)} has the multiplier 0 for every coefficient, so it says nothing about them.`;
    fault(reading, 'limit_nonsense', at, message);
  }
  return [{ combination, equals: written.equals ?? 0, path }];
}

/** The index of the first equality whose combination is one of those before it, or null; by elimination. */
function dependentEquality(equalities: readonly EqualityPlan[]): number | null {
  const names = [...new Set(equalities.flatMap(({ combination }) => [...combination.keys()]))];
  const reduced: { readonly row: readonly number[]; readonly pivot: number }[] = [];
  for (const [index, { combination }] of equalities.entries()) {
    let row = names.map((name) => combination.get(name) ?? 0);
    const size = largest(row);
    if (size === 0) continue;
    for (const { row: earlier, pivot } of reduced) {
      const factor = row[pivot]! / earlier[pivot]!;
      row = row.map((value, k) => (k === pivot ? 0 : value - factor * earlier[k]!));
    }
    if (largest(row) <= 1e-12 * size) return index;
    reduced.push({ row, pivot: row.findIndex((value) => Math.abs(value) === largest(row)) });
  }
  return null;
}

function largest(values: readonly number[]): number {
  return values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
}

function resolveSlopes(
  reading: Reading,
  names: Names,
  inTerms: readonly string[],
): ReadonlyMap<string, readonly number[]> {
  const written = reading.file.inference?.slopes_at;
  const slopes = new Map<string, readonly number[]>();
  for (const name of reading.written.keysAt(['inference', 'slopes_at'])) {
    const path = ['inference', 'slopes_at', name];
    const values = (written?.[name] ?? []).filter((value) => value !== undefined);
    const named = names.get(name);
    if (named === undefined) {
      const message = `${showPath(path)} is neither a variable nor derived.`;
      fault(reading, 'name_unknown', path, message, didYouMean(name, inTerms));
      continue;
    }
    if (named.type !== null && named.type !== 'number' && named.type !== 'integer') {
      const message = `${showPath(path)} names ${name}, which is ${TYPE_WORDS[named.type]}; slopes are along a number.`;
      fault(reading, 'type_unsuited', path, message);
      continue;
    }
    if (!inTerms.includes(name)) {
      const message = `${showPath(path)} gives places for the slopes of ${name}, which no candidate uses.`;
      warning(reading, 'name_unused', reading.written.keyPlaceOf(path), message, didYouMean(name, inTerms));
    }
    slopes.set(
      name,
      [...new Set(values)].sort((a, b) => a - b),
    );
  }
  return slopes;
}

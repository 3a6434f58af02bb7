import type {
  CoefficientChange,
  ComparedModel,
  Comparison,
  ComparisonTest,
  ContractChange,
  DeclarationChange,
  NewRows,
} from '../comparison-type.ts';
import {
  count,
  fixed,
  percent,
  pPhrase,
  rounded,
  roundingFor,
  significant,
  value,
  withUnit,
} from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { comparedCriterionSentence } from './acceptance.ts';
import { counted, type Lexicon, labelOf, listed, named, raised, stopped, unitOf } from './lexicon.ts';
import { criterionName, criterionRounding } from './selection.ts';

/** A change of a coefficient of this many earlier standard errors is more than chance makes usual. */
const MUCH = 2;
/** Tests below this are pointed out. */
const RARE = 0.05;

/** What became of the rows. */
export function rowsSentences({ rows, earlier, later }: Comparison): string[] {
  if (rows === null) {
    return [
      `${counted(earlier.rows_used, 'row was', 'rows were', count)} used before, ${count(later.rows_used)} are used now.`,
    ];
  }
  const { kept, revised, added, removed } = rows;
  const fate = [
    { rows: kept, what: 'unchanged' },
    { rows: revised ?? 0, what: 'revised' },
    { rows: removed, what: 'gone' },
  ]
    .filter((part) => part.rows > 0)
    .map((part, k) => `${count(part.rows)} ${k > 0 ? '' : part.rows === 1 ? 'is ' : 'are '}${part.what}`);
  const before = `Of the ${counted(earlier.rows_used, 'row', 'rows', count)} used before, ${listed(fate)}.`;
  const now = `${added === 0 ? 'No row is' : counted(added, 'row is', 'rows are', count)} new; ${count(later.rows_used)} are used now.`;
  return [before, now];
}

/** Which variables were revised, and in how many rows. */
export function revisedSentence({ rows }: Comparison): string | null {
  if (rows === null || rows.revised_cells.length === 0) return null;
  const parts = rows.revised_cells.map(
    ({ variable, rows: n }) => `${variable} in ${counted(n, 'row', 'rows', count)}`,
  );
  return `Revised: ${listed(parts)}.`;
}

/** The unit that a variable's earlier values are in: that of now, but where the contract says that it was another. */
export function earlierUnitOf(
  lexicon: Lexicon,
  variable: string,
  contract: readonly ContractChange[],
): string | null {
  const was = contract.find((change) => change.kind === 'unit' && change.variable === variable);
  if (was === undefined) return unitOf(lexicon, variable);
  return was.earlier === 'none' ? null : String(was.earlier);
}

/** One change of the contract as a sentence; `contract` has all changes, and so the units of before. */
export function contractChangeSentence(
  lexicon: Lexicon,
  change: ContractChange,
  contract: readonly ContractChange[],
): string {
  const { variable, name, likely } = change;
  const label = variable ?? '';
  const unit = variable === null ? null : unitOf(lexicon, variable);
  const unitBefore = variable === null ? null : earlierUnitOf(lexicon, variable, contract);
  const numbers = (side: ContractChange['earlier']) => (Array.isArray(side) ? side : []);
  const [a, b] = [numbers(change.earlier), numbers(change.later)];
  const span = (ends: readonly number[], of: string | null) =>
    withUnit(`${value(ends[0])} to ${value(ends[1])}`, of);
  switch (change.kind) {
    case 'level_new':
      return `The level “${name}” of ${label} is new, with ${counted(b[0] ?? 0, 'row', 'rows', count)}.`;
    case 'level_gone':
      return `The level “${name}” of ${label}, with ${counted(a[0] ?? 0, 'row', 'rows', count)} before, has none now.${likelySentence(change)}`;
    case 'level_undeclared':
      return `Cells of ${label} say “${name}”, which is no declared level: is it a new one? Then declare it.`;
    case 'rescaled':
      return `${rescaledPhrase(label, b)}${unitBefore === unit ? ': has its unit changed?' : ', and its declared unit is another.'}`;
    case 'range':
      return `${label} runs from ${span(b, unit)}; before it ran from ${span(a, unitBefore)}.`;
    case 'middle':
      return `The middle of ${label} has moved: its median is ${withUnit(value(b[0]), unit)}, outside ${span(a, unitBefore)}, the middle half of its values before.`;
    case 'missing':
      return `${label} is missing more often: in ${percent(b[0] ?? 0)} of the rows read, ${percent(a[0] ?? 0)} before.`;
    case 'bad_values':
      return `${counted(b[0] ?? 0, 'cell breaks', 'cells break', count)} the contract, ${count(a[0] ?? 0)} before.`;
    case 'rows_lost':
      return `${percent(b[0] ?? 0)} of the rows read are not used, ${percent(a[0] ?? 0)} before.`;
    case 'variable_gone':
      return `The variable ${label} is no longer declared.${likely === null ? '' : ` Is it ${likely} now?`}`;
    case 'variable_new':
      return `The variable ${label} is newly declared.`;
    case 'column_gone':
      return `The column “${name}”, which the study does not use, is gone.${likely === null ? '' : ` Is it “${likely}” now?`}`;
    case 'column_new':
      return `The column “${name}” is new; the study does not use it.`;
    case 'unit':
      return `The unit of ${label} is declared as ${String(change.later)}, before as ${String(change.earlier)}: unless that is another name of the same unit, values of before and now are not to be compared, nor is what comes of them.`;
    case 'type':
      return `${label} is declared as ${String(change.later)}, before as ${String(change.earlier)}.`;
  }
}

/** "All 272 revised values of length are 0.1 × what they were" */
function rescaledPhrase(
  label: string,
  [following = 0, revised = 0, offset = 0, factor = 1]: readonly number[],
) {
  const which = following === revised ? `All ${count(revised)}` : `${count(following)} of ${count(revised)}`;
  const times = `${value(factor)} × what they were`;
  const line =
    factor === 1
      ? `${value(Math.abs(offset), 5)} ${offset < 0 ? 'below' : 'above'} what they were`
      : offset === 0
        ? times
        : `${times} ${offset < 0 ? '−' : '+'} ${value(Math.abs(offset), 5)}`;
  return `${which} revised values of ${label} are ${line}`;
}

function likelySentence({ likely, because, name }: ContractChange): string {
  if (likely === null) return '';
  return because === 'rows'
    ? ` It is called “${likely}” now: every row that had “${name}” and is still there has that.`
    : because === 'contract'
      ? ` In its variable most cells that break the contract say “${likely}”: is that its new name? Then declare it.`
      : ` Is it spelt “${likely}” now?`;
}

/** One change of the study as a sentence. */
export function declarationChangeSentence({ kind, name, earlier, later }: DeclarationChange): string {
  const from = `is now ${later ?? 'left out'}, before ${earlier ?? 'it was not there'}`;
  switch (kind) {
    case 'candidate_added':
      return `New candidate ${named(name ?? '')}: ${later}.`;
    case 'candidate_removed':
      return `${named(name ?? '')} is no candidate any more (${earlier}).`;
    case 'candidate_changed':
      return `The candidate ${named(name ?? '')} is another: ${later}; before ${earlier}.`;
    case 'derivation':
      return later === null || earlier === null
        ? `${name} is ${later === null ? `no longer derived (it was ${earlier})` : `newly derived: ${later}`}.`
        : `${name} is derived by ${later}, before by ${earlier}.`;
    case 'exclusion':
      return later === null
        ? `Rows are no longer left out because: ${stopped(earlier ?? '')}`
        : `Rows are newly left out because: ${stopped(later)}`;
    case 'response_scale':
      return `The response is fitted on the ${later} scale, before on the ${earlier} scale.`;
    case 'weights':
      return `Rows are weighted by ${later ?? 'nothing'}, before by ${earlier ?? 'nothing'}.`;
    case 'admission':
      return later === null
        ? `A rule of admission is gone: ${stopped(earlier ?? '')}`
        : `A new rule of admission: ${stopped(later)}`;
    case 'setting':
      return `${name} ${from}.`;
    case 'parameter':
      return `The parameter ${name} ${from}.`;
  }
}

/** What became of the choice, and how far the two are apart by the rule of now. */
export function choiceSentences({ choice }: Comparison, selection: StudyRecord['selection']): string[] {
  const { earlier, later, difference } = choice;
  if (later === null && earlier === null) return ['No candidate is chosen, as before.'];
  if (later === null) return [`No candidate is chosen; before, ${named(earlier!.name)} was.`];
  if (earlier === null) return [`${named(later.name)} is chosen; before, no candidate was.`];
  const rule = choice.rule_changed ? ['The rule of the choice is another than before.'] : [];
  if (!choice.changed) return [`${named(later.name)} is chosen again.`, ...rule];
  const criterion = criterionName(selection.rank_by);
  const { decimals } = criterionRounding(selection);
  const apart =
    difference === null
      ? `How far apart the two are now cannot be said in ${criterion}. ${earlier.reason ?? later.reason ?? ''}`.trim()
      : `On the rows of now ${named(earlier.name)} comes out ${fixed(Math.abs(difference), decimals)} ${difference < 0 ? 'better' : 'worse'} in ${criterion}${Math.abs(difference) <= choice.prefer_smaller_within ? ', which the rule counts as equal' : ''}.`;
  const why =
    earlier.admitted === false
      ? [`It is refused now. ${earlier.refused_because.map(stopped).join(' ')}`.trim()]
      : [];
  return [`${named(later.name)} is chosen; before, ${named(earlier.name)} was.`, ...rule, apart, ...why];
}

const CAUSES = {
  removed: 'rows removed',
  revised: 'revised values',
  added: 'rows added',
  declaration: 'the changed declaration',
} as const;

/** The coefficient of a model that moved most, and by what. */
export function largestChangeSentence(model: ComparedModel): string | null {
  const { largest_change: largest } = model;
  if (largest === null) return null;
  const coefficient = model.coefficients.find(({ name }) => name === largest.name)!;
  const size = Math.abs(largest.in_standard_errors);
  if (coefficient.difference === 0) return 'No coefficient has changed.';
  const rounding = roundingFor(coefficient.before ?? 0, coefficient.before_standard_error);
  const moved = `from ${rounded(coefficient.before, rounding)} to ${rounded(coefficient.after, rounding)}`;
  return `The coefficient that moved most is ${largest.name}, ${moved}: ${fixed(size, size < 10 ? 1 : 0)} of its earlier standard errors${mainly(coefficient)}.`;
}

/** ", most of it by rows added": the largest part where it is more than half of all of them. */
function mainly({ parts }: CoefficientChange): string {
  if (parts === null) return '';
  const entries = (Object.keys(CAUSES) as (keyof typeof CAUSES)[]).map(
    (cause) => [cause, Math.abs(parts[cause])] as const,
  );
  const whole = entries.reduce((sum, [, size]) => sum + size, 0);
  const [first] = [...entries].sort((a, b) => b[1] - a[1]);
  if (first === undefined || !(first[1] > whole / 2)) return '';
  return first[1] === whole ? `, all of it by ${CAUSES[first[0]]}` : `, most of it by ${CAUSES[first[0]]}`;
}

/** How the new rows lie to the earlier model; `model` is that of now, whose standard errors may allow for more than tests do. */
export function newRowsSentences(lexicon: Lexicon, rows: NewRows, model: StudyRecord['model']): string[] {
  const { scored, bias, root_mean_squared_error: rmse } = rows;
  const notScored = rows.not_scored.map(
    ({ because, rows: n }) => `${counted(n, 'new row', 'new rows', count)} cannot be predicted: ${because}.`,
  );
  if (scored === 0) return notScored;
  const rounding = roundingFor(bias ?? 0, rmse === null ? null : rmse / 10);
  const label = labelOf(lexicon, lexicon.response.variable);
  const errors =
    bias === null || rmse === null
      ? []
      : [
          `In the ${counted(scored, 'new row', 'new rows', count)} ${label} lies ${withUnit(rounded(Math.abs(bias), rounding), rows.unit)} ${bias < 0 ? 'below' : 'above'} what ${named(rows.candidate)} predicted before, on average; the typical error (root mean square) is ${withUnit(rounded(rmse, rounding), rows.unit)}.`,
        ];
  return [
    ...errors,
    ...insideSentence(rows),
    ...surfaceSentences(rows),
    ...classicalSentence(rows, model?.standard_errors?.kind ?? 'classical'),
    ...notScored,
  ];
}

/** What Chow's tests and the binomial interval take for granted and the declared standard errors do not. */
function classicalSentence({ same_surface: first, predictive: second }: NewRows, kind: string): string[] {
  if (kind === 'classical' || (first === null && second === null)) return [];
  return kind === 'hac' || kind === 'clustered'
    ? [
        'Chow’s tests and the interval for that share are the classical ones: they count rows as independent, which the declared standard errors do not.',
      ]
    : [
        'Chow’s tests are the classical ones: they take errors to spread evenly, which the declared standard errors do not.',
      ];
}

function insideSentence(rows: NewRows): string[] {
  if (rows.inside === null || rows.share_inside === null) return [];
  const ends =
    rows.share_lower === null || rows.share_upper === null
      ? ''
      : `, ${percent(rows.share_confidence)} interval for that share ${percent(rows.share_lower)} to ${percent(rows.share_upper)}`;
  return [
    `${count(rows.inside)} of ${count(rows.scored)} lie inside the ${percent(rows.interval)} prediction intervals of before (${percent(rows.share_inside)}${ends}); ${insideVerdict(rows)}.`,
  ];
}

function insideVerdict({ share_lower: low, share_upper: high, interval }: NewRows): string {
  if (low === null || high === null) return 'how many that ought to be cannot be said';
  if (high < interval) return `fewer than the ${percent(interval)} that ought to`;
  return low > interval
    ? `more than the ${percent(interval)} that ought to`
    : `${percent(interval)} is within that interval`;
}

/** Chow's tests, each with its sentence. */
function surfaceSentences({ same_surface: first, predictive: second }: NewRows): string[] {
  return [
    ...(first === null
      ? []
      : [
          `${
            first.p_value < RARE
              ? 'The new rows ask for coefficients of their own'
              : 'The new rows give no sign of other coefficients'
          }: one set for earlier and new rows against one for each (Chow’s first test), ${testPhrase(first)}.`,
        ]),
    ...(second === null
      ? []
      : [
          `${
            second.p_value < RARE
              ? 'Taken together they lie farther from the earlier fit than its own scatter explains'
              : 'Taken together they lie as near to the earlier fit as its own scatter lets expect'
          } (Chow’s second test): ${testPhrase(second)}.`,
        ]),
  ];
}

function testPhrase({ statistic, df1, df2, p_value: p }: ComparisonTest): string {
  return `F\u00a0=\u00a0${significant(statistic, 3)} on ${count(df1)} and ${count(df2)}\u00a0degrees of freedom, ${pPhrase(p)}`;
}

/** What a reader ought to look at first, most important first; empty where nothing stands out. */
export function attentionLines(
  lexicon: Lexicon,
  comparison: Comparison,
  selection: StudyRecord['selection'],
): string[] {
  const { choice, models, new_rows: rows, contract } = comparison;
  const renamed = contract.filter(({ kind }) =>
    ['level_gone', 'level_undeclared', 'variable_gone', 'rescaled'].includes(kind),
  );
  const worse = contract.filter(({ kind }) => ['bad_values', 'rows_lost', 'missing'].includes(kind));
  const fresh = contract.filter(({ kind }) => kind === 'level_new');
  const units = contract.filter(({ kind }) => kind === 'unit');
  const studyChanges = comparison.declaration.changes.filter(({ kind }) => kind !== 'parameter').length;
  return [
    // Values in another unit explain all that follows.
    ...units.map((change) => contractChangeSentence(lexicon, change, contract)),
    ...comparison.acceptance.filter(({ passed }) => passed === false).map(comparedCriterionSentence),
    ...(choice.changed ? [choiceSentences(comparison, selection)[0]!] : []),
    ...renamed.map((change) => contractChangeSentence(lexicon, change, contract)),
    ...models
      .filter(({ largest_change: change }) => Math.abs(change?.in_standard_errors ?? 0) > MUCH)
      .flatMap((model) => largestChangeSentence(model) ?? []),
    ...(rows?.share_upper != null && rows.share_upper < rows.interval ? insideSentence(rows) : []),
    ...(rows?.same_surface != null && rows.same_surface.p_value < RARE
      ? surfaceSentences({ ...rows, predictive: null })
      : []),
    ...worse.map((change) => contractChangeSentence(lexicon, change, contract)),
    ...fresh.map((change) => contractChangeSentence(lexicon, change, contract)),
    ...(studyChanges > 0 ? [`The study itself changed in ${counted(studyChanges, 'place')}.`] : []),
    ...comparison.cannot_tell,
  ].map(raised);
}

/** Whether the study is the same file, or how it differs, in a sentence. */
export function studySentence({ declaration }: Comparison): string {
  if (!declaration.study_changed) return 'The study file is the same, to the byte.';
  return declaration.changes.every(({ kind }) => kind === 'parameter')
    ? 'The study file is another, but in nothing that a record tells of: perhaps in labels, comments or conditions.'
    : 'The study file is another:';
}

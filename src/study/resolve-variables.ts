import { didYouMean, type Named, TYPE_WORDS } from './names.ts';
import { listed, type Path, quote, showPath } from './path.ts';
import { cellText, cellTexts, entriesInOrder, fault, keyFault, type Loose, type Reading } from './reading.ts';
import type { VariablePlan, VariableType } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';
import type { VariableInFile } from './study-file.generated.ts';

/** Keys of a variable that suit some types only. */
const SUITED: Readonly<Partial<Record<keyof VariableInFile, readonly VariableType[]>>> = {
  unit: ['number', 'integer'],
  at_least: ['number', 'integer'],
  at_most: ['number', 'integer'],
  levels: ['category'],
  baseline: ['category'],
  values: ['flag'],
  pattern: ['date'],
};

/** Names that mean something else where a variable's name may stand. */
const RESERVED: ReadonlyMap<string, string> = new Map([
  ['label', 'it is the label of a row under predict.rows'],
  ['intercept', 'it is the name of the intercept'],
]);

/** The declared variables, in order, and what is known of their names. */
export function resolveVariables(reading: Reading): {
  readonly variables: readonly VariablePlan[];
  readonly names: readonly Named[];
} {
  const variables: VariablePlan[] = [];
  const names: Named[] = [];
  const missing = dataMissing(reading);
  for (const [name, written] of entriesInOrder(reading, reading.file.data?.variables, [
    'data',
    'variables',
  ])) {
    const path = ['data', 'variables', name];
    checkReserved(reading, name, path);
    const plan = written?.type === undefined ? null : variable(reading, name, written, written.type, path);
    names.push({ name, derived: false, type: plan?.type ?? null, levels: plan?.levels ?? null });
    if (plan === null) continue;
    variables.push(plan);
    checkMissing(reading, plan, missing, path);
  }
  return { variables, names };
}

/** Reports a name that has another meaning already. */
export function checkReserved(reading: Reading, name: string, path: Path): void {
  const meaning = RESERVED.get(name);
  if (meaning === undefined) return;
  keyFault(
    reading,
    'value_not_allowed',
    path,
    `${quote(name)} cannot be the name of a variable: ${meaning}.`,
  );
}

/** Cell texts read as missing in every column. */
export function dataMissing(reading: Reading): readonly string[] {
  const list = reading.file.data?.missing;
  const texts =
    list === undefined ? STUDY_DEFAULTS['data.missing'] : cellTexts(reading, list, ['data', 'missing']);
  return texts.map((text) => text.trim());
}

function variable(
  reading: Reading,
  name: string,
  written: Loose<VariableInFile>,
  type: VariableType,
  path: Path,
): VariablePlan {
  for (const [key, suited] of Object.entries(SUITED)) {
    if (written[key as keyof VariableInFile] === undefined || suited.includes(type)) continue;
    const at = [...path, key];
    const message = `${showPath(at)} does not suit ${TYPE_WORDS[type]}.`;
    const article = listed(
      suited.map((each) => TYPE_WORDS[each]),
      'or',
    );
    keyFault(reading, 'type_unsuited', at, message, `It belongs to ${article}.`);
  }
  const atLeast = written.at_least ?? null;
  const atMost = written.at_most ?? null;
  checkRange(reading, atLeast, atMost, path);
  const levels =
    written.levels === undefined ? null : cellTexts(reading, written.levels, [...path, 'levels']);
  const baseline =
    written.baseline === undefined ? null : cellText(reading, written.baseline, [...path, 'baseline']);
  if (levels !== null) checkTwice(reading, levels, [...path, 'levels']);
  if (levels !== null && baseline !== null && !levels.includes(baseline)) {
    const at = [...path, 'baseline'];
    const message = `${showPath(at)} is ${quote(baseline)}, which is not among the levels.`;
    fault(reading, 'level_undeclared', at, message, didYouMean(baseline, levels));
  }
  const values =
    written.values === undefined ? null : cellTexts(reading, written.values, [...path, 'values']);
  if (values !== null) checkTwice(reading, values, [...path, 'values']);
  const pattern = written.pattern ?? null;
  if (pattern !== null && type === 'date') checkPattern(reading, pattern, [...path, 'pattern']);
  return {
    name,
    type,
    column: written.column ?? name,
    unit: written.unit ?? null,
    label: written.label ?? null,
    atLeast,
    atMost,
    levels,
    baseline,
    flagValues: values?.[0] === undefined || values[1] === undefined ? null : [values[0], values[1]],
    pattern,
    missing: cellTexts(reading, written.missing ?? [], [...path, 'missing']).map((text) => text.trim()),
  };
}

/** Reports limits between which nothing lies. */
export function checkRange(
  reading: Reading,
  atLeast: number | null,
  atMost: number | null,
  path: Path,
): void {
  if (atLeast === null || atMost === null || atLeast <= atMost) return;
  const message = `${showPath(path)} has at_least ${atLeast} above at_most ${atMost}, so that nothing fits.`;
  fault(reading, 'limit_nonsense', [...path, 'at_least'], message);
}

function checkTwice(reading: Reading, texts: readonly string[], path: Path): void {
  texts.forEach((text, index) => {
    if (texts.indexOf(text) === index) return;
    fault(
      reading,
      'name_twice',
      [...path, index],
      `${showPath(path)} has ${quote(text)} twice.`,
      'Keep one of them.',
    );
  });
}

/** A level that is read as missing could never be found. */
function checkMissing(reading: Reading, plan: VariablePlan, everywhere: readonly string[], path: Path): void {
  for (const [key, texts] of [
    ['levels', plan.levels ?? []],
    ['values', plan.flagValues ?? []],
  ] as const) {
    texts.forEach((text, index) => {
      const own = plan.missing.includes(text.trim());
      if (!own && !everywhere.includes(text.trim())) return;
      const at = [...path, key, index];
      const list = own ? showPath([...path, 'missing']) : 'data.missing';
      const message = `${showPath(at)} is ${quote(text)}, which ${list} reads as missing.`;
      const hint = own ? undefined : 'Write data.missing without it.';
      fault(reading, 'value_not_allowed', at, message, hint);
    });
  }
}

function checkPattern(reading: Reading, pattern: string, path: Path): void {
  const parts: readonly string[] = pattern.match(/YYYY|MM|DD|hh|mm|ss/g) ?? [];
  const twice = parts.find((part, index) => parts.indexOf(part) !== index);
  const wrong =
    twice !== undefined
      ? `has ${twice} twice`
      : !parts.includes('YYYY')
        ? 'has no YYYY for the year'
        : parts.includes('DD') && !parts.includes('MM')
          ? 'has a day DD without a month MM'
          : null;
  if (wrong === null) return;
  const hint =
    'A pattern is made of YYYY, MM, DD, hh, mm and ss with other characters between them: DD.MM.YYYY.';
  fault(reading, 'value_not_allowed', path, `${showPath(path)} is ${quote(pattern)}, which ${wrong}.`, hint);
}

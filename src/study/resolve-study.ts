import { isAbsolute } from 'node:path';
import { namesIn } from '../expression/names-in.ts';
import { declaredScales, declaredTerms } from './declared-terms.ts';
import { writtenTerms } from './family-keys.ts';
import { type Names, TYPE_WORDS } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { entriesInOrder, fault, type Reading, warning } from './reading.ts';
import { resolveAcceptance } from './resolve-acceptance.ts';
import { resolveCandidates } from './resolve-candidates.ts';
import { resolveDerivations } from './resolve-derivations.ts';
import { resolveExamination } from './resolve-examination.ts';
import { checkText, parseText, untypedUses } from './resolve-expression.ts';
import { resolveInference } from './resolve-inference.ts';
import { resolvePredict } from './resolve-predict.ts';
import { resolveRepeat, resolveResponse, resolveRowRoles, resolveWeights } from './resolve-roles.ts';
import { resolveSelection } from './resolve-selection.ts';
import { termVariables } from './resolve-terms.ts';
import { dataMissing, resolveVariables } from './resolve-variables.ts';
import { settingsOf } from './settings.ts';
import type { DataPlan, LeaveOutPlan, ReportPlan, Study, VariablePlan } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';

/** Where a study comes from: what cannot be read in its text. */
export interface StudyOrigin {
  readonly file: string;
  readonly folder: string;
  readonly sha256: string;
  readonly parameters: Study['parameters'];
}

/**
 * The meaning check: looks up every name, fills every default, and reports all that cannot be meant. The result is
 * sound only where nothing was reported as an error; null where too little is there to form one.
 */
export function resolveStudy(given: Reading, origin: StudyOrigin): Study | null {
  let errors = 0;
  const reading: Reading = {
    ...given,
    report: (problem) => {
      if (problem.severity === 'error') errors++;
      given.report(problem);
    },
  };
  const { file } = reading;
  const { variables, names: declared } = resolveVariables(reading);
  const { derive, names, reads } = resolveDerivations(reading, declared);
  const derivedFrom = (name: string) => restsOn(name, names, reads);
  const leaveOut = resolveLeaveOut(reading, names);
  const roles = resolveRowRoles(reading, names);
  const response = resolveResponse(reading, names);
  const weights = resolveWeights(reading, names);
  const resolved = resolveCandidates(reading, names, response, derivedFrom);
  const { candidates, families } = resolved;
  const inTerms = [...new Set(declaredTerms(resolved).flatMap(termVariables))];

  const named = file.candidates?.flatMap((candidate) => candidate?.name ?? []) ?? [];
  const selection = resolveSelection(reading, names, declaredScales(resolved));
  const acceptance = resolveAcceptance(reading, { candidates: named, families, names, time: roles.time });
  const examination = resolveExamination(reading, names);
  const rests = new Set(inTerms.flatMap((name) => [...derivedFrom(name)]));
  const inModels = response === null ? rests : new Set([...rests, ...derivedFrom(response.variable)]);
  const repeatFor = resolveRepeat(reading, names, inModels);
  const inference = resolveInference(reading, names, roles.time, inTerms);
  const predict = resolvePredict(reading, {
    variables,
    names,
    needed: variables.map(({ name }) => name).filter((name) => rests.has(name)),
    allowed: weights === null ? new Set() : derivedFrom(weights),
    unsure:
      errors > 0 ||
      file.candidates === undefined ||
      candidates.length + families.length < file.candidates.length,
    derivedFrom,
  });
  const { holdOut } = selection;
  const inConditions = [
    ...leaveOut.flatMap((rule) => rule.names),
    ...(holdOut?.kind === 'where' ? namesIn(holdOut.where) : []),
  ];
  const used = usedNames(reading, inConditions, reads);
  warnOfUnused(
    reading,
    entriesInOrder(reading, file.derive, ['derive']).map(([name]) => name),
    used,
  );
  checkFileNames(reading);
  const report = resolveReport(reading);

  if (file.title === undefined || response === null || file.data?.file === undefined) return null;
  return {
    ...origin,
    title: file.title,
    question: file.question ?? null,
    data: dataPlan(reading, file.data.file, variables, roles),
    derive,
    leaveOut: leaveOut.map((rule) => rule.plan),
    response,
    weights,
    repeatFor,
    candidates,
    families,
    selection,
    inference,
    examination,
    predict,
    acceptance,
    report,
    settings: settingsOf(reading),
    placeOf: reading.written.placeOf,
    keyPlaceOf: reading.written.keyPlaceOf,
  };
}

/** The declared variables that a variable rests on, itself among them where it is declared. */
function restsOn(
  name: string,
  names: Names,
  reads: ReadonlyMap<string, readonly string[]>,
): ReadonlySet<string> {
  const declared = new Set<string>();
  for (const each of withEverythingRead([name], reads)) {
    if (names.get(each)?.derived === false) declared.add(each);
  }
  return declared;
}

function withEverythingRead(
  start: readonly string[],
  reads: ReadonlyMap<string, readonly string[]>,
): ReadonlySet<string> {
  const seen = new Set<string>();
  const open = [...start];
  for (let name = open.pop(); name !== undefined; name = open.pop()) {
    if (seen.has(name)) continue;
    seen.add(name);
    open.push(...(reads.get(name) ?? []));
  }
  return seen;
}

/** Every name that the study uses outside `derive`, with what those are derived from. From the text, so that a faulty use counts. */
function usedNames(
  reading: Reading,
  inConditions: readonly string[],
  reads: ReadonlyMap<string, readonly string[]>,
): ReadonlySet<string> {
  const { file } = reading;
  const split = file.examination?.split_at?.variable;
  const start = [...inConditions, file.weights, file.data?.time, file.data?.row_id, split].filter(
    (name) => typeof name === 'string',
  );
  for (const value of [
    file.response,
    file.inference?.standard_errors,
    file.selection?.validation?.group,
    file.selection?.honest_error?.group,
    file.selection?.stability?.group,
    ...(file.candidates ?? []).map((candidate) => candidate && writtenTerms(candidate)),
  ]) {
    start.push(...textsIn(value));
  }
  return withEverythingRead(start, reads);
}

/** All texts in a value. */
function textsIn(value: unknown): readonly string[] {
  if (typeof value === 'string') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(textsIn) : [];
}

function resolveLeaveOut(
  reading: Reading,
  names: Names,
): readonly { readonly plan: LeaveOutPlan; readonly names: readonly string[] }[] {
  return (reading.file.leave_out ?? []).flatMap((rule, index) => {
    if (rule?.where === undefined) return [];
    const path = ['leave_out', index, 'where'];
    const where = parseText(reading, rule.where, path);
    if (where === null) return [];
    const checked = checkText(reading, where, path, names, untypedUses(where, names));
    if (checked.type !== null && checked.type !== 'flag') {
      const message = `${showPath(path)} yields ${TYPE_WORDS[checked.type]}, but must be a condition.`;
      fault(reading, 'expression_type', path, message, 'Compare it with something: ==, !=, <, <=, > or >=.');
    }
    const plan = { where, text: rule.where, because: rule.because ?? '' };
    return [{ plan, names: checked.names }];
  });
}

function dataPlan(
  reading: Reading,
  file: string,
  variables: readonly VariablePlan[],
  roles: { readonly rowId: string | null; readonly time: string | null },
): DataPlan {
  const format = reading.file.data?.format;
  return {
    file,
    format: {
      delimiter: format?.delimiter ?? STUDY_DEFAULTS['data.format.delimiter'],
      decimalMark: format?.decimal_mark ?? STUDY_DEFAULTS['data.format.decimal_mark'],
      encoding: format?.encoding ?? STUDY_DEFAULTS['data.format.encoding'],
    },
    missing: dataMissing(reading),
    rowId: roles.rowId,
    time: roles.time,
    variables,
    onBadValue: reading.file.data?.on_bad_value ?? STUDY_DEFAULTS['data.on_bad_value'],
  };
}

function resolveReport(reading: Reading): ReportPlan {
  const written = reading.file.report;
  const formats =
    written?.formats?.filter((format) => format !== undefined) ?? STUDY_DEFAULTS['report.formats'];
  const templates = {
    html: written?.templates?.html ?? STUDY_DEFAULTS['report.templates.html'],
    markdown: written?.templates?.markdown ?? STUDY_DEFAULTS['report.templates.markdown'],
    comparison: {
      html: written?.templates?.comparison?.html ?? STUDY_DEFAULTS['report.templates.comparison.html'],
      markdown:
        written?.templates?.comparison?.markdown ?? STUDY_DEFAULTS['report.templates.comparison.markdown'],
    },
  };
  written?.formats?.forEach((format, index) => {
    if (format === undefined || written.formats?.indexOf(format) === index) return;
    fault(reading, 'name_twice', ['report', 'formats', index], `report.formats has ${format} twice.`);
  });
  for (const format of ['html', 'markdown'] as const) {
    if (templates[format] === null || formats.includes(format)) continue;
    const path = ['report', 'templates', format];
    const message = `${showPath(path)} is given, but report.formats does not have ${format}.`;
    warning(reading, 'name_unused', reading.written.keyPlaceOf(path), message);
  }
  return {
    formats,
    templates,
    keepSample: written?.keep_sample ?? STUDY_DEFAULTS['report.keep_sample'],
    caution: written?.caution ?? STUDY_DEFAULTS['report.caution'],
  };
}

/** File names are relative, so that the record of a study says the same on every machine. */
function checkFileNames(reading: Reading): void {
  const { data, predict, report } = reading.file;
  const given: readonly (readonly [Path, string | null | undefined])[] = [
    [['data', 'file'], data?.file],
    [['predict', 'file'], predict?.file],
    [['report', 'templates', 'html'], report?.templates?.html],
    [['report', 'templates', 'markdown'], report?.templates?.markdown],
    [['report', 'templates', 'comparison', 'html'], report?.templates?.comparison?.html],
    [['report', 'templates', 'comparison', 'markdown'], report?.templates?.comparison?.markdown],
  ];
  for (const [path, name] of given) {
    if (typeof name !== 'string' || !(isAbsolute(name) || /^[A-Za-z]:[\\/]/.test(name))) continue;
    const message = `${showPath(path)} is ${quote(name)}, which is not relative to the study file.`;
    const hint = 'Write it as seen from the folder of the study file.';
    fault(reading, 'value_not_allowed', path, message, hint);
  }
  const format = data?.format;
  if (format?.delimiter !== undefined && format.delimiter === (format.decimal_mark ?? '.')) {
    const message = `data.format.delimiter and the decimal mark are both ${quote(format.delimiter ?? '')}.`;
    fault(reading, 'limit_nonsense', ['data', 'format', 'delimiter'], message);
  }
}

/** Reports names of derived variables that nothing uses. */
function warnOfUnused(reading: Reading, derived: readonly string[], used: ReadonlySet<string>): void {
  for (const name of derived) {
    if (used.has(name)) continue;
    const place = reading.written.keyPlaceOf(['derive', name]);
    const message = `${showPath(['derive', name])} is derived, but nothing uses it.`;
    warning(reading, 'name_unused', place, message, 'Remove it, or add it to a candidate.');
  }
}

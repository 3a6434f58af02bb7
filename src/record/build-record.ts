import { formatDate } from '../data/format-date.ts';
import type { Table } from '../data/table.ts';
import { classicalCovariance } from '../engine/covariance.ts';
import type { Fit } from '../engine/fit.ts';
import type { FittedAll } from '../engine/fit-all.ts';
import { beforeYouRely } from '../examine/before-you-rely.ts';
import type { Chosen } from '../examine/chosen.ts';
import { examine } from '../examine/examine.ts';
import { findDependencies } from '../examine/find-dependencies.ts';
import { standardErrorsOf } from '../examine/infer.ts';
import { normalQuantiles } from '../examine/normal-quantiles.ts';
import { withoutRows } from '../examine/without-row.ts';
import type { Design } from '../model/design.ts';
import { type DesignRows, numbersOf } from '../model/design-rows.ts';
import { scaleName } from '../model/response-scale.ts';
import { packageVersion } from '../package-file.ts';
import { type Predicted, smearingResiduals } from '../predict/predict.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Spread } from '../prepare/spread.ts';
import type { Place, Problem } from '../problem.ts';
import type { Choice } from '../select/choose.ts';
import { coefficientFigures } from '../select/coefficients.ts';
import type { FoundFamily } from '../select/search-families.ts';
import { summarise } from '../select/summarise.ts';
import type { Study } from '../study/study.ts';
import { acceptanceAgainstEarlier, acceptanceOf } from './acceptance.ts';
import { rowSummaries } from './chart-points.ts';
import { type Bootstrapped, describeBootstrap } from './describe-bootstrap.ts';
import { describeFamilies, modelsLookedAt, searchWarnings } from './describe-families.ts';
import { describeModel } from './describe-model.ts';
import {
  choiceWarnings,
  describeSelection,
  type SelectionFindings,
  splitSentence,
  validationFigures,
} from './describe-selection.ts';
import { describeVariables } from './describe-variables.ts';
import type { KeptSample } from './keep-sample.ts';
import type { RecordCandidate, RecordExamination, StudyRecord } from './record.ts';

/** Everything a run found, from which the record is put together. */
export interface Run {
  readonly study: Study;
  readonly table: Table;
  readonly sample: Sample;
  /** The level whose rows these are, where the study repeats for a variable. */
  readonly repeat: { readonly variable: string; readonly level: string } | null;
  readonly spreads: ReadonlyMap<string, Spread>;
  readonly design: Design;
  readonly rows: DesignRows;
  /** The candidates fitted on the rows that the chosen model is estimated from. */
  readonly fitted: FittedAll;
  /** The candidates fitted on the rows that the choice was made on: the same, unless the study splits them. */
  readonly ranked: FittedAll;
  readonly findings: SelectionFindings;
  readonly choice: Choice;
  readonly families: readonly FoundFamily[];
  readonly chosen: Chosen | null;
  readonly predicted: Predicted | null;
  /** Null where the study asks for no bootstrap, or the chosen model leaves nothing to draw. */
  readonly bootstrapped: Bootstrapped | null;
  /** The rows used, to be kept beside the record; null where the study declines it. */
  readonly kept: KeptSample | null;
  /** Warnings found on the way; the record keeps them. */
  readonly problems: readonly Problem[];
}

/**
 * The record: everything a report may say, with full-precision numbers and nothing of the clock, the machine
 * or where files lie, so that the same study, data and version give the same bytes.
 */
export function buildRecord(run: Run): StudyRecord {
  const { study, table, sample, choice, chosen, predicted } = run;
  const { findings } = run;
  const positive = isPositive(run);
  const candidates = candidatesOf(run, run.ranked, findings.split === null).map((candidate, index) => ({
    ...candidate,
    ...validationFigures(findings.validated, index, positive),
  }));
  const chosenOf = (list: readonly RecordCandidate[]) =>
    choice.chosen === null ? null : list[choice.chosen]!;
  const estimated = findings.split === null ? null : chosenOf(candidatesOf(run, run.fitted, true));
  const winner = estimated ?? chosenOf(candidates);
  const variables = describeVariables(study, table, sample, run.spreads);
  const response = variables.find((variable) => variable.name === study.response.variable)!;
  const examination = chosen === null ? null : examinationOf(chosen, run);
  const againstEarlier = acceptanceAgainstEarlier(study.acceptance);
  const predictions = (predicted?.predictions ?? []).map((one) => ({
    ...one,
    values: one.values.map((value) => ({ ...value })),
  }));
  return {
    format: 'plumbrule-record/1',
    tool: { name: 'plumbrule', version: packageVersion() },
    study: {
      title: study.title,
      question: study.question,
      file: study.file,
      sha256: study.sha256,
      settings: study.settings.map((setting) => ({ ...setting })),
      ...(study.parameters.length === 0
        ? {}
        : { parameters: study.parameters.map((parameter) => ({ ...parameter })) }),
      caution: study.report.caution,
      confidence: study.inference.confidence,
      prediction_interval: study.predict.interval,
      report: { formats: [...study.report.formats], templates: templatesOf(study) },
    },
    data: {
      file: table.file,
      sha256: table.sha256,
      delimiter: table.format.delimiter,
      encoding: table.format.encoding,
      ...(run.repeat === null ? {} : { repeat: { ...run.repeat } }),
      rows_read: table.rowCount,
      rows_used: sample.rowCount,
      left_out: sample.losses.map((loss) => ({
        because: loss.because,
        kind: loss.kind,
        rows: loss.rows,
        variable: loss.variable,
        missing_any: loss.missingAny,
      })),
      columns_ignored: [...table.ignored],
      bad_values: table.badValues.map((bad) => ({ ...bad })),
      bad_value_count: table.badValueCount,
      time: timeSpan(study, sample),
      sample: run.kept === null ? null : { file: run.kept.file, sha256: run.kept.sha256 },
      variables,
    },
    response: {
      variable: study.response.variable,
      scale: scaleName(study.response.scale),
      unit: response.unit,
      label: response.label,
    },
    candidates,
    partial_f: choice.partialF.map((row) => ({
      ...row,
      smaller: candidates[row.smaller]!.name,
      larger: candidates[row.larger]!.name,
    })),
    partial_f_omitted: choice.partialFOmitted,
    ...(run.families.length === 0
      ? {}
      : { families: describeFamilies(run.families, study.selection, choice, candidates) }),
    selection: {
      rank_by: study.selection.rankBy,
      prefer_smaller_within: study.selection.preferSmallerWithin,
      significance: study.selection.significance,
      admission: [...choice.rules],
      ranking: choice.ranking.map(({ candidate, ...place }) => ({
        ...place,
        candidate: candidates[candidate]!.name,
      })),
      chosen: winner?.name ?? null,
      because: [choice.because, ...splitSentence(findings)].join(' '),
      ...(run.families.length === 0
        ? {}
        : { models_looked_at: modelsLookedAt(study.candidates.length, run.families) }),
      ...describeSelection(findings, { study, design: run.design, candidates, positive }, estimated),
    },
    model:
      chosen === null ? null : describeModel(chosen, run.rows, run.fitted.factor, smearingResiduals(chosen)),
    examination,
    predictions,
    prediction_total: predicted?.total ?? null,
    acceptance: acceptanceOf(study.acceptance, {
      candidate: winner,
      families: run.families
        .filter(({ models }) => models.some(({ candidate }) => candidate === winner?.name))
        .map(({ plan }) => plan.name),
      chosen,
      findings: examination?.findings ?? [],
      predictions,
      rowsRead: table.rowCount,
      rowsUsed: sample.rowCount,
      rowsLost: sample.losses.reduce((sum, loss) => (loss.kind === 'left_out' ? sum : sum + loss.rows), 0),
      newest: newestDay(study, sample),
    }),
    ...(againstEarlier.length === 0 ? {} : { acceptance_against_earlier: againstEarlier }),
    warnings: warningsOf(run),
  };
}

/** As the study names them; those of a comparison only where it names one. */
function templatesOf({ report }: Study): StudyRecord['study']['report']['templates'] {
  const { html, markdown, comparison } = report.templates;
  const none = comparison.html === null && comparison.markdown === null;
  return { html, markdown, ...(none ? {} : { comparison: { ...comparison } }) };
}

function examinationOf(chosen: Chosen, run: Run): RecordExamination {
  const without = withoutRows(chosen, run);
  const findings = examine(chosen, without);
  return {
    findings,
    before_you_rely: beforeYouRely(findings, run.predicted?.predictions ?? []),
    collinearity: findDependencies(chosen, run.fitted),
    bootstrap: describeBootstrap(chosen, run.bootstrapped),
    normal_quantiles: normalQuantiles(chosen),
    ...rowSummaries(chosen, without),
  };
}

function isPositive({ sample, study }: Run): boolean {
  return numbersOf(sample, study.response.variable).every((y) => y > 0);
}

/** @param refined whether the chosen model is estimated from these fits' rows */
function candidatesOf(
  { study, design, choice, chosen }: Run,
  fitted: FittedAll,
  refined: boolean,
): RecordCandidate[] {
  // The chosen model may have been refined after the ranking; the record shows the refined figures.
  const isRefined = (index: number) => refined && index === choice.chosen && chosen !== null;
  const fits = fitted.fits.map((fit, index): Fit => (isRefined(index) ? chosen!.fit : fit));
  const context = { ...fitted, fits };
  const covariances = fits.map((fit, index) =>
    isRefined(index)
      ? chosen!.covariance
      : fitted.covariances === undefined
        ? classicalCovariance(fit)
        : fitted.covariances[index]!,
  );
  return fits.map((fit, index) => {
    const { admitted, refusedBecause } = choice.admissions[index]!;
    return {
      name: fit.candidate.name,
      terms: fit.candidate.terms.map((term) => term.name),
      scale: scaleName(fit.candidate.response.scale),
      intercept: fit.candidate.intercept,
      ...summarise(index, context),
      coefficients: coefficientFigures(
        fit,
        context.columnNames,
        study.inference.confidence,
        covariances[index],
      ),
      dropped: fit.dropped.map(({ column, sentence }) => ({
        column: design.columns[column]!.name,
        sentence,
      })),
      arithmetic: fit.arithmetic,
      admitted,
      refused_because: [...refusedBecause],
    };
  });
}

function timeSpan(study: Study, sample: Sample): StudyRecord['data']['time'] {
  const variable = study.data.time;
  const column = variable === null ? undefined : sample.columns.get(variable);
  if (variable === null || column === undefined || column.kind === 'category' || column.kind === 'text')
    return null;
  const order = sample.timeOrder!;
  const show = (value: number) => (column.kind === 'date' ? formatDate(value) : String(value));
  return { variable, first: show(column.values[order[0]!]!), last: show(column.values[order.at(-1)!]!) };
}

/** The latest date among the rows used; null where the study's time is not a date. */
function newestDay(study: Study, sample: Sample): number | null {
  const column = study.data.time === null ? undefined : sample.columns.get(study.data.time);
  return column?.kind === 'date' ? column.values[sample.timeOrder!.at(-1)!]! : null;
}

function warningsOf({
  problems,
  findings,
  fitted,
  chosen,
  study,
  predicted,
  families,
}: Run): StudyRecord['warnings'] {
  const warnings = problems
    .filter((problem) => problem.severity === 'warning')
    .map(({ place, message, hint }) => ({
      about: placeText(place),
      text: hint === undefined ? message : `${message} ${hint}`,
    }));
  warnings.push(...searchWarnings(study.candidates.length, families, findings.split !== null));
  if (findings.trust !== null) warnings.push(...choiceWarnings(findings.trust));
  if (fitted.pressOmitted !== null)
    warnings.push({ about: 'PRESS', text: `PRESS was ${fitted.pressOmitted}.` });
  if (chosen !== null) {
    for (const text of standardErrorsOf(chosen).cautions) warnings.push({ about: 'standard errors', text });
    if (
      fitted.covariances?.some(
        (each, index) => each === null && classicalCovariance(fitted.fits[index]!) !== null,
      )
    )
      warnings.push({
        about: 'standard errors',
        text: 'The declared standard errors were worked out for the chosen candidate only: for each of the others they need one more pass over the rows.',
      });
  }
  if (
    study.predict.total &&
    chosen !== null &&
    predicted !== null &&
    predicted.total === null &&
    predicted.predictions.length > 0
  ) {
    warnings.push({
      about: 'predictions',
      text: `No total is given: its interval is known on the natural scale only, and the chosen model’s response is on the ${scaleName(chosen.fit.candidate.response.scale)} scale.`,
    });
  }
  return warnings;
}

function placeText(place: Place): string {
  switch (place.kind) {
    case 'source':
      return `${place.file}, line ${place.line}`;
    case 'cell':
      return [
        place.file,
        ...(place.row === undefined ? [] : [`row ${place.row}`]),
        ...(place.variable === undefined ? [] : [place.variable]),
      ].join(', ');
    case 'file':
      return place.file;
    case 'command':
      return 'command line';
  }
}

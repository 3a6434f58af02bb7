import type { Table } from '../data/table.ts';
import type { Sample } from '../prepare/sample.ts';
import { count, isoDate, value } from '../report/numbers.ts';
import { counted, listed } from '../report/words/lexicon.ts';
import type { CheckedStudy } from '../run/check-study.ts';
import type { Study } from '../study/study.ts';
import { type Paragraph, plumbLine, type Section } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** What `check` found: what is declared, the state of the data's contract, and the rows that would be fitted. Empty where the study could not be read. */
export function contractSummary(checked: CheckedStudy, terminal: Terminal): string {
  const { study, table, sample, problems } = checked;
  if (study === null) return '';
  const errors = problems.filter((problem) => problem.severity === 'error').length;
  const warnings = problems.length - errors;
  const sections: Section[] = [
    { label: 'asked', paragraphs: [study.title, ...(study.question === null ? [] : [study.question])] },
    { label: 'declared', paragraphs: declared(study) },
    ...(table === null ? [] : [{ label: 'data', paragraphs: dataFound(table) }]),
    ...(sample === null || table === null ? [] : [{ label: 'rows', paragraphs: rowsLeft(sample, table) }]),
    { label: 'state', paragraphs: [state(errors, warnings)] },
  ];
  return plumbLine(sections, terminal);
}

function tried({ candidates, families }: Study): string[] {
  return [
    ...(candidates.length > 0 ? [counted(candidates.length, 'candidate')] : []),
    ...(families.length > 0
      ? [counted(families.length, 'family of candidates', 'families of candidates')]
      : []),
  ];
}

function declared(study: Study): Paragraph[] {
  const { scale, variable } = study.response;
  const on = scale.kind === 'natural' ? '' : ` on the ${scale.kind.replace('_', '–')} scale`;
  const limits = study.acceptance.length;
  const predictions = study.predict.rows.length;
  const extras = [
    ...(study.leaveOut.length > 0 ? [counted(study.leaveOut.length, 'exclusion')] : []),
    ...(predictions > 0 ? [counted(predictions, 'row to predict', 'rows to predict')] : []),
    ...(study.predict.file === null ? [] : [`rows to predict in ${study.predict.file}`]),
    ...(limits > 0 ? [counted(limits, 'acceptance criterion', 'acceptance criteria')] : []),
  ];
  return [
    `${listed(tried(study))} for ${variable}${on}, ranked by ${study.selection.rankBy}; ${counted(study.data.variables.length, 'variable')} declared, ${count(study.derive.length)} derived.`,
    ...(extras.length > 0 ? [`Also ${listed(extras)}.`] : []),
  ];
}

function dataFound(table: Table): Paragraph[] {
  const rows = table.summaries.map((summary) => [
    summary.name,
    summary.type,
    summary.missing === 0 ? 'none' : count(summary.missing),
    found(summary),
  ]);
  return [
    `${table.file}: ${counted(table.rowCount, 'row', 'rows', count)} read; ${table.badValueCount === 0 ? 'every cell keeps the contract.' : `${counted(table.badValueCount, 'cell breaks', 'cells break', count)} the contract.`}`,
    ...(table.ignored.length > 0 ? [`Not used by the study: ${listed(table.ignored)}.`] : []),
    {
      columns: [
        { heading: 'variable', align: 'left' },
        { heading: 'type', align: 'left' },
        { heading: 'missing', align: 'right' },
        { heading: 'found', align: 'left', shrinks: true },
      ],
      rows,
    },
  ];
}

function found(summary: Table['summaries'][number]): string {
  if (summary.levels !== null) {
    return summary.levels.map(({ level, rows }) => `${level} ${count(rows)}`).join(', ');
  }
  if (summary.smallest === null || summary.largest === null) return '';
  const shown = summary.type === 'date' ? isoDate : value;
  return `${shown(summary.smallest)} to ${shown(summary.largest)}`;
}

function rowsLeft(sample: Sample, table: Table): Paragraph[] {
  return [
    `${count(sample.rowCount)} of ${counted(table.rowCount, 'row', 'rows', count)} would be fitted.`,
    ...sample.losses
      .filter((loss) => loss.rows > 0)
      .map((loss) => ({ mark: count(loss.rows).padStart(6), text: loss.because })),
  ];
}

function state(errors: number, warnings: number): string {
  const warned = warnings === 0 ? '' : `${counted(warnings, 'warning')}.`;
  if (errors > 0) return `${counted(errors, 'error')}: the study cannot be fitted. ${warned}`.trim();
  return warnings === 0 ? 'Nothing is wrong.' : `It can be fitted. ${warned}`;
}

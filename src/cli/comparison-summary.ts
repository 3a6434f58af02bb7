import type { Comparison } from '../compare/comparison.ts';
import type { StudyRecord } from '../record/record.ts';
import { count, fixed, rounded, roundingFor } from '../report/numbers.ts';
import { comparedCriterionSentence, verdictWord } from '../report/words/acceptance.ts';
import {
  attentionLines,
  choiceSentences,
  contractChangeSentence,
  declarationChangeSentence,
  largestChangeSentence,
  newRowsSentences,
  revisedSentence,
  rowsSentences,
  studySentence,
} from '../report/words/comparison.ts';
import { counted, type Lexicon, lexiconOf } from '../report/words/lexicon.ts';
import { type Paragraph, plumbLine, type Section } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** Longest lists; the page and the JSON have all. */
const MOST = 8;

/** What changed between two records, in the order in which a reader asks. `places` says where results lie. */
export function comparisonSummary(
  comparison: Comparison,
  record: StudyRecord,
  places: readonly string[],
  terminal: Terminal,
): string {
  const lexicon = lexiconOf(record);
  const { selection } = record;
  const revised = revisedSentence(comparison);
  const sections: Section[] = [
    { label: 'compared', paragraphs: [comparison.later.title, sidesLine(comparison)] },
    {
      label: 'first',
      paragraphs: marked(attentionLines(lexicon, comparison, selection)),
    },
    {
      label: 'rows',
      paragraphs: [rowsSentences(comparison).join(' '), ...(revised === null ? [] : [revised])],
    },
    {
      label: 'contract',
      paragraphs: marked(
        comparison.contract.map((change) => contractChangeSentence(lexicon, change, comparison.contract)),
      ),
    },
    {
      label: 'study',
      paragraphs: [
        studySentence(comparison),
        ...marked(comparison.declaration.changes.map(declarationChangeSentence)),
      ],
    },
    { label: 'choice', paragraphs: choiceSentences(comparison, selection) },
    { label: 'moved', paragraphs: comparison.models.flatMap((model) => moved(model)) },
    { label: 'new rows', paragraphs: newRows(lexicon, comparison, record) },
    {
      label: 'accepted',
      paragraphs: comparison.acceptance.map((each) => ({
        mark: '·',
        text: `${verdictWord(each.passed)}: ${comparedCriterionSentence(each)}`,
      })),
    },
    { label: 'written', paragraphs: places.map((line) => ({ line })) },
  ];
  return plumbLine(
    sections.filter((section) => section.paragraphs.length > 0),
    terminal,
  );
}

function sidesLine({ earlier, later }: Comparison): string {
  return `${earlier.data_file}, ${counted(earlier.rows_used, 'row', 'rows', count)} used, against ${later.data_file}, ${counted(later.rows_used, 'row', 'rows', count)} used.`;
}

function marked(lines: readonly string[]): Paragraph[] {
  const more = lines.length - MOST;
  return [
    ...lines.slice(0, MOST).map((text) => ({ mark: '·', text })),
    ...(more > 0 ? [`${count(more)} more are in the comparison.`] : []),
  ];
}

function newRows(lexicon: Lexicon, { new_rows: rows }: Comparison, { model }: StudyRecord): Paragraph[] {
  return rows === null ? [] : newRowsSentences(lexicon, rows, model);
}

function moved(model: Comparison['models'][number]): Paragraph[] {
  const finding = largestChangeSentence(model);
  const rows = model.coefficients.slice(0, MOST).map((c) => {
    const rounding = roundingFor(c.before ?? c.after ?? 0, c.before_standard_error ?? c.after_standard_error);
    return [
      c.name,
      rounded(c.before, rounding),
      rounded(c.after, rounding),
      rounded(c.difference, rounding),
      fixed(c.in_standard_errors, 2),
    ];
  });
  const more = model.coefficients.length - rows.length;
  return [
    `${model.candidate}. ${finding ?? ''}`.trim(),
    ...(model.note === null ? [] : [model.note]),
    {
      columns: [
        { heading: 'coefficient', align: 'left', shrinks: true },
        { heading: 'before', align: 'right' },
        { heading: 'now', align: 'right' },
        { heading: 'difference', align: 'right' },
        { heading: 'in earlier errors', align: 'right' },
      ],
      rows,
    },
    ...(more > 0 ? [`${count(more)} more are in the comparison.`] : []),
  ];
}

import type { ComparedCriterion } from '../comparison-type.ts';
import type { StudyRecord } from '../record-type.ts';
import type { ReportView } from '../view.ts';
import { cautions } from '../words/caution.ts';
import { lexiconOf, raised, stopped } from '../words/lexicon.ts';
import { againView } from './again.ts';
import { dataView } from './data.ts';
import { headView } from './head.ts';
import { predictsView } from './predicts.ts';
import { saysView } from './says.ts';
import { triedView } from './tried.ts';
import { trustView } from './trust.ts';

/**
 * The record as people read it: the one object that templates see.
 *
 * @param verdicts what came of the criteria that need an earlier record; null where they are not judged
 */
export function buildView(
  record: StudyRecord,
  verdicts: readonly ComparedCriterion[] | null = null,
): ReportView {
  const lexicon = lexiconOf(record);
  return {
    title: record.study.title,
    question: record.study.question,
    tool: `${record.tool.name} ${record.tool.version}`,
    hasModel: record.model !== null,
    head: headView(record, lexicon, verdicts),
    data: dataView(record),
    tried: triedView(record),
    says: saysView(record, lexicon),
    trust: trustView(record, lexicon),
    predicts: predictsView(record, lexicon),
    careful: {
      warnings: record.warnings.map((w) => ({ about: raised(w.about), text: stopped(w.text) })),
      cautions: cautions(record),
    },
    again: againView(record),
  };
}

import { sizesChart } from '../chart/sizes.ts';
import { count } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { FamilyView } from '../view.ts';
import { familySentences, stepEvidence } from '../words/family.ts';

/** What each search covered and found. */
export function familyViews({ families = [], selection }: StudyRecord): FamilyView[] {
  return families.map((family, i) => ({
    name: family.name,
    sentences: familySentences(family),
    chart: sizesChart(family, selection, `sizes-${i + 1}`),
    path: family.path.map((step) => ({
      step: count(step.step),
      term: step.term,
      action: step.action,
      evidence: stepEvidence(step),
    })),
  }));
}

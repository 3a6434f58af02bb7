import type { StudyRecord } from '../record-type.ts';
import { raised, stopped } from './lexicon.ts';
import { modelsLookedAt, modelsPhrase } from './models.ts';

/** A caution with a short heading. */
export interface Caution {
  /** A word or two. */
  readonly heading: string;
  /** The caution. */
  readonly text: string;
}

/** What to be careful about, whatever was found; the analyst's own caution first. */
export function cautions(record: StudyRecord): Caution[] {
  const looked = modelsLookedAt(record);
  const split = record.selection.split_sample !== undefined;
  const own = record.study.caution;
  return [
    ...(own === null || own.trim() === '' ? [] : [{ heading: 'From the study', text: stopped(own) }]),
    {
      heading: 'Association',
      text: 'Each statement says what goes with what among the rows observed, the other terms held. A thing that was left out may stand behind both sides. Whether changing a term would change the response is not answered by these data alone.',
    },
    {
      heading: 'Selection',
      text:
        looked.count > 1 && split
          ? `${raised(modelsPhrase(looked))} were looked at on one part of the rows, and the one picked was estimated on the other, so its p-values and intervals owe nothing to the choice. The choice itself may still be a poor one, and models tried before this study was declared are not counted here.`
          : looked.count > 1
            ? `${raised(modelsPhrase(looked))} were fitted to the same rows and one was picked. P-values and intervals are worked out as if it had been the only one, so they are somewhat too favourable; the more candidates were tried, the more so. Models tried before this study was declared are not counted here.`
            : 'One candidate was declared and fitted, so nothing was selected by this run. Models tried before this study was declared are not counted here.',
    },
    {
      heading: 'Extrapolation',
      text: 'The relationships are supported where there are rows. Beyond the ranges given under “What data?”, or in combinations that do not occur there, the intervals do not cover the chance that the relationship is a different one.',
    },
    {
      heading: 'Time',
      text: 'The model describes the period of its data. When equipment, prices, rules or the way of recording change, refit it before using it.',
    },
    {
      heading: 'Review',
      text: 'Where a code, standard, contract or law governs the use of such a model, or the decision belongs to licensed practice, that governs; a qualified person has to review this report before it is acted on.',
    },
  ];
}

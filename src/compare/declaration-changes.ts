import type { RecordCandidate, StudyRecord } from '../record/record.ts';
import { declaredAlike } from './choice.ts';
import type { DeclarationChange } from './comparison.ts';

type Kind = DeclarationChange['kind'];

/** What changed in the study, as far as the two records tell. */
export function declarationChanges(before: StudyRecord, now: StudyRecord): DeclarationChange[] {
  return [
    ...candidateChanges(before.candidates, now.candidates),
    ...differences('derivation', derivations(before), derivations(now)),
    ...differences('exclusion', exclusions(before), exclusions(now)),
    ...one('response_scale', before.response.scale, now.response.scale),
    ...one('weights', weights(before), weights(now)),
    ...differences('admission', sentences(before), sentences(now)),
    ...differences('setting', settings(before), settings(now)),
    ...differences('parameter', parameters(before), parameters(now)),
  ];
}

function candidateChanges(
  before: readonly RecordCandidate[],
  now: readonly RecordCandidate[],
): DeclarationChange[] {
  const find = (list: readonly RecordCandidate[], name: string) => list.find((each) => each.name === name);
  const changes: DeclarationChange[] = [];
  for (const was of before) {
    const is = find(now, was.name);
    if (is === undefined) {
      changes.push({ kind: 'candidate_removed', name: was.name, earlier: text(was), later: null });
    } else if (!declaredAlike(was, is)) {
      changes.push({ kind: 'candidate_changed', name: was.name, earlier: text(was), later: text(is) });
    }
  }
  for (const is of now) {
    if (find(before, is.name) === undefined) {
      changes.push({ kind: 'candidate_added', name: is.name, earlier: null, later: text(is) });
    }
  }
  return changes;
}

function text({ terms, scale, intercept }: RecordCandidate): string {
  const more = [
    ...(scale === 'natural' ? [] : [`${scale} scale`]),
    ...(intercept ? [] : ['without an intercept']),
  ];
  return [terms.join(', ') || 'no terms', ...more].join('; ');
}

type Entries = ReadonlyMap<string, string>;

function differences(kind: Kind, before: Entries, now: Entries): DeclarationChange[] {
  const names = [...new Set([...before.keys(), ...now.keys()])];
  return names.flatMap((name) => {
    const earlier = before.get(name) ?? null;
    const later = now.get(name) ?? null;
    return earlier === later ? [] : [{ kind, name, earlier, later }];
  });
}

function one(kind: Kind, earlier: string | null, later: string | null): DeclarationChange[] {
  return earlier === later ? [] : [{ kind, name: null, earlier, later }];
}

function derivations({ data }: StudyRecord): Entries {
  return new Map(
    data.variables.flatMap(({ name, derived_from: from }) => (from === null ? [] : [[name, from] as const])),
  );
}

/** A record has the reasons of exclusions, not their conditions. */
function exclusions({ data }: StudyRecord): Entries {
  return new Map(
    data.left_out.flatMap(({ kind, because, variable }) =>
      kind === 'left_out' && variable === null ? [[because, because] as const] : [],
    ),
  );
}

function weights({ data }: StudyRecord): string | null {
  return data.variables.find((variable) => variable.used_as.includes('weights'))?.name ?? null;
}

function sentences({ selection }: StudyRecord): Entries {
  return new Map(selection.admission.map((sentence) => [sentence, sentence]));
}

/** Settings with a kind of change of their own. */
const TOLD_APART = ['response.scale', 'weights'];

function settings({ study }: StudyRecord): Entries {
  return new Map(
    study.settings
      .filter(({ key }) => !TOLD_APART.includes(key) && !key.startsWith('report.'))
      .map(({ key, value }) => [key, value] as const),
  );
}

function parameters({ study }: StudyRecord): Entries {
  return new Map((study.parameters ?? []).map(({ name, value }) => [name, String(value)]));
}

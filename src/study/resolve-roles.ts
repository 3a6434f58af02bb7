import { lookUpOfType, type Names } from './names.ts';
import { fault, type Reading } from './reading.ts';
import { resolveScale } from './resolve-scale.ts';
import type { ResponsePlan } from './study.ts';

/** The response is a number, declared or derived. */
export function resolveResponse(reading: Reading, names: Names): ResponsePlan | null {
  const written = reading.file.response;
  if (written === undefined) return null;
  const isName = typeof written === 'string';
  const name = isName ? written : written.variable;
  if (name === undefined) return null;
  const path = isName ? ['response'] : ['response', 'variable'];
  const named = lookUpOfType(reading, names, name, path, ['number', 'integer'], 'a response is a number');
  if (named === null) return null;
  return { variable: name, scale: resolveScale(isName ? undefined : written.scale) ?? { kind: 'natural' } };
}

/** A weight is a number. */
export function resolveWeights(reading: Reading, names: Names): string | null {
  const name = reading.file.weights;
  if (name === undefined || name === null) return null;
  const purpose = 'a weight is a number';
  return lookUpOfType(reading, names, name, ['weights'], ['number', 'integer'], purpose)?.name ?? null;
}

/** One column may be declared twice: once for what it measures, once for its texts as identities. */
function secondVariable(reading: Reading, name: string): string | undefined {
  const declared = reading.file.data?.variables?.[name];
  if (declared === undefined) return undefined;
  const column = JSON.stringify(declared.column ?? name);
  return `Declare a second variable on the same column and name that: { column: ${column}, type: identifier }.`;
}

/** Row identity and time order. */
export function resolveRowRoles(
  reading: Reading,
  names: Names,
): { readonly rowId: string | null; readonly time: string | null } {
  const { row_id: rowId = null, time = null } = reading.file.data ?? {};
  if (rowId !== null) {
    const path = ['data', 'row_id'];
    const purpose = 'rows are identified by an identifier, a text or an integer';
    const suited = ['identifier', 'text', 'integer'] as const;
    const named = lookUpOfType(reading, names, rowId, path, suited, purpose, secondVariable(reading, rowId));
    if (named?.derived === true) {
      fault(
        reading,
        'type_unsuited',
        path,
        `data.row_id names ${rowId}, which is derived; ${purpose} in the data.`,
      );
    }
  }
  if (time !== null) {
    const purpose = 'rows are put in order by a date or a number';
    lookUpOfType(reading, names, time, ['data', 'time'], ['date', 'number', 'integer'], purpose);
  }
  return { rowId, time };
}

/** What a study repeats for is declared, has levels, and is no part of any model: within a level it is constant. */
export function resolveRepeat(reading: Reading, names: Names, inModels: ReadonlySet<string>): string | null {
  const name = reading.file.repeat_for;
  if (name === undefined) return null;
  const path = ['repeat_for'];
  const purpose = 'a study repeats for a category, a text, an identifier or an integer';
  const suited = ['category', 'text', 'identifier', 'integer'] as const;
  const named = lookUpOfType(reading, names, name, path, suited, purpose);
  if (named === null) return null;
  if (named.derived) {
    fault(
      reading,
      'type_unsuited',
      path,
      `repeat_for names ${name}, which is derived; ${purpose} in the data.`,
    );
  } else if (inModels.has(name)) {
    const message = `repeat_for names ${name}, which a candidate or the response uses; within one of its levels it is constant.`;
    fault(reading, 'rules_contradict', path, message, 'Take it out of the candidates, or do not repeat.');
  }
  return name;
}

import { isoDays } from '../expression/iso-date.ts';
import { didYouMean, type Named, type Names, TYPE_WORDS } from './names.ts';
import { listed, type Path, quote, showPath } from './path.ts';
import { cellText, fault, keyFault, type Reading, warning } from './reading.ts';
import type { PredictPlan, PredictRowPlan, VariablePlan } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';

/** What predictions need to know of the rest of the study. */
export interface PredictNeeds {
  readonly variables: readonly VariablePlan[];
  readonly names: Names;
  /** Declared variables that the candidates' terms rest on: a row must give them all. */
  readonly needed: readonly string[];
  /** Variables that a row may give as well: what the weights rest on. */
  readonly allowed: ReadonlySet<string>;
  /** Whether a fault elsewhere leaves it open what the candidates need. */
  readonly unsure: boolean;
  /** Declared variables that a derived one rests on. */
  readonly derivedFrom: (name: string) => ReadonlySet<string>;
}

export function resolvePredict(reading: Reading, needs: PredictNeeds): PredictPlan {
  const written = reading.file.predict;
  const labels = new Map<string, number>();
  const rows: PredictRowPlan[] = [];
  written?.rows?.forEach((row, index) => {
    if (row === undefined) return;
    const path = ['predict', 'rows', index];
    const values = resolveRow(reading, row, path, needs);
    const label = row.label;
    if (typeof label !== 'string') return;
    const earlier = labels.get(label);
    if (earlier !== undefined) {
      const message = `${showPath([...path, 'label'])} is ${quote(label)}, the label of predict.rows[${earlier}] already.`;
      fault(reading, 'name_twice', [...path, 'label'], message);
    }
    labels.set(label, index);
    rows.push({ label, values, place: reading.written.placeOf(path) });
  });
  return {
    rows,
    file: written?.file ?? STUDY_DEFAULTS['predict.file'],
    interval: written?.interval ?? STUDY_DEFAULTS['predict.interval'],
    total: written?.total ?? STUDY_DEFAULTS['predict.total'],
  };
}

type Value = number | string | boolean;

function resolveRow(
  reading: Reading,
  row: Readonly<Record<string, Value | undefined>>,
  path: Path,
  needs: PredictNeeds,
): ReadonlyMap<string, Value> {
  const values = new Map<string, Value>();
  const given = reading.written.keysAt(path).filter((key) => key !== 'label');
  for (const name of given) {
    const at = [...path, name];
    const named = needs.names.get(name);
    if (named === undefined && row[name] === undefined) continue;
    if (named === undefined) {
      const message = `${showPath(path)} gives a value for ${quote(name)}, which is not a variable.`;
      const hint = didYouMean(
        name,
        needs.variables.map((variable) => variable.name),
      );
      keyFault(reading, 'name_unknown', at, message, hint);
      continue;
    }
    if (named.derived) {
      const message = `${showPath(path)} gives a value for ${name}, which is derived.`;
      const from = [...needs.derivedFrom(name)];
      const hint = from.length === 0 ? 'Remove it.' : `It follows from ${listed(from, 'and')}.`;
      keyFault(reading, 'value_not_allowed', at, message, hint);
      continue;
    }
    const value = row[name];
    const variable = needs.variables.find((each) => each.name === name);
    if (value === undefined || variable === undefined) continue;
    const read = readValue(reading, value, variable, named, at);
    if (read !== null) values.set(name, read);
    if (!needs.unsure && !needs.needed.includes(name) && !needs.allowed.has(name)) {
      const message = `${showPath(path)} gives a value for ${name}, which no candidate uses.`;
      warning(reading, 'name_unused', reading.written.keyPlaceOf(at), message, 'Remove it.');
    }
  }
  const lacking = needs.needed.filter((name) => !given.includes(name));
  if (lacking.length > 0) {
    const what = lacking.length === 1 ? 'a value' : 'values';
    const message = `${showPath(path)} lacks ${what} for ${listed(lacking, 'and')}, which the candidates need.`;
    fault(reading, 'key_missing', path, message);
  }
  return values;
}

const NO_YES: ReadonlyMap<string, boolean> = new Map([
  ['no', false],
  ['yes', true],
  ['false', false],
  ['true', true],
  ['0', false],
  ['1', true],
  ['n', false],
  ['y', true],
]);

/** A number, the text of a level, an ISO date as text, or whether a flag holds; null (reported) where it is none. */
function readValue(
  reading: Reading,
  value: Value,
  variable: VariablePlan,
  named: Named,
  path: Path,
): Value | null {
  const text = cellText(reading, value, path);
  const wrong = (hint?: string): null => {
    const message = `${showPath(path)} is ${quote(text)}, but ${variable.name} is ${TYPE_WORDS[variable.type]}.`;
    fault(reading, 'value_not_allowed', path, message, hint);
    return null;
  };
  switch (variable.type) {
    case 'number':
      if (typeof value === 'number') return value;
      return wrong(/^-?\d+,\d+$/.test(text) ? `Write ${text.replace(',', '.')}.` : undefined);
    case 'integer':
      return typeof value === 'number' && Number.isInteger(value) ? value : wrong();
    case 'category':
      if (named.levels !== null && !named.levels.includes(text)) {
        const message = `${showPath(path)} is ${quote(text)}, which is not a declared level of ${variable.name}.`;
        const levels = `Its levels are ${listed(named.levels.slice(0, 12).map(quote), 'and')}${named.levels.length > 12 ? ' and others' : ''}.`;
        fault(reading, 'level_undeclared', path, message, didYouMean(text, named.levels) ?? levels);
        return null;
      }
      return text;
    case 'flag': {
      const texts = variable.flagValues;
      const holds = texts === null ? NO_YES.get(text.toLowerCase()) : flagHolds(texts, text);
      if (holds !== undefined) return holds;
      return wrong(texts === null ? 'Write true or false.' : `Write ${texts[0]} or ${texts[1]}.`);
    }
    case 'date':
      return isoDays(text) === null ? wrong('A date here is written as 2024-03-01.') : text;
    default:
      return text;
  }
}

function flagHolds(texts: readonly [string, string], text: string): boolean | undefined {
  return text === texts[1] ? true : text === texts[0] ? false : undefined;
}

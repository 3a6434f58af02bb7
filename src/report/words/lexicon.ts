import type { RecordTerm, RecordVariable, StudyRecord } from '../record-type.ts';

/** What sentences need to know about a study's names, units and the scale of its response. */
export interface Lexicon {
  readonly variables: ReadonlyMap<string, RecordVariable>;
  readonly response: {
    readonly variable: string;
    /** As it stands inside a sentence: "fuel burned". */
    readonly label: string;
    readonly unit: string | null;
    readonly scale: string;
    /** Box–Cox λ, null on the other scales. */
    readonly lambda: number | null;
  };
  /** Confidence of coefficient intervals and of prediction intervals, between 0 and 1. */
  readonly confidence: number;
  readonly predictionInterval: number;
}

export function lexiconOf(record: StudyRecord): Lexicon {
  const response = record.model?.response ?? { ...record.response, lambda: null };
  return {
    variables: new Map(record.data.variables.map((variable) => [variable.name, variable])),
    response: {
      variable: response.variable,
      label: lowered(response.label || response.variable),
      unit: response.unit,
      scale: response.scale,
      lambda: response.lambda,
    },
    confidence: record.study.confidence,
    predictionInterval: record.study.prediction_interval,
  };
}

/** "Fuel burned" → "fuel burned" inside a sentence; abbreviations and single capitals stay ("HDD", "CO₂"). */
export function lowered(label: string): string {
  return /^\p{Lu}\p{Ll}/u.test(label) ? label[0]!.toLowerCase() + label.slice(1) : label;
}

/** The first letter as a capital, at the start of a sentence or heading. */
export function raised(text: string): string {
  const first = text.codePointAt(0);
  if (first === undefined) return text;
  const letter = String.fromCodePoint(first);
  return letter.toUpperCase() + text.slice(letter.length);
}

/** A variable's label inside a sentence; its name where it has no label or is unknown. */
export function labelOf(lexicon: Lexicon, variable: string): string {
  const label = lexicon.variables.get(variable)?.label;
  return label ? lowered(label) : variable;
}

export function unitOf(lexicon: Lexicon, variable: string): string | null {
  return lexicon.variables.get(variable)?.unit ?? null;
}

/** A term for people: its name with the variables' labels in place of their names ("speed³", "cargo × vessel"). */
export function termLabel(lexicon: Lexicon, term: Pick<RecordTerm, 'name' | 'kind' | 'variables'>): string {
  if (term.kind === 'interaction') return relabelled(lexicon, term.name, term.variables);
  const [variable] = term.variables;
  if (variable === undefined || !term.name.startsWith(variable)) return term.name;
  const rest = term.name.slice(variable.length);
  const unit = term.kind === 'bend' ? unitOf(lexicon, variable) : null;
  return labelOf(lexicon, variable) + rest + (unit ? `\u00a0${unit}` : '');
}

/** Members of an interaction are joined by " × "; each starts with the name of its variable. */
function relabelled(lexicon: Lexicon, name: string, variables: readonly string[]): string {
  return name
    .split(' × ')
    .map((part) => {
      // The longest name first, so that "speed_cubed" is not taken for "speed" and a rest.
      const variable = [...variables].sort((a, b) => b.length - a.length).find((v) => part.startsWith(v));
      return variable === undefined ? part : labelOf(lexicon, variable) + part.slice(variable.length);
    })
    .join(' × ');
}

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[], word = 'and'): string {
  if (items.length <= 1) return items[0] ?? '';
  return `${items.slice(0, -1).join(', ')} ${word} ${items.at(-1)}`;
}

/** A candidate's name inside a sentence; in quotation marks where its own punctuation could be taken for the sentence's. */
export function named(name: string): string {
  return /[.,;:()]/.test(name) ? `“${name}”` : name;
}

/** Ends a sentence that may or may not have its full stop. */
export function stopped(sentence: string): string {
  const text = sentence.trim();
  return text === '' || /[.!?:]$/.test(text) ? text : `${text}.`;
}

/** "1 row", "12 rows". */
export function counted(
  n: number,
  one: string,
  many = `${one}s`,
  format = (x: number): string => String(x),
): string {
  return `${format(n)}\u00a0${n === 1 ? one : many}`;
}

/** The variable of exactly this name, or null. */
export function variableNamed(lexicon: Lexicon, name: string): RecordVariable | null {
  return lexicon.variables.get(name) ?? null;
}

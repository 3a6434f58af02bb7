import type { Path } from './path.ts';
import type { Reading } from './reading.ts';
import type { Setting } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';

/** Settings that are found from the data where they are null; every other null means "none". */
const FOUND = ['data.format.delimiter', 'data.format.encoding', 'examination.lags'];

/** Every setting that has a default, in the order of the schema, as it is in force. */
export function settingsOf(reading: Reading): readonly Setting[] {
  return Object.entries(STUDY_DEFAULTS).map(([key, fallback]) => {
    const written = valueAt(reading.file, key.split('.'));
    const value = written === undefined ? fallback : written;
    return {
      key,
      value: value === null && FOUND.includes(key) ? 'found from the data' : text(value),
      written: written !== undefined,
    };
  });
}

function valueAt(top: unknown, path: Path): unknown {
  let value = top;
  for (const step of path) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, step)) return undefined;
    value = (value as Record<string | number, unknown>)[step];
  }
  return value;
}

function text(value: unknown): string {
  if (value === null) return 'none';
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(text).join(', ');
  if (typeof value === 'object') {
    return Object.entries(value)
      .map(([key, inner]) => `${key} ${text(inner)}`)
      .join(', ');
  }
  return typeof value === 'string' && !/^[\w-]+$/.test(value) ? JSON.stringify(value) : String(value);
}

import type { Loose } from './reading.ts';
import type { Scale } from './study.ts';
import type { ScaleInFile } from './study-file.generated.ts';

/** A response scale as written, or null where none is. */
export function resolveScale(written: Loose<ScaleInFile> | undefined): Scale | null {
  if (written === undefined) return null;
  if (typeof written === 'string') return { kind: written };
  return written.box_cox === undefined ? null : { kind: 'box_cox', lambda: written.box_cox };
}

/** "log", "box_cox 0.5" */
export function scaleText(scale: Scale): string {
  return scale.kind === 'box_cox' ? `box_cox ${scale.lambda}` : scale.kind;
}

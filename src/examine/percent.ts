import { THIN } from '../numerals.ts';
import { significant } from '../select/words.ts';

/** A share as per cent to two significant digits: "20 %", "0.35 %". */
export function percent(share: number): string {
  return `${significant(100 * share, 2)}${THIN}%`;
}

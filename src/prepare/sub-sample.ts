import { gatherColumn, gatherLines } from './gather.ts';
import type { Sample } from './sample.ts';

/**
 * Some rows of a sample, as a sample; losses stay as they are.
 * @param positions in the sample, ascending, each once
 */
export function subSample(sample: Sample, positions: Int32Array): Sample {
  const place = new Int32Array(sample.rowCount).fill(-1);
  positions.forEach((position, i) => {
    place[position] = i;
  });
  const { ids, timeOrder } = sample;
  return {
    ...sample,
    rowCount: positions.length,
    rows: positions.map((position) => sample.rows[position]!),
    lines: gatherLines(sample.lines, positions),
    ids: ids === null ? null : Array.from(positions, (position) => ids[position]!),
    columns: new Map([...sample.columns].map(([name, column]) => [name, gatherColumn(column, positions)])),
    timeOrder:
      timeOrder === null ? null : timeOrder.map((position) => place[position]!).filter((i) => i >= 0),
  };
}

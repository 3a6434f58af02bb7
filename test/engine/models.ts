/** Small builders of designs for tests: from plain arrays, without a study file. */
import type { NumberColumn } from '../../src/data/table.ts';
import type { RowFacts } from '../../src/engine/fit-candidate.ts';
import type { CandidateModel, Design, DesignColumn, Piece } from '../../src/model/design.ts';
import { type DesignRows, designRows } from '../../src/model/design-rows.ts';
import { columnName } from '../../src/model/names.ts';
import { toScale } from '../../src/model/response-scale.ts';
import type { Scale } from '../../src/study/study.ts';

export interface TestModel {
  readonly design: Design;
  readonly rows: DesignRows;
  readonly facts: RowFacts;
}

export type PieceLists = readonly (readonly Piece[])[];

export const variable = (name: string): Piece[] => [{ kind: 'variable', variable: name }];
export const power = (name: string, to: number): Piece[] =>
  to === 1 ? variable(name) : [{ kind: 'power', variable: name, to }];

/** A design whose union is the intercept and `columns`; each candidate lists union indexes (0 is the intercept). */
export function testModel(
  data: Readonly<Record<string, readonly number[]>>,
  columns: PieceLists,
  candidates: readonly (readonly number[])[],
  options: { weights?: string; scales?: readonly Scale[] } = {},
): TestModel {
  const union: DesignColumn[] = [[], ...columns].map((pieces) => ({
    name: columnName(pieces),
    pieces,
    unit: null,
  }));
  const scales = options.scales ?? [{ kind: 'natural' as const }];
  const design: Design = {
    columns: union,
    responses: scales.map((scale) => ({ variable: 'y', scale })),
    families: [],
    candidates: candidates.map(
      (own, i): CandidateModel => ({
        name: `candidate ${i + 1}`,
        response: { variable: 'y', scale: scales[0]! },
        intercept: own.includes(0),
        terms: own
          .filter((j) => j > 0)
          .map((j) => ({
            name: union[j]!.name,
            plan: { kind: 'variable', variable: union[j]!.name },
            columns: [j],
          })),
        columns: own,
        responseColumn: 0,
      }),
    ),
  };
  const table = new Map(
    Object.entries(data).map(([name, values]): [string, NumberColumn] => [
      name,
      { kind: 'number', name, values: Float64Array.from(values) },
    ]),
  );
  const rowCount = data.y!.length;
  const rows = designRows(
    union,
    { rowCount, columns: table },
    scales.map((scale) => Float64Array.from(data.y!, (y) => toScale(y, scale))),
    options.weights ?? null,
  );
  const facts: RowFacts = {
    logWeights:
      options.weights === undefined ? 0 : data[options.weights]!.reduce((sum, w) => sum + Math.log(w), 0),
    logJacobians: scales.map(() => 0),
    columnNames: union.map((column) => column.name),
    columnVariables: union.map((column) => column.pieces.map((piece) => piece.variable)),
  };
  return { design, rows, facts };
}

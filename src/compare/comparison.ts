/**
 * A comparison of two records, as schemas/comparison.schema.json describes it. The types are generated from that
 * schema; this file names the parts that other files and rooms use.
 */
export type {
  ChoiceChange,
  CoefficientChange,
  ComparedCriterion,
  ComparedModel,
  ComparedRecord,
  ComparedRows,
  Comparison,
  ComparisonTest,
  Contender,
  ContractChange,
  DeclarationChange,
  NewRows,
  Parts,
  Revision,
} from './comparison-file.generated.ts';

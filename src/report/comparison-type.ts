/** The one place where the report takes in the type of a comparison. */
export type {
  CoefficientChange,
  ComparedModel,
  Comparison,
  ComparisonTest,
  ContractChange,
  DeclarationChange,
  NewRows,
} from '../compare/comparison.ts';

/** The one place where the report takes in the type of a comparison. */
export type {
  CoefficientChange,
  ComparedCriterion,
  ComparedModel,
  Comparison,
  ComparisonTest,
  ContractChange,
  DeclarationChange,
  NewRows,
} from '../compare/comparison.ts';

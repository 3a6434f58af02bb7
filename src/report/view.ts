import type { Figure } from './chart/svg.ts';
import type { Caution } from './words/caution.ts';

/**
 * What a template is given: everything already said in words and formatted numbers, so that a template
 * only arranges. Every key is always there; what does not apply is null, an empty list or false. Text is
 * plain text: the HTML templates escape it, and the Markdown view carries it escaped for Markdown.
 */
export interface ReportView {
  readonly title: string;
  /** The question as declared; null where none is. */
  readonly question: string | null;
  /** "plumbrule 0.1.0". */
  readonly tool: string;
  /** Whether a candidate was admitted and chosen. */
  readonly hasModel: boolean;
  /** The first screen. */
  readonly head: HeadView;
  readonly data: SourceView;
  readonly tried: TriedView;
  /** What the chosen model says; null where no candidate was admitted. */
  readonly says: SaysView | null;
  /** Whether it can be trusted; null with the model. */
  readonly trust: TrustView | null;
  /** Predictions; null where none were asked for or no model was chosen. */
  readonly predicts: PredictsView | null;
  readonly careful: CarefulView;
  readonly again: AgainView;
}

export interface HeadView {
  /** The answer: one to three sentences. */
  readonly answer: readonly string[];
  /** How closely the chosen model follows the data; null without a model. */
  readonly fit: string | null;
  /** The predictions asked for, up to eight; the total last. */
  readonly predictions: readonly HeadPrediction[];
  /** "90 %": confidence of the intervals beside the predictions. */
  readonly predictionConfidence: string;
  /** Says how many predictions are not among those above; null where all are. */
  readonly predictionsMore: string | null;
  /** Three to five lines to know before relying on the answer, most important first. */
  readonly beware: readonly string[];
  /** "All 2 acceptance criteria are met."; null where the study declares none. */
  readonly acceptance: string | null;
  readonly criteria: readonly CriterionView[];
  /** Study, data and date range in one line. */
  readonly line: string;
}

export interface HeadPrediction {
  readonly label: string;
  /** With its unit. */
  readonly estimate: string;
  /** "475 to 563 L". */
  readonly interval: string;
  readonly outside: boolean;
  readonly total: boolean;
}

export interface CriterionView {
  readonly name: string;
  readonly value: string;
  readonly limit: string;
  /** Null where it needs an earlier record. */
  readonly passed: boolean | null;
  /** "met", "missed" or "not judged". */
  readonly word: string;
}

export interface SourceView {
  readonly sentence: string;
  readonly file: string;
  readonly dates: string | null;
  readonly rowsRead: string;
  readonly rowsUsed: string;
  /** Each loss between rows read and rows used. */
  readonly losses: readonly { readonly rows: string; readonly because: string }[];
  readonly variables: readonly VariableView[];
  /** Other variables of the contract that the study does not use. */
  readonly unused: string | null;
  readonly contract: string;
  readonly badValues: readonly {
    readonly row: string;
    readonly variable: string;
    readonly text: string;
    readonly because: string;
  }[];
  readonly ignored: string | null;
}

export interface VariableView {
  readonly name: string;
  readonly label: string;
  /** Whether the label says more than the name. */
  readonly labelled: boolean;
  readonly unit: string;
  readonly usedAs: string;
  /** "20 to 140" with the unit, or the levels with their rows. */
  readonly range: string;
  /** The middle half of the values; an en dash where it has none. */
  readonly middle: string;
  readonly mean: string;
  readonly missing: string;
  readonly derivedFrom: string | null;
}

export interface TriedView {
  /** The declared rule in words, and how candidates were held against rows they had not seen. */
  readonly rule: readonly string[];
  /** What each search of a family covered and found. */
  readonly families: readonly FamilyView[];
  /** How often what was chosen would be chosen again; null where the study does not ask. */
  readonly stability: StabilityView | null;
  /** Admission rules in force, a sentence each. */
  readonly admission: readonly string[];
  readonly because: string;
  /** Name of the criterion, as a column heading. */
  readonly criterion: string;
  /** Whether candidates carry a value of that criterion. */
  readonly ranked: boolean;
  /** Whether candidates carry weights of evidence. */
  readonly hasEvidence: boolean;
  /** Whether candidates carry an error on rows held out. */
  readonly hasError: boolean;
  /** The best ranked in full, the chosen one among them. */
  readonly candidates: readonly CandidateView[];
  /** How many further candidates are in the tables; null where all are shown. */
  readonly candidatesMore: string | null;
  readonly chart: Figure | null;
  /** Partial F of nested pairs: those that decided, then those that the chosen candidate is part of. */
  readonly pairs: readonly PairView[];
  /** Whether any of them decided the choice. */
  readonly pairsDecided: boolean;
  readonly pairsNote: string | null;
}

export interface CandidateView {
  readonly rank: string;
  readonly name: string;
  readonly terms: string;
  /** Scale of its response where it differs from the study's; else null. */
  readonly scale: string | null;
  readonly value: string;
  readonly difference: string;
  readonly coefficients: string;
  readonly adjustedRSquared: string;
  /** Weight of evidence: "48.7 %"; an en dash where there is none. */
  readonly evidence: string;
  /** Root mean squared error on rows held out, with its unit; an en dash where there is none. */
  readonly error: string;
  readonly admitted: boolean;
  readonly chosen: boolean;
  /** "chosen", "admitted", or why it was refused. */
  readonly verdict: string;
  /** Columns left out because they depend on others, as sentences. */
  readonly dropped: readonly string[];
}

export interface FamilyView {
  readonly name: string;
  /** What was searched, how exactly, and why it ended. */
  readonly sentences: readonly string[];
  /** How the best value falls with size; null for elimination and selection. */
  readonly chart: Figure | null;
  /** The steps of elimination or selection. */
  readonly path: readonly {
    readonly step: string;
    readonly term: string;
    /** "enters" or "leaves". */
    readonly action: string;
    readonly evidence: string;
  }[];
}

export interface StabilityView {
  readonly finding: string;
  /** How rows were drawn. */
  readonly method: string;
  /** How often each candidate is chosen; null where it is always the same. */
  readonly candidates: Figure | null;
  /** How often each term is in what is chosen; null likewise. */
  readonly terms: Figure | null;
}

export interface PairView {
  readonly smaller: string;
  readonly larger: string;
  readonly statistic: string;
  readonly freedom: string;
  readonly pValue: string;
  readonly decided: boolean;
}

export interface SaysView {
  readonly candidate: string;
  readonly fit: string;
  /** How to read it where the scale is not natural; else null. */
  readonly scaleNote: string | null;
  readonly equation: {
    readonly left: string;
    readonly text: string;
    readonly note: string | null;
    readonly summands: readonly { readonly sign: string; readonly number: string; readonly factor: string }[];
  };
  /** Overall F in a sentence; null where it is not defined. */
  readonly overall: string | null;
  readonly ladder: Figure | null;
  readonly terms: readonly TermView[];
  readonly coefficients: readonly CoefficientView[];
  /** Which standard errors they rest on; null for a record of a version before it. */
  readonly errors: string | null;
  /** How many models were looked at before this one; null where none was. */
  readonly looked: string | null;
  /** What the study asks of the coefficients. */
  readonly hypotheses: readonly {
    readonly name: string;
    readonly verdict: string;
    readonly evidence: string;
  }[];
  /** Further measures of each coefficient; null for a record of a version before them. */
  readonly more: MoreView | null;
  /** Estimates averaged over the admitted candidates; null where the study does not ask. */
  readonly averaged: AveragedView | null;
  /** "95 %". */
  readonly confidence: string;
  /** Quantity and unit of the coefficients: "fuel burned, L". */
  readonly quantity: string;
}

export interface TermView {
  readonly heading: string;
  readonly sentences: readonly string[];
  /** Joint test of the term; null where nothing can be tested. */
  readonly test: string | null;
  readonly chart: Figure | null;
  /** Levels or slopes where there are too many for sentences. */
  readonly rows: readonly { readonly name: string; readonly estimate: string; readonly interval: string }[];
  /** Level means and pairs of levels of a category; null for other terms. */
  readonly levels: LevelsView | null;
}

export interface LevelsView {
  readonly heading: string;
  /** What the means are of: "fuel burned in L". */
  readonly quantity: string;
  /** Where everything else is held. */
  readonly held: string;
  readonly means: readonly {
    readonly level: string;
    readonly rows: string;
    readonly estimate: string;
    readonly interval: string;
  }[];
  /** What the pairs’ p-values and intervals hold for; null where none are compared. */
  readonly method: string | null;
  readonly pairs: readonly {
    readonly level: string;
    readonly other: string;
    readonly estimate: string;
    readonly interval: string;
    /** Adjusted for the number of pairs. */
    readonly pValue: string;
  }[];
  readonly pairsNote: string | null;
}

export interface AveragedView {
  /** What is averaged, and how to read it. */
  readonly sentence: string;
  /** "95 %": of the coefficients’ intervals. */
  readonly confidence: string;
  readonly coefficients: readonly {
    readonly name: string;
    /** Weight of the candidates that have it. */
    readonly weight: string;
    readonly estimate: string;
    readonly standardError: string;
    readonly interval: string;
  }[];
  /** "90 %": of the predictions’ intervals. */
  readonly predictionConfidence: string;
  readonly predictions: readonly {
    readonly label: string;
    readonly estimate: string;
    readonly interval: string;
  }[];
}

export interface MoreView {
  /** What the simultaneous intervals hold for; null where not asked for. */
  readonly simultaneous: string | null;
  /** "95 %". */
  readonly confidence: string;
  /** Whether intervals were drawn from the rows again. */
  readonly hasDrawn: boolean;
  readonly coefficients: readonly {
    readonly name: string;
    /** Coefficient in standard deviations of both sides. */
    readonly standardised: string;
    /** Partial correlation with the response. */
    readonly partial: string;
    /** What R² would lose without the column. */
    readonly lost: string;
    /** Interval that holds for all together; an en dash where not asked for. */
    readonly simultaneous: string;
    /** Interval drawn from the rows again; an en dash where not asked for. */
    readonly drawn: string;
  }[];
}

export interface CoefficientView {
  readonly name: string;
  readonly unit: string;
  readonly estimate: string;
  readonly standardError: string;
  readonly interval: string;
  readonly pValue: string;
  readonly vif: string;
}

export interface TrustView {
  /** How many findings call for care, in a sentence. */
  readonly summary: string;
  /** How the model does on rows that it has not seen; null where the study does not ask. */
  readonly unseen: UnseenView | null;
  /** What calls for care or is worth a look, weightiest first, each with its drawings. */
  readonly findings: readonly FindingView[];
  /** What was asked with nothing to see. */
  readonly quiet: readonly QuietView[];
  /** Drawings of the residuals beside questions that found nothing. */
  readonly pictures: readonly Figure[];
  /** Columns that nearly depend on one another; null where none do. */
  readonly dependencies: DependenciesView | null;
  /** The bootstrap beside the declared intervals; null where the study asks for none. */
  readonly drawnAgain: AgainstRowsView | null;
  /** Observed against fitted values. */
  readonly fitted: Figure;
  /** How many rows lie far off or far out, as sentences. */
  readonly counts: readonly string[];
  /** The rows that move the coefficients most, up to five. */
  readonly rows: readonly InfluentialRowView[];
  /** What the rule would choose without each of them; null where it was not asked again. */
  readonly rowsNote: string | null;
  /** How precisely the model was worked out. */
  readonly arithmetic: string;
}

export interface UnseenView {
  readonly finding: string;
  /** How that was found out, and what the rows set aside say. */
  readonly sentences: readonly string[];
  readonly chart: Figure | null;
}

export interface FindingView {
  /** Stable name: "equal_spread". */
  readonly name: string;
  readonly question: string;
  /** "Worth a look", "Take care". */
  readonly word: string;
  /** 1 or 2. */
  readonly concern: number;
  readonly verdict: string;
  /** Statistic, degrees of freedom, p-value or mark; null without a statistic. */
  readonly evidence: string | null;
  /** What to do about it; null where nothing is to be done. */
  readonly advice: string | null;
  readonly charts: readonly Figure[];
}

export interface QuietView {
  /** Stable name: "equal_spread". */
  readonly name: string;
  readonly question: string;
  readonly verdict: string;
  /** As for a finding. */
  readonly evidence: string | null;
}

export interface DependenciesView {
  /** Which columns carry each dependency and what that means. */
  readonly sentences: readonly string[];
  readonly chart: Figure | null;
  /** What the coefficients become without one of their partners. */
  readonly rows: readonly {
    readonly leftOut: string;
    readonly name: string;
    readonly estimate: string;
    readonly standardError: string;
    readonly estimateWithout: string;
    readonly standardErrorWithout: string;
  }[];
}

export interface AgainstRowsView {
  /** How both kinds of interval compare. */
  readonly finding: string;
  /** How rows were drawn. */
  readonly method: string;
  readonly chart: Figure | null;
}

export interface InfluentialRowView {
  /** Line in the data file. */
  readonly row: string;
  /** Its identity, or "Row 12". */
  readonly name: string;
  /** Whether the name is an identity of its own. */
  readonly identified: boolean;
  readonly observed: string;
  readonly fitted: string;
  /** Standardised residual. */
  readonly residual: string;
  readonly leverage: string;
  /** Cook’s distance. */
  readonly distance: string;
  /** The coefficient that it moves most, with and without it; null where the record does not say. */
  readonly moves: string | null;
}

export interface PredictsView {
  readonly rows: readonly PredictionView[];
  /** Names of the variables that rows are predicted at. */
  readonly chart: Figure | null;
  readonly total: {
    readonly rows: string;
    readonly estimate: string;
    readonly interval: string;
    readonly mean: string | null;
  } | null;
  readonly notes: readonly string[];
  readonly confidence: string;
  /** Whether a mean stands beside the median. */
  readonly hasMean: boolean;
  /** Whether intervals were drawn from the rows again. */
  readonly hasDrawn: boolean;
}

export interface PredictionView {
  readonly label: string;
  /** "cargo 80 t, speed 9 kn". */
  readonly values: string;
  readonly estimate: string;
  readonly mean: string;
  readonly meanInterval: string;
  readonly newInterval: string;
  /** Interval for a new row drawn from the rows again; an en dash where there is none. */
  readonly drawnInterval: string;
  readonly inside: boolean;
  /** "inside the data", or how it lies outside. */
  readonly place: string;
}

export interface CarefulView {
  readonly warnings: readonly { readonly about: string; readonly text: string }[];
  readonly cautions: readonly Caution[];
}

export interface AgainView {
  /** Commands to type; in Markdown not escaped, since they stand in a code block. */
  readonly commands: readonly string[];
  /** The study's parameters with the values of this run. */
  readonly parameters: readonly {
    readonly name: string;
    readonly value: string;
    readonly default: string;
    /** "given" or "default". */
    readonly source: string;
  }[];
  readonly files: readonly { readonly role: string; readonly name: string; readonly sha256: string }[];
  readonly tool: string;
  readonly format: string;
  readonly reading: string;
  readonly settings: readonly { readonly key: string; readonly value: string; readonly written: string }[];
}

import type { Figure } from './chart/svg.ts';
import type { Caution } from './words/caution.ts';

/**
 * What a template is given: everything already said in words and formatted numbers, so that a template
 * only arranges. Every key is always there; what does not apply is null, an empty list or false. Text is
 * plain text: the HTML templates escape it, and the Markdown view carries it escaped for Markdown.
 */
export interface ReportView {
  /** The study’s title. */
  readonly title: string;
  /** The question as declared; null where none is. */
  readonly question: string | null;
  /** "plumbrule 0.1.0". */
  readonly tool: string;
  /** Whether a candidate was admitted and chosen. */
  readonly hasModel: boolean;
  /** The first screen. */
  readonly head: HeadView;
  /** Where the rows come from. */
  readonly data: SourceView;
  /** The candidates and the rule. */
  readonly tried: TriedView;
  /** What the chosen model says; null where no candidate was admitted. */
  readonly says: SaysView | null;
  /** Whether it can be trusted; null with the model. */
  readonly trust: TrustView | null;
  /** Predictions; null where none were asked for or no model was chosen. */
  readonly predicts: PredictsView | null;
  /** Warnings and cautions. */
  readonly careful: CarefulView;
  /** How to get the same again. */
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
  /** "All 2 acceptance criteria are met.", and what came of those against an earlier record; null where the study declares none. */
  readonly acceptance: string | null;
  /** Each acceptance criterion. */
  readonly criteria: readonly CriterionView[];
  /** Study, data and date range in one line. */
  readonly line: string;
}

export interface HeadPrediction {
  /** What the row is called. */
  readonly label: string;
  /** With its unit. */
  readonly estimate: string;
  /** "475 to 563 L". */
  readonly interval: string;
  /** Whether it lies outside the data. */
  readonly outside: boolean;
  /** Whether it is the total of the others. */
  readonly total: boolean;
}

export interface CriterionView {
  /** What is limited: "Adjusted R²". */
  readonly name: string;
  /** What was found. */
  readonly value: string;
  /** What the study asks for. */
  readonly limit: string;
  /** Null where it is not judged: it needs an earlier record, or no row is new. */
  readonly passed: boolean | null;
  /** "met", "missed" or "not judged". */
  readonly word: string;
}

export interface SourceView {
  /** How many rows were read and used. */
  readonly sentence: string;
  /** The data file. */
  readonly file: string;
  /** "4 January 2023 to 27 February 2024"; null where no time is declared. */
  readonly dates: string | null;
  /** Rows in the file. */
  readonly rowsRead: string;
  /** Rows that every candidate is fitted on. */
  readonly rowsUsed: string;
  /** Each loss between rows read and rows used. */
  readonly losses: readonly { readonly rows: string; readonly because: string }[];
  /** The variables that the study uses. */
  readonly variables: readonly VariableView[];
  /** Other variables of the contract that the study does not use. */
  readonly unused: string | null;
  /** Whether the data kept its declared contract. */
  readonly contract: string;
  /** The first values that broke it. */
  readonly badValues: readonly {
    readonly row: string;
    readonly variable: string;
    readonly text: string;
    readonly because: string;
  }[];
  /** Columns of the file that no variable reads; null where there are none. */
  readonly ignored: string | null;
}

export interface VariableView {
  /** Its name in the study. */
  readonly name: string;
  /** What people call it. */
  readonly label: string;
  /** Whether the label says more than the name. */
  readonly labelled: boolean;
  /** Its unit; empty where it has none. */
  readonly unit: string;
  /** How the study uses it. */
  readonly usedAs: string;
  /** "20 to 140" with the unit, or the levels with their rows. */
  readonly range: string;
  /** The middle half of the values; an en dash where it has none. */
  readonly middle: string;
  /** Its mean; an en dash where it has none. */
  readonly mean: string;
  /** Rows in which it was missing when read. */
  readonly missing: string;
  /** The expression that it is worked out by; null where it is read. */
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
  /** Why that candidate was chosen, or none. */
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
  /** Distance from the best against number of coefficients; null where a family’s drawing says it, or nothing is ranked. */
  readonly chart: Figure | null;
  /** Partial F of nested pairs: those that decided, then those that the chosen candidate is part of. */
  readonly pairs: readonly PairView[];
  /** Whether any of them decided the choice. */
  readonly pairsDecided: boolean;
  /** How many pairs are not shown; null where all are. */
  readonly pairsNote: string | null;
}

export interface CandidateView {
  /** Its place, from 1. */
  readonly rank: string;
  /** Its name. */
  readonly name: string;
  /** Its terms. */
  readonly terms: string;
  /** Scale of its response where it differs from the study's; else null. */
  readonly scale: string | null;
  /** Its value of the criterion. */
  readonly value: string;
  /** Its distance from the best. */
  readonly difference: string;
  /** How many coefficients it has. */
  readonly coefficients: string;
  /** Its adjusted R². */
  readonly adjustedRSquared: string;
  /** Weight of evidence: "48.7 %"; an en dash where there is none. */
  readonly evidence: string;
  /** Root mean squared error on rows held out, with its unit; an en dash where there is none. */
  readonly error: string;
  /** Whether it keeps the rules of admission. */
  readonly admitted: boolean;
  /** Whether it is the one chosen. */
  readonly chosen: boolean;
  /** "chosen", "admitted", or why it was refused. */
  readonly verdict: string;
  /** Columns left out because they depend on others, as sentences. */
  readonly dropped: readonly string[];
}

export interface FamilyView {
  /** Its name in the study. */
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
  /** How often what was chosen would be chosen again. */
  readonly finding: string;
  /** How rows were drawn. */
  readonly method: string;
  /** How often each candidate is chosen; null where it is always the same. */
  readonly candidates: Figure | null;
  /** How often each term is in what is chosen; null likewise. */
  readonly terms: Figure | null;
}

export interface PairView {
  /** The smaller candidate. */
  readonly smaller: string;
  /** The candidate that contains it. */
  readonly larger: string;
  /** Partial F. */
  readonly statistic: string;
  /** "2 and 231" degrees of freedom. */
  readonly freedom: string;
  /** Its p-value. */
  readonly pValue: string;
  /** Whether the choice rests on it. */
  readonly decided: boolean;
}

export interface SaysView {
  /** Name of the chosen candidate. */
  readonly candidate: string;
  /** How closely it follows the data. */
  readonly fit: string;
  /** How to read it where the scale is not natural; else null. */
  readonly scaleNote: string | null;
  /** The equation, on one line and summand by summand. */
  readonly equation: {
    readonly left: string;
    readonly text: string;
    readonly note: string | null;
    readonly summands: readonly { readonly sign: string; readonly number: string; readonly factor: string }[];
  };
  /** Overall F in a sentence; null where it is not defined. */
  readonly overall: string | null;
  /** A typical step of each term on one axis; null without steps. */
  readonly ladder: Figure | null;
  /** What each term says. */
  readonly terms: readonly TermView[];
  /** Every coefficient. */
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
  /** The term, for people. */
  readonly heading: string;
  /** What it says. */
  readonly sentences: readonly string[];
  /** Joint test of the term; null where nothing can be tested. */
  readonly test: string | null;
  /** Its relationship or its levels; null where another term shows it. */
  readonly chart: Figure | null;
  /** Levels or slopes where there are too many for sentences. */
  readonly rows: readonly { readonly name: string; readonly estimate: string; readonly interval: string }[];
  /** Level means and pairs of levels of a category; null for other terms. */
  readonly levels: LevelsView | null;
}

export interface LevelsView {
  /** What the tables are of. */
  readonly heading: string;
  /** What the means are of: "fuel burned in L". */
  readonly quantity: string;
  /** Where everything else is held. */
  readonly held: string;
  /** What the model expects at each level. */
  readonly means: readonly {
    readonly level: string;
    readonly rows: string;
    readonly estimate: string;
    readonly interval: string;
  }[];
  /** What the pairs’ p-values and intervals hold for; null where none are compared. */
  readonly method: string | null;
  /** How levels differ pair by pair. */
  readonly pairs: readonly {
    readonly level: string;
    readonly other: string;
    readonly estimate: string;
    readonly interval: string;
    /** Adjusted for the number of pairs. */
    readonly pValue: string;
  }[];
  /** Why pairs are not listed; null where all are. */
  readonly pairsNote: string | null;
}

export interface AveragedView {
  /** What is averaged, and how to read it. */
  readonly sentence: string;
  /** "95 %": of the coefficients’ intervals. */
  readonly confidence: string;
  /** Each coefficient of one of the candidates. */
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
  /** The mean at each row that was asked for. */
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
  /** Each coefficient. */
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
  /** Name of its column. */
  readonly name: string;
  /** "per t"; empty where it has none. */
  readonly unit: string;
  /** The estimate. */
  readonly estimate: string;
  /** Its standard error. */
  readonly standardError: string;
  /** Its interval. */
  readonly interval: string;
  /** Its p-value against zero. */
  readonly pValue: string;
  /** Its variance inflation factor. */
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
  /** "log": the scale that the observed and fitted values of the rows are on; null where it is the response's own. */
  readonly rowsScale: string | null;
  /** How precisely the model was worked out. */
  readonly arithmetic: string;
}

export interface UnseenView {
  /** Error of the whole procedure beside that of the mean, or of the rows set aside. */
  readonly finding: string;
  /** How that was found out, and what the rows set aside say. */
  readonly sentences: readonly string[];
  /** The errors on one axis; null for fewer than two. */
  readonly chart: Figure | null;
}

export interface FindingView {
  /** Stable name: "equal_spread". */
  readonly name: string;
  /** What was asked of the model. */
  readonly question: string;
  /** "Worth a look", "Take care". */
  readonly word: string;
  /** 1 or 2. */
  readonly concern: number;
  /** What was found. */
  readonly verdict: string;
  /** Statistic, degrees of freedom, p-value or mark; null without a statistic. */
  readonly evidence: string | null;
  /** What to do about it; null where nothing is to be done. */
  readonly advice: string | null;
  /** Drawings that answer the question. */
  readonly charts: readonly Figure[];
}

export interface QuietView {
  /** Stable name: "equal_spread". */
  readonly name: string;
  /** What was asked of the model. */
  readonly question: string;
  /** That there was nothing to see. */
  readonly verdict: string;
  /** As for a finding. */
  readonly evidence: string | null;
}

export interface DependenciesView {
  /** Which columns carry each dependency and what that means. */
  readonly sentences: readonly string[];
  /** Which columns carry each; null where a sentence says it. */
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
  /** Both intervals of each coefficient; null without any. */
  readonly chart: Figure | null;
}

export interface InfluentialRowView {
  /** Line in the data file. */
  readonly row: string;
  /** Its identity, or "Row 12". */
  readonly name: string;
  /** Whether the name is an identity of its own. */
  readonly identified: boolean;
  /** What was observed. */
  readonly observed: string;
  /** What the model says. */
  readonly fitted: string;
  /** Standardised residual. */
  readonly residual: string;
  /** Its leverage. */
  readonly leverage: string;
  /** Cook’s distance. */
  readonly distance: string;
  /** The coefficient that it moves most, with and without it; null where the record does not say. */
  readonly moves: string | null;
}

export interface PredictsView {
  /** The predicted rows. */
  readonly rows: readonly PredictionView[];
  /** Names of the variables that rows are predicted at. */
  readonly chart: Figure | null;
  /** The total of all rows; null where not asked for. */
  readonly total: {
    readonly rows: string;
    readonly estimate: string;
    readonly interval: string;
    readonly mean: string | null;
  } | null;
  /** How to read the intervals. */
  readonly notes: readonly string[];
  /** "90 %". */
  readonly confidence: string;
  /** Whether a mean stands beside the median. */
  readonly hasMean: boolean;
  /** Whether intervals were drawn from the rows again. */
  readonly hasDrawn: boolean;
}

export interface PredictionView {
  /** What the row is called. */
  readonly label: string;
  /** "cargo 80 t, speed 9 kn". */
  readonly values: string;
  /** The prediction, with its unit. */
  readonly estimate: string;
  /** The mean beside the median; an en dash where there is none. */
  readonly mean: string;
  /** Interval for the mean. */
  readonly meanInterval: string;
  /** Interval for a new row. */
  readonly newInterval: string;
  /** Interval for a new row drawn from the rows again; an en dash where there is none. */
  readonly drawnInterval: string;
  /** Whether it lies inside the data. */
  readonly inside: boolean;
  /** "inside the data", or how it lies outside. */
  readonly place: string;
}

export interface CarefulView {
  /** Found in this run. */
  readonly warnings: readonly { readonly about: string; readonly text: string }[];
  /** Always to be told. */
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
  /** Study and data with their hashes. */
  readonly files: readonly { readonly role: string; readonly name: string; readonly sha256: string }[];
  /** Program and version. */
  readonly tool: string;
  /** Format of the record. */
  readonly format: string;
  /** How the data file was read. */
  readonly reading: string;
  /** Settings in force. */
  readonly settings: readonly { readonly key: string; readonly value: string; readonly written: string }[];
}

import { describe, expect, it } from 'vitest';
import { PROBLEM_CODES } from '../../src/problem.ts';
import { changed, marked, read, SMALL, SOUND } from './sample.ts';

interface Case {
  readonly from: string;
  /** With «marks» around what the problems must point to, in the order of the text. */
  readonly to: string;
  readonly code: string;
  /** One for each mark. */
  readonly says: readonly string[];
  readonly in?: string;
}

/** Every code of the study group in src/problem.ts. */
const STUDY_CODES = PROBLEM_CODES.slice(0, PROBLEM_CODES.indexOf('data_unreadable'));

const CASES: readonly Case[] = [
  // Keys
  {
    from: 'title: Small',
    to: '«titel»: Small\ntitle: Small',
    code: 'key_unknown',
    says: ['titel is not a key here. Did you mean title?'],
  },
  {
    from: 'y: { type: number }',
    to: 'y: { type: number, «at_mots»: 3 }',
    code: 'key_unknown',
    says: ['data.variables.y.at_mots is not a key here. Did you mean at_most?'],
  },
  {
    from: 'response: y',
    to: 'response: y\n«owner»: 3',
    code: 'key_unknown',
    says: ['owner is not a key here. Keys here are plumbrule, title,'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { «significance»: 0.05 }',
    code: 'key_unknown',
    says: ['inference.significance is not a key here. Keys here are confidence, dependent_columns,'],
  },
  // How coefficients are judged
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: «hc5» }',
    code: 'value_not_allowed',
    says: ['inference.standard_errors is "hc5", but must be classical, hc0,', 'Did you mean hc0?'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: { clustered_by: «kk» } }',
    code: 'name_unknown',
    says: ['inference.standard_errors.clustered_by names "kk", which is neither a variable nor derived.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: { clustered_by: «x» } }',
    code: 'type_unsuited',
    says: ['names x, which is a number; clusters are named by a category, an identifier, a text,'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: { hac_lags: «4» } }',
    code: 'key_missing',
    says: ['inference.standard_errors.hac_lags needs rows in time order, but data.time is not declared.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: { hac_lags: «-1» } }',
    code: 'limit_nonsense',
    says: ['inference.standard_errors.hac_lags is -1, but must be at least 0.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { standard_errors: { hac_lags: «many» } }',
    code: 'value_not_allowed',
    says: ['inference.standard_errors.hac_lags is "many", which is not allowed here.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [«{ name: A }»] }',
    code: 'value_not_allowed',
    says: ['inference.hypotheses[0] is a mapping with the key name, but must be { name: …, combination: …'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [{ name: A, «combination»: {} }] }',
    code: 'value_not_allowed',
    says: ['inference.hypotheses[0].combination is empty.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [{ name: A, «combination»: { x: 0 } }] }',
    code: 'limit_nonsense',
    says: ['inference.hypotheses[0].combination has the multiplier 0 for every coefficient'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [{ name: A, combination: { x: 1 } }, { name: «A», all_of: [{ combination: { x: 1 } }] }] }',
    code: 'name_twice',
    says: ['inference.hypotheses[1].name is "A", the name of inference.hypotheses[0] already.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [{ name: A, all_of: [{ combination: { x: «one» } }] }] }',
    code: 'value_not_allowed',
    says: ['inference.hypotheses[0].all_of[0].combination.x must be a number, but is "one".'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { hypotheses: [{ name: A, all_of: [{ combination: { x: 1, z: 2 } }, { combination: { z: 1 } }, «{ combination: { x: -3 }, equals: 1 }»] }] }',
    code: 'limit_nonsense',
    says: [
      'inference.hypotheses[0].all_of[2] says of the coefficients what the equalities before it say, or contradicts them.',
    ],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { slopes_at: { «xx»: [1] } }',
    code: 'name_unknown',
    says: ['inference.slopes_at.xx is neither a variable nor derived.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { slopes_at: { «k»: [1] } }',
    code: 'type_unsuited',
    says: ['inference.slopes_at.k names k, which is a category; slopes are along a number.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ polynomial: x, «degre»: 2 }]',
    code: 'key_unknown',
    says: ['candidates[0].terms[0].degre is not a key here. Did you mean degree?'],
  },
  { from: '  file: a.csv\n', to: '', code: 'key_missing', says: [] },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { «split_at»: { variable: x } }',
    code: 'key_missing',
    says: ['examination.split_at lacks the key value.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { split_at: { variable: «z», value: 1 } }',
    code: 'name_unknown',
    says: ['examination.split_at.variable names "z", which is neither a variable nor derived.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { split_at: { variable: «k», value: low } }',
    code: 'type_unsuited',
    says: [
      'examination.split_at.variable names k, which is a category; rows are split at a value of a number, a date or a flag.',
    ],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { split_at: { variable: d, value: «March» } }',
    code: 'value_not_allowed',
    says: ['examination.split_at.value is "March", but d is a date. A date here is written as 2024-03-01.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { split_at: { variable: f, value: «false» } }',
    code: 'value_not_allowed',
    says: ['examination.split_at.value is "false", but f is a flag. Write true:'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { split_at: { variable: x, value: «high» } }',
    code: 'value_not_allowed',
    says: ['examination.split_at.value is "high", but x is a number.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { bootstrap: { by: «blocks» } }',
    code: 'value_not_allowed',
    says: ['examination.bootstrap.by is blocks, but data.time names no variable that orders the rows.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { bootstrap: { block_length: «4» } }',
    code: 'value_not_allowed',
    says: ['examination.bootstrap.block_length is given, but by is rows. Write by: blocks, or remove it.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nexamination: { bootstrap: { repetitions: «10» } }',
    code: 'limit_nonsense',
    says: ['examination.bootstrap.repetitions is 10, but must be'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «{ power: x }»]',
    code: 'key_missing',
    says: ['candidates[0].terms[1] lacks the key to.'],
  },
  {
    from: 'y: { type: number }',
    to: '«y»: { unit: L }',
    code: 'key_missing',
    says: ['data.variables.y lacks the key type.'],
  },
  // Values
  {
    from: 'plumbrule: 1',
    to: 'plumbrule: «2»',
    code: 'value_not_allowed',
    says: ['plumbrule is 2, and this version of Plumbrule reads study format 1. Write plumbrule: 1.'],
  },
  {
    from: 'title: Small',
    to: 'title: «2024»',
    code: 'value_not_allowed',
    says: ['title must be a text, but is 2024. Put it in quotes: "2024".'],
  },
  { from: 'title: Small', to: 'title: «""»', code: 'value_not_allowed', says: ['title is empty.'] },
  {
    from: 'response: y',
    to: 'response: y\n«report»:',
    code: 'value_not_allowed',
    says: ['report must be a mapping of keys, but is empty. Write something under it, or remove the key.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { confidence: «"0,9"» }',
    code: 'value_not_allowed',
    says: ['inference.confidence must be a number, but is "0,9". Write 0.9.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { confidence: «.inf» }',
    code: 'value_not_allowed',
    says: ['inference.confidence must be a number, but is .inf.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nselection: { rank_by: «split_half» }',
    code: 'value_not_allowed',
    says: ['selection.rank_by is "split_half", which is not one of adjusted_r_squared, aic,'],
  },
  {
    from: 'response: y',
    to: 'response: { variable: y, scale: «lgo» }',
    code: 'value_not_allowed',
    says: [
      'response.scale is "lgo", but must be natural, log, sqrt, reciprocal or { box_cox: … }. Did you mean log?',
    ],
  },
  {
    from: 'response: y',
    to: 'response: «3»',
    code: 'value_not_allowed',
    says: ["response is 3, but must be a variable's name or { variable: …, scale: … }."],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [«7»]',
    code: 'value_not_allowed',
    says: ["candidates[0].terms[0] is 7, but must be a variable's name or one of { interaction: […] }"],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [«{ polynom: x, degree: 2 }»]',
    code: 'value_not_allowed',
    says: ['candidates[0].terms[0] is a mapping with the keys polynom and degree, but must be'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { interaction: [x, «[k]»] }]',
    code: 'value_not_allowed',
    says: [
      "candidates[0].terms[1].interaction[1] is a list, but must be a variable's name or one of { polynomial",
    ],
  },
  {
    from: 'terms: [x]',
    to: 'terms: «x»',
    code: 'value_not_allowed',
    says: ['candidates[0].terms must be a list, but is "x". Put it in brackets'],
  },
  {
    from: '    x: { type: number }',
    to: '    «" x"»: { type: number }\n    x: { type: number }',
    code: 'value_not_allowed',
    says: ['" x" cannot be the name of a variable.'],
  },
  {
    from: '    x: { type: number }',
    to: '    «label»: { type: number }\n    x: { type: number }',
    code: 'value_not_allowed',
    says: ['"label" cannot be the name of a variable: it is the label of a row'],
  },
  {
    from: 'd: { type: date }',
    to: 'd: { type: date, pattern: «DD/YYYY» }',
    code: 'value_not_allowed',
    says: ['data.variables.d.pattern is "DD/YYYY", which has a day DD without a month MM.'],
  },
  {
    from: 'd: { type: date }',
    to: 'd: { type: date, pattern: «YYYYMMMM» }',
    code: 'value_not_allowed',
    says: ['which has MM twice.'],
  },
  {
    from: 'd: { type: date }',
    to: 'd: { type: date, pattern: «DD.MM» }',
    code: 'value_not_allowed',
    says: ['which has no YYYY for the year.'],
  },
  {
    from: 'levels: [low, high]',
    to: 'levels: [low, «NA»]',
    code: 'value_not_allowed',
    says: [
      'data.variables.k.levels[1] is "NA", which data.missing reads as missing. Write data.missing without it.',
    ],
  },
  {
    from: 'k: { type: category, levels: [low, high] }',
    to: 'k: { type: category, levels: [«low», high], missing: [low] }',
    code: 'value_not_allowed',
    says: ['which data.variables.k.missing reads as missing.'],
  },
  {
    from: 'file: a.csv',
    to: 'file: «/data/a.csv»',
    code: 'value_not_allowed',
    says: ['data.file is "/data/a.csv", which is not relative to the study file.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [«{ log: x }»]',
    code: 'value_not_allowed',
    says: ['What is worked out, such as log(…), is given a name under derive, and that is the term.'],
  },
  // Names
  {
    from: 'response: y',
    to: 'response: «"y ~ x"»',
    code: 'name_unknown',
    says: ['One name stands here; what is worked out from variables is given a name under derive.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «xx1»]',
    code: 'name_unknown',
    says: ['candidates[0].terms[1] names "xx1", which is neither a variable nor derived.'],
  },
  {
    in: SOUND,
    from: 'terms: [cargo, speed_cubed]',
    to: 'terms: [cargo, «speed_cube»]',
    code: 'name_unknown',
    says: [
      'candidates[0].terms[1] names "speed_cube", which is neither a variable nor derived. Did you mean speed_cubed?',
    ],
  },
  {
    in: SOUND,
    from: 'polynomial: headwind',
    to: 'polynomial: «headwnd»',
    code: 'name_unknown',
    says: [
      'candidates[2].terms[0].polynomial names "headwnd", which is neither a variable nor derived. Did you mean headwind?',
    ],
  },
  {
    in: SOUND,
    from: '[cargo, vessel] }',
    to: '[cargo, «vesel»] }',
    code: 'name_unknown',
    says: [
      'candidates[1].terms[4].interaction[1] names "vesel", which is neither a variable nor derived. Did you mean vessel?',
    ],
  },
  {
    in: SOUND,
    from: 'variable: fuel',
    to: 'variable: «feul»',
    code: 'name_unknown',
    says: ['response.variable names "feul", which is neither a variable nor derived. Did you mean fuel?'],
  },
  {
    in: SOUND,
    from: 'weights: share',
    to: 'weights: «shore»',
    code: 'name_unknown',
    says: ['Did you mean share?'],
  },
  {
    in: SOUND,
    from: 'row_id: crossing',
    to: 'row_id: «crosing»',
    code: 'name_unknown',
    says: ['Did you mean crossing?'],
  },
  {
    in: SOUND,
    from: 'time: departed',
    to: 'time: «departd»',
    code: 'name_unknown',
    says: ['Did you mean departed?'],
  },
  {
    in: SOUND,
    from: 'chosen: [By vessel]',
    to: 'chosen: [«By vesel»]',
    code: 'name_unknown',
    says: ['acceptance.chosen[0] names "By vesel", which is not a candidate. Did you mean By vessel?'],
  },
  {
    in: SOUND,
    from: 'headwind: 4,',
    to: 'headwind: 4, «headwinds»: 4,',
    code: 'name_unknown',
    says: ['predict.rows[0] gives a value for "headwinds", which is not a variable. Did you mean headwind?'],
  },
  {
    from: 'response: y',
    to: 'derive:\n  a: { expression: 1 + «b» }\n  b: { expression: x + 1 }\nresponse: y\nweights: a',
    code: 'name_unknown',
    says: ['derive.a.expression names "b", which is derived only further down. Move b above a.'],
  },
  {
    from: 'response: y',
    to: 'derive:\n  «x»: { expression: y + 1 }\nresponse: y',
    code: 'name_twice',
    says: ['derive.x has the name of a declared variable.'],
  },
  {
    from: 'levels: [low, high]',
    to: 'levels: [low, high, «low»]',
    code: 'name_twice',
    says: ['data.variables.k.levels has "low" twice.'],
  },
  {
    from: 'f: { type: flag }',
    to: 'f: { type: flag, values: [on, «on»] }',
    code: 'name_twice',
    says: ['data.variables.f.values has "on" twice.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, k, «x»]',
    code: 'name_twice',
    says: ['candidates[0].terms[2] is the same term as candidates[0].terms[0].'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «{ polynomial: x, degree: 2 }»]',
    code: 'name_twice',
    says: ['candidates[0].terms[1] brings in x itself, as does candidates[0].terms[0].'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ polynomial: x, degree: 3 }, «{ power: x, to: 2 }»]',
    code: 'name_twice',
    says: ['candidates[0].terms[1] brings in x to the power 2, as does candidates[0].terms[0].'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ interaction: [x, k] }, «{ interaction: [k, x] }»]',
    code: 'name_twice',
    says: ['candidates[0].terms[1] is the same term as candidates[0].terms[0].'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { interaction: [x, «x»] }]',
    code: 'name_twice',
    says: [
      'candidates[0].terms[1] is an interaction of x with itself. For a curve use { polynomial: x, degree: 2 } or { power: x, to: 2 }.',
    ],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { interaction: [k, «k»] }]',
    code: 'name_twice',
    says: ['candidates[0].terms[1] is an interaction of k with itself. Each member'],
  },
  {
    from: 'response: y',
    to: 'response: y\nreport: { formats: [html, «html»] }',
    code: 'name_twice',
    says: ['report.formats has html twice.'],
  },
  {
    from: 'response: y',
    to: 'response: y\npredict: { rows: [{ label: A, x: 1 }, { label: «A», x: 2 }] }',
    code: 'name_twice',
    says: ['predict.rows[1].label is "A", the label of predict.rows[0] already.'],
  },
  // Levels
  {
    in: SOUND,
    from: 'baseline: Tern',
    to: 'baseline: «Turn»',
    code: 'level_undeclared',
    says: ['data.variables.vessel.baseline is "Turn", which is not among the levels. Did you mean Tern?'],
  },
  {
    in: SOUND,
    from: 'status == "trial"',
    to: 'status == «"trail"»',
    code: 'level_undeclared',
    says: [
      'leave_out[0].where compares status with "trail", which is not among its levels. Did you mean trial?',
    ],
  },
  {
    in: SOUND,
    from: 'vessel: Tern',
    to: 'vessel: «Greyhound»',
    code: 'level_undeclared',
    says: [
      'predict.rows[0].vessel is "Greyhound", which is not a declared level of vessel. Its levels are "Skerry", "Tern" and "Holm".',
    ],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [«"y ~ x"»]',
    code: 'name_unknown',
    says: [
      'candidates[0].terms[0] is "y ~ x"; a term is one name. Terms are given as a list of names; the response is named once, under response.',
    ],
  },
  {
    in: SOUND,
    from: 'vessel: Tern',
    to: 'vessel: «Turn»',
    code: 'level_undeclared',
    says: ['predict.rows[0].vessel is "Turn", which is not a declared level of vessel. Did you mean Tern?'],
  },
  // Types
  {
    from: 'terms: [x]',
    to: 'terms: [x, { polynomial: «k», degree: 2 }]',
    code: 'type_unsuited',
    says: ['candidates[0].terms[1].polynomial names k, which is a category; a polynomial needs a number.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { power: «f», to: 2 }]',
    code: 'type_unsuited',
    says: ['power names f, which is a flag; a power needs a number.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { bend: «k», at: 2 }]',
    code: 'type_unsuited',
    says: ['bend names k, which is a category; a bend needs a number.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, { spline: «d», knots: [1, 2, 3] }]',
    code: 'type_unsuited',
    says: ['spline names d, which is a date; a spline needs a number.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «d»]',
    code: 'type_unsuited',
    says: [
      'candidates[0].terms[1] names d, which is a date; a term is a number, a category or a flag. Derive a number from it, such as days_between(',
    ],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «t», «i»]',
    code: 'type_unsuited',
    says: ['names t, which is a text;', 'names i, which is an identifier;'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [x, «y»]',
    code: 'type_unsuited',
    says: ['candidates[0].terms[1] is of y, which is the response.'],
  },
  {
    from: 'response: y',
    to: 'response: «k»',
    code: 'type_unsuited',
    says: ['response names k, which is a category; a response is a number.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nweights: «f»',
    code: 'type_unsuited',
    says: ['weights names f, which is a flag; a weight is a number.'],
  },
  {
    from: 'file: a.csv',
    to: 'file: a.csv\n  time: «k»\n  row_id: «x»',
    code: 'type_unsuited',
    says: ['data.time names k, which is a category;', 'data.row_id names x, which is a number;'],
  },
  {
    from: 'x: { type: number }',
    to: 'x: { type: number, «levels»: [a, b] }',
    code: 'type_unsuited',
    says: ['data.variables.x.levels does not suit a number. It belongs to a category.'],
  },
  {
    from: 'k: { type: category,',
    to: 'k: { type: category, «unit»: m, «at_least»: 1, «values»: [a, b], «pattern»: YYYY,',
    code: 'type_unsuited',
    says: ['unit does not', 'at_least does not', 'values does not', 'pattern does not'],
  },
  // Derivations
  {
    from: 'response: y',
    to: 'derive:\n  a: { expression: «a» + 1 }\nresponse: y\nweights: a',
    code: 'derivation_cycle',
    says: ['derive.a is derived from itself.'],
  },
  {
    from: 'response: y',
    to: 'derive:\n  a: { expression: «c» + 1 }\n  b: { expression: a }\n  c: { expression: b }\nresponse: y\nweights: c',
    code: 'derivation_cycle',
    says: ['derive.a is derived from c, which is derived from a in turn.'],
  },
  // Candidates
  {
    from: '  - name: A',
    to: '  - name: A\n    terms: [k]\n  - name: «A»',
    code: 'candidate_twice',
    says: ['candidates[1].name is "A", the name of candidates[0] already.'],
  },
  {
    from: '    terms: [x]',
    to: '    terms: [x, k]\n  - «name: B»\n    terms: [k, x]',
    code: 'candidate_twice',
    says: ['candidates[1] has the same terms, scale and intercept as "A".'],
  },
  {
    from: '    terms: [x]',
    to: '    terms: [{ polynomial: x, degree: 1 }]\n  - «name: B»\n    terms: [x]\n    scale: natural',
    code: 'candidate_twice',
    says: ['candidates[1] has the same terms'],
  },
  {
    from: '    terms: [x]',
    to: '    subsets_of: [x, «{ interaction: [x, k] }»]',
    code: 'hierarchy_impossible',
    says: ['candidates[0].subsets_of[1] contains k, which is no term of this family'],
  },
  // Criteria
  ...(['adjusted_r_squared', 'mallows_cp', 'press', 'partial_f'] as const).map(
    (criterion): Case => ({
      from: '    terms: [x]',
      to: `    terms: [x]\n  - name: B\n    terms: [x]\n    scale: log\nselection: { rank_by: «${criterion}» }`,
      code: 'criterion_across_scales',
      says: [
        `selection.rank_by is ${criterion}, which cannot rank candidates across response scales (natural and log). Rank by aic, aicc, bic or cross_validation`,
      ],
    }),
  ),
  // How far the choice can be trusted
  ...(
    [
      [
        'validation: { by: rows, group: «k» }',
        ['selection.validation.group is given, but by is rows. Write by: group'],
      ],
      ['validation: { start: «3» }', ['selection.validation.start is given, but by is rows. Write by: time']],
      [
        'validation: { by: leave_one_out, folds: «3» }',
        ['selection.validation.folds is given, but by is leave_one_out.'],
      ],
      [
        'honest_error: { by: rows, horizon: «2» }',
        ['selection.honest_error.horizon is given, but by is rows.'],
      ],
      [
        'one_standard_error: «true»',
        ['selection.one_standard_error needs a cross-validated error, but rank_by is aicc.'],
      ],
      [
        'rank_by: cross_validation, prefer_smaller_within: 2, one_standard_error: «true»',
        ['selection.one_standard_error and prefer_smaller_within are two rules for the same thing. Keep one'],
      ],
      [
        'rank_by: press, average: «true»',
        ['selection.average needs weights of evidence, but rank_by is press.'],
      ],
      ['stability: { block_length: «3» }', ['selection.stability.block_length is given, but by is rows.']],
      [
        '«hold_out»: { share: 0.2, last: 3 }',
        ['selection.hold_out has share and last, but rows are set aside in one'],
      ],
      [
        '«hold_out»: {}',
        ['selection.hold_out does not say which rows to set aside. Write one of share, last and where.'],
      ],
      [
        "hold_out: { where: 'x > 3', seed: «2» }",
        ['selection.hold_out.seed is given, but nothing is drawn.'],
      ],
    ] as const
  ).map(
    ([selection, says]): Case => ({
      from: '    terms: [x]',
      to: `    terms: [x]\n  - name: B\n    terms: []\nselection: { ${selection} }`,
      code: 'rules_contradict',
      says,
    }),
  ),
  ...(
    [
      ['«honest_error»: {}', 'Of one candidate, selection.validation gives the honest error.'],
      ['«stability»: {}', 'Declare another candidate'],
      ['«split_sample»: {}', 'Declare another candidate'],
      ['average: «true»', 'Declare another candidate'],
    ] as const
  ).map(
    ([selection, hint]): Case => ({
      from: 'response: y',
      to: `response: y\nselection: { ${selection} }`,
      code: 'rules_contradict',
      says: [`is about the choice among candidates, but there is only one. ${hint}`],
    }),
  ),
  ...(
    [
      [
        'validation: { by: «time» }',
        'selection.validation.by is time, but a rolling origin needs rows in time order',
      ],
      ['honest_error: { by: «time» }', 'selection.honest_error.by is time, but a rolling origin needs'],
      [
        'stability: { by: «blocks» }',
        'selection.stability.by is blocks, but blocks are of rows in time order',
      ],
      ['hold_out: { last: «3» }', 'selection.hold_out.last is 3, but the latest rows can be told only'],
      ['validation: { by: «group» }', 'selection.validation.by is group, but no group is named.'],
    ] as const
  ).map(
    ([selection, says]): Case => ({
      from: '    terms: [x]',
      to: `    terms: [x]\n  - name: B\n    terms: []\nselection: { ${selection} }`,
      code: 'key_missing',
      says: [says],
    }),
  ),
  {
    from: 'response: y',
    to: 'response: y\nselection: { validation: { by: group, group: «kk» } }',
    code: 'name_unknown',
    says: ['selection.validation.group names "kk", which is neither a variable nor derived.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nselection: { validation: { by: group, group: «x» } }',
    code: 'type_unsuited',
    says: ['selection.validation.group names x, which is a number; rows are grouped by'],
  },
  {
    from: 'response: y',
    to: 'response: y\nselection: { hold_out: { where: «x + 1» } }',
    code: 'expression_type',
    says: ['selection.hold_out.where yields a number, but must be a condition.'],
  },
  {
    from: '    terms: [x]',
    to: '    terms: [x]\n  - name: B\n    terms: [x]\n    scale: log\nselection: { average: «true» }',
    code: 'criterion_across_scales',
    says: ['selection.average cannot be had where candidates are on different response scales'],
  },
  // Limits
  {
    from: 'y: { type: number }',
    to: 'y: { type: number, at_least: «9», at_most: 3 }',
    code: 'limit_nonsense',
    says: ['data.variables.y has at_least 9 above at_most 3, so that nothing fits.'],
  },
  {
    from: 'response: y',
    to: 'response: y\ninference: { confidence: «95» }',
    code: 'limit_nonsense',
    says: ['inference.confidence is 95, but must be above 0 and below 1.'],
  },
  {
    from: 'response: y',
    to: 'response: y\npredict: { interval: «0» }',
    code: 'limit_nonsense',
    says: ['predict.interval is 0, but must be above 0 and below 1.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nselection: { significance: «1», prefer_smaller_within: «-1» }',
    code: 'limit_nonsense',
    says: ['above 0 and below 1', 'selection.prefer_smaller_within is -1, but must be at least 0.'],
  },
  {
    from: 'response: y',
    to: 'response: y\nselection: { admit: { vif: { at_most: «0.5» }, p_value: { at_most: «2» }, rows_per_coefficient: { at_least: «0» }, adjusted_r_squared: { at_least: «1.5» } } }',
    code: 'limit_nonsense',
    says: ['at least 1', 'above 0 and at most 1', 'above 0', 'at most 1'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ polynomial: x, degree: «0» }]',
    code: 'limit_nonsense',
    says: ['candidates[0].terms[0].degree is 0, but must be at least 1 and at most 12.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ polynomial: x, degree: «13» }]',
    code: 'limit_nonsense',
    says: ['but must be at least 1 and at most 12.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ spline: x, knots: [1, 3, «3», 4] }]',
    code: 'limit_nonsense',
    says: ['candidates[0].terms[0].knots must increase, but 3 follows 3.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ spline: x, «knots»: [1, 3] }]',
    code: 'limit_nonsense',
    says: ['candidates[0].terms[0].knots has 2 items, but must have at least 3 and at most 50.'],
  },
  {
    from: 'terms: [x]',
    to: 'terms: [{ «interaction»: [x] }]',
    code: 'limit_nonsense',
    says: ['candidates[0].terms[0].interaction has 1 item, but must have at least 2.'],
  },
  {
    from: 'terms: [x]',
    to: '«terms»: []\n    intercept: false',
    code: 'limit_nonsense',
    says: ['candidates[0] has neither a term nor an intercept'],
  },
  {
    from: 'response: y',
    to: 'response: y\nacceptance:\n  r_squared: { at_least: «1.2» }\n  largest_vif: { at_most: «0.5» }\n  rows_used: { at_least: «90», at_most: 50 }',
    code: 'limit_nonsense',
    says: ['r_squared is never above 1', 'largest_vif is never below 1', 'has at_least 90 above at_most 50'],
  },
  {
    from: 'file: a.csv',
    to: 'file: a.csv\n  format: { delimiter: «","», decimal_mark: "," }',
    code: 'limit_nonsense',
    says: ['data.format.delimiter and the decimal mark are both ",".'],
  },
  // Rows to predict
  {
    in: SOUND,
    from: '- { label: "Loaded, slow", cargo: 80, speed: 9,',
    to: '- «{ label: "Loaded, slow", speed: 9,',
    code: '',
    says: [],
  },
  {
    in: SOUND,
    from: 'cargo: 80',
    to: 'cargo: «"80"»',
    code: 'value_not_allowed',
    says: ['predict.rows[0].cargo is "80", but cargo is a number.'],
  },
  {
    in: SOUND,
    from: 'hull_days: 30',
    to: 'hull_days: «30.5»',
    code: 'value_not_allowed',
    says: ['predict.rows[0].hull_days is "30.5", but hull_days is an integer.'],
  },
  {
    in: SOUND,
    from: 'night: day }',
    to: 'night: «dusk» }',
    code: 'value_not_allowed',
    says: ['predict.rows[0].night is "dusk", but night is a flag. Write day or night.'],
  },
  {
    in: SOUND,
    from: 'cargo: 80,',
    to: 'cargo: 80, «speed_cubed»: 27,',
    code: 'value_not_allowed',
    says: ['predict.rows[0] gives a value for speed_cubed, which is derived. It follows from speed.'],
  },
  // Expressions
  { in: SOUND, from: 'speed ^ 3', to: 'speed ^ «*» 3', code: 'expression_syntax', says: [''] },
  {
    in: SOUND,
    from: 'speed_cubed * cargo',
    to: 'speed_cubed * «carga»',
    code: 'expression_name',
    says: ['The expression names "carga", which is neither a variable nor derived. Did you mean cargo?'],
  },
  {
    in: SOUND,
    from: 'speed_cubed * cargo',
    to: 'speed_cubed * «vessel»',
    code: 'expression_type',
    says: [''],
  },
  {
    in: SOUND,
    from: 'status == "trial"',
    to: '«speed + 1»',
    code: 'expression_type',
    says: ['leave_out[0].where yields a number, but must be a condition.'],
  },
  {
    in: SOUND,
    from: 'speed_cubed * cargo',
    to: '«vessel»',
    code: 'expression_type',
    says: [
      'derive.work.expression yields a category; a derived variable is a number, a condition or a date.',
    ],
  },
  // YAML
  {
    from: 'title: Small',
    to: 'title: Small\n«title»: Again',
    code: 'yaml_duplicate_key',
    says: ['The key "title" stands twice at the top; first on line 2. Keep one of them.'],
  },
  {
    from: '    x: { type: number }',
    to: '    x: { type: number }\n    «x»: { type: number }',
    code: 'yaml_duplicate_key',
    says: ['The key "x" stands twice under data.variables; first on line 7.'],
  },
  {
    from: 'title: Small',
    to: 'title: Small\nquestion:\n«\t»Why',
    code: 'yaml_syntax',
    says: ['A tab indents this line. YAML is indented with spaces only.'],
  },
  { from: 'title: Small', to: 'title: «"»Small', code: 'yaml_syntax', says: ['The closing " is missing.'] },
  {
    from: 'title: Small',
    to: 'title: «!text» Small',
    code: 'yaml_syntax',
    says: ['A study file has no tags'],
  },
  {
    from: 'title: Small',
    to: 'title: «*name»',
    code: 'yaml_syntax',
    says: ['*name stands for no earlier anchor &name.'],
  },
  {
    from: 'title: Small',
    to: 'title: Small\n«---»\ntitle: Again',
    code: 'yaml_syntax',
    says: ['A second document begins here.'],
  },
  {
    from: 'title: Small',
    to: 'title: &a [«*a»]',
    code: 'yaml_alias_limit',
    says: ['*a stands inside the value that it repeats.'],
  },
].filter((each) => each.code !== '');

describe('one fault, told once, at its place', () => {
  it.each(CASES)('$code: $to', ({ in: base = SMALL, from, to, code, says }) => {
    const { text, places } = marked(changed(base, from, to));
    const outcome = read(text);
    const expected = says.length === 0 ? outcome.places : places.map((place) => `${place} ${code}`);
    const found = outcome.problems
      .filter((problem) => problem.severity === 'error')
      .map((problem, index) => ({
        problem,
        shown: outcome.places[outcome.problems.indexOf(problem)]!,
        index,
      }))
      .sort((a, b) => position(a.shown) - position(b.shown));
    expect(found.map(({ shown }) => shown)).toEqual(expected);
    found.forEach(({ problem }, index) => {
      expect(`${problem.message} ${problem.hint ?? ''}`).toContain(says[index] ?? '');
      expect(problem.message).toMatch(/\.$/);
    });
    expect(outcome.study).toBeNull();
  });
});

function position(shown: string): number {
  const [line, column] = shown.split(/[:+]/).map(Number);
  return line! * 10_000 + column!;
}

describe('faults at the edges', () => {
  it.each([
    ['x * k', 'An interaction is written { interaction: [x, k] }, beside its parts as terms of their own.'],
    ['x:k', 'An interaction is written { interaction: [x, k] }, beside its parts as terms of their own.'],
    ['x + k', 'Terms stand in a list: [x, k].'],
    ['x ^ 2', 'A power is written { power: x, to: 2 }.'],
    ['log(x)', 'What is worked out from variables is given a name under derive, and that is the term.'],
    ['x / 2', 'What is worked out from variables is given a name under derive, and that is the term.'],
  ])('tells how a calculation becomes a term: %s', (term, hint) => {
    const text = changed(SMALL, '[x]', `["${term}"]`);
    expect(read(text).problems).toMatchObject([{ code: 'name_unknown', hint }]);
  });

  it('leaves a name alone that only looks like a calculation', () => {
    expect(read(changed(SMALL, '[x]', '["x-ray"]')).problems).toMatchObject([
      { message: 'candidates[0].terms[0] names "x-ray", which is neither a variable nor derived.' },
    ]);
    const known = changed(SMALL, 'x: { type: number }', 'x: { type: number }\n    x*f: { type: number }');
    expect(read(changed(known, '[x]', '[x*f]')).problems).toEqual([]);
  });

  it('tells how a bare number becomes a limit', () => {
    const text = changed(
      SMALL,
      'response: y',
      'response: y\nacceptance: { largest_vif: 5 }\nselection: { admit: { p_value: 0.05 } }',
    );
    expect(
      read(text)
        .problems.map(({ hint }) => hint)
        .sort(),
    ).toEqual(['Write { at_least: 5 } or { at_most: 5 }.', 'Write { at_most: 0.05 }.']);
  });

  it('does not call a value unused where it is open what the candidates need', () => {
    const text = changed(
      SMALL,
      'response: y',
      'derive: { z: { expression: k / f } }\nresponse: y\npredict: { rows: [{ label: A, x: 1 }] }',
    );
    expect(read(changed(text, '[x]', '[z]')).problems.map(({ code }) => code)).not.toContain('name_unused');
    const term = changed(SMALL, 'response: y', 'response: y\npredict: { rows: [{ label: A, x: 1 }] }');
    expect(read(changed(term, '[x]', '[xx]')).problems.map(({ code }) => code)).toEqual(['name_unknown']);
  });

  it('tells how a date can be the identity of rows', () => {
    const text = changed(SMALL, '  file: a.csv\n', '  file: a.csv\n  row_id: d\n').replace(
      'd: { type: date }',
      'd: { type: date, column: Day of week }',
    );
    expect(read(text).problems).toMatchObject([
      {
        code: 'type_unsuited',
        hint: 'Declare a second variable on the same column and name that: { column: "Day of week", type: identifier }.',
      },
    ]);
  });

  it('tells of a missing key where its mapping begins', () => {
    expect(read(changed(SMALL, '  file: a.csv\n', '')).places).toEqual(['3:1+4 key_missing']);
    expect(read(changed(SMALL, 'title: Small\n', '')).places).toEqual(['1:1+12 key_missing']);
  });

  it('tells of values that a row to predict lacks, through derived variables', () => {
    const { text, places } = marked(
      changed(
        changed(SOUND, ' cargo: 80, speed: 9,', ''),
        '    - { label: "Loaded, slow", headwind: 4, hull_days: 30, vessel: Tern, night: day }',
        '    - «{ label: "Loaded, slow", headwind: 4, hull_days: 30, vessel: Tern, night: day }»',
      ),
    );
    const { problems, places: found } = read(text);
    expect(found).toEqual(places.map((place) => `${place} key_missing`));
    expect(problems[0]!.message).toBe(
      'predict.rows[0] lacks values for cargo and speed, which the candidates need.',
    );
  });

  it('warns of a derived variable that nothing uses, and goes on', () => {
    const { text, places } = marked(
      changed(
        SMALL,
        'response: y',
        'derive:\n  «a»: { expression: x + 1 }\n  «b»: { expression: a + 1 }\nresponse: y',
      ),
    );
    const outcome = read(text);
    expect(outcome.places).toEqual(places.map((place) => `${place} name_unused`));
    expect(outcome.problems.every(({ severity }) => severity === 'warning')).toBe(true);
    expect(outcome.study).not.toBeNull();
  });

  it('warns of slopes along a variable that no candidate uses', () => {
    const { text, places } = marked(
      changed(
        SMALL,
        'response: y',
        'derive: { z: { expression: x + 1 } }\nleave_out: [{ where: z > 9, because: Large }]\nresponse: y\ninference: { slopes_at: { «z»: [1] } }',
      ),
    );
    const outcome = read(text);
    expect(outcome.places).toEqual(places.map((place) => `${place} name_unused`));
    expect(outcome.problems[0]!.message).toBe(
      'inference.slopes_at.z gives places for the slopes of z, which no candidate uses.',
    );
    expect(outcome.study).not.toBeNull();
  });

  it('does not warn of declared variables that nothing uses, nor of a derived one that only a condition uses', () => {
    const text = changed(
      SMALL,
      'response: y',
      'derive:\n  a: { expression: x + 1 }\nleave_out: [{ where: a > 2, because: Large }]\nresponse: y',
    );
    expect(read(text).places).toEqual([]);
  });

  it('does not take values for unused where the candidates cannot be read', () => {
    const text = changed(SMALL, 'candidates:', 'candidtes:');
    const rows = changed(text, 'response: y', 'response: y\npredict: { rows: [{ label: A, x: 1 }] }');
    expect(read(rows).problems.filter(({ severity }) => severity === 'warning')).toEqual([]);
  });

  it('warns of a value that no candidate uses, a template of no format, and a term derived from the response', () => {
    const { text, places } = marked(
      changed(
        changed(
          SMALL,
          'response: y',
          'derive: { z: { expression: y / 2 } }\nresponse: y\npredict: { rows: [{ label: A, x: 1, y: 2, «f»: true }] }\nreport: { formats: [markdown], templates: { «html»: a.hbs } }',
        ),
        'terms: [x]',
        'terms: [x, «z»]',
      ),
    );
    const outcome = read(text);
    expect([...outcome.places].sort()).toEqual(
      [`${places[0]} name_unused`, `${places[1]} name_unused`, `${places[2]} type_unsuited`].sort(),
    );
    expect(outcome.study).not.toBeNull();
  });

  it.each([
    [
      'a number',
      '[k, «{ interaction: [x, k] }»]',
      'the interaction x × k, but x is no term of its own. It is then held to make no difference where k is at its baseline.',
    ],
    [
      'a category',
      '[x, «{ interaction: [x, k] }»]',
      'but k is no term of its own. It is then held to make no difference where x is 0, which is one common intercept for all its levels.',
    ],
    [
      'a flag beside a bend',
      '[x, «{ interaction: [{ bend: x, at: 3 }, f] }»]',
      'f is no term of its own. It is then held to make no difference where x is at most 3, which is one common intercept',
    ],
    [
      'both',
      '[«{ interaction: [x, f] }»]',
      'x and f are no terms of their own. Each is then held to make no difference where the other is 0 or at its baseline.',
    ],
    [
      'a pair',
      '[x, k, f, { interaction: [x, k] }, { interaction: [k, f] }, «{ interaction: [x, k, f] }»]',
      'but x × f is no term of its own. It is then held to make no difference where k is at its baseline.',
    ],
  ])('warns of an interaction without its parts, and goes on: %s', (_, terms, says) => {
    const { text, places } = marked(changed(SMALL, '[x]', terms));
    const outcome = read(text);
    expect(outcome.places).toEqual(places.map((place) => `${place} term_without_parts`));
    expect(outcome.problems[0]).toMatchObject({
      severity: 'warning',
      message: expect.stringContaining(says),
      hint: expect.stringContaining('This is allowed; add'),
    });
    expect(outcome.study).not.toBeNull();
  });

  it.each([
    '[{ polynomial: x, degree: 2 }, k, { interaction: [x, k] }]',
    '[{ power: x, to: 3 }, k, { interaction: [{ bend: x, at: 3 }, k] }]',
    '[{ spline: x, knots: [1, 2, 3] }, k, { interaction: [k, x] }]',
    '[{ bend: x, at: 5 }, { polynomial: x, degree: 3 }]',
  ])('takes any form of a variable for its part, and asks nothing of curves: %s', (terms) => {
    expect(read(changed(SMALL, '[x]', terms)).places).toEqual([]);
  });

  it('warns of a category without an intercept, whose baseline is held at zero', () => {
    const { text, places } = marked(changed(SMALL, '[x]', '[x, «k»]\n    intercept: false'));
    const outcome = read(text);
    expect(outcome.places).toEqual(places.map((place) => `${place} term_without_parts`));
    expect(outcome.problems[0]).toMatchObject({
      severity: 'warning',
      message: expect.stringContaining('Its baseline is then held at a response of zero'),
    });
    expect(outcome.study).not.toBeNull();
  });

  it('knows a comma inside braces that cuts a text short', () => {
    const text = changed(SMALL, 'response: y', 'derive:\n  z: { expression: min(x, 2) }\nresponse: y');
    const { problems, places } = read(text);
    expect(places).toContain('14:27+2 key_unknown');
    const hint = problems.find(({ code }) => code === 'key_unknown')?.hint;
    expect(hint).toBe('A text with a comma inside braces stands in quotes.');
  });

  it('says nothing more of a name whose own declaration is faulty', () => {
    expect(read(changed(SMALL, 'x: { type: number }', 'x: { type: numbre }')).places).toHaveLength(1);
    const text = changed(
      SMALL,
      'response: y',
      'derive:\n  a: { expression: x + }\n  b: { expression: a + 1 }\nresponse: y',
    );
    expect(
      read(changed(text, '[x]', '[a, b]')).places.filter((place) => !place.includes('expression_syntax')),
    ).toEqual([]);
  });

  it('tells everything at once: YAML, schema and meaning', () => {
    const text = changed(
      changed(
        changed(SMALL, 'title: Small', 'title: Small\ntitle: B'),
        'y: { type: number }',
        'y: { type: number, untis: L }',
      ),
      '[x]',
      '[x, xyz]',
    );
    expect(read(text).problems.map(({ code }) => code)).toEqual([
      'yaml_duplicate_key',
      'key_unknown',
      'name_unknown',
    ]);
  });

  it('refuses what is no mapping, and what is empty', () => {
    expect(read('a,b,c\n1,2,3\n').problems[0]).toMatchObject({
      code: 'value_not_allowed',
      hint: expect.stringContaining('data file'),
    });
    expect(read('- a\n').places).toEqual(['1:1+3 value_not_allowed']);
    for (const text of ['', '  \n', '\ufeff', '# only a comment\n', '---\n']) {
      expect(read(text).places[0]).toMatch(/study_unreadable$/);
    }
  });

  it('counts columns without a byte-order mark', () => {
    expect(read(`\ufeff${SMALL}`).problems).toEqual([]);
    expect(read(`\ufeff${changed(SMALL, 'plumbrule: 1', 'plumbrul: 1')}`).places[0]).toBe(
      '1:1+8 key_unknown',
    );
  });

  it('reads Windows line ends', () => {
    expect(read(SOUND.replaceAll('\n', '\r\n')).problems).toEqual([]);
    const { text, places } = marked(changed(SMALL, '[x]', '[x, «xq»]'));
    expect(read(text.replaceAll('\n', '\r\n')).places).toEqual([`${places[0]} name_unknown`]);
  });
});

describe('the codes of the study group', () => {
  it('are each provoked here or in read-study.test.ts', () => {
    const here = new Set([...CASES.map(({ code }) => code), 'name_unused', 'term_without_parts']);
    const elsewhere = [
      'study_unreadable',
      'study_not_utf8',
      'parameter_unknown',
      'parameter_value',
      'subsets_too_many',
    ];
    expect(STUDY_CODES.filter((code) => !here.has(code) && !elsewhere.includes(code))).toEqual([]);
  });
});

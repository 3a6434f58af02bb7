import { describe, expect, it } from 'vitest';
import type { FamilyPlan } from '../../src/study/study.ts';
import { changed, marked, read, SMALL } from './sample.ts';

/** SMALL with two numbers more and this element as its only candidate. */
function withFamily(element: string): string {
  const more = changed(
    SMALL,
    '    x: { type: number }\n',
    '    x: { type: number }\n    z: { type: number }\n    w: { type: number }\n',
  );
  return changed(more, '  - name: A\n    terms: [x]\n', `  - ${element}\n`);
}

function familyOf(element: string): FamilyPlan {
  const { study, problems } = read(withFamily(element));
  expect(problems.map(({ message }) => message)).toEqual([]);
  return study!.families[0]!;
}

describe('families of candidates', () => {
  it('are resolved with their defaults, beside named candidates', () => {
    const text = withFamily(
      '{ name: Loads, subsets_of: [x, z, k, { interaction: [x, k] }], always: [f] }\n  - name: A\n    terms: [x]',
    );
    const { study, problems } = read(text);
    expect(problems).toEqual([]);
    expect(study!.candidates.map(({ name, position }) => [name, position])).toEqual([['A', 1]]);
    const [family] = study!.families;
    expect(family).toMatchObject({
      kind: 'subsets',
      name: 'Loads',
      position: 0,
      atLeast: 1,
      atMost: 5,
      keep: 3,
      hierarchy: true,
      intercept: true,
      scale: { kind: 'natural' },
    });
    expect(family!.terms.map(({ always }) => always)).toEqual([true, false, false, false, false]);
    // The interaction needs both of its members.
    expect(family!.terms.map(({ needs }) => needs)).toEqual([[], [], [], [], [1, 3]]);
  });

  it('of elimination and selection have their limits', () => {
    const back = familyOf(
      '{ name: Back, eliminate_from: [x, z], leave_at: 0.1, scale: log, intercept: false }',
    );
    expect(back).toMatchObject({
      kind: 'backward',
      leaveAt: 0.1,
      enterAt: null,
      scale: { kind: 'log' },
      intercept: false,
    });
    const forth = familyOf('{ name: Forth, add_from: [x, z], always: [k], enter_at: 0.05, leave_at: 0.1 }');
    expect(forth).toMatchObject({ kind: 'forward', leaveAt: 0.1, enterAt: 0.05 });
  });

  it('know what a term contains', () => {
    const needsOf = (terms: string, more = '') =>
      familyOf(`{ name: F, subsets_of: [${terms}]${more} }`).terms.map(({ needs }) => needs);
    expect(needsOf('x, { power: x, to: 2 }, { power: x, to: 3 }')).toEqual([[], [0], [0, 1]]);
    expect(needsOf('{ polynomial: x, degree: 3 }')).toEqual([[]]);
    // A product of curves contains each curve, and the products of lower powers are columns of its own.
    expect(
      needsOf('{ polynomial: x, degree: 2 }, k, { interaction: [{ polynomial: x, degree: 2 }, k] }'),
    ).toEqual([[], [], [0, 1]]);
    expect(
      needsOf(
        'x, z, w, { interaction: [x, z] }, { interaction: [x, w] }, { interaction: [z, w] }, { interaction: [x, z, w] }',
      ).at(-1),
    ).toEqual([0, 1, 2, 3, 4, 5]);
    expect(needsOf('{ bend: x, at: 4 }')).toEqual([[]]);
    expect(needsOf('x, { interaction: [x, k] }', ', hierarchy: false')).toEqual([[], []]);
    expect(needsOf('{ spline: x, knots: [1, 2, 3] }, k, { interaction: [x, k] }').at(-1)).toEqual([0, 1]);
  });

  it('count as used what they name, and lend their names to acceptance', () => {
    const text = changed(
      withFamily('{ name: F, subsets_of: [x2, z] }'),
      'response: y',
      'derive: { x2: { expression: x ^ 2 } }\nresponse: y',
    );
    expect(read(`${text}acceptance: { chosen: [F, F 3a, F 12ab] }\n`).problems).toEqual([]);
    const wrong = read(`${text}acceptance: { chosen: [F 3, G] }\n`);
    expect(wrong.problems.map(({ message }) => message)).toEqual([
      'acceptance.chosen[0] names "F 3", which is not a candidate.',
      'acceptance.chosen[1] names "G", which is not a candidate.',
    ]);
  });
});

describe('a family that cannot be meant', () => {
  const names = Array.from({ length: 70 }, (_, i) => `v${i}`);
  const many = changed(
    SMALL,
    '    x: { type: number }\n',
    `    x: { type: number }\n${names.map((name) => `    ${name}: { type: number }\n`).join('')}`,
  );

  it.each([
    [
      '{ name: F, subsets_of: [x, z], always: [k, f], at_most: «1» }',
      'limit_nonsense',
      'candidates[0].at_most is 1, but always has 2 terms, which are counted.',
    ],
    [
      '{ name: F, subsets_of: [x, z], at_least: «2», at_most: 1 }',
      'limit_nonsense',
      'candidates[0].at_least is 2, but at_most is 1.',
    ],
    [
      '{ name: F, subsets_of: [x, z], at_least: «3» }',
      'limit_nonsense',
      'candidates[0].at_least is 3, but the family has only 2 terms.',
    ],
    [
      '{ name: F, subsets_of: [x], keep: «0» }',
      'limit_nonsense',
      'candidates[0].keep is 0, but must be at least 1 and at most 100.',
    ],
    [
      '{ name: F, subsets_of: [x, «z»], always: [z] }',
      'name_twice',
      'candidates[0].subsets_of[1] is the same term as candidates[0].always[0].',
    ],
    [
      '{ name: F, subsets_of: [x, «{ polynomial: x, degree: 2 }»] }',
      'name_twice',
      'candidates[0].subsets_of[1] brings in x itself, as does candidates[0].subsets_of[0].',
    ],
    [
      '{ name: F, add_from: [x, z], enter_at: «0.2», leave_at: 0.1 }',
      'limit_nonsense',
      'candidates[0].enter_at is 0.2, above leave_at (0.1): a term could enter and leave without end.',
    ],
    [
      '{ name: F, subsets_of: [x, «{ power: x, to: 3 }»] }',
      'hierarchy_impossible',
      'candidates[0].subsets_of[1] contains x to the power 2, which is no term of this family',
    ],
    [
      '{ name: F, subsets_of: [x, z], always: [«{ interaction: [x, z] }»] }',
      'hierarchy_impossible',
      'candidates[0].always[0] contains z, which candidates[0].subsets_of[1] lets be left out.',
    ],
    [
      '{ name: F, subsets_of: [x, «nothing»] }',
      'name_unknown',
      'candidates[0].subsets_of[1] names "nothing"',
    ],
    [
      '{ name: F, subsets_of: [x, «y»] }',
      'type_unsuited',
      'candidates[0].subsets_of[1] is of y, which is the response.',
    ],
    [
      '{ name: F, subsets_of: [x] }\n  - { name: «F», terms: [x] }',
      'candidate_twice',
      'candidates[1].name is "F", the name of candidates[0] already.',
    ],
    [
      '{ name: F, subsets_of: [x] }\n  - { name: «F 2a», terms: [x] }',
      'candidate_twice',
      'candidates[1].name is "F 2a", as a model found for "F" could be called.',
    ],
    ['{ name: F, «subsets_of»: [] }', 'limit_nonsense', 'candidates[0].subsets_of has no items'],
    ['«{ name: F, eliminate_from: [x] }»', 'key_missing', 'candidates[0] lacks the key leave_at.'],
    [
      '{ name: F, subsets_of: [x], «leave_at»: 0.1 }',
      'key_unknown',
      'candidates[0].leave_at is not a key here.',
    ],
    ['{ name: F, terms: [x], «at_most»: 1 }', 'key_unknown', 'candidates[0].at_most is not a key here.'],
    ['«{ name: F, subsets_off: [x] }»', 'value_not_allowed', 'Did you mean subsets_of?'],
  ])('%s', (element, code, says) => {
    const { text, places } = marked(withFamily(element));
    const outcome = read(text);
    expect(outcome.places).toEqual(places.map((place) => `${place} ${code}`));
    const [problem] = outcome.problems;
    expect(`${problem!.message} ${problem!.hint ?? ''}`).toContain(says);
    expect(outcome.study).toBeNull();
  });

  it('has too many subsets, and is told what would make it possible', () => {
    const family = (terms: readonly string[], more = '') =>
      read(
        changed(
          many,
          '  - name: A\n    terms: [x]\n',
          `  - { name: F, subsets_of: [${terms.join(', ')}]${more} }\n`,
        ),
      );
    const { problems } = family(names);
    expect(problems.map(({ code, message, hint }) => [code, message, hint])).toEqual([
      [
        'subsets_too_many',
        'candidates[0] stands for 1.2 × 10^21 subsets of 70 terms, more than can be searched.',
        'Write at_most: 21, or choose from no more than 59 terms.',
      ],
    ]);
    expect(family(names, ', at_most: 21').problems).toEqual([]);
    expect(family(names.slice(0, 59)).problems).toEqual([]);
  });
});

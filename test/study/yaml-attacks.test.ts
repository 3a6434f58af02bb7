import { describe, expect, it } from 'vitest';
import { nestedTooDeep } from '../../src/study/nesting.ts';
import { changed, read, SMALL } from './sample.ts';

describe('aliases', () => {
  it('stand for the value at their anchor, which is where its faults are', () => {
    const text = changed(SMALL, '[x]', '&both [x, k]\n  - name: B\n    terms: *both\n    scale: log');
    const { study, problems } = read(text);
    expect(problems).toEqual([]);
    expect(study!.candidates[1]!.terms).toEqual(study!.candidates[0]!.terms);
    const faulty = read(changed(text, '[x, k]', '[x, kk1]'));
    expect(faulty.places).toEqual(['16:22+3 name_unknown', '16:22+3 name_unknown']);
  });

  it('cannot grow without end', () => {
    const levels = Array.from(
      { length: 12 },
      (_, i) => `a${i + 1}: &a${i + 1} [${`*a${i}, `.repeat(9)}*a${i}]`,
    );
    const bomb = `a0: &a0 [x]\n${levels.join('\n')}\n`;
    const { problems, places, study } = read(bomb);
    expect(study).toBeNull();
    expect(problems).toHaveLength(1);
    expect(places[0]).toMatch(/yaml_alias_limit$/);
    expect(problems[0]!.message).toBe('Aliases repeat more values than any study needs.');
  });

  it('cannot nest without end', () => {
    const chain = Array.from({ length: 500 }, (_, i) => `a${i + 1}: &a${i + 1} [*a${i}]`);
    const { problems } = read(`a0: &a0 [x]\n${chain.join('\n')}\n`);
    expect(problems.map(({ code }) => code)).toEqual(['yaml_alias_limit']);
  });

  it('cannot be keys', () => {
    expect(read('a: &b c\n*b : 1\n').places).toEqual(['2:1+2 yaml_syntax']);
  });

  it('do not merge: a key << is a key like any other', () => {
    expect(read(`${SMALL}<<: { a: 1 }\n`).places).toEqual(['17:1+2 key_unknown']);
  });
});

describe('nesting', () => {
  // The parser runs out of stack on these, at worst ending the process, so they must not reach it.
  it.each([
    ['brackets', '['.repeat(100_000)],
    ['braces', '{a: '.repeat(100_000)],
    ['dashes', '- '.repeat(100_000)],
    ['question marks', '? '.repeat(100_000)],
    ['keys on a line', 'a: '.repeat(100_000)],
    ['keys in brackets over lines', `[${'a:\n '.repeat(10_000)}`],
    ['indentation', Array.from({ length: 2_000 }, (_, i) => `${' '.repeat(i)}a:`).join('\n')],
    ['lists in lists', Array.from({ length: 2_000 }, (_, i) => `${' '.repeat(i)}-`).join('\n')],
  ])('of %s is refused before it is parsed', (_, text) => {
    const { problems, study } = read(text);
    expect(study).toBeNull();
    expect(problems.map(({ code, message }) => [code, message])).toEqual([
      ['yaml_syntax', 'The text is nested too deeply for a study.'],
    ]);
  });

  it('points to where it becomes too deep', () => {
    expect(read(`title: x\nquestion: ${'['.repeat(200)}`).places).toEqual(['2:71+1 yaml_syntax']);
  });

  it('is not seen in what a study holds', () => {
    expect(nestedTooDeep(SMALL)).toBeNull();
    const list = `x: [${'{ a: 1 }, '.repeat(5_000)}]\n# ${'-'.repeat(300)}\n${'a: b\n'.repeat(300)}`;
    expect(nestedTooDeep(list)).toBeNull();
    expect(nestedTooDeep('')).toBeNull();
  });
});

describe('data types of YAML', () => {
  it('are those of version 1.2, whatever the file asks for', () => {
    const text = `%YAML 1.1\n---\n${changed(SMALL, 'f: { type: flag }', 'f: { type: flag, values: [no, yes] }')}`;
    expect(read(text).study!.data.variables.find(({ name }) => name === 'f')?.flagValues).toEqual([
      'no',
      'yes',
    ]);
  });

  it('leave cells as they are spelt', () => {
    const text = changed(
      SMALL,
      'levels: [low, high]',
      'levels: [007, 1.50, true, 0x1F, "", -0], missing: [9e9]',
    );
    const { study, problems } = read(changed(text, 'file: a.csv', 'file: a.csv\n  missing: []'));
    expect(problems).toEqual([]);
    const k = study!.data.variables.find(({ name }) => name === 'k')!;
    expect(k.levels).toEqual(['007', '1.50', 'true', '0x1F', '', '-0']);
    expect(k.missing).toEqual(['9e9']);
  });
});

import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { escapeMarkdown } from '../../src/report/markdown.ts';
import { type Rendered, type RenderOptions, render } from '../../src/report/render.ts';
import { compiledOverview, compiledTemplates } from '../../templates/generate.ts';
import { NASTY, sampleRecord, VARIANTS } from './sample-record.ts';

/** Renders and expects no problem. */
function reports(record: ReturnType<typeof sampleRecord>, options: RenderOptions = {}): Required<Rendered> {
  const problems: Problem[] = [];
  const made = render(record, options, (problem) => problems.push(problem));
  expect(problems).toEqual([]);
  return made as Required<Rendered>;
}

/** What a user's template gives, or the problems that it has. */
function withTemplate(html: string): { html: string | undefined; problems: Problem[] } {
  const problems: Problem[] = [];
  const record = sampleRecord();
  record.study.report.templates.html = 'mine.hbs';
  const made = render(record, { formats: ['html'], templateText: { html } }, (problem) =>
    problems.push(problem),
  );
  return { html: made.html, problems };
}

const HEADINGS = [
  'What data?',
  'What was tried?',
  'What does it say?',
  'Can it be trusted?',
  'What does it predict?',
  'What to be careful about',
  'How to get this again',
];

describe.each(VARIANTS)('report of the record: %s', (_, wish) => {
  const record = sampleRecord(wish);
  const { html, markdown } = reports(record);
  it('has all sections in order, each id once, each link a target', () => {
    const places = HEADINGS.map((heading) => html.indexOf(`</span> ${heading}</h2>`));
    expect(places.every((place) => place > 0)).toBe(true);
    expect([...places].sort((a, b) => a - b)).toEqual(places);
    const ids = [...html.matchAll(/ id="([^"]+)"/g)].map((m) => m[1]);
    expect(new Set(ids).size).toBe(ids.length);
    for (const [, target] of html.matchAll(/href="#([^"]+)"/g)) expect(ids).toContain(target);
  });
  it('is one file without scripts, network or a number gone wrong', () => {
    expect(html).not.toMatch(/<script|<link|<iframe|<img|\ssrc=|href="(?!#)|url\(|@import|\son\w+=/i);
    expect(html).not.toMatch(/NaN|undefined|\[object|Infinity/);
    expect(markdown).not.toMatch(/NaN|undefined|\[object|Infinity|<script/);
  });
  it('gives the same bytes again, also of a record that went through a file', () => {
    expect(reports(JSON.parse(JSON.stringify(record)))).toEqual({ html, markdown });
  });
  it('is small', () => {
    expect(Buffer.byteLength(html)).toBeLessThan(400_000);
    expect(Buffer.byteLength(markdown)).toBeLessThan(20_000);
  });
  it('has headed tables: a caption, column and row headers', () => {
    for (const [table] of html.matchAll(/<table[\s\S]*?<\/table>/g)) {
      expect(table).toMatch(/<caption>\S/);
      expect(table).toMatch(/<th scope="col"/);
      for (const [row] of table.slice(table.indexOf('<tbody>')).matchAll(/<tr[\s\S]*?<\/tr>/g))
        expect(row).toContain('<th scope="row"');
    }
  });
  it('has Markdown tables whose rows have as many cells as their heads', () => {
    const cells = (line: string): number => line.replace(/\\\|/g, '').split('|').length;
    let head = 0;
    for (const line of markdown.split('\n')) {
      if (!line.startsWith('|')) head = 0;
      else if (head === 0) head = cells(line);
      else expect(cells(line)).toBe(head);
    }
    expect(markdown).not.toMatch(/\n\n\n/);
  });
  it('uses no stars or symbols for p-values', () => {
    expect(html).not.toMatch(/p-value[^<]*<[^>]*>\s*\*/);
    expect(html.replace(/<style>[\s\S]*?<\/style>/, '')).not.toMatch(/\*\*|&lt; ?0\.0/);
  });
});

describe('names full of markup', () => {
  const record = sampleRecord({ vessels: NASTY, title: NASTY[0] });
  record.study.question = NASTY[2];
  record.study.caution = NASTY[0];
  record.data.file = NASTY[0];
  record.warnings.push({ about: NASTY[0], text: `\`${NASTY[0]}\` twice` });
  record.examination!.findings[0]!.verdict = NASTY[0];
  record.examination!.points.id[0] = NASTY[0];
  record.predictions[0]!.label = NASTY[1];
  const { html, markdown } = reports(record);
  it('stand as text in HTML, in attributes and drawings too', () => {
    expect(html).not.toContain('<script');
    expect(html).not.toContain('<b>bold');
    expect(html).toContain('&lt;script&gt;alert(1)&lt;/script&gt;');
    expect(html).toContain('<code>&lt;script&gt;');
  });
  it('stand as text in Markdown', () => {
    expect(markdown.replace(/```[\s\S]*```/, '')).not.toMatch(/<script|<b>/);
    expect(markdown).toContain('a\\|b\\*\\_\\`\\[x\\](y)');
  });
  it('cannot end the code block', () => {
    record.study.file = 'x\n```\n# heading.yaml';
    const text = reports(record).markdown;
    expect(text.match(/```/g)).toHaveLength(2);
    expect(text).not.toMatch(/^# heading/m);
  });
});

describe('escapeMarkdown', () => {
  it.each([
    ['a|b', 'a\\|b'],
    ['_x_ *y* `z`', '\\_x\\_ \\*y\\* \\`z\\`'],
    ['<b>&', '&lt;b&gt;&amp;'],
    ['- item', '\\- item'],
    ['1. item', '1\\. item'],
    ['1.5 L', '1.5 L'],
    ['# head', '\\# head'],
    ['two\r\nlines', 'two lines'],
    ['a\\b', 'a\\\\b'],
  ])('%j', (text, expected) => {
    expect(escapeMarkdown(text)).toBe(expected);
  });
});

describe('formats', () => {
  it('are those of the study where none are asked for', () => {
    const record = sampleRecord();
    record.study.report.formats = ['markdown'];
    expect(Object.keys(reports(record))).toEqual(['markdown']);
    expect(Object.keys(reports(record, { formats: ['html'] }))).toEqual(['html']);
    expect(reports(record, { formats: [] })).toEqual({});
  });
});

describe('the user’s own template', () => {
  it('gets the view, the helpers and the partials', () => {
    const { html, problems } = withTemplate(
      '<h1>{{title}}</h1>{{#each tried.candidates}}<li>{{name}} {{#if chosen}}!{{/if}}</li>{{/each}}{{#if tried.chart}}{{drawing tried.chart}}{{/if}}{{> beware-nothing}}{{#*inline "beware-nothing"}}{{join head.beware " / "}}{{/inline}}{{> data}}',
    );
    expect(problems).toEqual([]);
    expect(html).toContain('<h1>Fuel burned per crossing</h1>');
    expect(html).toContain('<li>Hull as well !</li>');
    expect(html).toContain('<svg class="chart"');
    expect(html).toContain('rows read from crossings.csv');
  });
  it('renders the program’s own text to the same bytes as the compiled template', () => {
    const own = readFileSync(new URL('../../templates/report.html.hbs', import.meta.url), 'utf8');
    expect(withTemplate(own).html).toBe(reports(sampleRecord()).html);
    const text = readFileSync(new URL('../../templates/report.md.hbs', import.meta.url), 'utf8');
    expect(
      reports(sampleRecord(), { formats: ['markdown'], templateText: { markdown: text } }).markdown,
    ).toBe(reports(sampleRecord()).markdown);
  });
  it.each([
    ['<p>\n{{#if title}}\n</p>', 3, 'cannot be read'],
    ['line\n  {{shout title}}', 2, 'no helper named "shout"'],
    ['{{#each tried.candidates}}\n{{loud name}}{{/each}}', 2, 'no helper named "loud"'],
    ['a\nb\n{{> nowhere}}', 3, 'no partial named "nowhere"'],
    ['a\n{{titel}}', 2, '"titel", which the view does not hold'],
    ['a\n{{head.nothing.at.all}}', 2, 'does not hold'],
    ['{{#with (evil title)}}x{{/with}}', 1, 'no helper named "evil"'],
    ['{{log "x"}}', 1, 'no helper named "log"'],
    ['{{#helperMissing}}x{{/helperMissing}}', 1, ''],
    ['{{#*inline "me"}}{{> me}}{{/inline}}{{> me}}', 1, 'calls itself without end'],
  ])('with a fault is template_broken at its line: %j', (text, line, message) => {
    const { html, problems } = withTemplate(text);
    expect(html).toBeUndefined();
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({
      code: 'template_broken',
      severity: 'error',
      place: { kind: 'source', file: 'mine.hbs', line },
    });
    expect(problems[0]!.message).toContain(message);
    expect(problems[0]!.message).toMatch(/\.$/);
  });
  it('is told of all its unknown helpers at once', () => {
    expect(withTemplate('{{a1 title}}\n{{b2 title}}').problems.map((p) => p.message)).toEqual([
      'There is no helper named "a1".',
      'There is no helper named "b2".',
    ]);
  });
  it.each([
    '{{constructor}}',
    '{{title.constructor}}',
    '{{head.answer.constructor.name}}',
    '{{__proto__}}',
    '{{lookup this "constructor"}}',
    '{{lookup title "toString"}}',
    '{{#with title}}{{#with constructor}}{{name}}{{/with}}{{/with}}',
    '{{@root.constructor}}',
  ])('cannot reach past the view: %s', (text) => {
    const { html } = withTemplate(text);
    expect(html ?? '').toBe('');
  });
  it('escapes what it prints', () => {
    const record = sampleRecord({ title: NASTY[0] });
    expect(
      reports(record, { formats: ['html'], templateText: { html: '{{title}} {{rich title}}' } }).html,
    ).not.toContain('<script');
  });
});

describe('the compiled templates', () => {
  it('are fresh', () => {
    expect(readFileSync(new URL('../../src/report/templates.generated.ts', import.meta.url), 'utf8')).toBe(
      compiledTemplates(),
    );
    expect(
      readFileSync(new URL('../../src/report/overview-templates.generated.ts', import.meta.url), 'utf8'),
    ).toBe(compiledOverview());
  });
});

/** Many runs against the records of many earlier ones: `fit --against` and `compare`. */
import { cp, mkdir, mkdtemp, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { inFolder, plumbrule } from './in-folder.ts';
import { EARLIER, LATER, wellsData, wellsStudy } from './wells.ts';

const CRITERIA =
  'acceptance: { coefficient_change: { at_most: 8 }, new_rows_inside: { at_least: 0.3 }, rows_used: { at_least: 5 } }\n';
/** On one line, without the line of the terminal and spaces that do not break. */
const plain = (text: string) => text.replace(/[\s│]+/g, ' ');
const json = async (...path: string[]) => JSON.parse(await readFile(join(...path), 'utf8'));

/** The rows of a CSV file by their first cell, each as an object; no cell here has a comma in it but `why`. */
async function overviewRows(folder: string): Promise<Record<string, Record<string, string>>> {
  const [head, ...lines] = (await readFile(join(folder, 'overview.csv'), 'utf8')).trim().split('\n');
  const cells = (line: string) => line.replace(/"[^"]*"/g, 'quoted').split(',');
  const names = cells(head!);
  return Object.fromEntries(
    lines.map((line) => [
      cells(line)[0]!,
      Object.fromEntries(cells(line).map((cell, index) => [names[index]!, cell])),
    ]),
  );
}

/** The first cells of the rows of a Markdown table under a heading, without their links. */
function namesUnder(markdown: string, heading: string): string[] {
  const [, section = ''] = markdown.split(`## ${heading}\n`);
  const rows = section.split('\n## ')[0]!.match(/^\| .*\|$/gm) ?? [];
  return rows.slice(1).map((row) =>
    row
      .split('|')[1]!
      .replace(/[[\]]|\(.*\)/g, '')
      .trim(),
  );
}

let home: string;
const at = (...names: string[]) => join(home, ...names);

describe('a study that repeats', () => {
  let refreshed: Awaited<ReturnType<typeof plumbrule>>;
  beforeAll(async () => {
    home = await mkdtemp(join(tmpdir(), 'plumbrule-many-'));
    await writeFile(at('wells.study.yaml'), wellsStudy(CRITERIA));
    await writeFile(at('wells.csv'), wellsData(EARLIER));
    await plumbrule('fit', at('wells.study.yaml'), '--out', at('earlier'));
    await cp(at('earlier'), at('results'), { recursive: true });
    await writeFile(at('wells.csv'), wellsData(LATER));
    refreshed = await plumbrule(
      ...['fit', at('wells.study.yaml'), '--out', at('results'), '--against', at('results')],
      ...['--junit', at('ci.xml')],
    );
  }, 60_000);
  afterAll(() => rm(home, { recursive: true }));

  test('is no earlier record of one run; the folder of one of them is', async () => {
    const one = wellsStudy().replace(/^repeat_for:.*\n/m, '');
    await writeFile(at('one.study.yaml'), one);
    const ran = await plumbrule('fit', at('one.study.yaml'), '--out', at('one'), '--against', at('earlier'));
    expect(ran.status).toBe(2);
    expect(plain(ran.err)).toContain('holds the records of other runs, each in its own folder');
    expect(ran.err).toContain(`such as "${at('earlier', 'Alder')}"`);
    expect(await readdir(home)).not.toContain('one');
  });

  test('is refreshed in place: kept, changed, missed, new, gone and failed levels', async () => {
    const ran = refreshed;
    expect(ran.status).toBe(2);
    expect(ran.err).toContain('Dogwood: ');
    expect(plain(ran.err)).toContain('One earlier record has no run now: "Elm". Nothing was deleted');
    // Nothing of what is no longer there or failed was touched.
    for (const name of ['Elm', 'Dogwood']) {
      expect(await readdir(at('results', name))).toEqual(await readdir(at('earlier', name)));
    }
    const order = ['Dogwood', 'Cedar', 'Birch', 'Gorse', 'Alder', 'Fir', 'Elm'];
    expect(
      [...ran.out.matchAll(/│ ([A-Z][a-z]+) {2,}(?:done|failed|crit|no l)/g)].map(([, name]) => name),
    ).toEqual(order);
    expect(plain(ran.out)).toContain(
      'Against the earlier records, 3 keep their choice, 1 chooses another candidate and 1 is new. 1 earlier record has no run now.',
    );

    const markdown = await readFile(at('results', 'overview.md'), 'utf8');
    expect(namesUnder(markdown, 'What changed since the earlier records?')).toEqual(order);
    expect(namesUnder(markdown, 'What came of each run?')).toEqual(LATER.map(({ name }) => name));
    expect(markdown).toContain(
      '| [Birch](Birch/comparison.html) | done | **changed: Flow to Flow and pressure** |',
    );
    expect(markdown).toContain('| Fir | done | **new: Flow** |');
    expect(markdown).toContain('| Elm | no longer there | **before: Flow** |');
    expect(markdown).toMatch(/^1\. \*\*Dogwood\*\*: failed\. .* It has an earlier record\.$/m);
    const html = await readFile(at('results', 'overview.html'), 'utf8');
    expect(html).toContain('<strong>Elm</strong>: no longer there');
    expect(html).toContain('<a href="Cedar/comparison.html">Cedar</a>');
    expect(html).not.toMatch(/NaN|undefined|\[object/);

    // The figures are those of the comparisons.
    const rows = await overviewRows(at('results'));
    const moves = order.slice(3, 5).map((name) => Math.abs(Number(rows[name]!.largest_move)));
    expect(moves[0]).toBeGreaterThan(moves[1]!);
    for (const name of ['Alder', 'Birch', 'Cedar', 'Gorse']) {
      const comparison = await json(at('results', name, 'comparison.json'));
      const { name: moved, in_standard_errors: by } = comparison.models[0].largest_change;
      expect(rows[name]).toMatchObject({
        against_earlier: comparison.choice.changed ? 'choice changed' : 'choice kept',
        chosen_before: comparison.earlier.chosen,
        largest_move_of: moved,
        largest_move: String(by),
        new_rows: '10',
        new_rows_inside: String(comparison.new_rows.inside),
        criteria_against_earlier: '2',
        comparison: `${name}/comparison.html`,
      });
    }
    expect(rows.Cedar).toMatchObject({
      outcome: 'criteria missed',
      criteria_against_earlier_met: '0',
      criteria_met: '1',
    });
    expect(rows.Dogwood).toMatchObject({ outcome: 'failed', against_earlier: 'not compared' });
    expect(rows.Fir).toMatchObject({ outcome: 'done', against_earlier: 'new', chosen_before: '' });
    expect(rows.Elm).toMatchObject({ outcome: 'no longer there', chosen_before: 'Flow', chosen: '' });

    const xml = await readFile(at('ci.xml'), 'utf8');
    // Missed: two of Cedar. Skipped: two of Fir, which has no earlier record, and what is no longer there.
    expect(xml).toContain('failures="2" errors="1" skipped="3"');
    expect(xml).toContain('<skipped message="There is an earlier record in Elm, and no run now."/>');
    expect(xml.match(/<testsuite /g)).toHaveLength(7);
  });

  test('the same against a copy gives the same bytes; a missed criterion alone is exit status 1', async () => {
    const fit = ['fit', at('wells.study.yaml'), '--out', at('beside'), '--against'];
    const ran = await plumbrule(...fit, at('earlier'));
    expect(ran.status).toBe(2);
    expect(plain(ran.err)).toContain('One earlier record has no run now: "Elm".');
    // It is nothing to these results, which go elsewhere.
    expect(ran.err).not.toContain('Nothing was deleted');
    for (const name of ['Alder', 'Birch', 'Cedar', 'Gorse', 'Fir']) {
      const compared = name === 'Fir' ? [] : ['comparison.json', 'comparison.md'];
      for (const file of ['record.json', 'report.html', ...compared]) {
        expect(await readFile(at('beside', name, file), 'utf8')).toBe(
          await readFile(at('results', name, file), 'utf8'),
        );
      }
    }
    expect(await readdir(at('beside', 'Fir'))).not.toContain('comparison.json');
    expect(await readdir(at('beside'))).not.toContain('Dogwood');

    await writeFile(at('wells.csv'), wellsData(LATER.filter(({ name }) => name !== 'Dogwood')));
    expect((await plumbrule(...fit, at('earlier'))).status).toBe(1);
    expect(await plumbrule(...fit, at('beside'), '--quiet')).toEqual({ status: 0, out: '', err: '' });
    expect(await readFile(at('beside', 'overview.md'), 'utf8')).toContain('No coefficient has moved.');
    await writeFile(at('wells.csv'), wellsData(LATER));
  });

  test('compare gives what fit --against gave, for each pair of two folders', async () => {
    await plumbrule('fit', at('wells.study.yaml'), '--out', at('later'));
    const ran = await plumbrule('compare', at('earlier'), at('later'), '--out', at('compared'));
    expect(ran.status).toBe(1);
    expect(plain(ran.err)).toContain('2 earlier records have no run now: "Dogwood", "Elm".');
    expect((await readdir(at('compared'))).sort()).toEqual([
      ...['Alder', 'Birch', 'Cedar', 'Gorse'],
      ...['overview.csv', 'overview.html', 'overview.md'],
    ]);
    for (const name of ['Alder', 'Birch', 'Cedar', 'Gorse']) {
      expect(await readFile(at('compared', name, 'comparison.json'), 'utf8')).toBe(
        await readFile(at('results', name, 'comparison.json'), 'utf8'),
      );
    }
    const [made, fitted] = [await overviewRows(at('compared')), await overviewRows(at('results'))];
    for (const column of [
      'against_earlier',
      'largest_move',
      'new_rows_inside',
      'criteria_against_earlier_met',
    ]) {
      expect(made.Birch![column]).toBe(fitted.Birch![column]);
    }
    const told = await plumbrule('compare', at('earlier'), at('later'), '--problems', 'json');
    expect(JSON.parse(told.out)).toMatchObject({ errors: 0, problems: [{ code: 'earlier_run_gone' }] });
    // Without a folder it is printed only; one of one format alone is one file each.
    const printed = await plumbrule('compare', at('earlier'), at('later'));
    expect(plain(printed.out)).toContain('Against the earlier records, 3 keep their choice');
    await plumbrule('compare', at('earlier'), at('later'), '--out', at('one'), '--format', 'markdown');
    expect(await readdir(at('one', 'Birch'))).toEqual(['comparison.md']);
    const refused = await plumbrule('compare', at('earlier'), at('later'), '--format', 'json');
    expect(refused).toMatchObject({ status: 2, out: '' });
    expect(refused.err).toContain('--format without --out prints one comparison');
  });

  test.each<[string, string[], RegExp]>([
    ['nothing', ['nowhere'], /--against names "[^"]*nowhere", and there is nothing there/],
    ['one record', ['earlier', 'Alder', 'record.json'], /and that is one record/],
    ['the folder of one record', ['earlier', 'Alder'], /and that is one record/],
    [
      'a folder without records',
      ['earlier', 'Alder', 'tables'],
      /and there is no record in the folders below it/,
    ],
  ])('against %s is refused before anything is run', async (_, path, message) => {
    const ran = await plumbrule(
      'fit',
      at('wells.study.yaml'),
      '--out',
      at('unwritten'),
      '--against',
      at(...path),
    );
    expect(ran).toMatchObject({ status: 2, out: '' });
    expect(plain(ran.err)).toMatch(message);
    expect(plain(ran.err)).toContain('Name the folder that an earlier run of the same went to');
    expect(await readdir(home)).not.toContain('unwritten');
  });

  test('compare refuses many against one', async () => {
    const ran = await plumbrule('compare', at('earlier'), at('earlier', 'Alder'));
    expect(ran).toMatchObject({ status: 2, out: '' });
    expect(plain(ran.err)).toContain(
      'holds the records of many runs, each in its own folder, and the other is one',
    );
  });

  test('a damaged earlier record fails its run and no other; one of another level is not compared with', async () => {
    await cp(at('earlier'), at('spoilt'), { recursive: true });
    await writeFile(at('spoilt', 'Alder', 'record.json'), '{');
    await rm(at('spoilt', 'Birch'), { recursive: true });
    await cp(at('earlier', 'Elm'), at('spoilt', 'Birch'), { recursive: true });
    const ran = await plumbrule(
      'fit',
      at('wells.study.yaml'),
      '--out',
      at('after'),
      '--against',
      at('spoilt'),
    );
    expect(ran.status).toBe(2);
    expect(plain(ran.err)).toContain('Alder: The record is not JSON');
    expect(plain(ran.err)).toContain(
      'This earlier record is of the level "Elm", so that the run of "Birch" is not compared',
    );
    const rows = await overviewRows(at('after'));
    expect(rows.Alder).toMatchObject({ outcome: 'failed', against_earlier: 'not compared' });
    expect(rows.Birch).toMatchObject({ outcome: 'done', against_earlier: 'new' });
    expect(rows.Gorse).toMatchObject({ outcome: 'done', against_earlier: 'choice kept' });
    expect(await readdir(at('after'))).not.toContain('Alder');
    const compared = await plumbrule('compare', at('spoilt'), at('results'));
    expect(compared.status).toBe(2);
    expect(plain(compared.out)).toMatch(/Alder failed not compared/);
  });

  test('a record whose move into its folder was cut short is an earlier record', async () => {
    await cp(at('earlier'), at('cut'), { recursive: true });
    const hidden = at('cut', 'Gorse', '.plumbrule-cut');
    await mkdir(join(hidden, 'new'), { recursive: true });
    await rename(at('cut', 'Gorse', 'record.json'), join(hidden, 'new', 'record.json'));
    await writeFile(join(hidden, 'forward.json'), JSON.stringify({ coming: ['record.json'], gone: [] }));
    await plumbrule('fit', at('wells.study.yaml'), '--out', at('uncut'), '--against', at('cut'));
    expect((await overviewRows(at('uncut'))).Gorse).toMatchObject({ against_earlier: 'choice kept' });
  });

  test('a study that cannot be read loses no level', async () => {
    await writeFile(at('wells.csv'), 'reading,lift\n');
    const ran = await plumbrule(
      ...[
        'fit',
        at('wells.study.yaml'),
        '--out',
        at('unread'),
        '--against',
        at('earlier'),
        '--problems',
        'json',
      ],
    );
    expect(ran.status).toBe(2);
    expect(ran.out).not.toContain('earlier_run_gone');
    expect(ran.out).not.toContain('record_unreadable');
    await writeFile(at('wells.csv'), wellsData(LATER));
  });

  test('rows that were not kept leave the choice to be told', async () => {
    await inFolder(
      { 'wells.study.yaml': wellsStudy('report: { keep_sample: false }\n'), 'wells.csv': wellsData(EARLIER) },
      async (folder) => {
        const args = ['fit', join(folder, 'wells.study.yaml'), '--out', join(folder, 'out')];
        await plumbrule(...args);
        const ran = await plumbrule(...args, '--against', join(folder, 'out'));
        expect(ran.status).toBe(0);
        expect(plain(ran.out)).toContain(
          'In 6 runs rows were not kept, so that moves and new rows cannot be told.',
        );
      },
    );
  });
});

test('several studies, one of which repeats, are held against the records at the same places', async () => {
  const one = (name: string) =>
    wellsStudy().replace('repeat_for: well\n', '').replace('Lift of the wells', name);
  const files = {
    'all.study.yaml': one('All wells'),
    'old.study.yaml': one('To be dropped'),
    'wells.study.yaml': wellsStudy(),
    'wells.csv': wellsData(EARLIER),
  };
  await inFolder(files, async (folder) => {
    const out = join(folder, 'results');
    await plumbrule('fit', folder, '--out', out);
    await writeFile(join(folder, 'wells.csv'), wellsData(LATER));
    await rm(join(folder, 'old.study.yaml'));
    await writeFile(join(folder, 'young.study.yaml'), one('A new one'));
    const ran = await plumbrule('fit', folder, '--out', out, '--against', out);
    expect(ran.status).toBe(2);
    expect(plain(ran.err)).toContain('2 earlier records have no run now: "old", "wells, Elm".');
    expect(plain(ran.err)).toContain('in old/, wells/Elm/. Remove');
    const rows = await readFile(join(out, 'overview.md'), 'utf8');
    expect(namesUnder(rows, 'What changed since the earlier records?')).toEqual([
      'wells, Dogwood',
      'wells, Birch',
      'wells, Cedar',
      'all',
      'wells, Gorse',
      'wells, Alder',
      'wells, Fir',
      'young',
      'old',
      'wells, Elm',
    ]);
    expect(rows).toContain('](wells/Birch/comparison.html)');
  });
});

describe('templates of one’s own for a comparison', () => {
  const REPORT = 'report: { formats: [markdown], templates: { comparison: { markdown: own.hbs } } }\n';
  const files = {
    'wells.study.yaml': wellsStudy(REPORT),
    'wells.csv': wellsData(EARLIER.slice(0, 2)),
    'own.hbs': 'Mine: {{title}}. {{join choice " "}}{{#each models}} {{finding}}{{/each}}',
  };
  const fitted = (folder: string, ...args: string[]) =>
    plumbrule('fit', join(folder, 'wells.study.yaml'), '--out', join(folder, 'out'), ...args);

  test('are used by fit --against; compare takes one from the command line and says so', async () => {
    await inFolder(files, async (folder) => {
      await fitted(folder);
      await cp(join(folder, 'out'), join(folder, 'first'), { recursive: true });
      expect((await fitted(folder, '--against', join(folder, 'first'))).status).toBe(0);
      const alder = join(folder, 'out', 'Alder');
      const mine = await readFile(join(alder, 'comparison.md'), 'utf8');
      expect(mine).toMatch(
        /^Mine: Lift of the wells: well Alder\. Flow is chosen again\. No coefficient has changed\.\n$/,
      );
      // The page is the program's own still, and so is the report.
      expect(await readFile(join(alder, 'comparison.html'), 'utf8')).toContain(
        'What moved each coefficient?',
      );
      expect(await readFile(join(alder, 'report.md'), 'utf8')).toContain('## What was tried?');
      expect((await json(alder, 'record.json')).study.report.templates).toEqual({
        html: null,
        markdown: null,
        comparison: { html: null, markdown: 'own.hbs' },
      });

      const pair = [join(folder, 'first', 'Alder'), alder];
      const without = await plumbrule('compare', ...pair, '--format', 'markdown');
      expect(plain(without.err)).toContain("Warning: The study's own template for markdown is not used");
      expect(without.out).toContain('## Is the choice the same?');
      const own = ['--format', 'markdown', '--template', join(folder, 'own.hbs')];
      expect(await plumbrule('compare', ...pair, ...own)).toEqual({ status: 0, err: '', out: mine });
      expect((await plumbrule('compare', ...pair)).err).toBe('');
      const both = await plumbrule(
        'compare',
        ...pair,
        '--out',
        folder,
        '--template',
        join(folder, 'own.hbs'),
      );
      expect([both.status, both.err]).toEqual([2, expect.stringContaining('--template is for one format')]);

      const roots = [join(folder, 'first'), join(folder, 'out'), '--out', join(folder, 'compared')];
      const many = await plumbrule('compare', ...roots);
      expect(many.err.match(/own template for markdown/g)).toHaveLength(1);
      expect((await plumbrule('compare', ...roots, ...own)).err).toBe('');
      expect(await readFile(join(folder, 'compared', 'Alder', 'comparison.md'), 'utf8')).toBe(mine);
      const refused = await plumbrule('compare', ...roots, '--template', join(folder, 'own.hbs'));
      expect([refused.status, refused.err]).toEqual([
        2,
        expect.stringContaining('--template is for one format'),
      ]);
    });
  });

  test.each([
    ['{{title}}\n{{titel}}', 2, /own\.hbs:2:\d+ .*asks for "titel", which the view does not hold/],
    ['\n\n{{> data}}{{> nothing}}', 3, /own\.hbs:3:\d+ .*no partial named "nothing"/],
    ['{{#each models}}\n{{finding.text.more}}{{/each}}', 2, /own\.hbs:2:\d+ .*finding\.text/],
    ['{{#if}}', 1, /own\.hbs:1:\d+/],
  ])('a fault is told with its line, and nothing is written: %j', async (text, line, message) => {
    await inFolder({ ...files, 'own.hbs': text }, async (folder) => {
      await fitted(folder);
      const before = await readFile(join(folder, 'out', 'Alder', 'record.json'), 'utf8');
      await writeFile(join(folder, 'wells.csv'), wellsData(LATER.slice(0, 2)));
      const ran = await fitted(folder, '--against', join(folder, 'out'));
      expect(ran.status).toBe(2);
      expect(plain(ran.err)).toMatch(message);
      expect(plain(ran.err)).toContain(` ${line} | `);
      expect(await readFile(join(folder, 'out', 'Alder', 'record.json'), 'utf8')).toBe(before);
    });
  });

  test('one that is not there is told; one with a path from the root is refused', async () => {
    const { 'own.hbs': _, ...without } = files;
    await inFolder(without, async (folder) => {
      await fitted(folder);
      const ran = await fitted(folder, '--against', join(folder, 'out'));
      expect([ran.status, plain(ran.err)]).toEqual([
        2,
        expect.stringContaining('The template cannot be read'),
      ]);
      await writeFile(join(folder, 'wells.study.yaml'), wellsStudy(REPORT.replace('own.hbs', '/own.hbs')));
      expect(plain((await fitted(folder)).err)).toContain(
        'report.templates.comparison.markdown is "/own.hbs"',
      );
    });
  });
});

describe('the report of a run that was held against an earlier record', () => {
  test('shows the verdicts, and render gives it again where the comparison lies beside the record', async () => {
    const files = { 'wells.study.yaml': wellsStudy(CRITERIA), 'wells.csv': wellsData(EARLIER) };
    await inFolder(files, async (folder) => {
      const study = join(folder, 'wells.study.yaml');
      const [out, cedar] = [join(folder, 'out'), join(folder, 'out', 'Cedar')];
      await plumbrule('fit', study, '--out', out);
      expect(await readFile(join(cedar, 'report.md'), 'utf8')).toContain('needs an earlier record');
      await writeFile(join(folder, 'wells.csv'), wellsData(LATER));
      await plumbrule('fit', study, '--out', out, '--against', out);
      const report = await readFile(join(cedar, 'report.md'), 'utf8');
      const said = plain(report);
      expect(said).toContain(
        'Against the earlier record 2 of 2 criteria are missed; comparison.html says what changed.',
      );
      expect(said).toMatch(
        /- missed: Largest change of a coefficient 12\.\d+ standard errors; asked for: at most 8/,
      );
      expect(report).not.toContain('needs an earlier record');
      expect(plain(await readFile(join(out, 'Alder', 'report.md'), 'utf8'))).toContain(
        'Against the earlier record all 2 criteria are met',
      );

      const rendered = async (name: string) => {
        const again = join(folder, name);
        const { status, err } = await plumbrule('render', join(cedar, 'record.json'), '--out', again);
        expect(status).toBe(0);
        return {
          err,
          markdown: await readFile(join(again, 'report.md'), 'utf8'),
          html: await readFile(join(again, 'report.html'), 'utf8'),
        };
      };
      expect(await rendered('again')).toEqual({
        err: '',
        markdown: report,
        html: await readFile(join(cedar, 'report.html'), 'utf8'),
      });
      // A comparison of another record says nothing of this one; one that is damaged is told.
      await cp(join(out, 'Alder', 'comparison.json'), join(cedar, 'comparison.json'));
      const other = await rendered('other');
      expect(other.err).toBe('');
      expect(other.markdown).toContain('needs an earlier record');
      for (const text of ['{', '{"format":"plumbrule-comparison/1","later":{},"acceptance":[{}]}', '[]']) {
        await writeFile(join(cedar, 'comparison.json'), text);
        const damaged = await rendered('damaged');
        expect(plain(damaged.err)).toContain('Warning: The comparison beside the record is damaged');
        expect(damaged.markdown).toBe(other.markdown);
      }
      // Where no row is new, that is said.
      await plumbrule('fit', study, '--out', out, '--against', out);
      expect(plain(await readFile(join(cedar, 'report.md'), 'utf8'))).toContain(
        'not judged: Share of the new rows inside the earlier prediction intervals no row is new',
      );
    });
  });
});

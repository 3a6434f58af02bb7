/** The parameters of a run stand where a reader learns how to get it again. */
import { expect, test } from 'vitest';
import type { StudyRecord } from '../../src/report/record-type.ts';
import { render } from '../../src/report/render.ts';
import type { ReportFormat } from '../../src/report/template-names.ts';
import { smallRecord } from '../record/small-record.ts';

function rendered(record: StudyRecord, format: ReportFormat): string {
  const made = render(record, { formats: [format] }, ({ message }) => {
    throw new Error(message);
  });
  return made[format]!;
}

const withParameters = () => {
  const record = smallRecord();
  return {
    ...record,
    study: {
      ...record.study,
      parameters: [
        { name: 'file', value: "may's rows.csv", default: 'a.csv', given: true },
        { name: 'least', value: 0.75, default: 0.75, given: false },
        { name: 'day', value: '2026-05-01', default: '2026-04-01', given: true },
      ],
    },
  };
};

test('the command gives what was given, and the table has all', () => {
  const markdown = rendered(withParameters(), 'markdown');
  expect(markdown).toContain(
    "npx plumbrule fit small.study.yaml --with 'file=may'\\''s rows.csv' --with day=2026-05-01\n",
  );
  expect(markdown).toContain(
    "| file | may's rows.csv | a.csv | given |\n| least | 0.75 | 0.75 | default |\n",
  );
  const html = rendered(withParameters(), 'html');
  const again = html.slice(html.indexOf('id="again"'));
  expect(again).toContain('<caption>Parameters</caption>');
  expect(again).toContain('<tr><th scope="row">least</th><td>0.75</td><td>0.75</td><td>default</td></tr>');
  expect(again).toContain('--with day&#x3D;2026-05-01');
});

test('a study without parameters has no such table', () => {
  for (const format of ['markdown', 'html'] as const) {
    const text = rendered(smallRecord(), format);
    expect(text).not.toMatch(/value in this run|--with/);
  }
});

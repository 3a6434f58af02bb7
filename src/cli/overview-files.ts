import { packageVersion } from '../package-file.ts';
import type { ResultFile } from '../record/write-results.ts';
import type { Overview } from '../report/overview.ts';
import { renderOverview } from '../report/render-overview.ts';
import { overviewTable } from './overview-table.ts';

export const OVERVIEW_FILES = ['overview.html', 'overview.md', 'overview.csv'] as const;

/** Many runs beside one another, as files to be written. */
export function overviewFiles(overview: Overview): ResultFile[] {
  const tool = `plumbrule ${packageVersion()}`;
  return [
    { name: 'overview.html', content: renderOverview(tool, overview, 'html') },
    { name: 'overview.md', content: renderOverview(tool, overview, 'markdown') },
    { name: 'overview.csv', content: overviewTable(overview) },
  ];
}

import { packageVersion } from '../package-file.ts';
import type { ResultFile } from '../record/write-results.ts';
import type { OverviewEntry } from '../report/overview.ts';
import { renderOverview } from '../report/render-overview.ts';
import { overviewTable } from './overview-table.ts';

export const OVERVIEW_FILES = ['overview.html', 'overview.md', 'overview.csv'] as const;

/** Many runs beside one another, as files to be written. */
export function overviewFiles(title: string, entries: readonly OverviewEntry[]): ResultFile[] {
  const tool = `plumbrule ${packageVersion()}`;
  return [
    { name: 'overview.html', content: renderOverview(title, tool, entries, 'html') },
    { name: 'overview.md', content: renderOverview(title, tool, entries, 'markdown') },
    { name: 'overview.csv', content: overviewTable(entries) },
  ];
}

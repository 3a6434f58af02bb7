import { mapped } from './markdown.ts';
import type { OverviewEntry } from './overview.ts';
import { OVERVIEW_HTML, OVERVIEW_MARKDOWN } from './overview-templates.generated.ts';
import type { OverviewView } from './overview-view.ts';
import { fillTemplate, type ReportFormat, type TemplateSpecification, tidied } from './render.ts';
import { overviewView } from './view/overview.ts';

/** Runs beside one another, as a page or as Markdown. `tool` is the program's name and version. */
export function renderOverview(
  title: string,
  tool: string,
  entries: readonly OverviewEntry[],
  format: ReportFormat,
): string {
  const view = overviewView(title, tool, entries);
  if (format === 'html') return fillTemplate(OVERVIEW_HTML as TemplateSpecification, view);
  const seen = withLinks(mapped(view) as OverviewView, view);
  return tidied(fillTemplate(OVERVIEW_MARKDOWN as TemplateSpecification, seen));
}

/** Addresses as they are: encoded already, but for what would end a link. */
function withLinks(view: OverviewView, { runs }: OverviewView): OverviewView {
  return {
    ...view,
    runs: view.runs.map((run, index) => ({
      ...run,
      link: runs[index]!.link?.replace(/[()]/g, (mark) => (mark === '(' ? '%28' : '%29')) ?? null,
    })),
  };
}

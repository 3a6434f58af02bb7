import { fillTemplate, type TemplateSpecification } from './fill-template.ts';
import { mapped } from './markdown.ts';
import type { Overview } from './overview.ts';
import { OVERVIEW_HTML, OVERVIEW_MARKDOWN } from './overview-templates.generated.ts';
import type { OverviewView } from './overview-view.ts';
import { tidied } from './render.ts';
import type { ReportFormat } from './template-names.ts';
import { overviewView } from './view/overview.ts';

/** Runs beside one another, as a page or as Markdown. `tool` is the program's name and version. */
export function renderOverview(tool: string, overview: Overview, format: ReportFormat): string {
  const view = overviewView(tool, overview);
  if (format === 'html') return fillTemplate(OVERVIEW_HTML as TemplateSpecification, view);
  const seen = withLinks(mapped(view) as OverviewView, view);
  return tidied(fillTemplate(OVERVIEW_MARKDOWN as TemplateSpecification, seen));
}

/** Addresses as they are: encoded already, but for what would end a link. */
function withLinks(view: OverviewView, { runs, changes }: OverviewView): OverviewView {
  return {
    ...view,
    runs: view.runs.map((run, index) => ({ ...run, link: address(runs[index]!.link) })),
    changes:
      view.changes === null
        ? null
        : {
            ...view.changes,
            rows: view.changes.rows.map((row, index) => ({
              ...row,
              link: address(changes!.rows[index]!.link),
            })),
          },
  };
}

function address(link: string | null): string | null {
  return link?.replace(/[()]/g, (mark) => (mark === '(' ? '%28' : '%29')) ?? null;
}

import { createRequire } from 'node:module';
import type Handlebars from 'handlebars';
import type { Report } from '../problem.ts';
import { faultThrown, type TemplateFault, templateFaults } from './check-template.ts';
import { HELPER_NAMES, helpers } from './helpers.ts';
import { markdownView } from './markdown.ts';
import type { StudyRecord } from './record-type.ts';
import { HTML, MARKDOWN, PARTIALS } from './templates.generated.ts';
import { buildView } from './view/build-view.ts';
import type { ReportView } from './view.ts';

export type ReportFormat = 'html' | 'markdown';

export interface RenderOptions {
  /** Formats to render; those that the record's study asks for where left out. */
  readonly formats?: readonly ReportFormat[];
  /** The text of the user's own templates; the program's own where left out. */
  readonly templateText?: { readonly html?: string; readonly markdown?: string };
}

export interface Rendered {
  readonly html?: string;
  readonly markdown?: string;
}

const require = createRequire(import.meta.url);

/** Access to anything but a value's own keys is off, also for the user's own templates. */
const WALLS = {
  allowProtoPropertiesByDefault: false,
  allowProtoMethodsByDefault: false,
} as const;

/**
 * Reports of a record, from the record and nothing else. The same record gives the same bytes. A user's
 * template that cannot be compiled or run is reported as `template_broken`, and its format is left out.
 */
export function render(record: StudyRecord, options: RenderOptions, report: Report): Rendered {
  const formats = options.formats ?? record.study.report.formats;
  const view = buildView(record);
  const result: { html?: string; markdown?: string } = {};
  for (const format of formats) {
    const seen = format === 'markdown' ? markdownView(view) : view;
    const text = options.templateText?.[format];
    const made =
      text === undefined
        ? ownTemplate(format, seen)
        : userTemplate(
            format,
            text,
            record.study.report.templates[format] ?? `template for ${format}`,
            seen,
            report,
          );
    if (made !== null) result[format] = format === 'markdown' ? tidied(made) : made;
  }
  return result;
}

/** The program's own templates, compiled ahead of time: only the small run-time part of Handlebars is loaded. */
function ownTemplate(format: ReportFormat, view: ReportView): string {
  return fillTemplate((format === 'html' ? HTML : MARKDOWN) as TemplateSpecification, view);
}

/** A template compiled ahead of time, filled from its view. */
export function fillTemplate(template: TemplateSpecification, view: object): string {
  const handlebars = environment(require('handlebars/dist/handlebars.runtime.min.js') as typeof Handlebars);
  return handlebars.template(template)(view, WALLS);
}

function userTemplate(
  format: ReportFormat,
  text: string,
  file: string,
  view: ReportView,
  report: Report,
): string | null {
  const handlebars = environment(require('handlebars') as typeof Handlebars);
  const broken = ({ message, line, column }: TemplateFault): null => {
    report({
      code: 'template_broken',
      severity: 'error',
      place: { kind: 'source', file, line, column, length: 1 },
      message,
    });
    return null;
  };
  let program: ReturnType<typeof Handlebars.parse> | null = null;
  try {
    program = handlebars.parse(text);
    const faults = templateFaults(program, new Set(Object.keys(PARTIALS)));
    if (faults.length > 0) {
      for (const fault of faults) broken(fault);
      return null;
    }
    return handlebars.compile(text, { strict: true, noEscape: format === 'markdown' })(view, WALLS);
  } catch (fault) {
    return broken(faultThrown(fault, program));
  }
}

export type TemplateSpecification = Parameters<typeof Handlebars.template>[0];

/** A Handlebars of its own with our helpers and partials and nothing else. */
function environment(base: typeof Handlebars): typeof Handlebars {
  const handlebars = base.create();
  // `log` writes to the console, the two hooks are for calls that a template must not make.
  for (const name of Object.keys(handlebars.helpers)) {
    if (!HELPER_NAMES.has(name) && name !== 'helperMissing' && name !== 'blockHelperMissing')
      handlebars.unregisterHelper(name);
  }
  const ours = helpers((html) => new handlebars.SafeString(html) as unknown as { toHTML(): string });
  for (const [name, helper] of Object.entries(ours)) handlebars.registerHelper(name, helper);
  for (const [name, partial] of Object.entries(PARTIALS)) {
    handlebars.registerPartial(name, handlebars.template(partial as TemplateSpecification));
  }
  return handlebars;
}

/** At most one empty line in a row, none at the ends: what an `{{#if}}` leaves behind. */
export function tidied(markdown: string): string {
  return `${markdown
    .replace(/[ \t]+$/gm, '')
    .replace(/\n{3,}/g, '\n\n')
    .trim()}\n`;
}

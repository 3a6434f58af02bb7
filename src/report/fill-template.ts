import { createRequire } from 'node:module';
import type Handlebars from 'handlebars';
import type { Report } from '../problem.ts';
import { faultThrown, type TemplateFault, templateFaults } from './check-template.ts';
import { HELPER_NAMES, helpers } from './helpers.ts';
import { PARTIALS } from './templates.generated.ts';

const require = createRequire(import.meta.url);

/** Access to anything but a value's own keys is off, also for the user's own templates. */
const WALLS = {
  allowProtoPropertiesByDefault: false,
  allowProtoMethodsByDefault: false,
} as const;

export type TemplateSpecification = Parameters<typeof Handlebars.template>[0];

/** A template compiled ahead of time, filled from its view: only the small run-time part of Handlebars is loaded. */
export function fillTemplate(template: TemplateSpecification, view: object): string {
  own ??= environment(require('handlebars/dist/handlebars.runtime.min.js') as typeof Handlebars);
  return own.template(template)(view, WALLS);
}

/** Made once: a study that repeats fills the program's templates for each of its runs, and nothing in them changes it. */
let own: typeof Handlebars | undefined;

/**
 * A template of the user's own, filled from its view; null where it cannot be compiled or run, each fault of which is
 * reported as `template_broken`.
 *
 * @param file the name under which problems know it
 * @param markdown whether the view is escaped already
 */
export function fillOwnTemplate(
  text: string,
  file: string,
  markdown: boolean,
  view: object,
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
    return handlebars.compile(text, { strict: true, noEscape: markdown })(view, WALLS);
  } catch (fault) {
    return broken(faultThrown(fault, program));
  }
}

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

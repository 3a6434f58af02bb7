import type { ErrorObject } from 'ajv';
import type { Path } from './path.ts';

interface Located {
  readonly error: ErrorObject;
  readonly path: Path;
}

interface ObjectSchema {
  readonly properties?: Readonly<Record<string, unknown>>;
  readonly required?: readonly string[];
}

/**
 * Where a value fits no branch of a union, every branch complains. Keeps, in place of the pile, the complaints
 * of the branch that the value was meant for (the one whose first required key it has), or else the union's own
 * single complaint. Branches are told apart by their keys, which no two branches of one union share.
 */
export function chooseBranches(errors: readonly Located[]): readonly Located[] {
  const kept: Located[] = [];
  for (const each of errors) {
    if (each.error.keyword !== 'anyOf') {
      kept.push(each);
      continue;
    }
    // The complaints of the branches come before that of their union.
    const inside = kept.filter(({ error }) => isWithin(error, each.error));
    const outside = kept.filter(({ error }) => !isWithin(error, each.error));
    kept.splice(0, kept.length, ...outside, ...complaintsOf(each, inside));
  }
  return kept;
}

function isWithin(error: ErrorObject, union: ErrorObject): boolean {
  return error.instancePath === union.instancePath || error.instancePath.startsWith(`${union.instancePath}/`);
}

function complaintsOf(union: Located, inside: readonly Located[]): readonly Located[] {
  const data = union.error.data as unknown;
  if (typeof data !== 'object' || data === null || Array.isArray(data)) return [union];
  const atTop = inside.filter(({ error }) => error.instancePath === union.error.instancePath);
  const deeper = inside.filter(({ error }) => error.instancePath !== union.error.instancePath);
  for (const { error } of atTop) {
    const branch = error.parentSchema as ObjectSchema;
    const first = branch.required?.[0];
    if (first === undefined || !Object.hasOwn(data, first)) continue;
    const own = atTop.filter((each) => (each.error.parentSchema as ObjectSchema).required?.[0] === first);
    return [
      ...own,
      ...deeper.filter(({ path }) => Object.hasOwn(branch.properties ?? {}, path[union.path.length]!)),
    ];
  }
  return deeper.length > 0 ? deeper : [union];
}

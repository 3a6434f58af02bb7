/** The part of JSON Schema 2020-12 that the schemas here use. */
export interface JsonSchema {
  readonly title?: string;
  readonly description?: string;
  readonly $ref?: string;
  readonly type?: string | readonly string[];
  readonly enum?: readonly unknown[];
  readonly const?: unknown;
  readonly default?: unknown;
  readonly examples?: readonly unknown[];
  readonly properties?: Readonly<Record<string, JsonSchema>>;
  readonly required?: readonly string[];
  readonly additionalProperties?: boolean | JsonSchema;
  readonly items?: JsonSchema;
  readonly anyOf?: readonly JsonSchema[];
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
  readonly exclusiveMaximum?: number;
  readonly $defs?: Readonly<Record<string, JsonSchema>>;
}

/** A schema with its `$ref` followed; what stands beside the `$ref` wins. */
export function resolved(schema: JsonSchema, root: JsonSchema): JsonSchema {
  if (schema.$ref === undefined) return schema;
  const { $ref, ...beside } = schema;
  const target = root.$defs?.[definitionName($ref)];
  if (target === undefined) throw new Error(`${$ref} is not in $defs.`);
  return { ...resolved(target, root), ...beside };
}

/** "term" of "#/$defs/term". */
export function definitionName(ref: string): string {
  return ref.slice(ref.lastIndexOf('/') + 1);
}

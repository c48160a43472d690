/** As much of JSON Schema (draft 2020-12) as the job's schema uses: every way in which a value breaks it. */
export type Schema = Readonly<Record<string, unknown>>;

/** Words that say nothing about the value. */
const REMARKS = new Set(['$schema', 'description', 'examples', 'title', 'default']);

type Judge = (wanted: never, value: unknown, schema: Schema, path: string) => readonly string[];

const JUDGES: Readonly<Record<string, Judge>> = {
  type: (wanted: string | readonly string[], value, _, path) =>
    [wanted].flat().some((type) => isOfType(value, type)) ? [] : [`${path}: not ${String(wanted)}`],
  enum: (wanted: readonly unknown[], value, _, path) =>
    wanted.includes(value) ? [] : [`${path}: not one of ${wanted.join()}`],
  minimum: (wanted: number, value, _, path) =>
    typeof value !== 'number' || value >= wanted ? [] : [`${path}: below ${wanted}`],
  maximum: (wanted: number, value, _, path) =>
    typeof value !== 'number' || value <= wanted ? [] : [`${path}: above ${wanted}`],
  maxLength: (wanted: number, value, _, path) =>
    typeof value !== 'string' || value.length <= wanted ? [] : [`${path}: longer than ${wanted}`],
  pattern: (wanted: string, value, _, path) =>
    typeof value !== 'string' || new RegExp(wanted).test(value) ? [] : [`${path}: not like ${wanted}`],
  minItems: (wanted: number, value, _, path) =>
    !Array.isArray(value) || value.length >= wanted ? [] : [`${path}: fewer than ${wanted}`],
  maxItems: (wanted: number, value, _, path) =>
    !Array.isArray(value) || value.length <= wanted ? [] : [`${path}: more than ${wanted}`],
  uniqueItems: (_wanted: boolean, value, _, path) =>
    !Array.isArray(value) || new Set(value).size === value.length ? [] : [`${path}: something twice`],
  items: (wanted: Schema, value, _, path) =>
    Array.isArray(value) ? value.flatMap((item, i) => breaches(wanted, item, `${path}[${i}]`)) : [],
  anyOf: (wanted: readonly Schema[], value, _, path) => {
    const each = wanted.map((schema) => breaches(schema, value, path));
    return each.some((found) => found.length === 0) ? [] : each.flat();
  },
  required: (wanted: readonly string[], value, _, path) =>
    wanted.filter((key) => isTree(value) && !(key in value)).map((key) => `${path}.${key}: missing`),
  properties: (wanted: Readonly<Record<string, Schema>>, value, _, path) =>
    Object.entries(wanted).flatMap(([key, schema]) =>
      isTree(value) && key in value ? breaches(schema, value[key], `${path}.${key}`) : [],
    ),
  propertyNames: (wanted: Schema, value, _, path) =>
    isTree(value) ? Object.keys(value).flatMap((key) => breaches(wanted, key, `${path}.${key}`)) : [],
  additionalProperties: (wanted: false | Schema, value, schema, path) =>
    (isTree(value) ? Object.keys(value) : [])
      .filter((key) => !(key in ((schema['properties'] ?? {}) as object)))
      .flatMap((key) =>
        wanted === false
          ? [`${path}.${key}: unknown`]
          : breaches(wanted, (value as Tree)[key], `${path}.${key}`),
      ),
};

export function breaches(schema: Schema, value: unknown, path = 'job'): readonly string[] {
  return Object.entries(schema).flatMap(([word, wanted]) => {
    const judge = JUDGES[word];
    if (judge === undefined && !REMARKS.has(word)) {
      throw new Error(`${word} is not understood here`);
    }
    return judge === undefined ? [] : judge(wanted as never, value, schema, path);
  });
}

type Tree = Readonly<Record<string, unknown>>;

function isTree(value: unknown): value is Tree {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function isOfType(value: unknown, type: string): boolean {
  switch (type) {
    case 'object':
      return isTree(value);
    case 'array':
      return Array.isArray(value);
    case 'integer':
      return Number.isInteger(value);
    case 'null':
      return value === null;
    default:
      return typeof value === type;
  }
}

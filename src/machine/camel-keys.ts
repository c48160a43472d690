/**
 * Keys as a machine file writes them (`line-longest`) to keys as the program uses them (`lineLongest`), in the value and
 * in its type: if the schema and `Machine` come apart, the type check says so.
 */
export type CamelKeys<T> = T extends readonly unknown[]
  ? T
  : T extends object
    ? { readonly [K in keyof T as K extends string ? Camel<K> : K]: CamelKeys<T[K]> }
    : T;

type Camel<S extends string> = S extends `${infer Head}-${infer Tail}`
  ? `${Head}${Capitalize<Camel<Tail>>}`
  : S;

export function camelKeys<T>(value: T): CamelKeys<T> {
  return renamed(value) as CamelKeys<T>;
}

function renamed(value: unknown): unknown {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return value;
  }
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, inner]) => inner !== undefined)
      .map(([key, inner]) => [
        key.replaceAll(/-([a-z])/g, (_, letter: string) => letter.toUpperCase()),
        renamed(inner),
      ]),
  );
}

/** Two values of a machine file that do not go together, and what a real machine would do. */
export interface Danger {
  /** The value to look at first, keys as in the file. */
  readonly path: readonly string[];
  readonly severity: 'error' | 'warning';
  readonly message: string;
  readonly hint: string;
}

/** `where` is the path with points: 'words.file.line-longest'. */
export function danger(where: string, message: string, hint: string): Danger {
  return { path: where.split('.'), severity: 'error', message, hint };
}

export function caution(where: string, message: string, hint: string): Danger {
  return { ...danger(where, message, hint), severity: 'warning' };
}

/** The dangers whose condition holds. */
export function those(...found: readonly (Danger | false)[]): readonly Danger[] {
  return found.filter((one) => one !== false);
}

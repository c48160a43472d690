/** Types of the part of gcode-parser 2.2.0 that the second reader uses; the library ships none. */
declare module 'gcode-parser' {
  export interface ParsedLine {
    readonly line: string;
    readonly words: readonly (readonly [letter: string, value: number | string])[];
    readonly comments?: readonly string[];
    readonly cmds?: readonly string[];
    readonly ln?: number;
    readonly cs?: number;
    readonly err?: boolean;
  }
  export function parseLine(
    line: string,
    options?: { readonly lineMode?: 'original' | 'stripped' | 'compact' },
  ): ParsedLine;
}

/** Runs of the whole flow that several tests of the report read, made once. */
import type { CutResult } from '../../src/cut.ts';
import type { SheetFacts } from '../../src/report/facts.ts';
import { cutText, sampleText } from './cut-text.ts';

const made = new Map<string, CutResult>();

export function runOf(name: string, change: (text: string) => string = (text) => text): CutResult {
  const text = change(sampleText(name));
  const known = made.get(text) ?? cutText(name, text);
  made.set(text, known);
  return known;
}

export function factsOf(name: string): SheetFacts {
  const { facts } = runOf(name);
  if (facts === undefined) {
    throw new Error(`${name} was not understood`);
  }
  return facts;
}

export function fileOf(result: CutResult, ending: string): string {
  return result.files.find(({ name }) => name.endsWith(ending))?.text ?? '';
}

/** A cutter that does not get into the tooth spaces. */
export function tooLargeCutter(text: string): string {
  return text.replace(/2: \{ diameter: 0\.5.*\}/, '2: { diameter: 1.6, flutes: 2, reach: 4.0 }');
}

/** Edits of a program's lines, and what the prover then says. */
import type { Finding, Proof, ProofInput } from '../../src/prove/proof.ts';
import { proveProgram } from '../../src/prove/prove-program.ts';
import { goodInput, goodLines, SETUP } from './good-program.ts';
import type { Setup } from '../../src/cutting/setup.ts';

export const GOOD: readonly string[] = goodLines({ parts: 8 });

/** 0-based line of a comment, counted from where it stands. */
export function lineOf(text: string, lines: readonly string[] = GOOD): number {
  const at = lines.indexOf(text);
  if (at < 0) {
    throw new Error(`no line "${text}"`);
  }
  return at;
}

/** The good program with one line put in place of `count` others. */
export function edited(at: number, count: number, ...put: string[]): string[] {
  return GOOD.toSpliced(at, count, ...put);
}

export function prove(lines: readonly string[], changes: Partial<ProofInput> = {}): Proof {
  return proveProgram(goodInput(lines, changes));
}

export function withSetup(changes: Partial<Setup>): { readonly setup: Setup } {
  return { setup: { ...SETUP, ...changes } };
}

/** Codes of the errors, each once. */
export function errorsOf({ findings }: Proof): string[] {
  return [...new Set(findings.filter(({ severity }) => severity === 'error').map(({ code }) => code))];
}

export function findingOf(proof: Proof, code: string): Finding {
  const found = proof.findings.find((finding) => finding.code === code);
  if (found === undefined) {
    throw new Error(`no ${code} among ${JSON.stringify(proof.findings)}`);
  }
  return found;
}

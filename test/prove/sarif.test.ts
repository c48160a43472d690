/** Findings as SARIF: the properties that OASIS SARIF 2.1.0 asks for (sections 3.13 to 3.30, from memory), and the place. */
import { describe, expect, it } from 'vitest';
import type { Finding } from '../../src/prove/proof.ts';
import { CHECK_CODES } from '../../src/prove/check-codes.ts';
import { sarifOf } from '../../src/prove/sarif.ts';

const FINDINGS: readonly Finding[] = [
  {
    code: 'prove.gouge',
    severity: 'error',
    message: 'tooth 3 is cut into: 2.1 um, where 1.1 um is allowed',
    hint: 'Move this cut away from the outline.',
    file: 'wheel 2.nc',
    line: 17,
    x: 1.25,
    y: -3,
  },
  { code: 'prove.end', severity: 'warning', message: 'words behind the end', file: 'wheel-1.nc', line: 0 },
  { code: 'prove.gouge', severity: 'error', message: 'again', file: 'wheel-1.nc', line: 4 },
];

interface Log {
  readonly version: string;
  readonly runs: readonly {
    readonly tool: {
      readonly driver: { readonly name: string; readonly rules: readonly { readonly id: string }[] };
    };
    readonly invocations: readonly { readonly executionSuccessful: boolean }[];
    readonly results: readonly {
      readonly ruleId: string;
      readonly ruleIndex: number;
      readonly level: string;
      readonly message: { readonly text: string };
      readonly locations: readonly {
        readonly physicalLocation: {
          readonly artifactLocation: { readonly uri: string };
          readonly region: { readonly startLine: number };
        };
      }[];
      readonly properties?: unknown;
    }[];
  }[];
}

function logOf(verdict: 'refuse' | 'unread', pathOf = (file: string): string => `out/${file}`): Log {
  return JSON.parse(JSON.stringify(sarifOf({ findings: FINDINGS, verdict }, '1.2.3', pathOf))) as Log;
}

describe('findings as SARIF 2.1.0', () => {
  const [run] = logOf('refuse').runs;
  const results = run?.results ?? [];
  it('one result for each, with its rule, its level and its line', () => {
    expect(logOf('refuse').version).toBe('2.1.0');
    expect(results.map(({ ruleId, level }) => [ruleId, level])).toEqual(
      FINDINGS.map(({ code, severity }) => [code, severity]),
    );
    expect(results.map(({ locations }) => locations[0]?.physicalLocation.region.startLine)).toEqual([
      17, 1, 4,
    ]);
  });
  it('names each rule once, and points to it', () => {
    const rules = run?.tool.driver.rules ?? [];
    expect(rules.map(({ id }) => id)).toEqual(['prove.end', 'prove.gouge']);
    expect(results.map(({ ruleId, ruleIndex }) => rules[ruleIndex]?.id === ruleId)).toEqual([
      true,
      true,
      true,
    ]);
    expect(JSON.stringify(rules)).toContain(CHECK_CODES['prove.gouge'].guards);
  });
  it('says what is wrong and what to change, and where on the part', () => {
    expect(results[0]?.message.text).toBe(
      'tooth 3 is cut into: 2.1 um, where 1.1 um is allowed. Move this cut away from the outline.',
    );
    expect(results[0]?.properties).toEqual({ placeOnPart: { x: 1.25, y: -3, unit: 'mm' } });
    expect(results[1]?.properties).toBeUndefined();
  });
  it('names the file as a URI, as the one who asked named it', () => {
    const uris = (pathOf?: (file: string) => string): unknown =>
      logOf('refuse', pathOf).runs[0]?.results.map(
        ({ locations }) => locations[0]?.physicalLocation.artifactLocation.uri,
      );
    expect(uris()).toEqual(['out/wheel%202.nc', 'out/wheel-1.nc', 'out/wheel-1.nc']);
    expect(uris((file) => `/jobs/${file}`)).toContain('file:///jobs/wheel%202.nc');
    expect(uris((file) => `C:\\jobs\\${file}`)).toContain('file:///C:/jobs/wheel%202.nc');
  });
  it('a program that was not read to its end is no success', () => {
    expect(run?.invocations[0]?.executionSuccessful).toBe(true);
    expect(logOf('unread').runs[0]?.invocations[0]?.executionSuccessful).toBe(false);
  });
});

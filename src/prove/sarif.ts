/**
 * A proof's findings as SARIF 2.1.0 (OASIS, Static Analysis Results Interchange Format), which editors and code hosts show at
 * the line. Lines are 1-based, as there. What to change stands behind what is wrong; the place on the part under `properties`.
 */
import { CHECK_CODES, type CheckCode } from './check-codes.ts';
import type { Finding, Proof } from './proof.ts';

/** `pathOf`: each program as the one who asked named it. */
export function sarifOf(
  proof: Pick<Proof, 'findings' | 'verdict'>,
  version: string,
  pathOf: (file: string) => string,
): Record<string, unknown> {
  const codes = [...new Set(proof.findings.map(({ code }) => code))].toSorted();
  return {
    $schema: 'https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json',
    version: '2.1.0',
    runs: [
      {
        tool: { driver: { name: 'Ogive', version, rules: codes.map(ruleOf) } },
        invocations: [{ executionSuccessful: proof.verdict !== 'unread' }],
        columnKind: 'utf16CodeUnits',
        results: proof.findings.map((finding) => resultOf(finding, codes.indexOf(finding.code), pathOf)),
      },
    ],
  };
}

function ruleOf(code: CheckCode): Record<string, unknown> {
  const { guards, blind } = CHECK_CODES[code];
  return {
    id: code,
    shortDescription: { text: guards },
    fullDescription: { text: `Guards against ${guards}. Cannot see: ${blind}.` },
  };
}

function resultOf(
  { code, severity, message, hint, file, line, x, y }: Finding,
  ruleIndex: number,
  pathOf: (file: string) => string,
): Record<string, unknown> {
  return {
    ruleId: code,
    ruleIndex,
    level: severity,
    message: { text: hint === undefined ? message : `${message}. ${hint}` },
    locations: [
      {
        physicalLocation: {
          artifactLocation: { uri: uriOf(pathOf(file)) },
          region: { startLine: Math.max(1, line) },
        },
      },
    ],
    ...(x === undefined || y === undefined ? {} : { properties: { placeOnPart: { x, y, unit: 'mm' } } }),
  };
}

/** A relative reference or a file URI (RFC 3986): separators stay, everything else that is not plain is escaped. */
function uriOf(path: string): string {
  const parts = path.replaceAll('\\', '/').split('/');
  const escaped = parts.map((part, i) =>
    i === 0 && /^[A-Za-z]:$/.test(part) ? part : encodeURIComponent(part),
  );
  const joined = escaped.join('/');
  return /^(?:\/|[A-Za-z]:\/)/.test(joined) ? `file://${joined.startsWith('/') ? '' : '/'}${joined}` : joined;
}

/** The summary: `ogive-summary/1`, lengths in mm whatever the job's unit, angles in degrees where there are any. */
import type { SheetFacts } from './facts.ts';

export function summaryOf(facts: SheetFacts): Record<string, unknown> {
  const { form, job, proof, reach, machine } = facts;
  const cutterOf = (number: number) => {
    const cutter = job.setup.cutters.find((candidate) => candidate.number === number);
    return { number, diameter: cutter?.diameter ?? 0, flutes: cutter?.flutes ?? 0 };
  };
  return {
    format: 'ogive-summary/1',
    title: job.title,
    version: facts.version,
    mark: facts.mark,
    verdict: facts.verdict,
    part: {
      kind: 'wheel',
      teeth: form.proportions.teeth,
      module: figure(form.proportions.module),
      pitchRadius: figure(form.pitchRadius),
      outsideRadius: figure(form.outsideRadius),
      rootRadius: figure(form.rootRadius),
      addendum: figure(form.addendum),
      dedendum: figure(form.dedendum),
      toothThickness: figure(form.toothThickness),
      thickness: figure(job.wheel.thickness),
      bore: figure(job.wheel.bore),
    },
    programs: facts.programs.map((program) => ({
      file: program.file,
      machine: machine.name,
      units: program.units,
      blocks: program.blocks,
      bytes: program.bytes,
      sha256: program.sha256,
      seconds: Math.round(program.seconds),
      cutters: program.cutters.map(cutterOf),
    })),
    ...(facts.walkFile === undefined ? {} : { walk: { file: facts.walkFile, sha256: facts.walkSha256 } }),
    reach: {
      largestCutter: known(reach?.largestCutter ?? facts.asCut?.largestCutter),
      leftAtRoot: known(reach?.leftAtRoot ?? facts.asCut?.leftAtRoot),
    },
    proof: {
      passed: facts.verdict === 'pass',
      flankGouge: known(proof?.figures?.flankGouge),
      flankLeft: known(proof?.figures?.flankLeft),
      leftAtRoot: known(proof?.figures?.leftAtRoot),
      notChecked: proof?.notChecked ?? ['No program was made, so nothing was proved.'],
      findings: [
        ...facts.problems.map((problem) => ({
          code: problem.code,
          severity: problem.severity,
          message: problem.hint === undefined ? problem.message : `${problem.message} ${problem.hint}`,
          file: 'file' in problem.at ? problem.at.file : '',
          line: 'line' in problem.at ? (problem.at.line ?? 0) : 0,
        })),
        ...(proof?.findings ?? []).map((finding) => ({
          code: finding.code,
          severity: finding.severity,
          message: finding.hint === undefined ? finding.message : `${finding.message} ${finding.hint}`,
          file: finding.file,
          line: finding.line,
        })),
      ],
    },
    derived: job.derived,
  };
}

/** mm to a thousandth of a micrometre, never -0. */
function figure(value: number): number {
  return Math.round(value * 1e6) / 1e6 + 0;
}

/** What was never reckoned is no figure, and not nought either. */
function known(value: number | undefined): number | null {
  return value === undefined ? null : figure(value);
}

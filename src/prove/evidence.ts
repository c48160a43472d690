/**
 * What every check judges from: the programs as they were read, the moves whose place and cutter are known, and the figures of the cut
 * metal. Made once; the checks only look.
 */
import { millimetresPer } from '../base/units.ts';
import type { Cutter } from '../cutting/setup.ts';
import type { TracedMove } from '../motion/traced-move.ts';
import { extentsOf, type Extents } from './extents.ts';
import { wheelBody, type WheelBody } from './metal-inside.ts';
import { wholePaths, type PathSet } from './metal-paths.ts';
import { solidMoves, type SolidMoves } from './metal-solids.ts';
import type { ProofInput } from './proof.ts';
import type { Trace } from './trace-program.ts';
import { wheelFigures, type WheelFigures } from './wheel-figures.ts';

export interface Evidence {
  readonly input: ProofInput;
  readonly traces: readonly Trace[];
  /** Of all programs, in order. */
  readonly moves: readonly TracedMove[];
  /** Those whose place and cutter are known. */
  readonly solids: SolidMoves;
  /** Their paths, whole and in the same order. */
  readonly paths: PathSet;
  readonly extents: Extents;
  readonly cutterOf: (move: TracedMove) => Cutter | undefined;
  /** One unit of the last digit the machine file writes, mm. */
  readonly lastDigit: number;
  /** The exact wheel, where there is a target. */
  readonly body: WheelBody | undefined;
  /** With a target, where every line was read. */
  readonly figures: WheelFigures | undefined;
}

export function gatherEvidence(input: ProofInput, traces: readonly Trace[]): Evidence {
  const moves = ([] as TracedMove[]).concat(...traces.map((trace) => trace.moves));
  const cutters = new Map(input.setup.cutters.map((cutter) => [cutter.number, cutter]));
  let last: Cutter | undefined;
  // Most moves are made with the cutter of the move before.
  const cutterOf = ({ cutter }: TracedMove): Cutter | undefined => {
    if (cutter === null || cutter !== last?.number) {
      last = cutter === null ? undefined : cutters.get(cutter);
    }
    return last;
  };
  const solids = solidMoves(moves, (move) => {
    const cutter = cutterOf(move);
    return cutter === undefined ? undefined : cutter.diameter / 2;
  });
  const { units, words } = input.machine;
  const lastDigit = millimetresPer(units) * 10 ** -words.numbers.lengthDecimals[units];
  const read = traces.every((trace) => trace.complete);
  const paths = wholePaths(solids);
  const body = input.target && wheelBody(input.target.form, input.target.bore, input.target.crossings);
  const figures =
    input.target === undefined || body === undefined || !read
      ? undefined
      : wheelFigures(input.target, body, input.setup, solids, paths, lastDigit);
  return {
    input,
    traces,
    moves,
    solids,
    paths,
    extents: extentsOf(moves),
    cutterOf,
    lastDigit,
    body,
    figures,
  };
}

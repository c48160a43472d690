/**
 * Arcs as blocks: on the grid first, then in the machine file's words; the block of an arc that came before is taken as it was.
 *
 * In  : the writer, an arc (mm, program frame). Out: blocks in the sink, the writer's place moved on.
 */
import type { ArcStep } from '../motion/motion.ts';
import { keepArc, recallArc } from './arc-memory.ts';
import { arcOnGrid } from './arc-on-grid.ts';
import type { GridArc, GridMove } from './grid-move.ts';
import { feedWord, motionWord, takeFeed } from './modal-words.ts';
import { complain, writeBlock } from './program-sink.ts';
import { straight } from './write-straight.ts';
import { lengthText, type Writer } from './writer.ts';

export function writeArc(writer: Writer, step: ArcStep): void {
  const { arcMemory, exact, x, y, z } = writer;
  const feed = feedWord(writer, step.feed * helixShare(writer, step));
  const known = recallArc(arcMemory, exact, x, y, step);
  if (known !== undefined) {
    putArc(writer, known.arc, z, known.body, feed);
    return;
  }
  const moves = arcOnGrid(writer.grid, writer.machine.words.arcs, exact, writer, step);
  const [first] = moves;
  if (moves.length === 1 && first?.kind === 'arc' && step.to.z === exact.z) {
    const body = arcWords(writer, first);
    keepArc(arcMemory, { from: exact, step, startX: x, startY: y, arc: first, body });
    putArc(writer, first, z, body, feed);
    return;
  }
  writeMoves(writer, moves, feedWord(writer, step.feed), feed);
}

function writeMoves(writer: Writer, moves: readonly GridMove[], feed: string, arcFeed: string): void {
  let lined = moves.length === 0;
  for (const move of moves) {
    if (move.kind === 'line') {
      lined = true;
      straight(writer, writer.codes.line, move.x, move.y, move.z, feed);
    } else if (move.kind === 'arc') {
      putArc(writer, move, move.z, arcWords(writer, move), arcFeed);
    } else {
      complain(writer.sink, 'post.arc', 'arc', {
        message: `an arc of radius ${move.radius.toFixed(4)} mm ends ${move.miss.toFixed(4)} mm off its circle when rounded to ${writer.grid.decimals} decimals of ${writer.grid.unit}, more than the controller allows`,
        hint: 'give length-decimals one more in the machine file, or arcs: { planes: none }',
      });
    }
  }
  writer.arcs.lined += lined ? 1 : 0;
}

function putArc(writer: Writer, arc: GridArc, z: number, body: string, feed: string): void {
  const motion = motionWord(writer, arc.counterClockwise ? writer.codes.ccw : writer.codes.cw);
  const { sink } = writer;
  writeBlock(sink, motion === '' ? body : motion + sink.gap + body, takeFeed(writer, feed));
  tally(writer, arc);
  writer.x = arc.x;
  writer.y = arc.y;
  writer.z = z;
}

/** The words of where it ends and turns; its motion word and feed are news or not. */
function arcWords(writer: Writer, arc: GridArc): string {
  const both =
    writer.everyAxis ||
    writer.machine.words.arcs.endWords === 'both' ||
    (arc.x === writer.x && arc.y === writer.y);
  const words: string[] = [];
  if (both || arc.x !== writer.x) {
    words.push(`X${lengthText(writer, arc.x)}`);
  }
  if (both || arc.y !== writer.y) {
    words.push(`Y${lengthText(writer, arc.y)}`);
  }
  if (arc.z !== writer.z) {
    words.push(`Z${lengthText(writer, arc.z)}`);
  }
  centreWords(writer, arc, words);
  return words.join(writer.sink.gap);
}

function centreWords(writer: Writer, arc: GridArc, words: string[]): void {
  const { centre, zeroWords } = writer.machine.words.arcs;
  if (centre === 'radius') {
    words.push(`R${lengthText(writer, arc.radius)}`);
    return;
  }
  const i = centre === 'from-start' ? arc.cx - writer.x : arc.cx;
  const j = centre === 'from-start' ? arc.cy - writer.y : arc.cy;
  // From zero an omitted word would be taken as the current place, or refused: both are always written.
  const omit = zeroWords === 'omit' && centre === 'from-start';
  if (!omit || i !== 0) {
    words.push(`I${lengthText(writer, i)}`);
  }
  if (!omit || j !== 0) {
    words.push(`J${lengthText(writer, j)}`);
  }
}

function tally(writer: Writer, arc: GridArc): void {
  writer.arcs.written++;
  const miss = arc.miss / writer.grid.perMm;
  if (miss > writer.arcs.worstMiss) {
    writer.arcs.worstMiss = miss;
    writer.arcs.worstLine = writer.sink.lines.length;
  }
}

/** Feed along the helix is meant; some controllers take F along the circle under it. */
function helixShare(writer: Writer, step: ArcStep): number {
  const rise = step.to.z - writer.exact.z;
  if (rise === 0 || writer.machine.words.path.helixFeedAlong === 'helix') {
    return 1;
  }
  const circle =
    Math.hypot(writer.exact.x - step.centre.x, writer.exact.y - step.centre.y) * Math.abs(step.turn);
  return circle / Math.hypot(circle, rise);
}

/**
 * Rapids, lines and arcs as blocks, with modal memory, from the rounded place the controller stands at.
 *
 * In  : the writer, a move (mm, program frame). Out: blocks in the sink, the writer's place moved on.
 * Kept: from an unknown place Z and XY never move together; a dog-leg rapid is split so that XY is crossed at the higher end.
 */
import { Bug } from '../base/bug.ts';
import { millimetresPer } from '../base/units.ts';
import type { ArcStep, LineStep, MoveStep, Position, RapidStep } from '../motion/motion.ts';
import { arcOnGrid, type GridArc } from './arc-on-grid.ts';
import { formatValue } from './format-word.ts';
import { toGrid } from './program-grid.ts';
import { complain, writeBlock } from './program-sink.ts';
import { writeTop } from './write-top.ts';
import { lengthText, type Writer } from './writer.ts';

export function writeMove(writer: Writer, step: MoveStep): void {
  if (!Number.isFinite(step.to.x + step.to.y + step.to.z)) {
    throw new Bug(`a ${step.kind} to nowhere`);
  }
  if (step.kind === 'rapid') {
    writeRapid(writer, step);
  } else if (Number.isNaN(writer.x + writer.y + writer.z)) {
    complain(writer.sink, 'post.cannot-say', 'unknown-place', {
      message: 'a feed move begins where the machine is not known to stand',
      hint: 'after the start, a stop or a change of cutter the first move is a rapid',
    });
  } else if (step.kind === 'line') {
    writeLine(writer, step);
  } else {
    writeArc(writer, step);
  }
  writer.exact = step.to;
}

function writeRapid(writer: Writer, step: RapidStep): void {
  const { x, y, z } = onGrid(writer, step.to);
  const known = !Number.isNaN(writer.x + writer.y + writer.z);
  if (!known && !writer.atTop) {
    writeTop(writer);
  }
  const acrossToo = x !== writer.x || y !== writer.y;
  if (acrossToo && z !== writer.z && (!known || writer.machine.words.positions.rapidShape === 'dog-leg')) {
    const acrossFirst = known ? z < writer.z : writer.atTop;
    if (acrossFirst) {
      straight(writer, writer.codes.rapid, x, y, writer.z, '');
      straight(writer, writer.codes.rapid, x, y, z, '');
    } else {
      straight(writer, writer.codes.rapid, writer.x, writer.y, z, '');
      straight(writer, writer.codes.rapid, x, y, z, '');
    }
    return;
  }
  straight(writer, writer.codes.rapid, x, y, z, '');
}

function writeLine(writer: Writer, step: LineStep): void {
  const { x, y, z } = onGrid(writer, step.to);
  straight(writer, writer.codes.line, x, y, z, feedWord(writer, step.feed));
}

/** One straight block, or none where nothing would move. NaN stands for an axis that is not known and not to be moved. */
function straight(writer: Writer, code: string, x: number, y: number, z: number, feed: string): void {
  // An axis that is not known and not to be moved is NaN on both sides: it differs from itself.
  const [dx, dy, dz] = [x === x && x !== writer.x, y === y && y !== writer.y, z === z && z !== writer.z];
  if (!dx && !dy && !dz) {
    return;
  }
  const every = writer.everyAxis;
  const words = motionWord(writer, code);
  if (dx || (every && x === x)) {
    words.push(`X${lengthText(writer, x)}`);
  }
  if (dy || (every && y === y)) {
    words.push(`Y${lengthText(writer, y)}`);
  }
  if (dz || (every && z === z)) {
    words.push(`Z${lengthText(writer, z)}`);
  }
  writeBlock(writer.sink, words, takeFeed(writer, feed));
  if (dz) {
    writer.atTop = false;
  }
  writer.x = x;
  writer.y = y;
  writer.z = z;
}

/** A new block's words, so far the motion word where it is news. */
function motionWord(writer: Writer, code: string): string[] {
  if (code === writer.motion && !writer.everyMotion) {
    return [];
  }
  writer.motion = code;
  return [code];
}

function writeArc(writer: Writer, step: ArcStep): void {
  const words = writer.machine.words.arcs;
  const moves = arcOnGrid(writer.grid, words, writer.exact, writer, step);
  const feed = feedWord(writer, step.feed);
  const arcFeed = feedWord(writer, step.feed * helixShare(writer, step));
  let lined = moves.length === 0;
  for (const move of moves) {
    if (move.kind === 'line') {
      lined = true;
      straight(writer, writer.codes.line, move.x, move.y, move.z, feed);
    } else if (move.kind === 'arc') {
      arcBlock(writer, move, arcFeed);
    } else {
      complain(writer.sink, 'post.arc', 'arc', {
        message: `an arc of radius ${move.radius.toFixed(4)} mm ends ${move.miss.toFixed(4)} mm off its circle when rounded to ${writer.grid.decimals} decimals of ${writer.grid.unit}, more than the controller allows`,
        hint: 'give length-decimals one more in the machine file, or arcs: { planes: none }',
      });
    }
  }
  writer.arcs.lined += lined ? 1 : 0;
}

function arcBlock(writer: Writer, arc: GridArc, feed: string): void {
  const both =
    writer.everyAxis ||
    writer.machine.words.arcs.endWords === 'both' ||
    (arc.x === writer.x && arc.y === writer.y);
  const words = motionWord(writer, arc.counterClockwise ? writer.codes.ccw : writer.codes.cw);
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
  writeBlock(writer.sink, words, takeFeed(writer, feed));
  tally(writer, arc);
  writer.x = arc.x;
  writer.y = arc.y;
  writer.z = arc.z;
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

function feedWord(writer: Writer, feed: number): string {
  if (feed === writer.lastFeed.value) {
    return writer.lastFeed.text;
  }
  const { numbers } = writer.machine.words;
  const value = feed / millimetresPer(writer.grid.unit);
  const text = `F${formatValue(value, numbers.feedDecimals, numbers)}`;
  if (!(Math.round(value * 10 ** numbers.feedDecimals) > 0)) {
    complain(writer.sink, 'post.cannot-say', 'feed', {
      message: `a feed of ${feed} mm/min rounds to nothing with ${numbers.feedDecimals} decimals`,
      hint: 'give feed-decimals one more in the machine file, or a faster feed',
    });
  }
  writer.lastFeed = { value: feed, text };
  return text;
}

/** The feed word where it is news. */
function takeFeed(writer: Writer, text: string): string {
  if (text === '' || text === writer.feedText) {
    return '';
  }
  writer.feedText = text;
  return text;
}

function onGrid(writer: Writer, to: Position): Position {
  return { x: toGrid(writer.grid, to.x), y: toGrid(writer.grid, to.y), z: toGrid(writer.grid, to.z) };
}

/**
 * Rapids and lines as blocks, arcs by `write-arc.ts`,, with modal memory, from the rounded place the controller stands at.
 *
 * In  : the writer, a move (mm, program frame). Out: blocks in the sink, the writer's place moved on.
 * Kept: from an unknown place Z and XY never move together; a dog-leg rapid is split so that XY is crossed at the higher end.
 */
import { Bug } from '../base/bug.ts';
import type { LineStep, MoveStep, RapidStep } from '../motion/motion.ts';
import { feedWord } from './modal-words.ts';
import { toGrid } from './program-grid.ts';
import { complain } from './program-sink.ts';
import { writeArc } from './write-arc.ts';
import { straight } from './write-straight.ts';
import { writeTop } from './write-top.ts';
import type { Writer } from './writer.ts';

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
  const x = toGrid(writer.grid, step.to.x);
  const y = toGrid(writer.grid, step.to.y);
  const z = toGrid(writer.grid, step.to.z);
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
  const x = toGrid(writer.grid, step.to.x);
  const y = toGrid(writer.grid, step.to.y);
  const z = toGrid(writer.grid, step.to.z);
  straight(writer, writer.codes.line, x, y, z, feedWord(writer, step.feed));
}

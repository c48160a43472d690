/**
 * What a person is told about fitting a cutter and finding heights and zero again: as the machine changes cutters, in its unit.
 *
 * In  : the task. Out: sentences for the comments of a program.
 */
import { fixedDecimals } from '../base/fixed-decimals.ts';
import { millimetresPer, type LengthUnit } from '../base/units.ts';
import type { Cutter } from '../cutting/setup.ts';
import type { CutTask } from './cut-task.ts';
import { touchPlace } from './places.ts';

/** Beside which cutter it is. Where nothing stops for hands nothing can be touched off. */
export function sayAtCutter(task: CutTask, cutter: Cutter): readonly string[] {
  const { change, lengthOffset } = task.machine.words.cutters;
  const offset = lengthOffset !== 'none';
  if (change === 'automatic') {
    return [
      offset
        ? `its length must stand in the table of the machine under number ${cutter.number} before the start: nothing stops here to measure it`
        : 'its length must be known to the machine before the start: nothing stops here to measure it',
    ];
  }
  if (change === 'one-program') {
    return [];
  }
  const { units } = task.machine;
  return [
    `fit it: it cuts ${length(cutter.diameter, units)} wide and sticks out ${length(cutter.stickOut, units)}`,
    offset
      ? `measure its length into the table under number ${cutter.number}; ${touchWords(task)}`
      : touchWords(task),
  ];
}

export function touchWords(task: CutTask): string {
  const { units } = task.machine;
  return `touch off its height on the wheel, ${placeWords(task)}: there the top is at height ${length(task.heights.top, units)}`;
}

/** Where the axis is, where a hole was there before. */
export function axisWords({ job, machine }: CutTask): string {
  const hole = `the hole of ${length(job.setup.bored, machine.units)} that is there`;
  return job.setup.holding.includes('arbor')
    ? `the axis of the arbor is X and Y zero: run a dial gauge round the rim of the blank, or round the arbor where it shows`
    : `the axis of ${hole} is X and Y zero: find it with a dial gauge or pin`;
}

function placeWords(task: CutTask): string {
  const { units } = task.machine;
  const { x, y } = touchPlace(task);
  const decimals = units === 'mm' ? 2 : 3;
  const beside = (mm: number): string => fixedDecimals(Math.abs(mm) / millimetresPer(units), decimals);
  const right = Number(beside(x)) === 0 ? '' : `${beside(x)} ${units} ${x > 0 ? 'right' : 'left'} of`;
  const behind = Number(beside(y)) === 0 ? '' : `${beside(y)} ${units} ${y > 0 ? 'behind' : 'in front of'}`;
  if (behind === '') {
    return `${right} the axis, level with it`;
  }
  return right === '' ? `${behind} the axis, in line with it` : `${right} and ${behind} the axis`;
}

function length(mm: number, unit: LengthUnit): string {
  return `${fixedDecimals(mm / millimetresPer(unit), unit === 'mm' ? 3 : 4)} ${unit}`;
}

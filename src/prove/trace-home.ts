/**
 * Moves that leave the program's frame: G28 and G30 to the machine's home, G53 to a place in the machine's own
 * coordinates. Where an axis then stands in the program's frame is not known (null).
 */
import { millimetresPer } from '../base/units.ts';
import { AXES, BIT, has, valueOf, type Block } from './block.ts';
import type { Here, MotionMode } from './modes.ts';
import { feedRefused } from './trace-move.ts';
import { sayAssumed } from './trace-assumed.ts';
import { placeOf, placeRefused } from './trace-place.ts';
import { lostRefused } from './trace-zero.ts';
import { happen, makeMove, unread, type AxisName, type Refusal, type Run } from './trace-run.ts';

const NAMES: readonly (readonly [number, AxisName])[] = [
  [BIT.X, 'x'],
  [BIT.Y, 'y'],
  [BIT.Z, 'z'],
];

/** By way of the place that is named (in the program's frame), then home: the named axes, or all, by machine. */
export function goHome(run: Run, block: Block, axes: number): Refusal | undefined {
  if (axes !== 0) {
    const refused = placeRefused(run) ?? lostRefused(run, axes);
    if (refused !== undefined) {
      return refused;
    }
    sayAssumed(run, 'machine');
    const via = placeOf(run, block, axes);
    if (
      via.x !== run.here.x ||
      via.y !== run.here.y ||
      via.z !== run.here.z ||
      isUnseen(run, block, axes, via)
    ) {
      run.placed = true;
      makeMove(run, 'rapid', via, null);
    }
  }
  const named = run.machine.words.positions.top === 'G28-named' && axes !== 0 ? axes : AXES;
  leaveFrame(run, named, 'rapid', null);
  happen(run, { kind: 'machine-place', axes: namesOf(named) });
  return undefined;
}

/** A step of an axis that isn't known moves it all the same. */
function isUnseen(run: Run, block: Block, axes: number, via: Here): boolean {
  const steps = NAMES.some(
    ([bit, name]) =>
      (axes & bit) !== 0 && via[name] === null && (block.values[name.charCodeAt(0) - 97] ?? 0) !== 0,
  );
  return (
    steps ||
    (run.modes.distance === 'absolute' && NAMES.some(([bit, name]) => axes & bit && via[name] === null))
  );
}

/** G53: this block only, with G0 or G1, in absolute places. */
export function moveInMachine(
  run: Run,
  block: Block,
  motion: MotionMode | undefined,
  axes: number,
): Refusal | undefined {
  if (motion !== 'G0' && motion !== 'G1') {
    return unread('G53 needs X, Y or Z, and G0 or G1 on');
  }
  const refused = placeRefused(run) ?? (motion === 'G1' ? feedRefused(run, block) : undefined);
  if (refused !== undefined) {
    return refused;
  }
  if (motion === 'G1' && run.modes.feedMode === 'inverse-time') {
    return unread('G53 G1 under G93: how long the way is, and so its feed, is not known');
  }
  if (run.modes.distance === 'incremental') {
    return unread('G53 under G91: controllers differ in what it means');
  }
  sayAssumed(run, 'machine');
  const unit = millimetresPer(run.modes.unit ?? 'mm');
  leaveFrame(
    run,
    axes,
    motion === 'G0' ? 'rapid' : 'line',
    motion === 'G0' ? null : (run.modes.feed ?? null),
  );
  happen(run, {
    kind: 'machine-place',
    axes: namesOf(axes),
    place: {
      ...(has(block, axes & BIT.X) ? { x: valueOf(block, 'X') * unit } : {}),
      ...(has(block, axes & BIT.Y) ? { y: valueOf(block, 'Y') * unit } : {}),
      ...(has(block, axes & BIT.Z) ? { z: valueOf(block, 'Z') * unit } : {}),
    },
  });
  return undefined;
}

function leaveFrame(run: Run, axes: number, kind: 'rapid' | 'line', feed: number | null): void {
  const { here } = run;
  makeMove(
    run,
    kind,
    {
      x: axes & BIT.X ? null : here.x,
      y: axes & BIT.Y ? null : here.y,
      z: axes & BIT.Z ? null : here.z,
    },
    feed,
  );
}

function namesOf(axes: number): readonly AxisName[] {
  return NAMES.filter(([bit]) => (axes & bit) !== 0).map(([, name]) => name);
}

/**
 * The outline of one pitch from one side of a tooth: the side with its root corner sharp or filled by a resting disc, in the
 * wheel's frame, and its mirror image. Counter-clockwise, material on the left, from -pi/N to +pi/N.
 */
import { mirrorPiece, partOf, reversePiece, turnPiece } from '../geometry/change-piece.ts';
import { endOf } from '../geometry/on-piece.ts';
import type { ArcPiece, Piece } from '../geometry/piece.ts';
import { angleOf, polar, subtract, wrapAngle, type Point } from '../geometry/point.ts';
import { kinkDisc } from './kink-disc.ts';
import type { RestingDisc } from './resting-disc.ts';
import type { ToothSide } from './tooth-side.ts';
import type { WheelPiece } from './wheel.ts';

/** What fills the corners: a disc at the root (none: sharp), and how far a cutter gets into a hollow at the pitch point. */
export interface CornerDiscs {
  readonly root?: RestingDisc | undefined;
  /** Radius of the disc that rolls along the side; 0 for the exact outline. */
  readonly rolling: number;
}

export function toothSector(side: ToothSide, discs: CornerDiscs): readonly WheelPiece[] {
  const toWheel = -Math.PI / side.teeth;
  const rising = sidePieces(side, discs).map(({ role, piece }) => ({
    role,
    piece: turnPiece(piece, toWheel),
  }));
  const falling = rising
    .toReversed()
    .map(({ role, piece }) => ({ role, piece: reversePiece(mirrorPiece(piece)) }));
  return [...rising, ...land(side, rising), ...falling];
}

/** From the middle of the space to the tip corner, in the frame of the side. */
export function sidePieces(side: ToothSide, discs: CornerDiscs): readonly WheelPiece[] {
  const bottom = bottomPieces(side, discs.root);
  const rest = discs.root
    ? afterFoot(side, discs.root)
    : [flank(side, polar(side.rootRadius, side.spaceAngle)), whole(side)];
  const kink = discs.rolling > 0 ? kinkDisc(side, discs.rolling) : undefined;
  return [...bottom, ...(kink ? fillKink(rest, kink) : rest)].filter((part) => part !== undefined);
}

function bottomPieces(side: ToothSide, disc: RestingDisc | undefined): readonly WheelPiece[] {
  const rootArc = (turn: number): WheelPiece => ({
    role: 'root',
    piece: { kind: 'arc', centre: { x: 0, y: 0 }, radius: side.rootRadius, start: 0, turn },
  });
  if (!disc) {
    return [rootArc(side.spaceAngle)];
  }
  const floorAngle = angleOf(disc.centre);
  const arc: WheelPiece = { role: 'fillet', piece: hollowArc(disc, floorAngle + Math.PI, disc.foot.point) };
  return disc.onRoot && floorAngle > 0 ? [rootArc(floorAngle), arc] : [arc];
}

/** The arc that a disc leaves from a direction seen from its centre to a point of its rim: clockwise, for it is hollow. */
function hollowArc(disc: { centre: Point; radius: number }, start: number, to: Point): ArcPiece {
  const turn = wrapAngle(angleOf(subtract(to, disc.centre)) - start);
  return { kind: 'arc', centre: disc.centre, radius: disc.radius, start, turn };
}

function flank(side: ToothSide, from: Point): WheelPiece {
  return { role: 'flank', piece: { kind: 'line', from, to: polar(side.pitchRadius, side.spaceAngle) } };
}

function whole(side: ToothSide): WheelPiece {
  return { role: 'addendum', piece: side.addendum };
}

function afterFoot(side: ToothSide, { foot }: RestingDisc): readonly WheelPiece[] {
  if (foot.on === 'flank') {
    return [flank(side, foot.point), whole(side)];
  }
  const rest: Piece = foot.u === 0 ? side.addendum : partOf(side.addendum, foot.u, 1);
  return [{ role: 'addendum', piece: rest }];
}

/** The flank ends and the addendum begins where the disc in the hollow touches them. */
function fillKink(
  rest: readonly WheelPiece[],
  kink: NonNullable<ReturnType<typeof kinkDisc>>,
): readonly WheelPiece[] {
  const [first, second] = rest;
  // A foot above the hollow's lower touch means that the disc at the root has filled the hollow already.
  if (
    first?.piece.kind !== 'line' ||
    !second ||
    kink.flankReach <= Math.hypot(first.piece.from.x, first.piece.from.y)
  ) {
    return rest;
  }
  const from = angleOf(subtract(kink.flankPoint, kink.centre));
  return [
    { role: 'flank', piece: { ...first.piece, to: kink.flankPoint } },
    { role: 'fillet', piece: hollowArc(kink, from, kink.addendumPoint) },
    { role: 'addendum', piece: partOf(second.piece, kink.u, 1) },
  ];
}

/** From the rising tip corner to its mirror image. */
function land(side: ToothSide, rising: readonly WheelPiece[]): readonly WheelPiece[] {
  const last = rising.at(-1);
  if (side.landAngle === 0 || !last) {
    return [];
  }
  const start = angleOf(endOf(last.piece));
  return [
    {
      role: 'land',
      piece: { kind: 'arc', centre: { x: 0, y: 0 }, radius: side.outsideRadius, start, turn: -2 * start },
    },
  ];
}

/**
 * The cutter centre's path along one pitch of the outline, as lines and arcs, and where on it a loop is joined.
 *
 * In  : the form's exact outline, the distance kept from it, the way round, whether the machine has arcs.
 * Out : pieces in travel order from the tip corner of tooth 1 at which loops are joined to the same corner of the next
 *       tooth, wheel frame, mm. Turned round by whole pitches they make the loop.
 * The pieces of the exact offset stay what they are; arcs stand for the addendum's offset within the tolerance asked for.
 */
import { Bug } from '../base/bug.ts';
import { success, type Outcome } from '../base/problem.ts';
import { LINE_TIP_ERROR, SAME_POINT } from '../base/tolerances.ts';
import { reversePiece, turnPiece } from '../geometry/change-piece.ts';
import { fitAlike, type ArcFit } from '../geometry/fit-alike.ts';
import { fitLines } from '../geometry/fit-lines.ts';
import { offsetSector } from '../geometry/offset-chain.ts';
import type { ArcPiece, LinePiece, Piece } from '../geometry/piece.ts';
import { headingOn } from '../geometry/on-piece.ts';
import { cross, dot, norm } from '../geometry/point.ts';
import type { WheelForm } from '../tooth/wheel.ts';
import { overLand, roundTip, type TipPath } from './over-land.ts';

export type PathRole = 'root' | 'fillet' | 'flank' | 'addendum' | 'corner' | 'land';

export interface PathPiece {
  readonly role: PathRole;
  readonly piece: LinePiece | ArcPiece;
  /** Belongs to the tooth after this pitch's, in travel order. */
  readonly next: boolean;
}

export interface PitchPath {
  readonly distance: number;
  /** +1 counter-clockwise round the wheel. */
  readonly way: 1 | -1;
  readonly made: 'arcs' | 'lines';
  /** How far lines stray from curves, always away from the wheel. */
  readonly strays: number;
  /** The corner at which loops are joined, whole: the first piece. It stays an arc until it is cut where it is joined. */
  readonly corner: ArcPiece;
  /** What follows it, up to the next tooth's. */
  readonly rest: readonly PathPiece[];
  /** Whether a land lies before the corner (else the corner is the tooth's whole tip). */
  readonly land: boolean;
}

export interface PathRequest {
  readonly form: WheelForm;
  readonly distance: number;
  readonly way: 1 | -1;
  readonly made: 'arcs' | 'lines';
  /** How far lines may stray from curves, away from the wheel. */
  readonly strays: number;
  /** How far arcs may lie from curves, to either side: closer, and where that takes too many blocks. */
  readonly arcError: { readonly close: number; readonly most: number };
  /** 'clear': the lands are not cut (a disc turned to the tip circle). A number: one arc round the tip if it leaves no more on it. */
  readonly lands: 'cut' | 'clear' | number;
  /** Which corner of tooth 1, in travel order, begins the path; the other one where a path runs against another's way. */
  readonly begins: 'after-land' | 'before-land';
}

/** A stretch of the exact offset. */
export interface OffsetPiece {
  readonly role: PathRole;
  readonly piece: Piece;
  readonly next: boolean;
}

export function pitchPath(request: PathRequest): Outcome<PitchPath> {
  const { form, distance, way, made, strays } = request;
  const { teeth } = form.proportions;
  const outline = form.sector.map(({ piece }) => piece);
  const offset = offsetSector(outline, teeth, distance);
  if (!offset.ok) {
    return offset;
  }
  const named = offset.value.chain.map(({ piece }) => ({
    piece,
    role: roleOf(form, piece, distance),
    next: false,
  }));
  const travelled =
    way === 1 ? named : named.toReversed().map((part) => ({ ...part, piece: reversePiece(part.piece) }));
  const exact = fromCorner(mergeRoot(travelled), request);
  const { corner, rest } = overTip(exact, request);
  return success({
    distance,
    way,
    made,
    strays,
    corner,
    rest: fewest(rest, request),
    land: rest.at(-1)?.role === 'land',
  });
}

function overTip(path: TipPath, { form, way, lands }: PathRequest): TipPath {
  switch (lands) {
    case 'cut':
      return path;
    case 'clear':
      return overLand(path, form.proportions.teeth, way);
    default:
      return roundTip(path, lands);
  }
}

/** What a piece of the offset runs along, told by its kind and place. */
function roleOf(form: WheelForm, piece: Piece, distance: number): PathRole {
  if (piece.kind !== 'arc') {
    return piece.kind === 'line' ? 'flank' : 'addendum';
  }
  const centre = norm(piece.centre);
  if (centre < SAME_POINT) {
    return piece.radius < form.pitchRadius + distance ? 'root' : 'land';
  }
  if (piece.turn < 0) {
    return 'fillet';
  }
  return Math.abs(centre - form.outsideRadius) < SAME_TIP ? 'corner' : 'addendum';
}

/** Slack on the radius at which a tip corner lies. Far above the rounding of turned points, far below any curve's centre. */
const SAME_TIP = SAME_POINT * 1000;

/** The root arc is cut in two where pitches meet: the second half goes on to the middle of the next space and beyond. */
function mergeRoot(pieces: readonly OffsetPiece[]): readonly OffsetPiece[] {
  const first = pieces[0];
  const last = pieces.at(-1);
  if (first?.role !== 'root' || last?.role !== 'root' || last.piece.kind !== 'arc') {
    return pieces;
  }
  return [...pieces.slice(1, -1), { ...last, piece: { ...last.piece, turn: 2 * last.piece.turn } }];
}

/** Begins at a tip corner of tooth 1; what lies before it is the next tooth's. */
function fromCorner(pieces: readonly OffsetPiece[], { form, way, begins }: PathRequest): TipPath {
  const { teeth } = form.proportions;
  const isCorner = ({ role }: OffsetPiece): boolean => role === 'corner';
  const at = begins === 'after-land' ? pieces.findLastIndex(isCorner) : pieces.findIndex(isCorner);
  const corner = pieces[at]?.piece;
  if (corner?.kind !== 'arc') {
    throw new Bug('an outline without a tip corner');
  }
  const pitch = (way * 2 * Math.PI) / teeth;
  const before = pieces
    .slice(0, at)
    .map(({ role, piece }) => ({ role, piece: turnPiece(piece, pitch), next: true }));
  return { corner, rest: [...pieces.slice(at + 1), ...before] };
}

/** Fitted as closely as a usual number of blocks allows. */
function fewest(rest: readonly OffsetPiece[], request: PathRequest): readonly PathPiece[] {
  const { close, most } = request.arcError;
  const fitted = (error: number): readonly PathPiece[] => {
    const fit = fitAlike(error);
    return joined(rest.flatMap((part) => plainly(part, request, fit)));
  };
  const closely = fitted(close);
  return request.made === 'arcs' && most > close && closely.length > USUAL_BLOCKS ? fitted(most) : closely;
}

/** Blocks a pitch, besides the corner and the split before the root. Judgement: 16 a pitch is what slow controllers keep up with. */
const USUAL_BLOCKS = 14;

/** Lines and arcs only, or lines only. */
function plainly(part: OffsetPiece, request: PathRequest, fit: ArcFit): readonly PathPiece[] {
  const { role, piece, next } = part;
  if (request.made === 'lines') {
    return chords(piece, role, request).map((line) => ({ role, piece: line, next }));
  }
  return piece.kind === 'cycloid'
    ? fit(piece).map((arc) => ({ role, piece: arc, next }))
    : [{ role, piece, next }];
}

/** Lines in place of a piece, where the machine has no arcs; never on the wheel's side of it. */
export function chords(
  piece: Piece,
  role: PathRole,
  { way, strays }: Pick<PathRequest, 'way' | 'strays'>,
): readonly LinePiece[] {
  const most = role === 'corner' ? Math.max(strays, LINE_TIP_ERROR) : strays;
  return piece.kind === 'line' ? [piece] : fitLines([piece], most, way === 1 ? 'right' : 'left');
}

/** A line that goes on straight in the next is one line: the tangents at the ends of curves, and flanks before them. */
function joined(parts: readonly PathPiece[]): readonly PathPiece[] {
  const out: PathPiece[] = [];
  for (const part of parts) {
    const last = out.at(-1);
    if (last?.piece.kind === 'line' && part.piece.kind === 'line' && goesOn(last.piece, part.piece)) {
      const role = part.role === 'flank' ? 'flank' : last.role;
      out[out.length - 1] = { role, piece: { ...last.piece, to: part.piece.to }, next: part.next };
    } else {
      out.push(part);
    }
  }
  return out;
}

function goesOn(a: LinePiece, b: LinePiece): boolean {
  const [before, after] = [headingOn(a, 0), headingOn(b, 0)];
  return dot(before, after) > 0 && Math.abs(cross(before, after)) < SAME_HEADING;
}

/** Sine between lines that are one. Far above rounding, far below what a tolerance of a micrometre makes of a curve. */
const SAME_HEADING = SAME_POINT * 1000;

/**
 * How long a machine takes for a chain of moves, found step by step: nothing of `src/motion`, no trapezoid and no look-ahead.
 * mm, s, mm/s, mm/s2; feeds mm/min.
 *
 * Each move is cut into short steps. What is the greatest speed at each step's end is read off the path itself: its heading and its
 * curvature from places close to each other, the corner's angle from the headings on both its sides. From the far end back to the
 * start no step may be entered faster than can be braked in it; from the start on no step may be left faster than can be gained in
 * it. A step between v and w takes 2 ds / (v + w).
 * Rules: `reference/cutting.md` 3.1 to 3.3 of the contract, that is v^2 = u^2 + 2 a s; v = sqrt(a R) with R = d s / (1 - s), s the sine of half
 * the angle at the corner; v = sqrt(a R) on arcs; along a heading u the least of a_axis / |u_axis|, the same for rates.
 */
export interface Place {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface ChainMove {
  readonly kind: 'rapid' | 'line' | 'arc';
  readonly from: Place;
  readonly to: Place;
  readonly centre?: { readonly x: number; readonly y: number };
  readonly turn?: number;
  readonly feed?: number;
  readonly standsBefore?: boolean;
}

export interface ChainLimits {
  readonly acceleration: Place;
  readonly rapid: Place;
  readonly cornerAllowance: number;
  readonly blockSeconds: number;
}

/** Ends of steps, one after the other over the whole chain. */
interface Steps {
  readonly long: number[];
  readonly gain: number[];
  /** Greatest square of the speed at each end; one more than there are steps. */
  readonly most: number[];
  readonly ofMove: number[];
}

export function stepAlong(moves: readonly ChainMove[], limits: ChainLimits, stepsAMove: number): number {
  const steps = walk(moves, limits, stepsAMove);
  const { long, gain, most, ofMove } = steps;
  const square = [...most];
  for (let k = long.length - 1; k >= 0; k--) {
    square[k] = Math.min(square[k]!, square[k + 1]! + 2 * gain[k]! * long[k]!);
  }
  for (let k = 0; k < long.length; k++) {
    square[k + 1] = Math.min(square[k + 1]!, square[k]! + 2 * gain[k]! * long[k]!);
  }
  const seconds = moves.map(() => 0);
  for (let k = 0; k < long.length; k++) {
    seconds[ofMove[k]!]! += (2 * long[k]!) / (Math.sqrt(square[k]!) + Math.sqrt(square[k + 1]!));
  }
  return seconds.reduce((sum, own) => sum + (own > 0 ? Math.max(own, limits.blockSeconds) : 0), 0);
}

function walk(moves: readonly ChainMove[], limits: ChainLimits, count: number): Steps {
  const steps: Steps = { long: [], gain: [], most: [0], ofMove: [] };
  let before: { readonly move: ChainMove; readonly gain: number; readonly most: number } | undefined;
  let stood = true;
  moves.forEach((move, i) => {
    stood ||= move.standsBefore === true;
    if (distance(placeAt(move, 0), placeAt(move, 0.5)) === 0) {
      return;
    }
    const headings = headingsOf(move);
    const gain = least(headings, limits.acceleration);
    const most = speedOf(move, gain, least(headings, limits.rapid) / 60);
    const join = steps.most.length - 1;
    steps.most[join] =
      before === undefined || stood
        ? 0
        : Math.min(before.most, most, cornerOf(before.move, move, Math.min(before.gain, gain), limits)) ** 2;
    let here = placeAt(move, 0);
    for (let k = 0; k < count; k++) {
      const next = placeAt(move, shareAt((k + 1) / count));
      steps.long.push(distance(here, next));
      here = next;
      steps.gain.push(gain);
      steps.most.push(most * most);
      steps.ofMove.push(i);
    }
    before = { move, gain, most };
    stood = false;
  });
  steps.most[steps.most.length - 1] = 0;
  return steps;
}

/** Steps are short at both ends, where the speed changes most. */
function shareAt(step: number): number {
  return Math.sin((Math.PI / 2) * step) ** 2;
}

function placeAt({ kind, from, to, centre, turn }: ChainMove, share: number): Place {
  const z = from.z + share * (to.z - from.z);
  if (kind !== 'arc' || centre === undefined || turn === undefined) {
    return { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y), z };
  }
  const [c, s] = [Math.cos(share * turn), Math.sin(share * turn)];
  const [dx, dy] = [from.x - centre.x, from.y - centre.y];
  return { x: centre.x + c * dx - s * dy, y: centre.y + s * dx + c * dy, z };
}

function distance(a: Place, b: Place): number {
  return Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z);
}

/** Heading at a share of the way, from two places close to it on either side. */
function headingAt(move: ChainMove, share: number): Place {
  const [a, b] = [placeAt(move, share - CLOSE), placeAt(move, share + CLOSE)];
  const long = distance(a, b);
  return { x: (b.x - a.x) / long, y: (b.y - a.y) / long, z: (b.z - a.z) / long };
}

const CLOSE = 1e-5;

/**
 * Every heading that a move may take, each axis' share of it: of an arc those of its whole circle. A helix gives its circle no more than a
 * flat arc would: the careful reading of a rule that speaks of arcs only.
 */
function headingsOf(move: ChainMove): readonly Place[] {
  if (move.kind !== 'arc') {
    return [headingAt(move, 0.5)];
  }
  return Array.from({ length: ROUND }, (_, k) => {
    const { x, y, z } = headingAt(move, (k / ROUND) * ((2 * Math.PI) / move.turn!));
    const flat = Math.hypot(x, y);
    return { x: x / flat, y: y / flat, z };
  });
}

const ROUND = 180;

/** The greatest value of which no axis takes more than its own. */
function least(headings: readonly Place[], most: Place): number {
  let value = Infinity;
  for (const { x, y, z } of headings) {
    value = Math.min(value, most.x / Math.abs(x), most.y / Math.abs(y), most.z / Math.abs(z));
  }
  return value;
}

function speedOf(move: ChainMove, gain: number, rate: number): number {
  const asked = move.kind === 'rapid' ? rate : Math.min((move.feed ?? 0) / 60, rate);
  return move.kind === 'arc' ? Math.min(asked, Math.sqrt(gain * radiusOf(move))) : asked;
}

/** Of the circle through three places of the path, seen from above. */
function radiusOf(move: ChainMove): number {
  const turn = move.turn!;
  const [a, b, c] = [0, 0.5 / turn, 1 / turn].map((share) => ({ ...placeAt(move, share), z: 0 })) as [
    Place,
    Place,
    Place,
  ];
  const area = Math.abs((b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)) / 2;
  return (distance(a, b) * distance(b, c) * distance(c, a)) / (4 * area);
}

function cornerOf(
  before: ChainMove,
  after: ChainMove,
  gain: number,
  { cornerAllowance }: ChainLimits,
): number {
  const u = headingAt(before, 1);
  const w = headingAt(after, 0);
  const turned = Math.acos(Math.max(-1, Math.min(1, u.x * w.x + u.y * w.y + u.z * w.z)));
  const sine = Math.sin((Math.PI - turned) / 2);
  return sine >= 1 ? Infinity : Math.sqrt((gain * cornerAllowance * sine) / (1 - sine));
}

/**
 * The roll parameter at which a cycloid span, or a parallel of it, is nearest to a point.
 *
 * With p in the curve's own frame let f(t) = p . e^(ih) - R cos kt and d(t) = p . n - (R + 2r) sin kt - offset be the place
 * of p along and across the heading, seen from P(t) (k = R/2r, h = (1 + k) t; the contact point lies on every normal).
 * The distance squared is f^2 + d^2, its derivative -2 rate f; and f' = -(rate + (1 + k) d) = -G, d' = (1 + k) f.
 * Where G keeps its sign f has one root at most. Spans where that can't be shown are halved; spans that lie too far off
 * for the best found so far are left out. Ends and cusps (rate 0) are candidates too.
 */
import { cycloidCusps } from './cycloid.ts';
import type { CycloidPiece } from './piece.ts';
import type { Point } from './point.ts';

/** The curve's constants and the point in its own frame. */
interface Question {
  readonly R: number;
  readonly k: number;
  readonly bend: number;
  readonly swing: number;
  readonly offset: number;
  readonly chord: number;
  readonly px: number;
  readonly py: number;
}

/** What is known at one t. */
interface Look {
  readonly t: number;
  readonly f: number;
  readonly d: number;
  readonly rate: number;
  readonly square: number;
}

/** Halvings: past them the span is too short for the choice within it to matter (a 4096th, squared). */
const DEPTH = 12;

export function nearestRoll(piece: CycloidPiece, point: Point): number {
  const question = ask(piece, point);
  const first = look(question, Math.min(piece.from, piece.to));
  const last = look(question, Math.max(piece.from, piece.to));
  let best = first.square <= last.square ? first : last;
  if (first.rate * last.rate < 0 || hasVertex(question, first.t, last.t)) {
    for (const t of cycloidCusps(piece)) {
      best = nearer(best, look(question, t));
    }
  }
  return search(question, first, last, best, DEPTH).t;
}

function ask(piece: CycloidPiece, point: Point): Question {
  const { fixed: R, rolling: r, offset, cusp, sense } = piece;
  const c = Math.cos(cusp);
  const s = Math.sin(cusp);
  const k = R / (2 * r);
  return {
    R,
    k,
    bend: 1 + k,
    swing: 2 * (R + r),
    offset,
    chord: R + 2 * r,
    px: point.x * c + point.y * s,
    py: sense * (point.y * c - point.x * s),
  };
}

function look(q: Question, t: number): Look {
  const ch = Math.cos(q.bend * t);
  const sh = Math.sin(q.bend * t);
  const sk = Math.sin(q.k * t);
  const f = q.px * ch + q.py * sh - q.R * Math.cos(q.k * t);
  const d = q.px * sh - q.py * ch - q.chord * sk - q.offset;
  return { t, f, d, rate: q.swing * sk + q.offset * q.bend, square: f * f + d * d };
}

function nearer(a: Look, b: Look): Look {
  return b.square < a.square ? b : a;
}

/** Whether the rate has a greatest or least value inside. */
function hasVertex(q: Question, a: number, b: number): boolean {
  return Math.floor((q.k * a) / Math.PI + 0.5) !== Math.floor((q.k * b) / Math.PI + 0.5);
}

function search(q: Question, a: Look, b: Look, best: Look, depth: number): Look {
  const half = (b.t - a.t) / 2;
  const wild = hasVertex(q, a.t, b.t);
  const top = Math.abs(q.swing) + Math.abs(q.offset * q.bend);
  const speed = wild ? top : Math.max(Math.abs(a.rate), Math.abs(b.rate));
  const far = Math.sqrt(Math.max(a.square, b.square)) + speed * half;
  const near = (Math.sqrt(a.square) + Math.sqrt(b.square)) / 2 - speed * half;
  if (near > 0 && near * near > best.square) {
    return best;
  }
  if (depth === 0 || !mayTurn(q, a, b, wild ? top : 0, far)) {
    return a.f > 0 === b.f > 0 ? nearer(nearer(best, a), b) : nearer(best, solve(q, a, b));
  }
  const middle = look(q, a.t + half);
  const found = search(q, a, middle, nearer(best, middle), depth - 1);
  return search(q, middle, b, found, depth - 1);
}

/** Whether G can change its sign: d moves by at most |1 + k| |f|, and |f| is at most the distance. */
function mayTurn(q: Question, a: Look, b: Look, slack: number, far: number): boolean {
  const half = (b.t - a.t) / 2;
  const drift = q.bend * q.bend * far * half + 2 * slack;
  const lowest = Math.min(a.rate, b.rate) + Math.min(q.bend * a.d, q.bend * b.d) - drift;
  const highest = Math.max(a.rate, b.rate) + Math.max(q.bend * a.d, q.bend * b.d) + drift;
  return lowest <= 0 && highest >= 0;
}

/** Newton within a bracket that shrinks. */
function solve(q: Question, a: Look, b: Look): Look {
  let low = a.t;
  let high = b.t;
  let at = look(q, low + ((high - low) * a.f) / (a.f - b.f || 1));
  for (let step = 0; step < 60 && at.f !== 0; step++) {
    if (at.f > 0 === a.f > 0) {
      low = at.t;
    } else {
      high = at.t;
    }
    const slope = -(at.rate + q.bend * at.d);
    const newton = at.t - at.f / slope;
    const t = newton > low && newton < high ? newton : (low + high) / 2;
    if (t === at.t || Math.abs(t - at.t) <= 4 * Number.EPSILON * Math.abs(t)) {
      break;
    }
    at = look(q, t);
  }
  return at;
}

/**
 * Meetings of two pieces of any kind, by halving both until they either lie apart, or cross at a clear angle (the
 * headings differ by more than both spans turn, so they meet once at most) and Newton's method can finish.
 * Spans that stay near and parallel until they are as good as straight count where they come within SAME_POINT. mm.
 */
import { SAME_POINT } from '../base/tolerances.ts';
import { cycloidRate, cycloidVertices } from './cycloid.ts';
import { pointOn, rollAt, turnOf, velocityOn } from './on-piece.ts';
import type { Piece } from './piece.ts';
import { cross, distance, dot, subtract } from './point.ts';

interface Span {
  readonly piece: Piece;
  readonly from: number;
  readonly to: number;
}

interface Meeting {
  readonly u: number;
  readonly v: number;
}

/** Spans looked at before two pieces are taken to lie on one another, where only their ends are meetings. */
const MOST_SPANS = 5000;

/** Both together; far more than it takes to make any span flat. */
const DEPTH = 60;

/** Sag under which a span is as good as straight. */
const FLAT = SAME_POINT / 10;

export function meetByHalving(a: Piece, b: Piece): Meeting[] {
  const search: Search = { found: [], spans: 0 };
  halve({ piece: a, from: 0, to: 1 }, { piece: b, from: 0, to: 1 }, DEPTH, search);
  return search.spans < MOST_SPANS ? search.found : [];
}

interface Search {
  readonly found: Meeting[];
  spans: number;
}

function halve(a: Span, b: Span, depth: number, search: Search): void {
  search.spans++;
  const halfA = greatestSpeed(a) * (a.to - a.from) * 0.5;
  const halfB = greatestSpeed(b) * (b.to - b.from) * 0.5;
  const between = distance(pointOn(a.piece, middle(a)), pointOn(b.piece, middle(b)));
  if (between > halfA + halfB + SAME_POINT || search.spans >= MOST_SPANS) {
    return;
  }
  if (clearAngle(a, b)) {
    const meeting = newton(a, b);
    if (meeting !== undefined) {
      search.found.push(meeting);
    }
    return;
  }
  const sag = (halfA * turnOf(a.piece) * (a.to - a.from) + halfB * turnOf(b.piece) * (b.to - b.from)) / 4;
  if (depth === 0 || sag < FLAT) {
    const touch = newton(a, b);
    const near = 8 * (halfA + halfB);
    const known = touch && search.found.at(-1);
    if (touch && !(known && distance(pointOn(a.piece, known.u), pointOn(a.piece, touch.u)) < near)) {
      search.found.push(touch);
    }
    return;
  }
  if (halfA >= halfB) {
    halve({ ...a, to: middle(a) }, b, depth - 1, search);
    halve({ ...a, from: middle(a) }, b, depth - 1, search);
  } else {
    halve(a, { ...b, to: middle(b) }, depth - 1, search);
    halve(a, { ...b, from: middle(b) }, depth - 1, search);
  }
}

function middle(span: Span): number {
  return (span.from + span.to) / 2;
}

/** No less than |dP/du| anywhere on the span. */
function greatestSpeed({ piece, from, to }: Span): number {
  if (piece.kind !== 'cycloid') {
    const speed = velocityOn(piece, from);
    return Math.hypot(speed.x, speed.y);
  }
  const part = { ...piece, from: rollAt(piece, from), to: rollAt(piece, to) };
  const ends = [part.from, ...cycloidVertices(part), part.to].map((t) => Math.abs(cycloidRate(piece, t)));
  return Math.max(...ends) * Math.abs(piece.to - piece.from);
}

/** The lines along both spans differ in direction by more than the two spans turn. */
function clearAngle(a: Span, b: Span): boolean {
  const turns = (turnOf(a.piece) * (a.to - a.from) + turnOf(b.piece) * (b.to - b.from)) / 2;
  if (turns > Math.PI / 4) {
    return false;
  }
  const p = velocityOn(a.piece, middle(a));
  const q = velocityOn(b.piece, middle(b));
  return Math.atan2(Math.abs(cross(p, q)), Math.abs(dot(p, q))) > turns * 1.01 && cross(p, q) !== 0;
}

function newton(a: Span, b: Span): Meeting | undefined {
  let u = middle(a);
  let v = middle(b);
  for (let step = 0; step < 40; step++) {
    const gap = subtract(pointOn(b.piece, v), pointOn(a.piece, u));
    const p = velocityOn(a.piece, u);
    const q = velocityOn(b.piece, v);
    const turn = cross(p, q);
    if (turn === 0) {
      break;
    }
    const nextU = clamp(u + cross(gap, q) / turn, a);
    const nextV = clamp(v + cross(gap, p) / turn, b);
    const still = Math.abs(nextU - u) <= 2 * Number.EPSILON && Math.abs(nextV - v) <= 2 * Number.EPSILON;
    u = nextU;
    v = nextV;
    if (still) {
      break;
    }
  }
  return distance(pointOn(a.piece, u), pointOn(b.piece, v)) <= SAME_POINT ? { u, v } : undefined;
}

function clamp(x: number, span: Span): number {
  return Math.min(Math.max(x, span.from), span.to);
}

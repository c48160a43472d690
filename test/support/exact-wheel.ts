/**
 * A wheel form built by hand from its definition, so that the prover's tests lean on nothing but the exact pieces:
 * radial flanks, addendum rolled by half the mate's pitch circle, tooth = half the pitch, and a fillet that touches root circle
 * and flank where one is asked for.
 */
import { mirrorPiece, reversePiece } from '../../src/geometry/change-piece.ts';
import { cycloidPoint } from '../../src/geometry/cycloid.ts';
import type { CycloidPiece, Piece } from '../../src/geometry/piece.ts';
import { angleOf, norm, ORIGIN, polar } from '../../src/geometry/point.ts';
import type { WheelForm, WheelPiece } from '../../src/tooth/wheel.ts';

export function exactWheel(teeth: number, module: number, leaves: number, fillet = 0): WheelForm {
  const pitchRadius = (module * teeth) / 2;
  const generatingRadius = (module * leaves) / 4;
  const dedendum = 1.5708 * module;
  const rootRadius = pitchRadius - dedendum;
  const beta = Math.PI / (2 * teeth);
  const whole: CycloidPiece = {
    kind: 'cycloid',
    fixed: pitchRadius,
    rolling: generatingRadius,
    cusp: -beta,
    sense: 1,
    offset: 0,
    from: 0,
    to: 1,
  };
  const pointed = solve(0, 1, (t) => angleOf(cycloidPoint(whole, t)) < 0);
  const pointedAddendum = norm(cycloidPoint(whole, pointed)) - pitchRadius;
  const addendum = 0.95 * pointedAddendum;
  const outsideRadius = pitchRadius + addendum;
  const to = solve(0, pointed, (t) => norm(cycloidPoint(whole, t)) < outsideRadius);
  const face: CycloidPiece = { ...whole, to };
  const tip = angleOf(cycloidPoint(whole, to));
  const arc = (radius: number, start: number, turn: number): Piece => ({
    kind: 'arc',
    centre: ORIGIN,
    radius,
    start,
    turn,
  });
  // The fillet's centre stands off the root circle and the flank by its radius.
  const aside = Math.asin(fillet / (rootRadius + fillet));
  const foot = (rootRadius + fillet) * Math.cos(aside);
  const round: Piece = {
    kind: 'arc',
    centre: polar(rootRadius + fillet, -beta - aside),
    radius: fillet,
    start: Math.PI - beta - aside,
    turn: aside - Math.PI / 2,
  };
  const flank: Piece = { kind: 'line', from: polar(foot, -beta), to: polar(pitchRadius, -beta) };
  const half = Math.PI / teeth;
  const mirrored = (piece: Piece): Piece => reversePiece(mirrorPiece(piece));
  const sector: WheelPiece[] = [
    { role: 'root', piece: arc(rootRadius, -half, half - beta - aside) },
    ...(fillet > 0 ? [{ role: 'fillet', piece: round } as const] : []),
    { role: 'flank', piece: flank },
    { role: 'addendum', piece: face },
    { role: 'land', piece: arc(outsideRadius, tip, -2 * tip) },
    { role: 'addendum', piece: mirrored(face) },
    { role: 'flank', piece: mirrored(flank) },
    ...(fillet > 0 ? [{ role: 'fillet', piece: mirrored(round) } as const] : []),
    { role: 'root', piece: arc(rootRadius, beta + aside, half - beta - aside) },
  ];
  return {
    proportions: {
      teeth,
      module,
      mate: { kind: 'pinion', leaves, leaf: 1.05, tip: 'third-ogive', dedendum: 1.87 },
      centres: (module * (teeth + leaves)) / 2,
      addendumForm: 'epicycloid',
      height: 0.95,
      tooth: 0.5,
      dedendum: 1.5708,
      rootFillet: fillet,
    },
    pitchRadius,
    outsideRadius,
    rootRadius,
    addendum,
    dedendum,
    pointedAddendum,
    toothThickness: (Math.PI * module) / 2,
    generatingRadius,
    workingRadius: pitchRadius,
    sector,
  };
}

/** Where a condition that holds at `low` stops holding. */
function solve(low: number, high: number, holds: (t: number) => boolean): number {
  let [a, b] = [low, high];
  for (let k = 0; k < 80; k++) {
    const t = (a + b) / 2;
    [a, b] = holds(t) ? [t, b] : [a, t];
  }
  return (a + b) / 2;
}

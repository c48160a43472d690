/** Outlines to try the offsets on, made of nothing but exact pieces. mm, radians. */
import { mirrorChain } from '../../src/geometry/change-piece.ts';
import { contactPoint, cycloidPoint } from '../../src/geometry/cycloid.ts';
import type { Chain, CycloidPiece } from '../../src/geometry/piece.ts';
import { angleOf, norm, polar } from '../../src/geometry/point.ts';
import { findRoot } from '../../src/geometry/roots.ts';

export interface ToothShape {
  readonly teeth: number;
  readonly module: number;
  readonly leaves: number;
  /** Share of the pointed height that is kept. */
  readonly height: number;
  /** Tooth thickness over circular pitch. */
  readonly tooth: number;
  /** In modules. */
  readonly dedendum: number;
}

export const THIRD_WHEEL: ToothShape = {
  teeth: 60,
  module: 0.5,
  leaves: 8,
  height: 0.95,
  tooth: 0.5,
  dedendum: Math.PI / 2,
};

/** One pitch, counter-clockwise, tooth on +X: root arc, radial flank, epicycloid, land, and the same mirrored. */
export function toothSector(shape: ToothShape): Chain {
  const { teeth, module, leaves, height, tooth, dedendum } = shape;
  const fixed = (module * teeth) / 2;
  const rolling = (module * leaves) / 4;
  const half = (tooth * Math.PI) / teeth;
  const base = { kind: 'cycloid', fixed, rolling, cusp: -half, sense: 1, offset: 0, from: 0 } as const;
  const end = (Math.PI * rolling) / fixed;
  const seen = (t: number): number => angleOf(cycloidPoint({ ...base, to: end }, t));
  const pointed = findRoot(seen, 1e-9, end);
  const addendum = norm(cycloidPoint({ ...base, to: end }, pointed)) - fixed;
  const outside = fixed + height * addendum;
  const to =
    height < 1 ? findRoot((t) => norm(cycloidPoint({ ...base, to: end }, t)) - outside, 0, pointed) : pointed;
  const flankTop = contactPoint({ ...base, to }, 0);
  const addendumPiece: CycloidPiece = { ...base, to };
  const landStart = angleOf(cycloidPoint(addendumPiece, to));
  const root = fixed - dedendum * module;
  const side: Chain = [
    {
      kind: 'arc',
      centre: { x: 0, y: 0 },
      radius: root,
      start: -Math.PI / teeth,
      turn: Math.PI / teeth - half,
    },
    { kind: 'line', from: polar(root, -half), to: flankTop },
    addendumPiece,
  ];
  const land: Chain =
    height < 1
      ? [{ kind: 'arc', centre: { x: 0, y: 0 }, radius: outside, start: landStart, turn: -2 * landStart }]
      : [];
  return [...side, ...land, ...mirrorChain(side)];
}

/**
 * How far a cutter bends and how close it is to breaking. mm, N, N/mm2.
 *
 * A cantilever of three sections from the tip: the fluted length, as stiff as a rod of 0.8 D (Kops and Vo, CIRP Annals
 * 1990); the neck up to the reach, solid of diameter D; a cone of 15 degrees half angle to the shank; the shank up to the collet.
 * Bending: delta = F/E times the integral of x^2/I from the load to the collet, in closed form for rods and cone. Stress at a
 * section: 32 M / (pi d^3).
 * E 590 kN/mm2 for 10 % Co carbide (rule of mixtures on Humphry-Baker and Smith, Phil. Trans. A 377, 20170443); breaking
 * stress 3 kN/mm2 and 0.7 D as the section that carries it between the flutes are judgement between published figures.
 */
import type { Cutter } from './setup.ts';

export const YOUNG = 590_000;
export const BREAKING_STRESS = 3000;
const FLUTE_STIFF = 0.8;
const FLUTE_STRONG = 0.7;
const CONE = (15 * Math.PI) / 180;

export interface Section {
  /** Distances from the tip. */
  readonly from: number;
  readonly to: number;
  /** Diameter that counts for stiffness at either end. */
  readonly stiffFrom: number;
  readonly stiffTo: number;
  /** Diameter that counts for stress at its far end. */
  readonly strongTo: number;
}

/** The sections of a cutter, tip to collet. */
export function sectionsOf(cutter: Cutter): readonly Section[] {
  const { nominal: d, flute, shank } = cutter;
  const reach = Math.min(Math.max(cutter.reach, flute), cutter.stickOut);
  const fluteEnd = Math.min(flute, reach);
  const sections: Section[] = [cylinder(0, fluteEnd, FLUTE_STIFF * d, FLUTE_STRONG * d)];
  if (reach > fluteEnd) {
    sections.push(cylinder(fluteEnd, reach, d, FLUTE_STRONG * d));
  }
  const coneLength = Math.min(Math.max((shank - d) / 2 / Math.tan(CONE), 0), cutter.stickOut - reach);
  if (coneLength > 0) {
    const top = d + 2 * coneLength * Math.tan(CONE);
    sections.push({ from: reach, to: reach + coneLength, stiffFrom: d, stiffTo: top, strongTo: top });
  }
  if (cutter.stickOut > reach + coneLength) {
    sections.push(cylinder(reach + coneLength, cutter.stickOut, shank, shank));
  }
  return sections;
}

function cylinder(from: number, to: number, stiff: number, strong: number): Section {
  return { from, to, stiffFrom: stiff, stiffTo: stiff, strongTo: strong };
}

/** Bending at the load, mm a newton, for a load at `at` from the tip. */
export function compliance(cutter: Cutter, at: number): number {
  return sectionsOf(cutter).reduce((sum, section) => sum + sectionCompliance(section, at), 0);
}

function sectionCompliance(section: Section, at: number): number {
  const x1 = Math.max(section.from - at, 0);
  const x2 = Math.max(section.to - at, 0);
  if (x2 <= x1) {
    return 0;
  }
  const slope = (section.stiffTo - section.stiffFrom) / (section.to - section.from);
  const d1 = section.stiffTo - slope * (x2 - x1);
  if (slope === 0) {
    return (x2 ** 3 - x1 ** 3) / (3 * YOUNG * ((Math.PI * d1 ** 4) / 64));
  }
  // With d = k x + ..., the integral of x^2 / I over a cone: 64 / (pi E k) [G(d2) - G(d1)], found by substituting d for x.
  const c = x1 - d1 / slope;
  const g = (d: number): number => -1 / (slope ** 2 * d) - c / (slope * d ** 2) - c ** 2 / (3 * d ** 3);
  return (64 / (Math.PI * YOUNG * slope)) * (g(section.stiffTo) - g(d1));
}

/** Force (N) at `at` from the tip at which the weakest section reaches the breaking stress. */
export function breakingForce(cutter: Cutter, at: number): number {
  return BREAKING_STRESS / stressPerNewton(cutter, at);
}

function stressPerNewton(cutter: Cutter, at: number): number {
  return Math.max(
    ...sectionsOf(cutter).map(
      (section) => (32 * Math.max(section.to - at, 0)) / (Math.PI * section.strongTo ** 3),
    ),
  );
}

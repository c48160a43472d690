/**
 * How deep: the cutter against the plate under the blank and the skin that is to stay, its shank (where it is wider than what it cuts) against the
 * walls beside it, and the collet nut against the blank's top.
 */
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { isCleared, isInBlank } from './metal-cover.ts';
import type { SolidMove } from './metal-paths.ts';
import type { Finding } from './proof.ts';

export function checkDepth(evidence: Evidence): Finding[] {
  const { setup } = evidence.input;
  const { solids, lastDigit } = evidence;
  const deepest = solids.reduce<SolidMove | undefined>(
    (low, solid) => (low === undefined || lowOf(solid) < lowOf(low) ? solid : low),
    undefined,
  );
  if (deepest === undefined) {
    return [];
  }
  const z = lowOf(deepest);
  const floor = setup.plateZ - setup.intoPlate;
  const skinZ = setup.plateZ + setup.skin;
  const wide = solids.findIndex((_, i) => shankRubs(evidence, i));
  return [
    ...(z < floor - lastDigit ? [tooDeep(deepest, z, floor)] : []),
    ...(setup.skin > 0 && z < skinZ - lastDigit ? [throughSkin(deepest, z, skinZ)] : []),
    ...(wide < 0 ? [] : [shank(evidence, wide)]),
    ...nutRubs(evidence),
  ];
}

function lowOf(solid: SolidMove): number {
  return Math.min(solid.z0, solid.z1);
}

function tooDeep(solid: SolidMove, z: number, floor: number): Finding {
  return findingAt(solid.move, {
    code: 'prove.plate',
    message: `the cutter goes down to Z ${lengthText(z)}; the plate may be cut to Z ${lengthText(floor)}`,
    hint: 'Check Z of this block, or allow more under the wheel (cuts: below).',
    x: solid.x1,
    y: solid.y1,
  });
}

function throughSkin(solid: SolidMove, z: number, skinZ: number): Finding {
  return findingAt(solid.move, {
    code: 'prove.skin',
    message: `the cutter goes down to Z ${lengthText(z)}, through the skin that holds the wheel and reaches up to Z ${lengthText(skinZ)}`,
    hint: 'Stop every cut above the skin.',
    x: solid.x1,
    y: solid.y1,
  });
}

/** Whether the shank would touch metal that nothing has cut: asked only where it dips under the top of the blank. */
function shankRubs({ input, solids, paths, lastDigit, cutterOf }: Evidence, i: number): boolean {
  const { setup } = input;
  const solid = solids[i]!;
  const cutter = cutterOf(solid.move);
  if (cutter === undefined || cutter.shank <= cutter.diameter) {
    return false;
  }
  const z = lowOf(solid) + cutter.reach;
  if (z >= setup.topZ - lastDigit) {
    return false;
  }
  const stands = { x: solid.x1, y: solid.y1, z, radius: cutter.shank / 2 };
  return !isCleared(paths, solids.length, setup, stands, lastDigit);
}

function shank({ input, solids, cutterOf }: Evidence, i: number): Finding {
  const solid = solids[i]!;
  const cutter = cutterOf(solid.move)!;
  const { topZ } = input.setup;
  return findingAt(solid.move, {
    code: 'prove.shank',
    message:
      `cutter ${String(cutter.number)} works ${lengthText(topZ - lowOf(solid))} below the top; its reach is ` +
      `${lengthText(cutter.reach)}, and its shank (${lengthText(cutter.shank)}) rubs on the walls above`,
    hint: 'Use a cutter that reaches deeper, or one whose shank is no wider than what it cuts.',
    x: solid.x1,
    y: solid.y1,
  });
}

function nutRubs({ input, solids, cutterOf, lastDigit }: Evidence): Finding[] {
  const { setup, machine } = input;
  const radius = machine.limits.nut.diameter / 2;
  const solid = solids.find((each) => {
    const cutter = cutterOf(each.move);
    return (
      cutter !== undefined &&
      lowOf(each) + cutter.stickOut < setup.topZ - lastDigit &&
      nearBlank(setup, each, radius)
    );
  });
  if (solid === undefined) {
    return [];
  }
  const cutter = cutterOf(solid.move)!;
  return [
    findingAt(solid.move, {
      code: 'prove.nut',
      message: `the collet nut comes down to Z ${lengthText(lowOf(solid) + cutter.stickOut)}, below the top of the blank at Z ${lengthText(setup.topZ)}`,
      hint: `Let cutter ${String(cutter.number)} stick out further than ${lengthText(cutter.stickOut)}.`,
      x: solid.x1,
      y: solid.y1,
    }),
  ];
}

/** Whether any of eight points of the nut's rim, or its middle, stands over the blank. */
function nearBlank(setup: Evidence['input']['setup'], solid: SolidMove, radius: number): boolean {
  return Array.from({ length: 9 }, (_, k) => (k === 8 ? 0 : radius)).some((rho, k) =>
    isInBlank(
      setup,
      solid.x1 + rho * Math.cos((k * Math.PI) / 4),
      solid.y1 + rho * Math.sin((k * Math.PI) / 4),
    ),
  );
}

/**
 * How deep: the cutter against the plate under the blank and the skin that is to stay, its shank (where it is wider than what it cuts) against the
 * walls beside it, and the collet nut against the blank's top.
 */
import type { Cutter } from '../cutting/setup.ts';
import type { Evidence } from './evidence.ts';
import { findingAt, lengthText } from './finding-at.ts';
import { isCleared, isInBlank } from './metal-cover.ts';
import { lowOf } from './metal-solids.ts';
import type { Finding } from './proof.ts';

export function checkDepth(evidence: Evidence): Finding[] {
  const { input, solids, lastDigit } = evidence;
  const { setup } = input;
  if (solids.count === 0) {
    return [];
  }
  let deepest = 0;
  let wide = -1;
  let rubs = -1;
  let deep = Infinity;
  // Nothing but a cutter's tip comes below the top while it cuts no deeper than this.
  const harmless = setup.topZ - lastDigit - Math.min(...setup.cutters.map(shortest));
  for (let i = 0; i < solids.count; i++) {
    const low = lowOf(solids, i);
    if (low < deep) {
      deep = low;
      deepest = i;
    }
    if (low < harmless) {
      wide = wide < 0 && shankRubs(evidence, i, low) ? i : wide;
      rubs = rubs < 0 && nutRubs(evidence, i, low) ? i : rubs;
    }
  }
  const z = lowOf(solids, deepest);
  const floor = setup.plateZ - setup.intoPlate;
  const skinZ = setup.plateZ + setup.skin;
  return [
    ...(z < floor - lastDigit ? [tooDeep(evidence, deepest, floor)] : []),
    ...(setup.skin > 0 && z < skinZ - lastDigit ? [throughSkin(evidence, deepest, skinZ)] : []),
    ...(wide < 0 ? [] : [shank(evidence, wide)]),
    ...(rubs < 0 ? [] : [nut(evidence, rubs)]),
  ];
}

/** How far above its tip a cutter first gets wider than what it cuts. */
function shortest(cutter: Cutter): number {
  return cutter.shank > cutter.diameter ? Math.min(cutter.reach, cutter.stickOut) : cutter.stickOut;
}

/** Where move i ends. */
function endOf({ solids }: Evidence, i: number): { readonly x: number; readonly y: number } {
  return { x: solids.x1[i]!, y: solids.y1[i]! };
}

function tooDeep(evidence: Evidence, i: number, floor: number): Finding {
  const { solids } = evidence;
  return findingAt(solids.moves[i], {
    code: 'prove.plate',
    message: `the cutter goes down to Z ${lengthText(lowOf(solids, i))}; the plate may be cut to Z ${lengthText(floor)}`,
    hint: 'Check Z of this block, or allow more under the wheel (cuts: below).',
    ...endOf(evidence, i),
  });
}

function throughSkin(evidence: Evidence, i: number, skinZ: number): Finding {
  const { solids } = evidence;
  return findingAt(solids.moves[i], {
    code: 'prove.skin',
    message: `the cutter goes down to Z ${lengthText(lowOf(solids, i))}, through the skin that holds the wheel and reaches up to Z ${lengthText(skinZ)}`,
    hint: 'Stop every cut above the skin.',
    ...endOf(evidence, i),
  });
}

/** Whether the shank would touch metal that nothing has cut: asked only where it dips under the top of the blank. */
function shankRubs(evidence: Evidence, i: number, low: number): boolean {
  const { input, solids, lastDigit } = evidence;
  const { setup } = input;
  const cutter = evidence.cutterOf(solids.moves[i]!);
  if (cutter === undefined || cutter.shank <= cutter.diameter) {
    return false;
  }
  const z = low + cutter.reach;
  if (z >= setup.topZ - lastDigit) {
    return false;
  }
  const stands = { ...endOf(evidence, i), z, radius: cutter.shank / 2 };
  return !isCleared(evidence, solids.count, setup, stands, lastDigit);
}

function shank(evidence: Evidence, i: number): Finding {
  const { input, solids } = evidence;
  const cutter = evidence.cutterOf(solids.moves[i]!)!;
  const { topZ } = input.setup;
  return findingAt(solids.moves[i], {
    code: 'prove.shank',
    message:
      `cutter ${String(cutter.number)} works ${lengthText(topZ - lowOf(solids, i))} below the top; its reach is ` +
      `${lengthText(cutter.reach)}, and its shank (${lengthText(cutter.shank)}) rubs on the walls above`,
    hint: 'Use a cutter that reaches deeper, or one whose shank is no wider than what it cuts.',
    ...endOf(evidence, i),
  });
}

function nutRubs(evidence: Evidence, i: number, low: number): boolean {
  const { input, solids, lastDigit } = evidence;
  const { setup, machine } = input;
  const cutter = evidence.cutterOf(solids.moves[i]!);
  return (
    cutter !== undefined &&
    low + cutter.stickOut < setup.topZ - lastDigit &&
    nearBlank(setup, solids.x1[i]!, solids.y1[i]!, machine.limits.nut.diameter / 2)
  );
}

function nut(evidence: Evidence, i: number): Finding {
  const { input, solids } = evidence;
  const cutter = evidence.cutterOf(solids.moves[i]!)!;
  return findingAt(solids.moves[i], {
    code: 'prove.nut',
    message: `the collet nut comes down to Z ${lengthText(lowOf(solids, i) + cutter.stickOut)}, below the top of the blank at Z ${lengthText(input.setup.topZ)}`,
    hint: `Let cutter ${String(cutter.number)} stick out further than ${lengthText(cutter.stickOut)}.`,
    ...endOf(evidence, i),
  });
}

/** Whether any of eight points of the nut's rim, or its middle, stands over the blank. */
function nearBlank(setup: Evidence['input']['setup'], x: number, y: number, radius: number): boolean {
  return Array.from({ length: 9 }, (_, k) => (k === 8 ? 0 : radius)).some((rho, k) =>
    isInBlank(setup, x + rho * Math.cos((k * Math.PI) / 4), y + rho * Math.sin((k * Math.PI) / 4)),
  );
}

/**
 * G93: F says how often a minute the move would fit, so that it takes 1/F minutes (NISTIR 6556 §3.5.19). Every cutting move
 * needs its own F; on any other line F is passed over. Out: the feed along the move, mm/min.
 */
import { BIT, has, valueOf, type Block } from './block.ts';
import type { Here } from './modes.ts';
import { unread, type Refusal, type Run } from './trace-run.ts';

export function inverseRefused(run: Run, block: Block): Refusal | undefined {
  return run.modes.feedMode === 'inverse-time' && !has(block, BIT.F)
    ? unread('a cutting move under G93 without its own F')
    : undefined;
}

/** The feed that is on, or under G93 the one that this move's time asks for. */
export function feedAlong(
  run: Run,
  block: Block,
  to: Here,
  arc?: { readonly centre: { readonly x: number; readonly y: number }; readonly turn: number },
): number | Refusal | null {
  const { here, modes } = run;
  if (modes.feedMode !== 'inverse-time') {
    return modes.feed ?? null;
  }
  if ([here.x, here.y, here.z, to.x, to.y, to.z].includes(null)) {
    return unread('a move under G93 from or to a place that is not known: its feed is not known either');
  }
  const [x, y, z] = [to.x! - here.x!, to.y! - here.y!, to.z! - here.z!];
  const across =
    arc === undefined
      ? Math.hypot(x, y)
      : Math.abs(arc.turn) * Math.hypot(to.x! - arc.centre.x, to.y! - arc.centre.y);
  const feed = Math.hypot(across, z) * valueOf(block, 'F');
  return feed > 0 && Number.isFinite(feed)
    ? feed
    : unread('a move of no length under G93, which takes its time');
}

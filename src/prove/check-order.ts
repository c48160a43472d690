/**
 * Holding and order. Something must hold the wheel when it is cut free; bore before teeth and crossings; where glue, tape or skin hold,
 * crossings after the teeth, so that the rim is stiff while it is cut.
 */
import { whatIsCut, type CutPlace } from './what-is-cut.ts';
import type { Evidence } from './evidence.ts';
import { findingAt } from './finding-at.ts';
import type { Finding } from './proof.ts';
import type { TracedMove } from '../motion/traced-move.ts';

export function checkOrder(evidence: Evidence): Finding[] {
  const { target, setup } = evidence.input;
  if (target === undefined) {
    return [];
  }
  const cuts = firstAndLast(evidence);
  const holds = setup.holding.filter((holding) => holding !== 'screw');
  // An arbor or a screw holds in the middle: there the stiffness of the rim decides, and either order may be right.
  const heldInTheMiddle = setup.holding.includes('arbor') || setup.holding.includes('screw');
  const bore = cuts.get('bore');
  const teeth = cuts.get('teeth');
  const crossing = cuts.get('crossing');
  return [
    ...(teeth !== undefined && holds.length === 0 ? [notHeld(teeth.first)] : []),
    ...(bore !== undefined && teeth !== undefined && teeth.at < bore.end
      ? [late(bore.last, teeth.first, 'bore', 'teeth', 'error')]
      : []),
    ...(bore !== undefined && crossing !== undefined && crossing.at < bore.end
      ? [late(bore.last, crossing.first, 'bore', 'crossings', 'error')]
      : []),
    ...(teeth !== undefined && crossing !== undefined && crossing.at < teeth.end && !heldInTheMiddle
      ? [late(teeth.last, crossing.first, 'teeth', 'crossings', 'warning')]
      : []),
  ];
}

interface Span {
  readonly at: number;
  readonly first: TracedMove;
  end: number;
  last: TracedMove;
}

function firstAndLast(evidence: Evidence): Map<CutPlace, Span> {
  const spans = new Map<CutPlace, Span>();
  const judge = whatIsCut(evidence);
  const { count, moves } = evidence.solids;
  for (let i = 0; i < count; i++) {
    const place = judge(i);
    if (place === undefined) {
      continue;
    }
    const span = spans.get(place);
    if (span === undefined) {
      spans.set(place, { at: i, first: moves[i]!, end: i, last: moves[i]! });
    } else {
      span.end = i;
      span.last = moves[i]!;
    }
  }
  return spans;
}

function notHeld(move: TracedMove): Finding {
  return findingAt(move, {
    code: 'prove.holding',
    message: 'the teeth are cut with nothing but a screw to hold the wheel: cutting turns it off',
    hint: 'Hold it by glue, tape, an arbor or a skin as well.',
  });
}

function late(
  last: TracedMove,
  first: TracedMove,
  before: string,
  after: string,
  severity: Finding['severity'],
): Finding {
  return findingAt(last, {
    code: 'prove.order',
    severity,
    message: `the ${before} ${before === 'bore' ? 'is' : 'are'} still being cut here; the ${after} were begun at line ${String(first.line)} of ${first.file}`,
    hint: `Cut the ${before} before the ${after}, or run the programs in their order.`,
  });
}

/**
 * The edge of a condition that holds at `low` and fails at `high`: halved until the two sides are neighbouring
 * doubles. Slow and certain: the few equations of a tooth that have no closed form are solved once a wheel.
 */
export function largestWhere(holds: (x: number) => boolean, low: number, high: number): number {
  let inside = low;
  let outside = high;
  for (let halving = 0; halving < HALVINGS; halving++) {
    const middle = inside + (outside - inside) / 2;
    if (middle === inside || middle === outside) {
      break;
    }
    if (holds(middle)) {
      inside = middle;
    } else {
      outside = middle;
    }
  }
  return inside;
}

/** A root close to zero has ever smaller neighbours; 2^-100 of the bracket is far below anything that is summed. */
const HALVINGS = 100;

/**
 * M98 and M99: the lines behind O and a number, run from where they are called, as often as L says. On controllers whose
 * machine file has them; not in NISTIR 6556.
 */
import { BIT, has, valueOf, wholeOf, type Block } from './block.ts';
import { mapNumbers } from './flow-map.ts';
import { M_GROUP } from './modes-codes.ts';
import { enter, jump, type Flow } from './run-flow.ts';
import { unread, type Refusal } from './trace-run.ts';

/** The line that is run after line `k`, both counted from 0. */
export function runCall(flow: Flow, k: number, block: Block): number | Refusal {
  const isCall = block.m[M_GROUP.call] === 98;
  const others = block.given & ~(isCall ? BIT.P | BIT.L : 0);
  const isAlone = block.g.every((code) => code < 0) && block.m.filter((code) => code >= 0).length === 1;
  if (others !== 0 || !isAlone) {
    return unread(
      `words beside M${isCall ? '98' : '99'}: whether they come before or after it, controllers differ`,
    );
  }
  if (!isCall) {
    return goBack(flow, k);
  }
  const number = has(block, BIT.P) ? wholeOf(valueOf(block, 'P')) : undefined;
  const times = has(block, BIT.L) ? wholeOf(valueOf(block, 'L')) : 1;
  return number === undefined || times === undefined || times < 1
    ? unread('M98 wants P with the number of a subprogram, and L, if it stands there, with how often')
    : call(flow, k, number, times);
}

function call(flow: Flow, k: number, number: number, times: number): number | Refusal {
  const numbers = (flow.numbers ??= mapNumbers(flow.lines));
  const at = numbers.get(number);
  if (at === undefined || at < 0) {
    return unread(
      `M98: O${String(number)} ${at === undefined ? 'is not in this file' : 'stands twice in this file'}`,
    );
  }
  return enter(flow, k, { block: undefined, start: at + 1, back: k + 1, again: times - 1, numbered: [], named: new Map(), rounds: new Map() }); // prettier-ignore
}

function goBack(flow: Flow, k: number): number | Refusal {
  const frame = flow.frames.at(-1);
  if (frame === undefined) {
    return unread('M99 outside a subprogram: the controller begins the program anew, without end');
  }
  if (frame.again > 0) {
    frame.again -= 1;
    return jump(flow, k, frame.start);
  }
  flow.frames.pop();
  return jump(flow, k, frame.back);
}

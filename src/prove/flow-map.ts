/**
 * Which flow words of a program belong together: a loop with its end, an `if` with its branches, a subprogram with its own.
 * Made once, when the first of them is run. Lines are counted from 0.
 */
import { BIT, valueOf, wholeOf } from './block.ts';
import { MOST_NESTED } from './bounds.ts';
import type { FlowLine } from './flow-words.ts';
import type { ReadLine } from './read-lines.ts';

export interface FlowBlock {
  readonly kind: 'sub' | 'if' | 'while' | 'do' | 'repeat';
  readonly label: string;
  readonly start: number;
  /** The line that closes it; -1 while none does. */
  end: number;
  /** elseif and else. */
  readonly branches: number[];
  hasElse: boolean;
}

export interface FlowMap {
  /** By line: the block that it opens, divides, closes or leaves. */
  readonly at: ReadonlyMap<number, FlowBlock>;
  readonly subs: ReadonlyMap<string, FlowBlock>;
  /** The first line that fits nowhere; nothing behind it is followed. */
  readonly fault: { readonly line: number; readonly why: string } | undefined;
}

const CLOSES: Readonly<Partial<Record<FlowLine['word'], FlowBlock['kind']>>> = {
  endsub: 'sub',
  endif: 'if',
  endwhile: 'while',
  endrepeat: 'repeat',
};

export function mapFlow(lines: readonly ReadLine[]): FlowMap {
  const at = new Map<number, FlowBlock>();
  const subs = new Map<string, FlowBlock>();
  const open: FlowBlock[] = [];
  for (const [k, { formula, skipped }] of lines.entries()) {
    const flow = formula?.flow;
    if (flow === undefined || flow.word === 'call') {
      continue;
    }
    const why = skipped ? 'a flow word on a line that begins with /' : place(flow, k, open, at, subs);
    if (why !== undefined) {
      return { at, subs, fault: { line: k, why } };
    }
  }
  return { at, subs, fault: undefined };
}

/** Answers why the word fits nowhere, if so. */
function place(
  flow: FlowLine,
  k: number,
  open: FlowBlock[],
  at: Map<number, FlowBlock>,
  subs: Map<string, FlowBlock>,
): string | undefined {
  const { word, label } = flow;
  const top = open.at(-1);
  const isOwn = top?.label === label;
  const closes = CLOSES[word] ?? (word === 'while' && isOwn && top.kind === 'do' ? 'do' : undefined);
  if (closes !== undefined) {
    if (top === undefined || !isOwn || top.kind !== closes) {
      return `o${label} ${word} closes nothing that is open`;
    }
    top.end = k;
    at.set(k, top);
    open.pop();
    return undefined;
  }
  switch (word) {
    case 'elseif':
    case 'else':
      if (top === undefined || !isOwn || top.kind !== 'if' || top.hasElse) {
        return `o${label} ${word} stands in no if of its label`;
      }
      top.branches.push(k);
      top.hasElse = word === 'else';
      at.set(k, top);
      return undefined;
    case 'break':
    case 'continue':
    case 'return': {
      const isWanted = ({ kind }: FlowBlock): boolean =>
        word === 'return' ? kind === 'sub' : kind !== 'sub' && kind !== 'if';
      const block = open.findLast((one) => one.label === label && isWanted(one));
      if (block === undefined) {
        return `o${label} ${word} stands in nothing of its label`;
      }
      at.set(k, block);
      return undefined;
    }
    default:
      return openBlock(word as FlowBlock['kind'], label, k, open, at, subs);
  }
}

function openBlock(
  kind: FlowBlock['kind'],
  label: string,
  k: number,
  open: FlowBlock[],
  at: Map<number, FlowBlock>,
  subs: Map<string, FlowBlock>,
): string | undefined {
  if (open.some((one) => one.label === label)) {
    return `o${label} ${kind} inside another o${label}`;
  }
  if (kind === 'sub' && (open.length > 0 || subs.has(label))) {
    return open.length > 0 ? `o${label} sub begins inside o${open[0]!.label}` : `o${label} sub stands twice`;
  }
  if (open.length >= MOST_NESTED) {
    return `more than ${String(MOST_NESTED)} loops and branches inside each other`;
  }
  const block: FlowBlock = { kind, label, start: k, end: -1, branches: [], hasElse: false };
  open.push(block);
  at.set(k, block);
  if (kind === 'sub') {
    subs.set(label, block);
  }
  return undefined;
}

/** By its number: the line of each O number up to the closing %, counted from 0; -1 where it stands twice. */
export function mapNumbers(lines: readonly ReadLine[]): ReadonlyMap<number, number> {
  const found = new Map<number, number>();
  let percents = 0;
  for (const [k, { block, percent }] of lines.entries()) {
    percents += percent === undefined ? 0 : 1;
    if (percents === 2) {
      break;
    }
    if (typeof block === 'object' && (block.given & BIT.O) !== 0) {
      const number = wholeOf(valueOf(block, 'O')) ?? -1;
      found.set(number, found.has(number) ? -1 : k);
    }
  }
  return found;
}

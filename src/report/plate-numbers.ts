/** Which plates a sheet has, and the numeral of each: a refused job has fewer. */
import type { SheetFacts } from './facts.ts';
import { numeral } from './words.ts';

export type PlateName = 'sizes' | 'table' | 'work' | 'space' | 'deviation';

export function hasPlate(facts: SheetFacts, name: PlateName): boolean {
  switch (name) {
    case 'sizes':
    case 'space':
      return true;
    case 'table':
      return facts.verdict === 'pass' && facts.park !== undefined;
    case 'work':
      return facts.passes.length > 0;
    case 'deviation':
      return (facts.proof?.figures?.deviation.length ?? 0) > 0;
  }
}

const ORDER: readonly PlateName[] = ['sizes', 'table', 'work', 'space', 'deviation'];

/** A plate with its caption; nothing where there is no picture. */
export function plateFigure(facts: SheetFacts, name: PlateName, svg: string, caption: string): string {
  const before = ORDER.slice(0, ORDER.indexOf(name) + 1).filter((one) => hasPlate(facts, one));
  return `<figure class="plate-${name}">\n${svg}\n<figcaption><b>Plate ${numeral(before.length)}.</b> ${caption}</figcaption>\n</figure>\n`;
}

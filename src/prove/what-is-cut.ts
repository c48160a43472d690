/** What a cutting move below the top works on, judged by where it is: bore, crossing or teeth. */
import { isInWindowAt } from './metal-inside.ts';
import type { Evidence } from './evidence.ts';
import { lowOf } from './metal-solids.ts';

export type CutPlace = 'bore' | 'crossing' | 'teeth';

/** Of each move by its number. Places are judged once, however often the cutter comes by. */
export function whatIsCut({ input, lastDigit, body, solids }: Evidence): (i: number) => CutPlace | undefined {
  if (body === undefined) {
    return () => undefined;
  }
  const top = input.setup.topZ - lastDigit;
  const judged: (CutPlace | 'nothing' | undefined)[] = [];
  const judge = (i: number): CutPlace | 'nothing' => {
    const x = solids.x1[i]!;
    const y = solids.y1[i]!;
    const rho = Math.sqrt(x * x + y * y);
    if (rho < body.boreRadius) {
      return 'bore';
    }
    if (rho > body.form.rootRadius) {
      return 'teeth';
    }
    return isInWindowAt(body, x, y) ? 'crossing' : 'nothing';
  };
  return (i) => {
    if (solids.rapid[i] === 1 || lowOf(solids, i) >= top) {
      return undefined;
    }
    const place = (judged[solids.twin[i]!] ??= judge(i));
    return place === 'nothing' ? undefined : place;
  };
}

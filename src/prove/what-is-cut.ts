/** What a cutting move below the top works on, judged by where it is: bore, crossing or teeth. */
import { wheelBody, isInWindowAt } from './metal-inside.ts';
import type { Evidence } from './evidence.ts';
import type { SolidMove } from './metal-paths.ts';

export type CutPlace = 'bore' | 'crossing' | 'teeth';

export function whatIsCut({ input, lastDigit }: Evidence): (solid: SolidMove) => CutPlace | undefined {
  const { target, setup } = input;
  if (target === undefined) {
    return () => undefined;
  }
  const body = wheelBody(target.form, target.bore, target.crossings);
  return ({ move, x1, y1, z0, z1 }) => {
    if (move.kind === 'rapid' || Math.min(z0, z1) >= setup.topZ - lastDigit) {
      return undefined;
    }
    const rho = Math.hypot(x1, y1);
    if (rho < body.boreRadius) {
      return 'bore';
    }
    if (rho > target.form.rootRadius) {
      return 'teeth';
    }
    return isInWindowAt(body, x1, y1) ? 'crossing' : undefined;
  };
}

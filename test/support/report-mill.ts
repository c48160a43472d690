/** The bench mill with everything of NISTIR 6556 that this reader follows, whatever its file in posts/ says of it. */
import type { Machine } from '../../src/machine/machine.ts';
import { post } from './bench-program.ts';

export function reportMill(): Machine {
  return post('bench-mill');
}

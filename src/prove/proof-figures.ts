/** The figures of a proof, from what was measured: the worst over every height. mm, radians. */
import { REGION } from './deviation-stations.ts';
import type { Evidence } from './evidence.ts';
import type { Proof } from './proof.ts';

export function proofFigures({ figures }: Evidence): Proof['figures'] {
  if (figures === undefined) {
    return undefined;
  }
  const { teeth, bore, window, inside } = figures;
  const { atTop, atBottom } = teeth;
  return {
    flankGouge: Math.max(atTop.gouge.value, inside.value),
    flankLeft: atBottom.left[REGION.flank]!.value,
    leftAtRoot: atBottom.left[REGION.root]!.value,
    byDepth: teeth.byDepth,
    boreError: Math.max(bore?.gouge.value ?? 0, bore?.left.value ?? 0),
    crossingGouge: window?.gouge.value ?? 0,
    crossingLeft: window?.left.value ?? 0,
    rollingLaw: teeth.rolling.angle,
    worstTooth: (teeth.worst?.copy ?? 0) + 1,
    deviation: teeth.worst?.points ?? [],
  };
}

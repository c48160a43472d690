/**
 * The load of a full slot: the worst force and where it acts, over a turn of the cutter. mm, N, 1/min, mm/min.
 *
 * The edge element at height z lags the tip by z tan(helix)/r; its chip is h sin(angle) while it is in the slot. The worst
 * sum over a turn of F and of F(z) (L - z) is searched in steps; runout makes one tooth cut more (chipsWithRunout).
 */
import { chipsWithRunout, RADIAL_SHARE } from './force.ts';
import type { Material } from './materials.ts';
import type { Cutter } from './setup.ts';
import { breakingForce, compliance } from './stiffness.ts';

export interface SlotLoad {
  /** Worst tangential force, N. */
  readonly force: number;
  /** Height above the tip at which it acts, mm. */
  readonly at: number;
  /** Breaking force over the whole (tangential and radial) force. */
  readonly margin: number;
  /** Bending at the tip under that force, mm. */
  readonly bending: number;
}

export interface SlotCut {
  readonly material: Material;
  readonly cutter: Cutter;
  readonly speed: number;
  readonly feed: number;
  readonly runout: number;
}

const TURN_STEPS = 72;
const HEIGHT_STEPS = 8;
/** Helix of a cutter of which nothing is known: straight flutes load the whole depth at once, the worst case. */
const UNKNOWN_HELIX = 0;

export function slotLoad(cut: SlotCut, depth: number): SlotLoad {
  const { material, cutter } = cut;
  const chips = chipsWithRunout(cut.feed / (cut.speed * cutter.flutes), cutter.flutes, cut.runout);
  const lag = Math.tan(((cutter.helix ?? UNKNOWN_HELIX) * Math.PI) / 180) / (cutter.diameter / 2);
  // Straight flutes load every height alike.
  const heights = lag === 0 ? 1 : HEIGHT_STEPS;
  const unit = material.kc11 * (depth / heights);
  // The tooth with the thickest chip is in the cut at worst: from where its tip enters to where its top leaves.
  const steps = Math.min(TURN_STEPS, Math.ceil(TURN_STEPS * (0.5 + (depth * lag) / (2 * Math.PI))));
  let force = 0;
  let moment = 0;
  for (let i = 0; i < steps; i++) {
    let sum = 0;
    let lever = 0;
    for (let tooth = 0; tooth < cutter.flutes; tooth++) {
      const chip = tooth === 0 ? chips.most : chips.least;
      for (let k = 0; k < heights; k++) {
        const z = (depth * (k + 0.5)) / heights;
        const sine = Math.sin(
          (2 * Math.PI * i) / TURN_STEPS + (2 * Math.PI * tooth) / cutter.flutes - z * lag,
        );
        const element = sine > 0 && chip > 0 ? unit * (chip * sine) ** (1 - material.mc) : 0;
        sum += element;
        lever += element * z;
      }
    }
    if (sum > force) {
      force = sum;
      moment = lever;
    }
  }
  const at = force > 0 ? moment / force : depth / 2;
  const whole = force * Math.sqrt(1 + RADIAL_SHARE ** 2);
  return { force, at, margin: breakingForce(cutter, at) / whole, bending: whole * compliance(cutter, at) };
}

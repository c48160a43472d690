/**
 * What stands on the machine: the blank, how it is held, what is in the way, and the cutters.
 * mm; Z as in the program (Z0 at the job's zero).
 */
export interface Cutter {
  readonly number: number;
  /** The diameter it really cuts: what every path is reckoned with. */
  readonly diameter: number;
  /** The diameter on its box. */
  readonly nominal: number;
  readonly flutes: number;
  /** Length that fits beside a wall, from the tip (neck included). */
  readonly reach: number;
  /** Cutting length from the tip. */
  readonly flute: number;
  /** Diameter of the shank above the reach. */
  readonly shank: number;
  /** From the tip to the collet. */
  readonly stickOut: number;
  /** Helix angle in degrees, where it is known. */
  readonly helix?: number;
  /** Radius difference between the teeth at worst (total indicated runout), mm. */
  readonly runout: number;
  /** May be driven straight down. */
  readonly plunges: boolean;
}

/** A thing that stands on the plate: a clamp, a screw's head. Solid from `fromZ` to `toZ`. */
export interface Obstacle {
  readonly name: 'keep-out' | 'screw head';
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly fromZ: number;
  readonly toZ: number;
}

export type BlankShape =
  | { readonly kind: 'sheet'; readonly width: number; readonly height: number }
  | { readonly kind: 'disc'; readonly diameter: number };

export interface Setup {
  readonly material: string;
  readonly shape: BlankShape;
  /** Z of the top of the blank and of the plate under it. */
  readonly topZ: number;
  readonly plateZ: number;
  /** Z above which the cutter may go anywhere where no obstacle stands. */
  readonly clearZ: number;
  /** How far under the plate's surface the cutter may go (into what the blank is held on); zero or positive. */
  readonly intoPlate: number;
  /** Diameter of a hole that is there already, 0 for none. */
  readonly bored: number;
  readonly holding: readonly ('glue' | 'tape' | 'arbor' | 'skin' | 'screw')[];
  /** Metal that stays under everything that is cut, 0 unless holding has 'skin'. */
  readonly skin: number;
  readonly obstacles: readonly Obstacle[];
  readonly cutters: readonly Cutter[];
  /** Where the program's zero lies in the machine's own coordinates, if known. */
  readonly zeroAt?: { readonly x: number; readonly y: number; readonly z: number };
}

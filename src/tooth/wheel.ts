/**
 * A wheel, from its proportions to its exact outline. Frame: the wheel's axis at the origin, tooth 1 centred on +X,
 * counter-clockwise seen from above. mm, radians.
 */
import type { Chain, Loop } from '../geometry/piece.ts';

export type Mate =
  | {
      readonly kind: 'pinion';
      readonly leaves: number;
      /** Leaf thickness along the pinion's pitch circle, in modules. */
      readonly leaf: number;
      readonly tip:
        'semicircle' | 'third-ogive' | 'full-ogive' | { readonly height: number; readonly radius: number };
      /** In modules. */
      readonly dedendum: number;
    }
  | {
      readonly kind: 'lantern';
      readonly trundles: number;
      /** Diameter in modules. */ readonly trundle: number;
    };

/** What the form follows from. */
export interface WheelProportions {
  readonly teeth: number;
  readonly module: number;
  readonly mate: Mate;
  /** The distance the pair will run at. */
  readonly centres: number;
  readonly addendumForm: 'epicycloid' | 'arc';
  /** Share of the pointed height that is kept. */
  readonly height: number;
  /** Tooth thickness over circular pitch. */
  readonly tooth: number;
  /** Dedendum in modules. */
  readonly dedendum: number;
  /** Fillet radius at the root corner, mm; 0 is sharp. */
  readonly rootFillet: number;
}

export interface CrossingProportions {
  readonly arms: number;
  /** Width of an arm where it leaves the hub circle and where it meets the rim. */
  readonly armAtHub: number;
  readonly armAtRim: number;
  /** Radial, below the root circle. */
  readonly rim: number;
  /** Diameter. */
  readonly hub: number;
  /** Fillet radius. */
  readonly corner: number;
}

/** The radii and angles of a form, and its exact outline. */
export interface WheelForm {
  readonly proportions: WheelProportions;
  readonly pitchRadius: number;
  readonly outsideRadius: number;
  readonly rootRadius: number;
  readonly addendum: number;
  readonly dedendum: number;
  /** Pointed (theoretical) addendum, mm. */
  readonly pointedAddendum: number;
  /** Along the pitch circle. */
  readonly toothThickness: number;
  /** Radius of the generating circle of the addendum (pinion pitch radius / 2; a lantern's pitch radius), mm. */
  readonly generatingRadius: number;
  /** Radius that the mate's tip reaches on the line of centres at `centres`: the working flank begins there. */
  readonly workingRadius: number;
  /**
   * The exact outline of one pitch, counter-clockwise, material on the left, from the middle of the space before tooth 1
   * (angle -pi/N) to the middle of the space after it (+pi/N): root arc, [fillet], flank, addendum, tip land, addendum,
   * flank, [fillet], root arc.
   */
  readonly sector: readonly WheelPiece[];
}

/** What a piece of the outline is in the trade's words. Mirror images share a name. */
export type PieceRole = 'root' | 'fillet' | 'flank' | 'addendum' | 'land';

export interface WheelPiece {
  readonly role: PieceRole;
  readonly piece: Chain[number];
}

/** The windows of the crossings: one exact loop, counter-clockwise round the window, turned `count` times. */
export interface Crossings {
  readonly proportions: CrossingProportions;
  readonly count: number;
  readonly window: Loop;
  readonly hubRadius: number;
  readonly windowInner: number;
  readonly windowOuter: number;
}

/**
 * What the blank may be made of, and how it cuts: specific cutting force (Kienzle), cutting speed, chip load by cutter
 * diameter, depths. mm, N/mm2, m/min. Figures marked "judgement" are defaults of ours between published ones.
 *
 * Sources: VDI 3323 only groups materials; kc1.1 and mc of a group are those of a maker's catalogue of inserts (2017/2022), no
 * open source and taken as judgement; 11SMnPb30 1200/0.18 and acetal from memory and judgement; cutting speeds: carbide figures of
 * catalogues and shop charts, taken low; chip loads: a maker's catalogue of solid carbide (2021) gives 0.13 to 0.6 % of the
 * diameter at 1 to 3 mm; ours are judgement.
 */
export type MaterialName =
  'leaded-brass' | 'brass' | 'free-cutting-steel' | 'silver-steel' | 'aluminium' | 'acetal';

export interface Material {
  readonly name: MaterialName;
  /** In the words of the sheet. */
  readonly words: string;
  /** N/mm2 at a chip of 1 mm by 1 mm. */
  readonly kc11: number;
  readonly mc: number;
  /** m/min for carbide in small diameters. */
  readonly cuttingSpeed: number;
  /** Chip load a tooth, mm, at the diameters of `CHIP_DIAMETERS`. */
  readonly chipLoads: readonly number[];
  /** Steepest ramp of a flat cutter, degrees. */
  readonly ramp: number;
  /** Deepest step of a full slot as a share of the diameter. */
  readonly slotShare: number;
  readonly hazards: readonly Hazard[];
}

/** What the cautions must say of the chips and dust. */
export type Hazard = 'lead' | 'needles' | 'not-beryllium' | 'strings' | 'fire' | 'melts';

export const CHIP_DIAMETERS: readonly number[] = [0.3, 0.4, 0.5, 0.6, 0.8, 1, 1.5, 2, 3];

const BRASS_CHIPS = [0.0025, 0.003, 0.004, 0.005, 0.006, 0.008, 0.012, 0.016, 0.025];

export const MATERIALS: Readonly<Record<MaterialName, Material>> = {
  'leaded-brass': {
    name: 'leaded-brass',
    words: 'leaded brass (CZ120, CW608N, C353 and the like)',
    kc11: 700,
    mc: 0.27,
    cuttingSpeed: 100,
    chipLoads: BRASS_CHIPS,
    ramp: 3,
    slotShare: 0.25,
    // VDI 3323 group 26.
    hazards: ['lead', 'needles', 'not-beryllium'],
  },
  brass: {
    name: 'brass',
    words: 'brass without lead (CuZn37 and the like)',
    kc11: 700,
    mc: 0.27,
    cuttingSpeed: 80,
    chipLoads: BRASS_CHIPS,
    ramp: 3,
    slotShare: 0.2,
    // VDI 3323 group 27; lead-free brass is really somewhat higher.
    hazards: ['needles', 'strings', 'not-beryllium'],
  },
  'free-cutting-steel': {
    name: 'free-cutting-steel',
    words: 'free-cutting steel (11SMnPb30 and the like)',
    kc11: 1350,
    mc: 0.21,
    cuttingSpeed: 80,
    chipLoads: [0.0015, 0.002, 0.0025, 0.003, 0.004, 0.005, 0.007, 0.01, 0.015],
    ramp: 2,
    slotShare: 0.15,
    // VDI 3323 group 1, the safe upper value.
    hazards: ['lead'],
  },
  'silver-steel': {
    name: 'silver-steel',
    words: 'silver steel, annealed (115CrV3)',
    kc11: 1775,
    mc: 0.24,
    cuttingSpeed: 45,
    chipLoads: [0.0012, 0.0015, 0.002, 0.0025, 0.003, 0.004, 0.006, 0.008, 0.012],
    ramp: 2,
    slotShare: 0.08,
    // VDI 3323 group 6.
    hazards: [],
  },
  aluminium: {
    name: 'aluminium',
    words: 'hardened wrought aluminium (6061, 6082 and the like)',
    kc11: 800,
    mc: 0.25,
    cuttingSpeed: 200,
    chipLoads: [0.002, 0.003, 0.004, 0.005, 0.006, 0.008, 0.012, 0.016, 0.025],
    ramp: 3,
    slotShare: 0.25,
    // VDI 3323 group 22.
    hazards: ['strings'],
  },
  acetal: {
    name: 'acetal',
    words: 'acetal (POM), for a trial cut',
    kc11: 90,
    mc: 0.25,
    cuttingSpeed: 150,
    chipLoads: [0.005, 0.007, 0.008, 0.01, 0.014, 0.018, 0.028, 0.038, 0.06],
    ramp: 5,
    slotShare: 0.5,
    // Judgement: 1.5 to 3 times its strength.
    hazards: ['melts'],
  },
};

export const MATERIAL_NAMES = Object.keys(MATERIALS) as readonly MaterialName[];

export function materialNamed(name: string): Material | undefined {
  return (MATERIALS as Readonly<Record<string, Material>>)[name];
}

/** Chip load a tooth for a diameter: linear between the listed ones, in proportion outside them. */
export function chipLoad(material: Material, diameter: number): number {
  const above = CHIP_DIAMETERS.findIndex((listed) => listed >= diameter);
  const first = CHIP_DIAMETERS[0] ?? 1;
  const last = CHIP_DIAMETERS.at(-1) ?? 1;
  if (above === 0) {
    return ((material.chipLoads[0] ?? 0) * diameter) / first;
  }
  if (above < 0) {
    return ((material.chipLoads.at(-1) ?? 0) * diameter) / last;
  }
  const d0 = CHIP_DIAMETERS[above - 1] ?? first;
  const d1 = CHIP_DIAMETERS[above] ?? last;
  const f0 = material.chipLoads[above - 1] ?? 0;
  const f1 = material.chipLoads[above] ?? 0;
  return f0 + ((f1 - f0) * (diameter - d0)) / (d1 - d0);
}

/** The only conversions of units. Inside: mm, radians, mm/min, 1/min, seconds. */
export const MM_PER_INCH = 25.4;

/** Unit of a text's lengths: of a job file, of a program. */
export type LengthUnit = 'mm' | 'inch';

export function millimetresPer(unit: LengthUnit): number {
  return unit === 'mm' ? 1 : MM_PER_INCH;
}

export function degrees(angle: number): number {
  return (angle * 180) / Math.PI;
}

export function radians(angle: number): number {
  return (angle * Math.PI) / 180;
}

/** The unit of a file's plain lengths: asked before anything else of it is read, because all the rest depends on it. */
import type { LengthUnit } from '../base/units.ts';

export function unitOf(value: unknown): LengthUnit {
  const said = typeof value === 'object' && value !== null && 'length' in value ? value.length : 'mm';
  return said === 'inch' ? 'inch' : 'mm';
}

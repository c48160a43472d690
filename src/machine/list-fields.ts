/** Every field of a machine with its value, a line each, by the path it has in a machine file. */
import type { Machine } from './machine.ts';

export function listFields(machine: Machine): readonly string[] {
  const { name: _, description: __, ...rest } = machine;
  const rows = rowsOf(rest, '');
  const width = Math.max(...rows.map(([path]) => path.length));
  return rows.map(([path, value]) => `${path.padEnd(width)}  ${value}`);
}

function rowsOf(value: unknown, path: string): readonly (readonly [string, string])[] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return [[path, shown(value)]];
  }
  return Object.entries(value).flatMap(([key, inner]) => {
    const kebab = key.replaceAll(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
    return rowsOf(inner, path === '' ? kebab : `${path}.${kebab}`);
  });
}

function shown(value: unknown): string {
  if (value === null) {
    return 'none';
  }
  if (typeof value === 'boolean') {
    return value ? 'yes' : 'no';
  }
  return Array.isArray(value) ? `[${value.join(', ')}]` : String(value);
}

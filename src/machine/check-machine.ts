/**
 * Values that are right one by one and dangerous together. In: a machine that has passed the schema. Out: every danger,
 * with what a real machine would do. Errors refuse the file; warnings are shown wherever it is read.
 */
import { arcDangers } from './arc-dangers.ts';
import { cutterDangers } from './cutter-dangers.ts';
import type { Danger } from './danger.ts';
import { limitDangers } from './limit-dangers.ts';
import type { Machine } from './machine.ts';
import { modeDangers } from './mode-dangers.ts';
import { pathDangers } from './path-dangers.ts';
import { textDangers } from './text-dangers.ts';

export function checkMachine(machine: Machine): readonly Danger[] {
  return [textDangers, modeDangers, arcDangers, cutterDangers, pathDangers, limitDangers].flatMap((check) =>
    check(machine),
  );
}

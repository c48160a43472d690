/** The job file's `blank`: the piece, how it is held, and what stands beside it. Split off `job-schema.ts`. */
import * as z from 'zod';
import type { LengthUnit } from '../base/units.ts';
import { MATERIAL_NAMES } from '../cutting/materials.ts';
import {
  choiceOf,
  lengthIn,
  lengthOf,
  listed,
  pointIn,
  valueOf,
  type Range,
  type Read,
} from './job-schema-values.ts';
import { showValue } from './read-number.ts';

export const HOLDINGS = ['glue', 'tape', 'arbor', 'skin'] as const;

export function blankSchema(unit: LengthUnit) {
  const length = (says: string, example: number, range: Range) => lengthOf({ says, example }, range, unit);
  return z
    .strictObject({
      material: choiceOf({ says: 'What it is made of', example: 'leaded-brass' }, MATERIAL_NAMES),
      shape: choiceOf({ says: 'sheet, or disc (turned to the tip circle already)', example: 'sheet' }, [
        'sheet',
        'disc',
      ]),
      size: sizeOf(unit).optional(),
      thickness: length("Thickness of the blank; the wheel's where it is left out", 1.5, {
        least: 0.05,
        most: 50,
      }).optional(),
      bored: boredOf(unit).optional(),
      holding: z.union([
        holdOf('What holds it: glue, tape, arbor, skin, or a list of them'),
        z.array(z.union([holdOf('What holds it: glue, tape, arbor or skin'), screwSchema(unit)])),
      ]),
      skin: length('With holding skin: how much stays under the wheel', 0.08, {
        least: 0.01,
        most: 1,
      }).optional(),
      'keep-out': z
        .array(keepOutSchema(unit))
        .meta({
          description: 'Clamps and the like: { x, y, radius, height }, solid from the plate up',
          examples: ['[{ x: 18, y: 18, radius: 6, height: 12 }]'],
        })
        .optional(),
    })
    .meta({ description: 'The piece it is made from, and how it is held' });
}

/** One hold by its name. A screw by itself is a likely slip, and its form cannot be guessed: it is shown. */
function holdOf(says: string) {
  return valueOf({ says, example: 'glue' }, { enum: HOLDINGS }, (value): Read<(typeof HOLDINGS)[number]> => {
    const hold = HOLDINGS.find((one) => one === value);
    if (hold !== undefined) {
      return { value: hold };
    }
    const screw = value === 'screw' || (typeof value === 'object' && value !== null && 'screw' in value);
    return screw
      ? {
          message:
            'a screw is said with its sizes, in a list, beside something that keeps the wheel from turning.',
          hint: `Write ${SCREW_FORM}, with the sizes of yours; tape or arbor will do for glue.`,
        }
      : { message: `${showValue(value)} is not known here. Use ${listed(HOLDINGS)}.` };
  });
}

/** How a screw is written, for whoever has to write one. */
export const SCREW_FORM = '[glue, { screw: { head: 8.0, height: 4.0, thread: 3.0 } }]';

function screwSchema(unit: LengthUnit) {
  const length = (says: string, example: number) =>
    lengthOf({ says, example }, { least: 0.2, most: 60 }, unit);
  return z.strictObject({
    screw: z.strictObject({
      head: length('Diameter of the head, or of its washer', 8),
      height: length('Height of the head above the blank', 4),
      thread: length('Diameter of the thread', 3),
    }),
  });
}

function keepOutSchema(unit: LengthUnit) {
  const length = (says: string, example: number, least: number) =>
    lengthOf({ says, example }, { least, most: 1000 }, unit);
  return z.strictObject({
    x: length('Its middle, from the axis of the wheel', 18, -1000),
    y: length('Its middle, from the axis of the wheel', 18, -1000),
    radius: length('Its radius', 6, 0.1),
    height: length('Its height above the plate', 12, 0.1),
  });
}

const SIZE: Range = { least: 1, most: 1000 };

/** [width, height] of a sheet, or the diameter of a disc. */
function sizeOf(unit: LengthUnit) {
  const words = {
    says: 'Of a sheet [width, height], centred on the wheel; of a disc its diameter',
    example: '[44, 44]',
  };
  return valueOf(words, { type: ['array', 'number', 'string'] }, (value): Read<readonly number[] | number> =>
    Array.isArray(value) ? pointIn(value, words.example, SIZE, unit) : lengthIn(value, SIZE, unit),
  );
}

function boredOf(unit: LengthUnit) {
  const words = { says: 'no, or the diameter of a hole that is there already', example: 'no' };
  return valueOf(words, { type: ['number', 'string', 'boolean'] }, (value) => {
    if (value === false || value === 'no' || value === 0) {
      return { value: 0 };
    }
    return lengthIn(value, { least: 0.1, most: 200 }, unit);
  });
}

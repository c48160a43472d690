/** The job file's `wheel`: proportions, mate and crossings. Split off `job-schema.ts`. */
import * as z from 'zod';
import type { LengthUnit } from '../base/units.ts';
import { choiceOf, countOf, lengthOf, numberOf, type Range } from './job-schema-values.ts';

export function wheelSchema(unit: LengthUnit) {
  const length = (says: string, example: number, range: Range) => lengthOf({ says, example }, range, unit);
  return z
    .strictObject({
      teeth: countOf({ says: 'Number of teeth', example: 60 }, { least: 6, most: 400 }),
      mate: mateSchema(),
      module: lengthOf(
        { says: 'Pitch diameter over number of teeth, always in mm', example: 0.5 },
        { least: 0.05, most: 6 },
        'mm',
      ).optional(),
      'diametral-pitch': numberOf(
        { says: 'Instead of module: teeth to an inch of pitch diameter', example: 50.8 },
        { least: 4, most: 500 },
      ).optional(),
      centres: length(
        'Distance of the two pivots the pair will run at; instead of module, which then follows from it, or beside it',
        17,
        { least: 1, most: 500 },
      ).optional(),
      addendum: choiceOf({ says: 'Curve of the addendum', example: 'epicycloid' }, [
        'epicycloid',
        'arc',
      ]).optional(),
      height: numberOf(
        { says: 'Share of the pointed height that is kept', example: 0.95 },
        { least: 0.3, most: 1 },
      ).optional(),
      tooth: numberOf(
        { says: 'Tooth thickness over circular pitch', example: 0.5 },
        { least: 0.2, most: 0.7 },
      ).optional(),
      dedendum: numberOf(
        { says: 'Depth below the pitch circle, in modules', example: 1.5708 },
        { least: 0.5, most: 3 },
        ' modules',
      ).optional(),
      root: length(
        'Fillet radius at the root corner; 0 is sharp (what the cutter leaves is reckoned anyway)',
        0,
        {
          least: 0,
          most: 5,
        },
      ).optional(),
      thickness: length('Thickness of the wheel', 1.5, { least: 0.05, most: 25 }),
      bore: length('Diameter of the bore; where there is none this line is left out', 4, {
        least: 0.1,
        most: 200,
      }).optional(),
      crossings: crossingsSchema(unit).optional(),
    })
    .meta({ description: 'The wheel to be made' });
}

function mateSchema() {
  const inModules = (says: string, example: number, range: Range) =>
    numberOf({ says, example }, range, ' modules').optional();
  const range = { least: 5, most: 60 };
  return z
    .strictObject({
      leaves: countOf({ says: 'Leaves of the pinion the wheel drives', example: 8 }, range).optional(),
      leaf: inModules('Thickness of a leaf at the pitch circle, in modules', 1.05, { least: 0.4, most: 2.5 }),
      tip: z
        .union([
          choiceOf(
            { says: 'Form of the leaf tips, or { height: …, radius: … } in modules', example: 'third-ogive' },
            ['semicircle', 'third-ogive', 'full-ogive'],
          ),
          z.strictObject({
            height: numberOf(
              { says: 'Height of the tip above the pitch circle', example: 0.67 },
              TIP,
              ' modules',
            ),
            radius: numberOf({ says: 'Radius of its arcs', example: 0.7 }, TIP, ' modules'),
          }),
        ])
        .optional(),
      dedendum: inModules('Depth of the leaves below the pitch circle, in modules', 1.87, {
        least: 0.3,
        most: 5,
      }),
      trundles: countOf(
        { says: 'Instead of leaves: pins of a lantern pinion; comes in a later version', example: 8 },
        range,
      ).optional(),
      trundle: inModules('Diameter of a trundle, in modules; comes in a later version', 1.05, {
        least: 0.4,
        most: 2.5,
      }),
    })
    .meta({ description: 'The pinion it runs with' });
}

const TIP: Range = { least: 0.05, most: 4 };

function crossingsSchema(unit: LengthUnit) {
  const length = (says: string, example: number) =>
    lengthOf({ says, example }, { least: 0.05, most: 300 }, unit);
  return z
    .strictObject({
      arms: countOf({ says: 'Number of arms', example: 5 }, { least: 3, most: 8 }),
      arm: z.union([
        length('Width of an arm, or { at-hub: …, at-rim: … }', 2.4),
        z.strictObject({
          'at-hub': length('Width of an arm where it leaves the hub', 3),
          'at-rim': length('Width of an arm where it meets the rim', 2.2),
        }),
      ]),
      rim: length('Width of the rim, radially, below the root circle', 1.8),
      hub: length('Diameter of the hub', 9),
      corner: length('Radius of the corners of the windows', 1.2),
    })
    .meta({ description: 'The windows cut through the wheel' });
}

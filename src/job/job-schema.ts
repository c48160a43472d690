/**
 * The job file: every key, what it means, its range, and an example. From this one schema come the reading of a job,
 * the commented starter job (`ogive new`) and the JSON Schema for editors.
 * Built for a unit of length, because plain numbers are in the job's own. Out: mm, mm/min, 1/min; modules where it says so.
 * With `job-schema-values.ts` the only file of job/ that knows zod.
 */
import * as z from 'zod';
import type { LengthUnit } from '../base/units.ts';
import type { PassKind } from './job.ts';
import { blankSchema } from './job-schema-blank.ts';
import {
  choiceOf,
  countOf,
  feedOf,
  lengthOf,
  numberOf,
  pointIn,
  textOf,
  valueOf,
  yesNo,
  type Range,
} from './job-schema-values.ts';
import { wheelSchema } from './job-schema-wheel.ts';

export const JOB_FORMAT = 'ogive-job/1';
export const CUTTERS_FORMAT = 'ogive-cutters/1';
export const PASS_KINDS = ['bore', 'roughing', 'finishing', 'crossings'] as const;

export type JobText = z.infer<ReturnType<typeof jobSchema>>;
export type WheelText = NonNullable<JobText['wheel']>;
export type CutterText = z.infer<ReturnType<typeof cutterSchema>>;
export type CutsText = NonNullable<JobText['cuts']>;

export function jobSchema(unit: LengthUnit) {
  return z.strictObject({
    format: formatOf(JOB_FORMAT).optional(),
    title: textOf(
      { says: 'What the sheet and the program are headed with', example: 'Third wheel' },
      200,
    ).optional(),
    length: lengthUnit().optional(),
    wheel: wheelSchema(unit).optional(),
    pinion: z.unknown().optional(),
    blank: blankSchema(unit),
    zero: choiceOf({ says: 'Where Z0 lies: on top of the blank, or on the plate under it', example: 'top' }, [
      'top',
      'plate',
    ]).optional(),
    'zero-at': zeroAt().optional(),
    clear: lengthOf(
      {
        says: 'Height above the blank at which the cutter may go anywhere that no keep-out stands',
        example: 5,
      },
      { least: 0.5, most: 200 },
      unit,
    ).optional(),
    machine: textOf(
      { says: 'A machine file of posts/ by its name, or the path of your own', example: 'desk-three-axis' },
      500,
    ),
    cutters: z
      .union([z.string().regex(/\S/, { error: 'no file is named.' }), cuttersSchema(unit)])
      .meta({ description: 'The cutters at hand, by number; or the path of a file of them' }),
    cuts: cutsSchema(unit).optional(),
  });
}

/** A file of cutters that many jobs share; it has its own unit. */
export function cutterFileSchema(unit: LengthUnit) {
  return z.strictObject({
    format: formatOf(CUTTERS_FORMAT).optional(),
    length: lengthUnit().optional(),
    cutters: cuttersSchema(unit),
  });
}

function formatOf(format: string) {
  return choiceOf({ says: 'Kind of file and its version', example: format }, [format]);
}

function lengthUnit() {
  return choiceOf({ says: 'Unit of all plain lengths and feeds of this file', example: 'mm' }, [
    'mm',
    'inch',
  ]);
}

function zeroAt() {
  const words = {
    says: "Where zero lies in the machine's own coordinates (X, Y, Z; mm unless it says its own unit), if known",
    example: '[60, 40, -35]',
  };
  return valueOf(words, POINT, (value) =>
    pointIn(value, words.example, { least: -10000, most: 10000 }, 'mm'),
  );
}

const POINT = { type: 'array', minItems: 3, maxItems: 3, items: { type: ['number', 'string'] } };

const CUTTER_NUMBER = /^[1-9]\d{0,3}$/;

function cuttersSchema(unit: LengthUnit) {
  return z.record(
    z.string().regex(CUTTER_NUMBER, { error: 'is no number of a cutter. Use 1 to 9999.' }),
    cutterSchema(unit),
  );
}

function cutterSchema(unit: LengthUnit) {
  const length = (says: string, example: number | string, least: number, most: number) =>
    lengthOf({ says, example }, { least, most }, unit);
  return z.strictObject({
    diameter: length('Diameter on its box', 0.5, 0.05, 25),
    flutes: countOf({ says: 'Number of cutting edges', example: 2 }, { least: 1, most: 8 }).optional(),
    reach: length('Length from the tip that fits beside a wall', 2, 0.1, 100).optional(),
    flute: length('Cutting length from the tip', 1.5, 0.1, 100).optional(),
    shank: length('Diameter of the shank', 3, 0.5, 25).optional(),
    'stick-out': length('From the tip to the collet', 14, 1, 150).optional(),
    helix: numberOf({ says: 'Helix angle', example: 30 }, { least: 0, most: 60 }, ' degrees').optional(),
    runout: length(
      'How far it runs out of true in its collet, as a dial gauge shows it',
      0.01,
      0,
      0.2,
    ).optional(),
    plunges: yesNo({ says: 'May it be driven straight down?', example: 'no' }).optional(),
    cuts: length('The diameter it really cuts, from a test slot', 0.512, 0.05, 25).optional(),
  });
}

function cutsSchema(unit: LengthUnit) {
  return z
    .strictObject({
      order: orderOf().optional(),
      bore: passSchema(unit, {
        leave: lengthOf(
          { says: 'Metal left in the bore for broaching or reaming, on the diameter', example: 0 },
          { least: 0, most: 5 },
          unit,
        ).optional(),
      }),
      crossings: passSchema(unit, {}),
      roughing: passSchema(unit, {
        allowance: lengthOf(
          { says: 'Metal left on the flanks for finishing', example: 0.03 },
          { least: 0.005, most: 0.5 },
          unit,
        ).optional(),
      }),
      finishing: passSchema(unit, {
        passes: countOf({ says: 'Finishing passes', example: 1 }, { least: 1, most: 5 }).optional(),
        spring: countOf(
          { says: 'Passes more along the same path, for what bending left', example: 1 },
          SPRING,
        ).optional(),
      }),
      below: lengthOf(
        { says: 'How far under the wheel the cutter goes', example: 0.1 },
        { least: 0, most: 5 },
        unit,
      ).optional(),
      climb: yesNo({ says: 'Climb milling; no is conventional', example: 'yes' }).optional(),
      play: z
        .strictObject({ x: playOf('X', unit), y: playOf('Y', unit) })
        .meta({ description: 'Play of the slides, if known' })
        .optional(),
    })
    .meta({ description: 'How it is cut; all of it may be left out' });
}

const SPRING: Range = { least: 0, most: 5 };

function playOf(axis: string, unit: LengthUnit) {
  return lengthOf({ says: `Play of the ${axis} slide`, example: 0 }, { least: 0, most: 1 }, unit);
}

function passSchema<T extends z.core.$ZodLooseShape>(unit: LengthUnit, more: T) {
  return z
    .strictObject({
      cutter: countOf({ says: 'Number of its cutter', example: 2 }, { least: 1, most: 9999 }).optional(),
      ...more,
      step: lengthOf({ says: 'Depth a lap', example: 0.12 }, { least: 0.001, most: 25 }, unit).optional(),
      speed: numberOf(
        { says: 'Spindle speed', example: 20000 },
        { least: 50, most: 200000 },
        ' a minute',
      ).optional(),
      feed: feedOf({ says: 'Feed', example: 150 }, { least: 0.1, most: 10000 }, unit).optional(),
      plunge: feedOf(
        { says: 'Feed straight down and down ramps', example: 40 },
        { least: 0.1, most: 5000 },
        unit,
      ).optional(),
    })
    .optional();
}

function orderOf() {
  const words = {
    says: 'Order of the passes; left out, it follows from the holding and the rim',
    example: `[${PASS_KINDS.join(', ')}]`,
  };
  const json = { type: 'array', items: { enum: PASS_KINDS }, uniqueItems: true };
  return valueOf(words, json, (value) => {
    const order = Array.isArray(value) ? PASS_KINDS.filter((kind) => value.includes(kind)) : [];
    return Array.isArray(value) && value.length > 0 && order.length === value.length
      ? { value: value as PassKind[] }
      : { message: `the order is not a list of different passes. Use the form ${words.example}.` };
  });
}

/** The JSON Schema (draft 2020-12) of a job file, for editors. Rules across keys are not in it. */
export function jobJsonSchema(): JsonSchema {
  return z.toJSONSchema(jobSchema('mm'), {
    io: 'input',
    unrepresentable: 'any',
    override: ({ zodSchema, jsonSchema }) => {
      // Values are read by functions of ours, of which zod knows neither whether they may be left out nor the examples.
      // zod hands over its inner type, of which `def` is not told further; only objects have a shape.
      const { shape } = (zodSchema as unknown as z.ZodType).def as { shape?: Record<string, z.ZodType> };
      if (shape !== undefined) {
        jsonSchema.required = Object.keys(shape).filter((key) => shape[key]?.def.type !== 'optional');
      }
      const examples = z.globalRegistry.get(zodSchema)?.['examples'];
      if (Array.isArray(examples)) {
        jsonSchema.examples = examples;
      }
    },
  }) as JsonSchema;
}

/** What the starter job needs to know of it. */
export interface JsonSchema {
  readonly description?: string;
  readonly examples?: readonly (string | number)[];
  readonly properties?: Readonly<Record<string, JsonSchema>>;
  readonly required?: readonly string[];
  readonly anyOf?: readonly JsonSchema[];
  readonly enum?: readonly unknown[];
  readonly additionalProperties?: JsonSchema | boolean;
}

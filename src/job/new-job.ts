/**
 * The commented starter job, from the same schema that jobs are read by, so that it cannot say anything else.
 * What the example sets stands as a line, everything else behind a comment mark with an example: take away "# " and the line
 * is in its place. The JSON Schema for editors is the schema itself.
 */
import { SCREW_FORM } from './job-schema-blank.ts';
import { jobJsonSchema, type JsonSchema } from './job-schema.ts';

export { jobJsonSchema };

/** A sixty-tooth third wheel, in the words of the job file. */
const EXAMPLE: Readonly<Record<string, string>> = {
  format: 'ogive-job/1',
  title: 'Third wheel of a bracket clock',
  length: 'mm',
  'wheel.teeth': '60',
  'wheel.mate.leaves': '8',
  'wheel.module': '0.5',
  'wheel.thickness': '1.5',
  'wheel.bore': '4.0',
  'wheel.crossings.arms': '5',
  'wheel.crossings.arm': '2.4',
  'wheel.crossings.rim': '1.8',
  'wheel.crossings.hub': '9.0',
  'wheel.crossings.corner': '1.2',
  'blank.material': 'leaded-brass',
  'blank.shape': 'sheet',
  'blank.size': '[44, 44]',
  'blank.holding': 'glue',
  zero: 'top',
  machine: 'desk-three-axis',
};

/** By number; each cutter's keys in the order of the schema. */
const CUTTERS: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  1: { diameter: '1.0', flutes: '2', reach: '4.0' },
  2: { diameter: '0.5', flutes: '2', reach: '2.0', flute: '1.7', shank: '3.0', 'stick-out': '14.0' },
};

const HEAD = [
  '# A job for ogive: one wheel, from its measurements to a program. It runs as it is: ogive cut THIS-FILE',
  '# Plain lengths are in the unit that `length` says; a value may say its own: 0.5 mm, 3/64 inch.',
  '# Lines that begin with "# " may be used too: take the mark and the blank after it away. What is left out is derived, and the sheet says why.',
  '# Where such a line says "Instead of", put the mark before the line whose place it takes.',
  '',
];

export function newJob(): string {
  return `${[...HEAD, ...linesOf(jobJsonSchema())].join('\n')}\n`;
}

/** Keys of the schema that are refused until wheels for lantern pinions can be cut: not offered. */
const LATER = ['wheel.mate.trundles', 'wheel.mate.trundle'];

/** A second form of a line, shown under it. */
const FORMS: Readonly<Record<string, readonly string[]>> = {
  'blank.holding': [
    'With a screw, which wants a second hold beside it and a hole, given as bored, to go through:',
    `holding: ${SCREW_FORM}`,
  ],
};

interface Line {
  readonly live: boolean;
  readonly text: string;
  readonly comment: string | undefined;
}

function linesOf(schema: JsonSchema): string[] {
  return Object.entries(schema.properties ?? {}).flatMap(([key, child]) => {
    const lines = group(key, child, []);
    return lines.length > 1 ? ['', ...lines.map(printed)] : lines.map(printed);
  });
}

/** A key with what stands under it; commented out as a whole where the example sets nothing of it. */
function group(key: string, schema: JsonSchema, path: readonly string[]): Line[] {
  const here = [...path, key];
  const indent = '  '.repeat(path.length);
  if (key === 'cutters') {
    return cutterLines(schema);
  }
  if (LATER.includes(here.join('.'))) {
    return [];
  }
  const children = Object.entries(schema.properties ?? {}).flatMap(([name, child]) =>
    group(name, child, here),
  );
  if (children.length > 0) {
    const live = children.some((line) => line.live);
    return [{ live, text: `${indent}${key}:`, comment: schema.description }, ...children];
  }
  const leaf = schema.anyOf?.[0] ?? schema;
  const comment = schema.description ?? leaf.description;
  const value = EXAMPLE[here.join('.')];
  const example = value ?? String(schema.examples?.[0] ?? leaf.examples?.[0] ?? '');
  const forms = (FORMS[here.join('.')] ?? []).map((form) => ({ live: false, text: '', comment: form }));
  return comment === undefined
    ? []
    : [
        { live: value !== undefined, text: `${indent}${key}: ${example}`, comment: choices(comment, leaf) },
        ...forms,
      ];
}

function choices(comment: string, { enum: options }: JsonSchema): string {
  const words = (options ?? []).filter((one) => typeof one === 'string');
  return words.length > 1 && words.some((word) => !comment.includes(word))
    ? `${comment} (${words.join(' | ')})`
    : comment;
}

function cutterLines(schema: JsonSchema): Line[] {
  const one = schema.anyOf
    ?.map((branch) => branch.additionalProperties)
    .find((each) => typeof each === 'object');
  const keys = typeof one === 'object' ? Object.entries(one.properties ?? {}) : [];
  const cutters = Object.entries(CUTTERS).map(([number, said]) => {
    const values = keys.flatMap(([key]) => (said[key] === undefined ? [] : [`${key}: ${said[key]}`]));
    return { live: true, text: `  ${number}: { ${values.join(', ')} }`, comment: undefined };
  });
  const meanings = keys.map(([key, child]) => ({
    live: false,
    text: '',
    comment: `  ${key}: ${child.description ?? ''}`,
  }));
  return [{ live: true, text: 'cutters:', comment: schema.description }, ...meanings, ...cutters];
}

/** Comments begin in one column, so that the values can be read down the page. */
const COLUMN = 38;

function printed({ live, text, comment }: Line): string {
  if (text === '') {
    return `  # ${(comment ?? '').trimStart()}`;
  }
  const line = live ? text : `# ${text}`;
  return comment === undefined ? line : `${line.padEnd(COLUMN)} # ${comment}`;
}

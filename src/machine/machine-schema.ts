/**
 * What a machine file may hold: every key, its range, and which are safety fields. A key without `.default` is a
 * safety field: it must be given, by the file or by what it is `like`. Lengths mm, feeds mm/min, seconds, whatever
 * unit the programs are in; `none` is written where there is nothing.
 * In: a plain tree with keys as in the file. Out: the tree with defaults filled in, or every issue with its path.
 * The defaults are the most cautious values that the controller of NISTIR 6556 reads. Only this file
 * and the one with its values know zod.
 */
import * as z from 'zod';
import {
  GWORD,
  MODE,
  MODES,
  PROVED,
  PROVED_WORDS,
  WORDS,
  axes,
  group,
  number,
  oneOf,
  orNone,
  plainGroup,
  text,
  travel,
  whole,
  words,
  yesNo,
} from './machine-schema-values.ts';

export interface SchemaIssue {
  readonly kind: 'unknown-key' | 'missing' | 'invalid';
  readonly path: readonly (string | number)[];
  /** What would be right: 'a whole number from 20 to 256 characters'. */
  readonly expected: string;
  /** Of an unknown key: the key, and the ones known in its place. */
  readonly key?: string;
}

export type MachineTree = z.infer<ReturnType<typeof machineSchema>>;
export type Checked =
  | { readonly ok: true; readonly tree: MachineTree }
  | { readonly ok: false; readonly issues: readonly SchemaIssue[] };

export function checkTree(tree: unknown): Checked {
  const parsed = theSchema().safeParse(tree, { jitless: true });
  return parsed.success
    ? { ok: true, tree: parsed.data }
    : { ok: false, issues: parsed.error.issues.flatMap((issue) => plainIssue(issue, tree)) };
}

/** Keys known at a place of the file, for the nearest one to a mistyped key and for posts/README.md. */
export function knownKeys(path: readonly (string | number)[]): readonly string[] {
  let here: unknown = theSchema();
  for (const key of path) {
    here = shapeOf(here)?.[String(key)];
  }
  return Object.keys(shapeOf(here) ?? {});
}

let schema: ReturnType<typeof machineSchema> | undefined;

/** Built when first asked for, so that a command that reads no machine file does not wait for it. */
function theSchema(): ReturnType<typeof machineSchema> {
  return (schema ??= machineSchema());
}

function shapeOf(type: unknown): Record<string, unknown> | undefined {
  let here = type as
    { shape?: Record<string, unknown>; def?: { innerType?: unknown; out?: unknown } } | undefined;
  while (here !== undefined && here.shape === undefined) {
    here = (here.def?.innerType ?? here.def?.out) as typeof here;
  }
  return here?.shape;
}

function plainIssue(issue: z.core.$ZodIssue, tree: unknown): SchemaIssue[] {
  const path = issue.path.map((key) => (typeof key === 'number' ? key : String(key)));
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ kind: 'unknown-key', path, key, expected: '' }));
  }
  const given = path.reduce<unknown>(
    (here, key) => (here as Record<string, unknown> | undefined)?.[key],
    tree,
  );
  return [{ kind: given === undefined ? 'missing' : 'invalid', path, expected: issue.message }];
}

function machineSchema() {
  return group({
    format: oneOf('ogive-machine/1').default('ogive-machine/1'),
    description: text(/^[ -~]{3,200}$/, 'a line of plain text, 3 to 200 characters'),
    like: text(/^[a-z0-9][a-z0-9-]*$/, 'the name of another machine file').optional(),
    units: oneOf('mm', 'inch'),
    proved: text(PROVED, PROVED_WORDS).default('unproved'),
    words: group({
      file: fileWords(),
      blocks: blockWords(),
      numbers: numberWords(),
      modes: modeWords(),
      arcs: arcWords(),
      holes: holeWords(),
      dwell: group({ letter: oneOf('P', 'X', 'F', 'S', 'none'), unit: oneOf('seconds', 'milliseconds') }),
      cutters: cutterWords(),
      spindle: spindleWords(),
      positions: positionWords(),
      path: pathWords(),
      rotary: rotaryWords(),
      end: group({ end: oneOf('M2', 'M30'), restore: words(MODE, MODES).default([]) }),
      language: languageWords(),
    }),
    limits: limits(),
  });
}

const fileWords = () =>
  group({
    ending: text(/^\.[a-z0-9]{1,8}$/, "a file ending with its point, like '.nc'").default('.nc'),
    'percent-lines': oneOf('none', 'both').default('both'),
    'program-label': oneOf('none', 'o-number', 'percent-name'),
    'label-digits': whole(1, 8, 'digits').default(4),
    'label-lowest': whole(0, 99_999_999).default(1),
    'label-highest': whole(0, 99_999_999).default(7999),
    'line-end': oneOf('lf', 'crlf').default('crlf'),
    'line-longest': whole(20, 256, 'characters'),
    'letter-case': oneOf('upper', 'any').default('upper'),
    'comment-form': oneOf('brackets', 'semicolon', 'none'),
    'comment-own-line': yesNo().default(true),
    'comment-letters': text(/^[!-~]{0,60}$/, 'plain signs without blanks, at most 60, in quotes'),
    'operator-note': orNone(text(/^[A-Z]{2,8},?$/, "a word like 'MSG,', or none")).default(null),
    'gap-between-words': yesNo().default(true),
    'file-largest': orNone(whole(1000, 1_000_000_000, 'bytes, or none')),
    'banned-characters': text(/^[!-~]{0,60}$/, 'plain signs without blanks, at most 60, in quotes'),
  });

const blockWords = () =>
  group({
    numbers: oneOf('none', 'all', 'cutter-changes').default('none'),
    first: whole(0, 99_999).default(10),
    step: whole(1, 1000).default(10),
    last: whole(99, 9_999_999).default(9999),
    'skip-mark': oneOf('honoured', 'ignored', 'forbidden'),
  });

const numberWords = () =>
  group({
    'length-decimals': group({
      mm: whole(3, 6, 'decimals').default(4),
      inch: whole(4, 7, 'decimals').default(5),
    }),
    'angle-decimals': whole(2, 6, 'decimals').default(3),
    'feed-decimals': whole(0, 4, 'decimals').default(1),
    'seconds-decimals': whole(0, 4, 'decimals').default(3),
    'speed-decimals': whole(0, 3, 'decimals').default(0),
    point: oneOf('always', 'as-needed'),
    'trailing-zeros': oneOf('keep', 'drop').default('drop'),
    'leading-zero': oneOf('keep', 'drop').default('keep'),
    'code-width': whole(1, 2, 'digits')
      .pipe(z.union([z.literal(1), z.literal(2)]))
      .default(1),
    'value-largest': number(10, 999_999.999_999, 'in the unit of the program'),
  });

const modeWords = () =>
  group({
    'millimetre-word': text(GWORD, "a G word like 'G21'"),
    'inch-word': text(GWORD, "a G word like 'G20'"),
    opening: words(MODE, MODES),
    'opening-one-per-block': yesNo().default(false),
    'power-on': words(WORDS, 'a list of words').default([]),
    'mode-repeat': oneOf('changed', 'every-block').default('changed'),
    'axis-repeat': oneOf('changed', 'every-block').default('changed'),
  });

const arcWords = () =>
  group({
    planes: oneOf('none', 'xy', 'xy-xz-yz'),
    centre: oneOf('from-start', 'from-zero', 'radius'),
    'centre-word': orNone(text(/^G9[01]\.1$/, 'G91.1 or G90.1, or none')).default(null),
    'zero-words': oneOf('write', 'omit').default('write'),
    'end-words': oneOf('both', 'changed').default('both'),
    'longest-sweep': number(30, 360, 'degrees').default(180),
    quadrants: yesNo().default(false),
    'whole-circle': oneOf('one-block', 'split'),
    helix: yesNo(),
    'helix-shallowest': number(0, 1, 'mm a turn').default(0.05),
    'miss-absolute': group({
      mm: number(0.0005, 0.5, 'mm').default(0.002),
      inch: number(0.000_02, 0.02, 'inch').default(0.0002),
    }),
    'miss-share': orNone(number(0.0001, 0.1, 'of the radius, or none')).default(null),
    'miss-at-most': orNone(number(0.001, 5, 'mm, or none')).default(null),
    'shortest-chord': number(0.001, 0.5, 'mm'),
    'smallest-radius': number(0.001, 1, 'mm').default(0.02),
    'largest-radius': number(10, 1_000_000, 'mm').default(9999),
    'chord-tolerance': number(0.0001, 0.01, 'mm').default(0.0005),
  });

const holeWords = () =>
  group({
    cycles: z.array(oneOf('G73', 'G81', 'G82', 'G83', 'G84', 'G85', 'G86', 'G88', 'G89'), {
      error: 'a list of cycles like G81, G82, G83; [] for none',
    }),
    'return-word': oneOf('none', 'G98', 'G99'),
    'clear-meaning': oneOf('absolute', 'from-start-level'),
    // A word that moves, or sets a mode, would take its place in every program.
    'end-word': oneOf('G80'),
    'peck-return': oneOf('clear-height', 'R').default('clear-height'),
  });

const cutterWords = () =>
  group({
    change: oneOf('automatic', 'by-hand', 'one-program'),
    words: oneOf('T-and-M6', 'T-then-M6', 'T-only', 'none').default('T-and-M6'),
    highest: whole(1, 9999).default(99),
    'length-offset': oneOf('none', 'G43-H', 'with-T'),
    'length-cancel': oneOf('none', 'G49-at-end'),
  });

const spindleWords = () =>
  group({
    run: oneOf('program', 'by-hand'),
    forward: oneOf('M3', 'M4'),
    'spin-up-seconds': number(0, 120, 'seconds'),
    'speed-word': oneOf('S-first', 'together').default('S-first'),
  });

const positionWords = () =>
  group({
    'work-offset': text(/^(none|G5[4-9](\.[1-9])?( P\d{1,3})?)$/, "a word like 'G54', or none"),
    top: oneOf('none', 'G53-Z', 'G28-named', 'G28-all'),
    'top-machine-z': orNone(number(-2000, 2000, 'mm, or none')),
    'rapid-shape': oneOf('straight', 'dog-leg'),
  });

const pathWords = () =>
  group({
    finishing: orNone(text(WORDS, "words like 'G61', or none")),
    roughing: orNone(text(WORDS, "words like 'G64', or none")),
    'roughing-strays': orNone(number(0, 0.5, 'mm, or none')).default(null),
    'feed-mode': orNone(text(/^G94$/, 'G94, or none')).default('G94'),
    'helix-feed-along': oneOf('helix', 'circle').default('helix'),
    'feed-demanded': yesNo().default(true),
  });

const languageWords = () =>
  group({
    parameters: oneOf('none', 'numbered', 'numbered-and-named').default('none'),
    'set-zero': z.array(oneOf('G10', 'G92'), { error: 'a list of G10, G92; [] for none' }).default([]),
    'inverse-time': yesNo().default(false),
    subprograms: oneOf('none', 'M98', 'O-words').default('none'),
    loops: oneOf('none', 'O-words').default('none'),
  });

/** The one group that may be absent; `rotary: none` takes away what the file it is `like` has. */
const rotaryWords = () =>
  z.preprocess((v) => (v === 'none' ? undefined : v), theRotary().optional()).optional();

const theRotary = () =>
  plainGroup({
    letter: oneOf('A', 'B', 'C'),
    about: oneOf('X', 'Y', 'Z'),
    sense: oneOf('plus', 'minus'),
    count: oneOf('endless', 'shortest-way', 'sign-is-direction'),
    'most-per-block': number(1, 360, 'degrees').default(90),
  });

const limits = () =>
  group({
    travel: axes(travel()),
    'feed-lowest': number(0.1, 1000, 'mm/min').default(1),
    'feed-highest': number(10, 60_000, 'mm/min').default(1000),
    rapid: axes(number(10, 120_000, 'mm/min')).default({ x: 1000, y: 1000, z: 500 }),
    'spindle-lowest': number(0, 100_000, 'turns a minute'),
    'spindle-highest': number(10, 300_000, 'turns a minute'),
    acceleration: axes(number(1, 20_000, 'mm/s2')).default({ x: 100, y: 100, z: 50 }),
    'corner-allowance': number(0.0001, 1, 'mm').default(0.01),
    'smallest-step': number(0.000_001, 0.1, 'mm').default(0.001_25),
    'block-seconds': number(0, 1, 'seconds').default(0.005),
    runout: number(0, 0.2, 'mm').default(0.01),
    nut: group({ diameter: number(5, 100, 'mm'), length: number(5, 100, 'mm') }),
    power: number(5, 50_000, 'watts').default(100),
  });

/** What each way of holding asks of the person who sets the blank up. */
import type { Setup } from '../cutting/setup.ts';
import type { Job } from '../job/job.ts';
import { lengthBoth } from './lengths.ts';

export const HOLDING_WORDS: Readonly<Record<Setup['holding'][number], (job: Job) => string>> = {
  glue: () =>
    'Glued flat on a waste plate, both faces clean and roughened, the glue set hard; a bowed sheet lifts when it is cut through.',
  tape: () =>
    'Taped flat on a waste plate, both faces free of grease, pressed down all over; tape creeps when it grows warm.',
  arbor: () =>
    'On its arbor under the nut, running true: put a dial gauge on the rim, half its swing is how far the teeth will stand off the axis.',
  skin: ({ setup, length }) =>
    `Clamped flat on the plate; a skin of ${lengthBoth(setup.skin, length)} stays under everything that is cut and holds wheel and slugs. Zero must be right, and the sheet flat, to less than that. The skin is stoned or filed away afterwards.`,
  screw: () =>
    'The screw through the bore presses it down; it does not keep it from turning, the other hold does.',
};

/** Dangers of how the path is followed, of cycles, of the way to the top and of the rotary axis. */
import { danger, those, type Danger } from './danger.ts';
import type { Machine } from './machine.ts';

export function pathDangers(machine: Machine): readonly Danger[] {
  return [
    ...wordDangers(machine),
    ...strayDangers(machine),
    ...topDangers(machine),
    ...otherDangers(machine),
  ];
}

/** Words that follow the path; G60 and G61 mean other things on other controllers. */
const PATH_WORDS = /^(G9|G60|G61|G61\.1|G64|[PQ]\d+(\.\d+)?)$/;

function wordDangers(machine: Machine): readonly Danger[] {
  const { path, modes } = machine.words;
  const din = modes.millimetreWord === 'G71';
  const said = [
    ['finishing', path.finishing],
    ['roughing', path.roughing],
  ] as const;
  return said.flatMap(([key, words]) => {
    const list = words?.split(' ') ?? [];
    const strange = list.filter((word) => !PATH_WORDS.test(word));
    return those(
      strange.length > 0 &&
        danger(
          `words.path.${key}`,
          `${strange.join(' ')} is no word for how a path is followed: it would move the machine or change another mode in the middle of a job.`,
          'G61, G61.1, G60 or G64, with P where the controller takes a tolerance.',
        ),
      din &&
        list.some((word) => word.startsWith('G61')) &&
        danger(
          `words.path.${key}`,
          'Some controllers that take G71 for millimetres take G61 for rounding: the corners of the teeth would be cut off.',
          'Exact stop is G60 there.',
        ),
    );
  });
}

/** mm that roughing leaves for finishing where a job says nothing. Why: straying as far as this cuts into the finished tooth. */
const USUAL_ALLOWANCE = 0.03;

function strayDangers(machine: Machine): readonly Danger[] {
  const { finishing, roughing, roughingStrays } = machine.words.path;
  const rounds = roughing?.includes('G64') === true;
  return those(
    finishing?.includes('G64') === true &&
      danger(
        'words.path.finishing',
        'G64 keeps the speed and rounds off what is in the way, without a limit: the flanks would not be what was programmed.',
        'Say G61 (G60 on a DIN controller), or none.',
      ),
    rounds &&
      roughingStrays === null &&
      danger(
        'words.path.roughing-strays',
        'G64 rounds corners by an amount that only this machine knows; more than the allowance and roughing cuts into the finished teeth.',
        'Measure it on a square corner, or reckon v2/(4a) with the roughing feed and the acceleration; or say roughing: none.',
      ),
    roughingStrays !== null &&
      roughingStrays >= USUAL_ALLOWANCE &&
      danger(
        'words.path.roughing-strays',
        `Straying ${roughingStrays} mm from the path takes all of the usual allowance, ${USUAL_ALLOWANCE} mm: roughing would cut into the finished teeth.`,
        'Rough with the words for finishing.',
      ),
    rounds &&
      finishing === null &&
      danger(
        'words.path.finishing',
        'After G64 for roughing nothing puts it out again: the teeth would be finished with rounded corners.',
        'Give the words for exact path, or say roughing: none.',
      ),
  );
}

function topDangers(machine: Machine): readonly Danger[] {
  const { top, topMachineZ } = machine.words.positions;
  const [low, high] = machine.limits.travel.z;
  return those(
    top === 'G53-Z' &&
      topMachineZ === null &&
      danger(
        'words.positions.top-machine-z',
        "G53 Z needs the machine's own Z of the top; a guess may send the spindle down.",
        'Home the machine, raise Z all the way and read the machine position.',
      ),
    top === 'G53-Z' &&
      topMachineZ !== null &&
      (topMachineZ > high || topMachineZ < (low + high) / 2) &&
      danger(
        'words.positions.top-machine-z',
        `${topMachineZ} mm is no top of a travel from ${low} to ${high} mm: the machine would run into its stop, or the spindle go down.`,
        "Give the machine's own Z with the spindle at its highest.",
      ),
    top === 'G28-all' &&
      danger(
        'words.positions.top',
        'This G28 sends every axis home, not Z alone: X and Y move while Z rises, across whatever stands there. No program that does so passes its proof.',
        'If the controller moves only the named axes say G28-named; if it has machine coordinates say G53-Z; else say none.',
      ),
  );
}

function otherDangers(machine: Machine): readonly Danger[] {
  const { holes, rotary } = machine.words;
  return those(
    holes.cycles.length > 0 &&
      holes.returnWord === 'none' &&
      danger(
        'words.holes.return-word',
        'Without G98 or G99 a cycle returns to whatever level the job before left: the way to the next hole may go through a clamp.',
        'Say G98.',
      ),
    rotary?.count === 'shortest-way' &&
      rotary.mostPerBlock >= 180 &&
      danger(
        'words.rotary.most-per-block',
        `A turn of ${rotary.mostPerBlock} degrees in one block may go either way where the shortest is taken: the cutter is dragged through the blank.`,
        'Give 90.',
      ),
  );
}

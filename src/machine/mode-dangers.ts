/** Dangers in the modes written at start and end: what is not said there is inherited from the job before. */
import { caution, danger, those, type Danger } from './danger.ts';
import type { Machine } from './machine.ts';
import { modalGroup, movesAtOnce } from './modal-group.ts';

export function modeDangers(machine: Machine): readonly Danger[] {
  return [
    ...unitDangers(machine),
    ...openingDangers(machine),
    ...inheritedDangers(machine),
    ...endDangers(machine),
  ];
}

function unitDangers(machine: Machine): readonly Danger[] {
  const { millimetreWord, inchWord, opening } = machine.words.modes;
  const literal = opening.filter((word) => ['G20', 'G21', 'G70', 'G71'].includes(word));
  const pair = `${inchWord}/${millimetreWord}`;
  return those(
    !['G20/G21', 'G70/G71'].includes(pair) &&
      danger(
        'words.modes.millimetre-word',
        `${inchWord} for inches with ${millimetreWord} for millimetres is no pair of any standard: the part would come out 25.4 times too large or too small, or mirrored.`,
        'G20 and G21 belong together (inch, mm), and G70 and G71 (inch, mm).',
      ),
    opening.filter((word) => word === 'UNIT').length !== 1 &&
      danger(
        'words.modes.opening',
        'The opening must say UNIT once: otherwise the unit of the job before stays, and every length is 25.4 times too large or too small.',
        `UNIT is written as ${machine.units === 'mm' ? millimetreWord : inchWord}.`,
      ),
    literal.length > 0 &&
      danger(
        'words.modes.opening',
        `${literal.join(' ')} in the opening may contradict units: ${machine.units}; the last one said would win.`,
        'Write UNIT in its place.',
      ),
  );
}

function openingDangers(machine: Machine): readonly Danger[] {
  const { opening } = machine.words.modes;
  const moving = opening.filter(movesAtOnce);
  const wrong = opening.filter((word) => WRONG_AT_START.includes(word));
  const groups = opening.map(modalGroup);
  const twice = opening.filter((_, i) => groups[i] !== undefined && groups.indexOf(groups[i]) !== i);
  return those(
    moving.length > 0 &&
      danger(
        'words.modes.opening',
        `${moving.join(' ')} moves the machine or shifts its zero before the operator expects anything.`,
        'The opening only sets modes.',
      ),
    wrong.length > 0 &&
      danger(
        'words.modes.opening',
        `${wrong.join(' ')} sets a mode that programs are not written for: lengths, planes or feeds would be read as something else.`,
        'Programs are written for G90, G17, G94 and compensation off.',
      ),
    twice.length > 0 &&
      danger(
        'words.modes.opening',
        `${twice.join(' ')} sets a mode that another word of the opening has set: the controller stops at two of a group, or takes the last.`,
        'Keep one of each group.',
      ),
  );
}

const WRONG_AT_START = ['G91', 'G90.1', 'G18', 'G19', 'G41', 'G42', 'G43', 'G93', 'G95'];

function inheritedDangers(machine: Machine): readonly Danger[] {
  const { modes, arcs, path, positions } = machine.words;
  const lacks = (word: string | null): boolean =>
    word !== null && word !== 'none' && !modes.opening.includes(word);
  const missing = (word: string, would: string): Danger =>
    danger('words.modes.opening', `${word} is not in the opening: ${would}`, `Add ${word}.`);
  return those(
    lacks('G90') &&
      missing('G90', 'if the job before left G91, every position would be added to the one before.'),
    arcs.planes !== 'none' &&
      lacks('G17') &&
      missing('G17', 'if the job before left another plane, arcs would dive into the table.'),
    lacks(path.feedMode) &&
      missing(path.feedMode ?? '', 'a feed left in turns or in inverse time would be read as mm a minute.'),
    lacks(positions.workOffset) &&
      missing(positions.workOffset, 'the zero of whatever job ran before would be used.'),
    lacks(arcs.centreWord) &&
      missing(
        arcs.centreWord ?? '',
        'arc centres would be read as they were for the job before: huge wrong arcs.',
      ),
    arcs.planes !== 'none' &&
      lacks('G40') &&
      caution(
        'words.modes.opening',
        'G40 is not in the opening: a radius compensation left on by the job before would shift every path by a cutter radius.',
        'Add G40, unless the controller has no compensation.',
      ),
  );
}

function endDangers(machine: Machine): readonly Danger[] {
  const { restore } = machine.words.end;
  const wrong = restore.filter((word) => movesAtOnce(word) || WRONG_AT_START.includes(word));
  return those(
    wrong.length > 0 &&
      danger(
        'words.end.restore',
        `${wrong.join(' ')} at the end moves the machine, or leaves the next job a mode it does not expect.`,
        'Write back only G17, UNIT, G40, G80, G90, G94 and a path mode.',
      ),
  );
}

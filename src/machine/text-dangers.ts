/** Dangers in the text itself: lines that are too long, comments that are not comments, labels that overwrite. */
import { caution, danger, those, type Danger } from './danger.ts';
import { longestBlock } from './longest-block.ts';
import type { Machine } from './machine.ts';

export function textDangers(machine: Machine): readonly Danger[] {
  return [...labelDangers(machine), ...commentDangers(machine), ...lineDangers(machine)];
}

/** Endings that a desk computer takes for orders, archives or pictures (common knowledge, no source). */
const STARTED = [
  '.exe .com .bat .cmd .msi .scr .dll .sys .lnk .app .pif .cpl .hta .so .sh .bash .ps1 .vbs .js .mjs .cjs .ts .py .pl',
  '.rb .php .jar .reg .zip .gz .tar .rar .7z .img .dmg .deb .rpm .apk .bin .pdf .doc .docx .xls .xlsx .csv .xml .htm',
  '.md .log .ini .conf .png .jpg .jpeg .gif .bmp .webp .mp3 .mp4 .wav .part .bak .old .tmp',
].flatMap((endings) => endings.split(' '));

function labelDangers(machine: Machine): readonly Danger[] {
  const { programLabel, percentLines, labelDigits, labelLowest, labelHighest, ending } = machine.words.file;
  const labelled = programLabel !== 'none';
  return those(
    labelled &&
      percentLines === 'none' &&
      danger(
        'words.file.program-label',
        `${programLabel} without % lines: a controller that keeps programs by number looks for % to know where one begins, and would refuse the program or run on into another.`,
        'Say percent-lines: both, or program-label: none.',
      ),
    labelled &&
      labelHighest >= 10 ** labelDigits &&
      danger(
        'words.file.label-highest',
        `${labelHighest} has more than ${labelDigits} digits: the number would be cut off, and another program be overwritten.`,
        `Say at most ${10 ** labelDigits - 1}.`,
      ),
    labelled &&
      labelLowest > labelHighest &&
      danger(
        'words.file.label-lowest',
        `${labelLowest} is above label-highest, ${labelHighest}: no number is left for a program.`,
        'Give the range that the controller leaves to its user.',
      ),
    STARTED.includes(ending) &&
      danger(
        'words.file.ending',
        `A computer starts or opens a file that ends in ${ending} as something else than a program for a mill.`,
        "Give the ending that the controller lists, like '.nc'.",
      ),
    ['.html', '.svg', '.json', '.yaml', '.yml', '.txt', '.dxf'].includes(ending) &&
      danger(
        'words.file.ending',
        `Programs that end in ${ending} would take the place of the sheet, the picture or a note of the same name.`,
        "Give another ending, like '.nc'.",
      ),
  );
}

function commentDangers(machine: Machine): readonly Danger[] {
  const { commentForm, commentLetters, bannedCharacters, operatorNote } = machine.words.file;
  const marks = [...commentLetters].filter((letter) => '();%'.includes(letter));
  const banned = [...commentLetters].filter((letter) => bannedCharacters.includes(letter));
  return those(
    commentForm !== 'none' &&
      marks.length > 0 &&
      danger(
        'words.file.comment-letters',
        `${marks.join(' ')} would be written inside comments: it ends a comment early, or opens one within another, and what follows is read as words that move.`,
        'Leave ( ) ; and % out.',
      ),
    commentForm !== 'none' &&
      banned.length > 0 &&
      danger(
        'words.file.comment-letters',
        `${banned.join(' ')} is banned too: the controller acts on it at once, even inside a comment (a hold, a reset, another speed).`,
        'Leave out of comment-letters what stands in banned-characters.',
      ),
    operatorNote !== null &&
      commentForm !== 'brackets' &&
      danger(
        'words.file.operator-note',
        `${operatorNote} shows a note only inside brackets; comment-form is ${commentForm}, so the operator would see nothing at a stop.`,
        'Say operator-note: none, or comment-form: brackets.',
      ),
    commentForm === 'none' &&
      machine.words.cutters.change === 'by-hand' &&
      caution(
        'words.file.comment-form',
        'The program stops for hands without a word of what to do; the sheet alone says which cutter is due.',
        'Say change: one-program, if that is the custom at this machine.',
      ),
  );
}

function lineDangers(machine: Machine): readonly Danger[] {
  const { file, blocks } = machine.words;
  const longest = longestBlock(machine);
  const needed = neededSigns(machine).filter((sign) => file.bannedCharacters.includes(sign));
  const letters = lettersOf(machine).filter((letter) => file.bannedCharacters.includes(letter));
  return those(
    needed.length > 0 &&
      danger(
        'words.file.banned-characters',
        `${needed.join(' ')} is banned, but no program can be written without it: the controller would act on it at once.`,
        'Look up which characters the controller picks out of the stream, or change the comment form.',
      ),
    letters.length > 0 &&
      danger(
        'words.file.banned-characters',
        `${letters.join(' ')} is banned: what comments say to hands, which cutter to fit and which speed to set, could not be read.`,
        'Ban signs only; where the controller trips over comments say comment-form: none.',
      ),
    longest > file.lineLongest &&
      danger(
        'words.file.line-longest',
        `A block may take ${longest} characters and a line holds ${file.lineLongest}: the controller drops or cuts what is too long, and the next block starts from the wrong place.`,
        'Give the true length of a line, or fewer decimals, no blanks between words, or no block numbers.',
      ),
    blocks.numbers !== 'none' &&
      blocks.first + blocks.step > blocks.last &&
      danger(
        'words.blocks.last',
        `After N${blocks.first} comes N${blocks.first + blocks.step}, above the last, N${blocks.last}: the numbers would leave the range and the controller stop in the cut.`,
        'Give the largest number that the controller reads.',
      ),
  );
}

/** Letters that comments are written with and words are not. */
function lettersOf({ words: { file } }: Machine): readonly string[] {
  const all = file.letterCase === 'any' ? 'ABCDELOQUVWabcdefghijklmnopqrstuvwxyz' : 'ABCDELOQUVW';
  return file.commentForm === 'none' ? [] : [...all];
}

/** Signs that words cannot do without. */
function neededSigns(machine: Machine): readonly string[] {
  const { file } = machine.words;
  const comment = { brackets: ['(', ')'], semicolon: [';'], none: [] }[file.commentForm];
  const percent = file.percentLines === 'both' ? ['%'] : [];
  return ['.', '-', ...'0123456789', ...'FGMNSTXYZIJKRPH', ...comment, ...percent];
}

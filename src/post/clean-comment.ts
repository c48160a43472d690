/**
 * Text from anywhere (titles, notes, our own sentences) as letters a machine's comment may hold.
 *
 * In  : any text, the machine file's file words. Out: one line of allowed characters, single blanks, trimmed.
 * Kept: nothing in it opens or closes a comment, acts at once on a streamed controller, breaks the line, or would read as a
 *       word (a letter standing alone before a number) if the comment marks were lost: `Z-50` becomes `Z=-50`, or goes.
 */
import type { FileWords } from '../machine/machine.ts';

/** What stands for letters and signs that controllers do not have. */
const STAND_INS: Readonly<Record<string, string>> = {
  ä: 'ae',
  ö: 'oe',
  ü: 'ue',
  Ä: 'Ae',
  Ö: 'Oe',
  Ü: 'Ue',
  ß: 'ss',
  æ: 'ae',
  Æ: 'Ae',
  œ: 'oe',
  Œ: 'Oe',
  ø: 'o',
  Ø: 'O',
  ł: 'l',
  Ł: 'L',
  đ: 'd',
  Đ: 'D',
  '°': ' deg ',
  '\u00b5': 'micro',
  '\u03bc': 'micro',
  '×': ' by ',
  '±': ' plus or minus ',
  '\u2212': '-',
  '\u2013': '-',
  '\u2014': '-',
  '%': ' percent ',
  '&': ' and ',
  "'": '',
  '\u2019': '',
  '"': '',
  ';': ',',
};

const NEEDS_STAND_IN = /[^ -~]|[%&'";]/;

/** Never in a comment, whatever the machine file allows: these open, close or delimit. */
const NEVER = '()[]{};%/\\"\'#';

/** What stands for done once a person has been at the machine, where no word says it: a title or a note must not. */
const ORDER = /^(cutter \d+$|set the spindle to|switch the spindle off)/i;

/** First words that some controllers act on even inside brackets. */
const ACTIVE_FIRST = /^(MSG|PRINT|DEBUG|LOG|PROBE)/i;

export type Cleaner = (text: string) => string;

export function commentCleaner(file: FileWords): Cleaner {
  const letters = allowedLetters(file);
  const has = (letter: string): boolean => letters.includes(letter);
  const notAllowed = noneOf(letters);
  // Points and signs stay until words that could be read are broken and figures are said in full.
  const notAtFirst = noneOf(`${letters}.-`);
  const colons = colonsAs(has);
  return (text) => {
    const plain = colons(NEEDS_STAND_IN.test(text) ? standIns(text) : text);
    const cased = file.letterCase === 'upper' ? plain.toUpperCase() : plain;
    const unread = breakWords(cased.replace(notAtFirst, ' '), has('='));
    const kept = signsInWords(unread, has).replace(notAllowed, ' ');
    return kept.replace(/ +(?=[ .,:])/g, '').trim();
  };
}

/** A colon that the letters lack still parts what it parted: "do what it says" must not run into what stands before it. */
function colonsAs(has: (letter: string) => boolean): (text: string) => string {
  if (has(':')) {
    return (text) => text;
  }
  const instead = [' - ', ', ', '. '].find((sign) => has(sign.trim())) ?? ' ';
  // A dash before a figure would read as its sign.
  const beforeFigure = [', ', '. '].find((sign) => has(sign.trim())) ?? ' ';
  return (text) =>
    text.replace(/:(?: +|(?=\D)|$)(?=([-+.\d])?)/g, (_, figure?: string) =>
      figure === undefined ? instead : beforeFigure,
    );
}

/** What a comment may hold. */
function allowedLetters(file: FileWords): string {
  const lower = file.letterCase === 'any' ? 'abcdefghijklmnopqrstuvwxyz' : '';
  return [...`ABCDEFGHIJKLMNOPQRSTUVWXYZ${lower}0123456789 ${file.commentLetters}`]
    .filter(
      (letter) =>
        letter >= ' ' && letter <= '~' && !NEVER.includes(letter) && !file.bannedCharacters.includes(letter),
    )
    .join('');
}

function noneOf(letters: string): RegExp {
  return new RegExp(`[^${letters.replace(/[\\\]^-]/g, '\\$&')}]`, 'g');
}

/** Accents dropped, signs spelt; what has no stand-in is left for the filter. */
function standIns(text: string): string {
  const spelt = text.normalize('NFC').replace(/[^ -~]|[%&'";]/g, (letter) => STAND_INS[letter] ?? letter);
  return spelt.normalize('NFKD').replace(/[\u0300-\u036f]/g, '');
}

/** A point or a sign that the letters lack is said in words: a figure must not lose its decimals or its sign. */
function signsInWords(text: string, has: (letter: string) => boolean): string {
  let said = text;
  if (!has('.')) {
    said = said.replace(/(\d)\.(?=\d)/g, '$1 POINT ');
  }
  if (!has('-')) {
    said = said.replace(/(^|[^\w])-(?=\.?\d)/g, '$1MINUS ');
  }
  return said;
}

/** A lone letter before a number is what a block is made of. The mark after its own word at the start of a line stays whole. */
function breakWords(text: string, equalsAllowed: boolean): string {
  return text.replace(
    /(?<=^mark )[0-9A-F]{8}\b|(?<![A-Za-z])([A-Za-z])([-+ .]*\d[\d.]*)/gi,
    (whole: string, letter: string | undefined, number: string) =>
      letter === undefined ? whole : equalsAllowed ? `${letter}=${number.replace(/ /g, '')}` : ' ',
  );
}

/**
 * A cleaned text in lines of at most `width` characters, broken at blanks. A word longer than a line is cut off: broken
 * in two, its rest could begin with anything.
 */
export function foldText(text: string, width: number): readonly string[] {
  if (text.length <= width && !ACTIVE_FIRST.test(text)) {
    return text === '' ? [] : [text];
  }
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const fitting = word.slice(0, width);
    if (line !== '' && line.length + 1 + fitting.length > width) {
      lines.push(line);
      line = fitting;
    } else {
      line = line === '' ? fitting : `${line} ${fitting}`;
    }
  }
  lines.push(line);
  return lines
    .filter((each) => each !== '')
    .map((each) => (ACTIVE_FIRST.test(each) ? `NOTE ${each}`.slice(0, width) : each));
}

/** A line that would read as an order to whoever changes cutters and sets speeds by hand is made a note. */
export function withoutOrders(line: string, width: number): string {
  return ORDER.test(line) ? `NOTE ${line}`.slice(0, width) : line;
}

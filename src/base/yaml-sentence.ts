/**
 * What the YAML parser objects to, in words for somebody who has never heard of YAML, with what to do about it.
 * In: the parser's code and its own sentence, which is kept where nothing better is known.
 */
export function yamlSentence(code: string, sentence: string): { message: string; hint?: string } {
  const flow = FLOWS.find((one) => sentence.startsWith(one.begins));
  return (
    flow?.says ??
    SENTENCES[code] ?? {
      message: `This is not valid YAML: ${sentence.split('\n')[0] ?? ''}.`.replace('..', '.'),
    }
  );
}

/** What the parser says of its flow collections, which it counts among the faults of indentation. */
const FLOWS = [
  {
    begins: 'Flow map',
    says: {
      message: 'A brace that is opened before this place is not closed.',
      hint: 'Look for a { without its }.',
    },
  },
  {
    begins: 'Flow sequence',
    says: {
      message: 'A bracket that is opened before this place is not closed.',
      hint: 'Look for a [ without its ].',
    },
  },
];

const SENTENCES: Readonly<Record<string, { message: string; hint?: string }>> = {
  TAB_AS_INDENT: {
    message: 'A tab stands at the beginning of a line.',
    hint: 'Indent with blanks.',
  },
  MULTIPLE_DOCS: {
    message: 'A second document begins here (a line of ---).',
    hint: 'One file holds one job or one machine: make two files of it.',
  },
  BLOCK_AS_IMPLICIT_KEY: {
    message: 'Two keys stand on one line, or a text holds a colon.',
    hint: 'A second key goes on a line of its own; a text with a colon goes between quotes: "Third wheel: brass".',
  },
  MULTILINE_IMPLICIT_KEY: {
    message: 'This line has no key that can be read.',
    hint: 'A colon is followed by a blank: "teeth: 60", not "teeth:60".',
  },
  MISSING_CHAR: {
    message: 'Something that was opened is not closed, or a comma or colon is missing.',
    hint: 'Look for a quote, brace or bracket without its partner.',
  },
  BAD_SCALAR_START: {
    message: 'A value cannot begin with this character.',
    hint: 'Put the value between quotes: "…".',
  },
  BAD_DQ_ESCAPE: {
    message: 'A backslash between double quotes begins something unknown.',
    hint: "Use single quotes: 'C:\\wheels'.",
  },
  BAD_ALIAS: { message: 'A value cannot begin with *.', hint: 'Put the value between quotes: "…".' },
  KEY_OVER_1024_CHARS: { message: 'A key is longer than 1024 letters.' },
  RESOURCE_EXHAUSTION: { message: 'Values are nested too deep.' },
  UNEXPECTED_TOKEN: {
    message: 'Something stands here that does not belong.',
    hint: 'A comma too many, a brace without its partner, or text after a closed value.',
  },
  BAD_INDENT: {
    message: 'The lines of one group do not begin in the same column.',
    hint: 'Let all keys of a group begin in the same column, further in than the key above them.',
  },
};

/** Blanks of print and of web pages look like blanks and part nothing: looked for where a line was not understood. */
export function oddBlank(text: string, offset: number): { message: string; hint: string } | undefined {
  const start = text.lastIndexOf('\n', offset - 1) + 1;
  const end = text.indexOf('\n', offset);
  const line = text.slice(start, end < 0 ? text.length : end);
  return ODD_BLANK.test(line)
    ? {
        message:
          'This line holds a blank that is none, as text copied from a page has it (a no-break space or the like).',
        hint: 'Type the blanks of this line anew.',
      }
    : undefined;
}

const ODD_BLANK = /[\u00a0\u2000-\u200b\u202f\u205f\u3000\ufeff]/;

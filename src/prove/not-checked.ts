/** What no reading of a program can tell: said with every verdict, never empty. */
import type { Evidence } from './evidence.ts';
import type { Trace } from './trace-program.ts';

/** `named`: the programs that are spoken of, which may be more than those that cut. */
export function notChecked(evidence: Evidence, named: readonly Trace[]): string[] {
  const { input } = evidence;
  const { setup, target } = input;
  const said = new Set([
    'the cutters: runout, wear, length, and that each is the one the program calls for',
    'bending of cutter, spindle and blank under the load of the cut',
    'play of the slides',
    'how strongly the blank is held',
    `that zero was set on the wheel's axis and at the right height`,
    'feed and speed overrides turned by hand',
    'whether speeds and feeds suit cutter and material well: only what no cutter bears, and the limits of the machine, are held',
  ]);
  if (setup.zeroAt === undefined) {
    said.add(
      "where the blank stands on the table: travel was judged by its size only, for want of 'zero-at'",
    );
  }
  if (target === undefined) {
    said.add('the form of the part: no job was given to hold it against');
  } else {
    if (target.form.proportions.addendumForm === 'arc') {
      said.add('the rolling law: an addendum of one arc does not follow it');
    }
    if (setup.bored > 0) {
      said.add('the hole that was there before: its size and place');
    }
  }
  for (const sentence of notReadOf(named)) {
    said.add(sentence);
  }
  return [...said];
}

/** What reading itself leaves open, over all programs: each thing once. */
function notReadOf(traces: readonly Trace[]): string[] {
  const alone = traces.reduce((sum, trace) => sum + trace.alone, 0);
  const reckoned = traces.reduce((sum, trace) => sum + trace.reckoned, 0);
  const passedOver = traces.reduce((sum, trace) => sum + trace.passedOver, 0);
  return [
    'what the controller itself does otherwise than its machine file says',
    ...(alone > 0
      ? [
          alone === 1
            ? '1 line that holds only %: the second reader cannot read it'
            : `${String(alone)} lines that hold only %: the second reader cannot read them`,
        ]
      : []),
    ...(reckoned > 0
      ? [
          `${String(reckoned)} line${reckoned === 1 ? '' : 's'} with parameters, expressions or words of loops and calls: read by one reader alone, the second one knows none of them`,
        ]
      : []),
    ...(traces.some(({ jumps }) => jumps)
      ? ['lines to which no loop, branch or call of the program came: they were not run, and not read']
      : []),
    ...(passedOver > 0
      ? [
          `${String(passedOver)} line${passedOver === 1 ? '' : 's'} that begin${passedOver === 1 ? 's' : ''} with /: passed over, as the switch was said to be on`,
        ]
      : []),
    ...traces.flatMap((trace) =>
      trace.complete ? [] : [`everything from line ${String(trace.lastRead)} of ${trace.file} on`],
    ),
  ];
}

/** What no reading of a program can tell: said with every verdict, never empty. */
import type { Evidence } from './evidence.ts';

export function notChecked(evidence: Evidence): string[] {
  const { input, traces } = evidence;
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
  for (const trace of traces) {
    trace.notChecked.forEach((sentence) => said.add(sentence));
  }
  return [...said];
}

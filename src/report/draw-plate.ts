/** NAME.svg: the plate of the work as a file of its own, with its look inside it, so that any viewer shows it. */
import { drawWork } from './draw-work.ts';
import type { SheetFacts } from './facts.ts';
import { standAlone } from './stand-alone.ts';

export function drawPlate(facts: SheetFacts): string {
  const { job, form } = facts;
  const title = `${job.title}: ${form.proportions.teeth} teeth, paths of the cutters' centres; coordinates in millimetres`;
  return standAlone(drawWork(facts, 'here').svg, title);
}

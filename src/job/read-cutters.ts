/**
 * The cutters of a job: those it lists itself, or those of a file that many jobs share (`format: ogive-cutters/1`, with a
 * unit of its own). Out: cutters as written, lengths in mm, and the text they stand in, for the places of problems.
 */
import { failure, success, type Outcome } from '../base/problem.ts';
import { readYaml, YAML_LARGEST } from '../base/read-yaml.ts';
import { jobProblem } from './job-problem.ts';
import { cutterFileSchema, type CutterText, type JobText } from './job-schema.ts';
import { issueProblem, readTree } from './job-schema-issues.ts';
import { placeProblems, type PlacedText } from './place-problems.ts';
import { unitOf } from './unit-of.ts';

export interface ReadCutters {
  readonly cutters: Readonly<Record<string, CutterText>>;
  /** Where they stand, if in a file of their own. */
  readonly placed?: PlacedText;
}

export function readCutters(
  text: JobText['cutters'],
  job: PlacedText,
  readCutterFile: ((path: string) => Outcome<string>) | undefined,
): Outcome<ReadCutters> {
  if (typeof text !== 'string') {
    return success({ cutters: text });
  }
  const content = readCutterFile?.(text);
  if (content === undefined || !content.ok) {
    const why = content?.problems[0]?.message;
    const message = `the file of cutters ${text} cannot be read${why === undefined ? '.' : `: ${why}`}`;
    const hint = 'The path counts from the job file; or list the cutters here.';
    const problem = jobProblem({ path: ['cutters'], code: 'file.unreadable', message, hint });
    return failure(placeProblems([problem], job, undefined));
  }
  const yaml = readYaml(text, content.value, YAML_LARGEST, 'job.syntax');
  if (!yaml.ok) {
    return yaml;
  }
  const placed: PlacedText = { file: text, yaml: yaml.value };
  const tree = readTree(cutterFileSchema(unitOf(yaml.value.value)), yaml.value.value);
  return tree.ok
    ? success({ cutters: tree.value.cutters, placed })
    : failure(placeProblems(tree.issues.map(issueProblem), placed, undefined));
}

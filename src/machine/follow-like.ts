/**
 * The machine file and the ones it is `like`, nearest first, each read as YAML. Chains that turn back on themselves, names
 * that no file has and chains too long to follow by eye are refused.
 */
import type { Outcome, Place, Problem } from '../base/problem.ts';
import { failure, success } from '../base/problem.ts';
import { readYaml, YAML_LARGEST, type YamlText } from '../base/read-yaml.ts';

export interface Layer {
  readonly name: string;
  readonly file: string;
  readonly yaml: YamlText;
}

/** Files in a chain. Why: a person who looks for where a value comes from opens them one after the other. */
const LONGEST_CHAIN = 5;

export function followLike(
  start: { readonly name: string; readonly file: string; readonly text: string },
  load: (name: string) => string | undefined,
): Outcome<readonly Layer[]> {
  const layers: Layer[] = [];
  let next: typeof start | undefined = start;
  while (next !== undefined) {
    const { name, file, text }: typeof start = next;
    const yaml = readYaml(file, text, YAML_LARGEST, 'machine.syntax');
    if (!yaml.ok) {
      return yaml;
    }
    const layer: Layer = { name, file, yaml: yaml.value };
    layers.push(layer);
    const said = (yaml.value.value as Record<string, unknown>)['like'];
    if (said === undefined) {
      break;
    }
    const base = nameOf(said);
    if (base === undefined) {
      // The fields that are missing follow from it: they are not told beside it.
      return failure([likeProblem(layer, ...noName(said, load))]);
    }
    const baseText = load(base);
    const fault = chainFault(base, layers, baseText);
    if (fault !== undefined) {
      return failure([likeProblem(layer, fault.message, fault.hint)]);
    }
    next = baseText === undefined ? undefined : { name: base, file: `${base}.yaml`, text: baseText };
  }
  return success(layers);
}

function nameOf(like: unknown): string | undefined {
  return typeof like === 'string' && /^[a-z0-9][a-z0-9-]*$/.test(like) ? like : undefined;
}

/** What stands behind `like:` and names no file; the name that it holds, where one is there. */
function noName(
  like: unknown,
  load: (name: string) => string | undefined,
): readonly [message: string, hint: string] {
  const form = 'Give the name of one of posts/ alone, without folder and ending: like: bench-mill.';
  if (typeof like !== 'string') {
    return [like === null ? 'Nothing stands behind the colon.' : 'One name belongs here.', form];
  }
  const plain = like
    .replace(/^.*[/\\]/, '')
    .replace(/\.ya?ml$/i, '')
    .toLowerCase()
    .replaceAll(/[ _]+/g, '-');
  return nameOf(plain) !== undefined && load(plain) !== undefined
    ? [`${like} is not how a machine file is named here.`, `Write like: ${plain}.`]
    : [`${like} is no name of a machine file.`, form];
}

function chainFault(
  base: string,
  layers: readonly Layer[],
  text: string | undefined,
): { readonly message: string; readonly hint: string } | undefined {
  const names = layers.map((layer) => layer.name);
  if (names.includes(base)) {
    return {
      message: `${[...names, base].join(' is like ')}: the files are like each other in a ring.`,
      hint: 'One of them has to stand by itself.',
    };
  }
  if (text === undefined) {
    return {
      message: `There is no machine file named ${base}.`,
      hint: '`ogive machines` lists the ones there are.',
    };
  }
  return layers.length < LONGEST_CHAIN
    ? undefined
    : {
        message: `${names.join(' is like ')}: more than ${LONGEST_CHAIN} files one after the other.`,
        hint: 'Be like one that is nearer to the end of the chain.',
      };
}

function likeProblem(layer: Layer, message: string, hint: string): Problem {
  const at: Place = { kind: 'value', file: layer.file, path: ['like'], ...layer.yaml.placeOf(['like']) };
  return { code: 'machine.invalid', severity: 'error', message, hint, at };
}

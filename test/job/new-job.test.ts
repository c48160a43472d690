import { describe, expect, it } from 'vitest';
import { readYaml, YAML_LARGEST } from '../../src/base/read-yaml.ts';
import { jobJsonSchema, newJob } from '../../src/job/new-job.ts';
import { readJob } from '../../src/job/read-job.ts';
import type { JsonSchema } from '../../src/job/job-schema.ts';

/** Every key of the schema, with its path. */
function keysOf(schema: JsonSchema, path: string): string[] {
  return Object.entries(schema.properties ?? {}).flatMap(([key, child]) => {
    const here = path === '' ? key : `${path}.${key}`;
    return [here, ...keysOf(child, here)];
  });
}

/** Refused until wheels for lantern pinions can be cut. */
const LATER = ['wheel.mate.trundles', 'wheel.mate.trundle'];

describe('the starter job', () => {
  it('runs as it is', () => {
    const job = readJob('new.yaml', newJob());
    expect(job.problems).toEqual([]);
    expect(job.ok && job.value.misfits).toEqual([]);
  });
  it('has every key that a job may have, with its meaning', () => {
    const lines = newJob().split('\n');
    const keys = keysOf(jobJsonSchema(), '').filter((path) => path !== 'pinion' && !LATER.includes(path));
    for (const path of keys) {
      const key = path.split('.').at(-1) ?? '';
      expect(lines.filter((line) => new RegExp(`^(# )? *${key}:`).test(line)).length, path).toBeGreaterThan(
        0,
      );
    }
  });
  it('is in place where the comment marks are taken away: only alternatives then exclude each other', () => {
    const bare = newJob().replaceAll(/^# (?=( *)[a-z-]+:)/gm, '');
    const yaml = readYaml('new.yaml', bare, YAML_LARGEST, 'job.syntax');
    expect(yaml.problems).toEqual([]);
    const problems = readJob('new.yaml', bare).problems.filter(({ severity }) => severity === 'error');
    expect(problems.map(({ at }) => (at.kind === 'value' ? at.path.join('.') : ''))).toEqual([
      'wheel.diametral-pitch',
      'blank.skin',
    ]);
  });
});

describe('the starter job, read by somebody who changes it', () => {
  it('offers no lantern pinion, which is refused', () => {
    expect(newJob()).not.toMatch(/trundle/);
  });
  it('says of a diametral pitch which line it takes the place of', () => {
    expect(newJob()).toMatch(/diametral-pitch: \S+ +# Instead of module:/);
    const changed = newJob()
      .replace(/^ {2}module:/m, '# $&')
      .replace(/^# ( *diametral-pitch:)/m, '$1');
    expect(readJob('new.yaml', changed).problems).toEqual([]);
  });
  it('shows how a screw is written: beside a second hold, with a hole', () => {
    const changed = newJob()
      .replace(/^ {2}holding:/m, '# $&')
      .replace(/^ {2}# (holding: \[.*\])$/m, '  $1\n  bored: 4.0');
    expect(changed).toMatch(/\n {2}holding: .*screw/);
    const job = readJob('new.yaml', changed);
    expect(job.problems).toEqual([]);
    expect(job.ok && job.value.setup.holding).toEqual(['glue', 'screw']);
  });
});

describe('the JSON Schema [JSON Schema draft 2020-12]', () => {
  const schema = jobJsonSchema();
  it('knows what must be there', () => {
    expect(schema.required).toEqual(['blank', 'machine', 'cutters']);
    expect(schema.properties?.['wheel']?.required).toEqual(['teeth', 'mate', 'thickness']);
  });
  it('allows nothing that is not a key', () => {
    expect(schema.additionalProperties).toBe(false);
  });
  it('describes every value', () => {
    const silent = keysOf(schema, '').filter((path) => {
      const node = path.split('.').reduce<JsonSchema | undefined>((at, key) => at?.properties?.[key], schema);
      const says = node?.description ?? node?.anyOf?.[0]?.description;
      return says === undefined && node?.properties === undefined && path !== 'pinion';
    });
    expect(silent).toEqual([]);
  });
});

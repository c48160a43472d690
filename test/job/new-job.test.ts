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

describe('the starter job', () => {
  it('runs as it is', () => {
    const job = readJob('new.yaml', newJob());
    expect(job.problems).toEqual([]);
    expect(job.ok && job.value.misfits).toEqual([]);
  });
  it('has every key that a job may have, with its meaning', () => {
    const lines = newJob().split('\n');
    const keys = keysOf(jobJsonSchema(), '').filter((path) => path !== 'pinion');
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
      'wheel.mate.trundles',
      'wheel.diametral-pitch',
      'blank.skin',
    ]);
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

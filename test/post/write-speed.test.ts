import { spawnSync } from 'node:child_process';
import { resolve } from 'node:path';
import { expect, it } from 'vitest';

const RUN = resolve(import.meta.dirname, '../bench/run.mjs');

it('writes 15,300 moves in four times what it takes to print their numbers', { timeout: 60_000 }, () => {
  const { stdout, stderr } = spawnSync(process.execPath, [RUN, 'write-speed'], { encoding: 'utf8' });
  expect(stderr).toBe('');
  const { blocks, ratio } = JSON.parse(stdout) as { blocks: number; ratio: number };
  expect(blocks).toBeGreaterThan(15_000);
  expect(ratio).toBeLessThan(4);
});

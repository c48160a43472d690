/**
 * What was read is never written over: a job in JSON has the name of its own summary, and would be lost.
 *
 * In  : the folder and the names that would be written or renamed there, the files that were read. Out: a problem for each
 *       of these that would be lost.
 */
import { join } from 'node:path';
import type { Problem } from '../base/problem.ts';
import { isSameFile } from './files.ts';

export function keepInputs(
  folder: string,
  names: readonly string[],
  inputs: readonly string[],
  hint: string,
): readonly Problem[] {
  return inputs.flatMap((input) => {
    const name = names.find((one) => isSameFile(join(folder, one), input));
    return name === undefined
      ? []
      : [
          {
            code: 'file.unwritable',
            severity: 'error',
            message: `would be lost: ${name} is to be written or renamed here, and this file was read for it. Nothing was changed.`,
            hint,
            at: { kind: 'file', file: input },
          },
        ];
  });
}

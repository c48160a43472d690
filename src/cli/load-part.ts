/**
 * Loads one command's part of the bundle (`dist/run-cut.js` and the like) with the byte code the build kept beside it:
 * each command is a process of its own, and reading and compiling its text takes longer than a small job does.
 *
 * The code is a help, never needed: V8 itself refuses what another version or other flags have made, what belongs to
 * another build is seen by the mark both carry, and then the text is compiled as any script is. Only in the bundle.
 */
import { createRequire, Module } from 'node:module';
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Script } from 'node:vm';
import { readOwnBytes } from './files.ts';

type PartFunction = (
  exports: object,
  require: NodeJS.Require,
  module: { readonly exports: object },
  file: string,
  folder: string,
) => void;

/** Letters of the mark: the last of a part's text, the first of its code. */
export const PART_MARK = 16;

const HERE = import.meta.url;

export function loadPart(name: string): object {
  const file = fileURLToPath(new URL(`./${name}.js`, HERE));
  const require = createRequire(HERE);
  const text = readOwnBytes(file);
  if (text === undefined) {
    throw new Error(`${file} is missing: the bundle is not whole`);
  }
  const code = codeOf(text, readOwnBytes(`${file}.code`));
  // The build writes nothing but ASCII, which needs no decoding.
  const script = new Script(Module.wrap(text.toString('latin1')), {
    filename: file,
    ...(code === undefined ? {} : { cachedData: code }),
  });
  const module = { exports: {} };
  const run = script.runInThisContext() as PartFunction;
  run(module.exports, require, module, file, dirname(file));
  return module.exports;
}

function codeOf(text: Buffer, kept: Buffer | undefined): Buffer | undefined {
  return kept?.subarray(0, PART_MARK).equals(text.subarray(-PART_MARK)) === true
    ? kept.subarray(PART_MARK)
    : undefined;
}

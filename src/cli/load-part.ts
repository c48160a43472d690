/**
 * Loads one command's part of the bundle (`dist/run-cut.js` and the like) with the byte code the build kept beside it:
 * each command is a process of its own, and reading and compiling its text takes longer than a small job does.
 *
 * The code is a help, never needed: V8 itself refuses what another version or other flags have made, what is damaged or
 * of another build does not add up with the text (V8 would take it and run wild), and then the text is compiled as any
 * script is. Only in the bundle.
 */
import { createRequire, Module } from 'node:module';
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';
import { setFlagsFromString } from 'node:v8';
import { Script } from 'node:vm';
import { crc32 } from 'node:zlib';
import { readOwnBytes } from './files.ts';

type PartFunction = (
  exports: object,
  require: NodeJS.Require,
  module: { readonly exports: object },
  file: string,
  folder: string,
) => void;

/** Bytes at the head of the code: the CRC-32 of text and code, as `keep-code.mjs` puts it there. */
const SUM_BYTES = 4;

/**
 * A run is over in a second. Code that V8 would optimise early hardly runs again, and doing so took nearly half of the time;
 * room for young objects that grows by small steps is swept over and over on the way up, a tenth of the time.
 * `keep-code.mjs` sets the same, for V8 takes kept byte code only under the flags it was made with.
 */
const SHORT_RUN = ['--interrupt-budget=800000', '--semi-space-growth-factor=16'];

const HERE = import.meta.url;

export function loadPart(name: string): object {
  SHORT_RUN.forEach((flag) => setFlagsFromString(flag));
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

/** Node before 20.15 has no crc32: then there is no code either. */
function codeOf(text: Buffer, kept: Buffer | undefined): Buffer | undefined {
  if (kept === undefined || kept.length < SUM_BYTES || typeof crc32 !== 'function') {
    return undefined;
  }
  const code = kept.subarray(SUM_BYTES);
  return crc32(code, crc32(text)) === kept.readUInt32LE(0) ? code : undefined;
}

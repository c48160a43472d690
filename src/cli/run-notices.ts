/** `ogive --notices`: the notices that the bundled libraries' licences ask for, gathered when the bundle was made. */
import { readOwn } from './files.ts';
import type { Exit } from './program.ts';

export function printNotices(): Exit {
  const text = readOwn(new URL('./notices.txt', import.meta.url));
  if (text === undefined) {
    process.stderr.write(
      'The notices lie in dist/notices.txt of the built command; this one is not built.\n',
    );
    return 2;
  }
  process.stdout.write(`Ogive contains these libraries:\n\n${text}`);
  return 0;
}

/**
 * Words after which a controller stands still at the end of every block: G61.1 (NISTIR 6556 3.5.14, exact stop) and the G60 of
 * DIN controllers. G61, the exact path, stops nowhere but where it must.
 */
export function isExactStop(words: string | null | undefined): boolean {
  const [word] = (words ?? '').split(' ');
  return word === 'G61.1' || word === 'G60';
}

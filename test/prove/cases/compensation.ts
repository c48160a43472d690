/** Cases 94 to 99: radius compensation. None of it is followed; every word of it is refused at its line. */
import type { CaseRow } from '../../support/case-row.ts';

const RADIUS = 'radius compensation is not followed';
const says = /radius compensation/;

export const COMPENSATION: readonly CaseRow[] = [
  { n: 94, ref: '§3.5.10', wrong: ['G41 D-1', 'G41 D1', 'G42 D999'], says },
  { n: 95, ref: 'App. B.5.1', wrong: ['G41 D1 G1 X5'], says },
  { n: 96, ref: 'App. B.5, §3.5.12 to 16', wrong: ['G41 D1 G54', 'G42 D1 G20'], says },
  { n: 97, ref: 'App. B.4', beyond: RADIUS, wrong: ['G41 D1'], says },
  { n: 98, ref: 'App. B.2.3', beyond: RADIUS, wrong: ['G1 X10 G41 D1'], says },
  { n: 99, ref: '§3.5.10', beyond: RADIUS, wrong: ['G41 D0'], says },
]; // prettier-ignore

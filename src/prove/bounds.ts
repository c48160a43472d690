/** How much one program may make the reader do beyond its own lines. Beyond it the line is refused; nothing hangs, nothing fills the memory. */

/** Pecks and repeats of one line of a drilling cycle.
 *  Why: a hole 100 mm deep in pecks of 0.05 mm has 2000; with five repeats that is the most anybody drills. */
export const MOST_PECKS = 10_000;

/** Moves that all cycles and all chords of arcs outside the XY plane make together.
 *  Why: a move takes some 200 bytes; 100 MB of them is what a desk computer gives without noticing. */
export const MOST_MADE = 500_000;

/** Chords of one arc outside the XY plane.
 *  Why: a whole circle of radius 2 m has 9,935; larger ones no machine of these has room for. */
export const MOST_CHORDS = 10_000;

/** Lines that loops and subprograms may run.
 *  Why: a wheel of 400 teeth with 50 laps of 40 lines a tooth has 800,000; that many moves take 200 MB. */
export const MOST_RUN = 1_000_000;

/** What one line costs of them, in characters; a longer one costs what it is longer.
 *  Why: a line of a common program has some 30; long lines take their time in proportion. */
export const LINE_COST = 32;

/** How deep subprograms may call each other.
 *  Why: controllers hold 4 to 10 (from memory); what goes deeper stops on the machine. */
export const MOST_DEPTH = 10;

/** How many loops and branches may stand inside each other.
 *  Why: nobody reads a tenth level; each more costs every line within it a look. */
export const MOST_NESTED = 100;

/** How much one program may make the reader do beyond its own lines. Beyond it the line is refused; nothing hangs, nothing fills the memory. */

/** Pecks and repeats of one line of a drilling cycle.
 *  Why: a hole 100 mm deep in pecks of 0.05 mm has 2000; with five repeats that is the most anybody drills. */
export const MOST_PECKS = 10_000;

/** Moves that all cycles of a program make together.
 *  Why: a move takes some 200 bytes; 100 MB of them is what a desk computer gives without noticing. */
export const MOST_CYCLE_MOVES = 500_000;

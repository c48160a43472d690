/**
 * Every tolerance, coarsest first, each with its reason. Lengths in mm, angles in radians.
 */

/** Largest distance between the cut flank and the exact curve, before the program's last digit.
 *  Why: a desktop machine steps 1.25 um; the program should not be the larger error. */
export const FORM_ERROR = 0.001;

/** The same where FIT_ERROR would take more blocks a pitch than a slow controller reads in time.
 *  Why: a tenth of the form error is left for the proof's own step; rounding has a unit of the last digit besides. */
export const FIT_ERROR_MOST = FORM_ERROR * 0.9;

/** Largest distance between the path and the exact offset where arcs stand for the addendum's offset.
 *  Why: 0.6 of the form error, so that rounding to a unit of the last digit and the proof's own step stay inside it. */
export const FIT_ERROR = FORM_ERROR * 0.6;

/** Largest distance outside the exact offset at which straight lines stand for its curves (a machine without arcs).
 *  Why: it is metal left, so it may take nearly the whole form error; blocks grow as one over its root. */
export const LINE_FIT_ERROR = FORM_ERROR * 0.95;

/** The same round the corner of a tooth's tip, where the path turns about a point and touches nothing else.
 *  Why: what is left there is a burr on the corner, smaller than the one every cutter raises; no flank and no land hangs on it. */
export const LINE_TIP_ERROR = FORM_ERROR * 3;

/** How far inside the exact offset such lines may run.
 *  Why: half the form error into the flank, shared with what is left on it, saves a block in five; more would be felt first. */
export const LINE_FIT_INSIDE = FORM_ERROR * 0.5;

/** How far the clipped polygon and the exact offset may disagree.
 *  Why: the two sags of the clipping (its input's and its own arcs') and grid rounding, with a quarter to spare. */
export const CLIP_AGREEMENT = FORM_ERROR * 5;

/** Largest sag of the chords that are handed to clipping, and of the arcs it makes.
 *  Why: the polygon only says which pieces remain; what is closer than this is told apart by exact distances, and where
 *  pieces meet is found exactly. A wrong piece is off by the cutter's size, not by micrometres; finer chords would cost
 *  time and move nothing. */
export const CLIP_SAG = FORM_ERROR * 2;

/** Largest sag of the chords of a sampled curve where a polygon stands for it (drawing, reckoning areas).
 *  Why: a fifth of the form error is below what a picture or a table shows. */
export const CHORD_SAG = FORM_ERROR / 5;

/** The proof's figures are found to this.
 *  Why: a tenth of the form error, and the last figure that is printed. */
export const PROOF_RESOLUTION = FORM_ERROR / 10;

/** Lengths that a person wrote (a reach, a thickness and what goes below it) are told apart to this.
 *  Why: 0.4 mm in inches with seven decimals is a millionth off; nobody measures a tenth of a micrometre. */
export const WRITTEN_LENGTH = FORM_ERROR / 10;

/** One integer step handed to clipper-lib.
 *  Why: 20 steps per sag (200 of clipping's own) hide the rounding, and parts up to +-474 mm stay in its fast exact range (47,453,132 steps). */
export const CLIPPER_STEP = CHORD_SAG / 20;

/** Points closer than this are one point.
 *  Why: far above double rounding at 500 mm (1e-13), far below anything that can be written (1e-5 inch = 2.5e-4 mm). */
export const SAME_POINT = 1e-9;

/** Headings closer than this are tangent, in radians, before rounding: 0.1 degree.
 *  Why: a break a look-ahead controller slows for is ten times larger. */
export const TANGENT = (0.1 * Math.PI) / 180;

/** A value of a program that stands for a whole number may differ from one by this; a code is tried after multiplying by ten.
 *  Why: NISTIR 6556 §3.3.2.1 reads it so; controllers refuse what differs more. No length. */
export const WHOLE_NUMBER = 0.0001;

/** How much nearer than the offset distance a point may seem before it counts as nearer.
 *  Why: ten times the rounding of a distance found at 500 mm, and far below SAME_POINT, so that what is cut away is cut right. */
export const OFFSET_NOISE = SAME_POINT / 100;

/**
 * Where the time of a cutting move goes. s, mm, mm/s.
 *
 * A trapezoid over L from v0 up to p and down to v1 takes L / p + (p - v0)^2 / (2 a p) + (p - v1)^2 / (2 a p). Of that L / F is
 * what the feed F asks for; what a lower limit v (a tight arc, a slow axis) adds is L / v - L / F; the ends, and a peak p that
 * stays below v for their sake, are the price of slow corners and stops. What is still missing is the controller's reading.
 */
export interface TimeSpent {
  /** The cutting length at the feed as it is written. */
  cutting: number;
  /** Slowing down for corners and stops and coming up again, of cutting moves. */
  corners: number;
  /** Arcs too tight, and axes too slow, for the feed. */
  limits: number;
  /** Blocks shorter than the controller takes to read one. */
  reading: number;
  /** Fast moves, and those above the blank. */
  air: number;
  /** The same on the way to and from a change of cutter. */
  changes: number;
  dwells: number;
  /** Waits after the spindle was set going. */
  spinUp: number;
}

/** How a move is run. */
export interface Pace {
  length: number;
  seconds: number;
  /** As it is written. */
  feed: number;
  limit: number;
  acceleration: number;
  enters: number;
  leaves: number;
  peak: number;
  /** Of the seconds those in which the controller still reads. */
  reading: number;
}

export function nothingSpent(): TimeSpent {
  return { cutting: 0, corners: 0, limits: 0, reading: 0, air: 0, changes: 0, dwells: 0, spinUp: 0 };
}

/** Adds the move's time where it goes, and says in `pace` how much of it is reading. */
export function spendCutting(spent: TimeSpent, pace: Pace): void {
  const { length, seconds, feed, limit, peak } = pace;
  const ends =
    rampLoss(peak, pace.enters, pace.acceleration) + rampLoss(peak, pace.leaves, pace.acceleration);
  const wanted = length / feed;
  const limited = length / limit;
  const run = length / peak + ends;
  spent.cutting += wanted;
  spent.limits += limited - wanted;
  spent.corners += run - limited;
  pace.reading = Math.max(0, seconds - run);
  spent.reading += pace.reading;
}

/** What it takes longer to come up from `v` to `peak` than to be at the peak all along. */
export function rampLoss(peak: number, v: number, acceleration: number): number {
  return (peak - v) ** 2 / (2 * acceleration * peak);
}

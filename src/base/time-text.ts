/** A time in words: "0.15 s", "42 s", "9.4 min", "83 min", "3 h 05 min"; seconds in, the same in every country. */
export function timeText(seconds: number): string {
  if (seconds < SECONDS_TO) {
    return `${seconds < FEW_SECONDS ? String(Number(seconds.toFixed(2))) : seconds.toFixed(0)} s`;
  }
  const minutes = seconds / 60;
  if (minutes < HOURS_FROM) {
    return `${minutes.toFixed(minutes < FEW_MINUTES ? 1 : 0)} min`;
  }
  const whole = Math.round(minutes);
  return `${Math.floor(whole / 60)} h ${String(whole % 60).padStart(2, '0')} min`;
}

/** Below so many seconds they are counted singly, and below so few with decimals. */
const SECONDS_TO = 99.5;
const FEW_SECONDS = 9.995;
/** Below so many minutes a decimal tells something; from so many on hours do. */
const FEW_MINUTES = 9.95;
const HOURS_FROM = 119.5;

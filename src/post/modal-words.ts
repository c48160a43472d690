/**
 * Words that stay in force: the motion word and the feed, written where they are news.
 *
 * In  : the writer, a motion code or a feed in mm/min. Out: the word, or '' where it is in force already.
 */
import { millimetresPer } from '../base/units.ts';
import { formatValue } from './format-word.ts';
import { complain } from './program-sink.ts';
import type { Writer } from './writer.ts';

/** The motion word where it is news. */
export function motionWord(writer: Writer, code: string): string {
  if (code === writer.motion && !writer.everyMotion) {
    return '';
  }
  writer.motion = code;
  return code;
}

/** A feed as its word, in force or not. */
export function feedWord(writer: Writer, feed: number): string {
  if (feed === writer.lastFeed.value) {
    return writer.lastFeed.text;
  }
  const { numbers } = writer.machine.words;
  const value = feed / millimetresPer(writer.grid.unit);
  const text = `F${formatValue(value, numbers.feedDecimals, numbers)}`;
  if (!(Math.round(value * 10 ** numbers.feedDecimals) > 0)) {
    complain(writer.sink, 'post.cannot-say', 'feed', {
      message: `a feed of ${feed} mm/min rounds to nothing with ${numbers.feedDecimals} decimals`,
      hint: 'give feed-decimals one more in the machine file, or a faster feed',
    });
  }
  writer.lastFeed = { value: feed, text };
  return text;
}

/** The feed word where it is news. */
export function takeFeed(writer: Writer, text: string): string {
  if (text === '' || text === writer.feedText) {
    return '';
  }
  writer.feedText = text;
  return text;
}

/** One straight block: the axes that move, from counts. */
import { motionWord, takeFeed } from './modal-words.ts';
import { writeBlock } from './program-sink.ts';
import { lengthText, type Writer } from './writer.ts';

/** One straight block, or none where nothing would move. NaN stands for an axis that is not known and not to be moved. */
export function straight(writer: Writer, code: string, x: number, y: number, z: number, feed: string): void {
  // An axis that is not known and not to be moved is NaN on both sides: it differs from itself.
  const [dx, dy, dz] = [x === x && x !== writer.x, y === y && y !== writer.y, z === z && z !== writer.z];
  if (!dx && !dy && !dz) {
    return;
  }
  const every = writer.everyAxis;
  const motion = motionWord(writer, code);
  const words = motion === '' ? [] : [motion];
  if (dx || (every && x === x)) {
    words.push(`X${lengthText(writer, x)}`);
  }
  if (dy || (every && y === y)) {
    words.push(`Y${lengthText(writer, y)}`);
  }
  if (dz || (every && z === z)) {
    words.push(`Z${lengthText(writer, z)}`);
  }
  writeBlock(writer.sink, words.join(writer.sink.gap), takeFeed(writer, feed));
  if (dz) {
    writer.atTop = false;
  }
  writer.x = x;
  writer.y = y;
  writer.z = z;
}

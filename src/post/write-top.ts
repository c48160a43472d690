/**
 * To the machine's own top by the machine file's way; nothing where it has none. Work coordinates of what moved are unknown after it.
 * Source of the ways: NISTIR 6556 sections 3.5.8 (G28 by way of the programmed point; there every axis goes home) and 3.5.12 (G53).
 */
import { millimetresPer } from '../base/units.ts';
import { writeCodes } from './program-sink.ts';
import { lengthText, forgetModes, type Writer } from './writer.ts';

export function writeTop(writer: Writer): void {
  const { sink, machine, grid } = writer;
  const positions = machine.words.positions;
  if (positions.top === 'none' || writer.atTop) {
    return;
  }
  switch (positions.top) {
    case 'G53-Z': {
      const z = Math.round(((positions.topMachineZ ?? 0) / millimetresPer(grid.unit)) * grid.perUnit) + 0;
      writeCodes(sink, 'G53', 'G0', `Z${lengthText(writer, z)}`);
      break;
    }
    case 'G28-named':
      // By way of the place it stands at, so nothing but Z moves; the step is absolute again at once.
      if (machine.words.modes.openingOnePerBlock) {
        writeCodes(sink, 'G91');
        writeCodes(sink, 'G28', `Z${lengthText(writer, 0)}`);
      } else {
        writeCodes(sink, 'G91', 'G28', `Z${lengthText(writer, 0)}`);
      }
      writeCodes(sink, 'G90');
      break;
    case 'G28-all':
      // By way of the program's highest place: Z first, then every axis goes home from there.
      writeCodes(sink, 'G28', `Z${lengthText(writer, writer.highestZ)}`);
      writer.x = NaN;
      writer.y = NaN;
      break;
  }
  writer.z = NaN;
  forgetModes(writer);
  writer.atTop = true;
}

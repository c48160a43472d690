import { describe, expect, it } from 'vitest';
import { loopsOf, type OutlineShape } from '../../src/report/outline-shape.ts';
import { outlineDxf } from '../../src/report/draw-dxf.ts';
import { nearestOnPiece } from '../../src/geometry/nearest-on-piece.ts';
import { crossings } from '../../src/tooth/crossings.ts';
import { wheelForm } from '../../src/tooth/wheel-form.ts';

/** Group codes and values, in pairs of lines [DXF reference, "About the DXF format"]. */
function pairsOf(text: string): [number, string][] {
  const lines = text.split(/\r?\n/);
  const pairs: [number, string][] = [];
  for (let i = 0; i + 1 < lines.length; i += 2) {
    pairs.push([Number(lines[i]), (lines[i + 1] ?? '').trim()]);
  }
  return pairs;
}

interface Polyline {
  layer: string;
  closed: boolean;
  vertices: { x: number; y: number; bulge: number }[];
}

function polylinesOf(pairs: readonly [number, string][]): Polyline[] {
  const found: Polyline[] = [];
  let current: Polyline | undefined;
  for (const [code, value] of pairs) {
    if (code === 0) {
      current = value === 'LWPOLYLINE' ? { layer: '', closed: false, vertices: [] } : undefined;
      if (current) {
        found.push(current);
      }
    } else if (current) {
      const last = current.vertices.at(-1);
      if (code === 8) {
        current.layer = value;
      } else if (code === 70) {
        current.closed = (Number(value) & 1) === 1;
      } else if (code === 10) {
        current.vertices.push({ x: Number(value), y: 0, bulge: 0 });
      } else if (code === 20 && last) {
        last.y = Number(value);
      } else if (code === 42 && last) {
        last.bulge = Number(value);
      }
    }
  }
  return found;
}

/** Centre and radius from a bulge, the tangent of a quarter of the arc's turn [DXF reference, LWPOLYLINE, code 42]. */
function arcOf(a: { x: number; y: number; bulge: number }, b: { x: number; y: number }) {
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  const radius = (chord * (1 + a.bulge ** 2)) / (4 * Math.abs(a.bulge));
  const height = (chord * (1 - a.bulge ** 2)) / (4 * a.bulge);
  const [nx, ny] = [-(b.y - a.y) / chord, (b.x - a.x) / chord];
  return { radius, x: (a.x + b.x) / 2 + nx * height, y: (a.y + b.y) / 2 + ny * height };
}

function shapeOf(): OutlineShape {
  const form = wheelForm({
    teeth: 30,
    module: 0.5,
    mate: { kind: 'pinion', leaves: 8, leaf: 1.05, tip: 'third-ogive', dedendum: 1.9 },
    centres: 9.5,
    addendumForm: 'epicycloid',
    height: 0.95,
    tooth: 0.5,
    dedendum: 1.5708,
    rootFillet: 0,
  });
  const windows = form.ok
    ? crossings(
        { arms: 4, armAtHub: 1.4, armAtRim: 1.4, rim: 1, hub: 4.4, corner: 0.5 },
        form.value.rootRadius,
      )
    : form;
  if (!form.ok || !windows.ok) {
    throw new Error('no shape');
  }
  return {
    title: 'x',
    form: form.value,
    sector: form.value.sector,
    crossings: windows.value,
    bore: 2,
    what: 'x',
  };
}

describe('the DXF', () => {
  const shape = shapeOf();
  const pairs = pairsOf(outlineDxf(shape));
  const polylines = polylinesOf(pairs);

  it('says millimetres [DXF reference, $INSUNITS: 4 is millimetres]', () => {
    const at = pairs.findIndex(([code, value]) => code === 9 && value === '$INSUNITS');
    expect(pairs[at + 1]).toEqual([70, '4']);
  });

  it('has one closed polyline for the teeth, the bore and each window, each on its layer', () => {
    expect(polylines.map(({ layer, closed }) => `${layer} ${closed}`)).toEqual([
      'TEETH true',
      'BORE true',
      ...Array.from({ length: 4 }, () => 'CROSSINGS true'),
    ]);
  });

  it('keeps root arcs and bore as arcs: bulges give back radius and centre', () => {
    const radii = polylines.flatMap(({ vertices }) =>
      vertices.flatMap((vertex, i) => {
        const next = vertices[(i + 1) % vertices.length];
        return vertex.bulge === 0 || next === undefined ? [] : [arcOf(vertex, next)];
      }),
    );
    const about = (radius: number) =>
      radii.filter((arc) => Math.abs(arc.radius - radius) < 1e-6 && Math.hypot(arc.x, arc.y) < 1e-6).length;
    expect(about(shape.form.rootRadius)).toBeGreaterThanOrEqual(30);
    expect(about(shape.form.outsideRadius)).toBeGreaterThanOrEqual(30);
    expect(about(1)).toBe(2);
    expect(radii.filter((arc) => Math.abs(arc.radius - 0.5) < 1e-6).length).toBeGreaterThanOrEqual(16);
  });

  it('lies within a tenth of a micrometre of the exact outline, in the middle of each arc too', () => {
    const loops = loopsOf(shape);
    polylines.forEach(({ vertices }, k) => {
      const loop = loops[k]?.loop ?? [];
      const off = vertices.map((vertex, i) => {
        const next = vertices[(i + 1) % vertices.length] ?? vertex;
        const middle = { x: (vertex.x + next.x) / 2, y: (vertex.y + next.y) / 2 };
        const chord = { x: next.x - vertex.x, y: next.y - vertex.y };
        // The sagitta is bulge times half the chord, to the right of it where the bulge is positive.
        const at = { x: middle.x + (chord.y / 2) * vertex.bulge, y: middle.y - (chord.x / 2) * vertex.bulge };
        return Math.min(...loop.map((piece) => nearestOnPiece(piece, at).distance));
      });
      expect(Math.max(...off)).toBeLessThan(1.2e-4);
    });
  });
});

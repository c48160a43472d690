/** Worked values of cutting force, engagement, bending and feed, typed from where each test names. */
import { describe, expect, it } from 'vitest';
import { insideArcFeed, steppedArcFeed } from '../../src/cutting/arc-feed.ts';
import { cutData } from '../../src/cutting/cut-data.ts';
import {
  engagementAngle,
  meanChip,
  radialDepthInside,
  radialDepthOutside,
  thickestChip,
} from '../../src/cutting/engagement.ts';
import { chipsWithRunout, cuttingPower, specificForce, toothForce } from '../../src/cutting/force.ts';
import { chipLoad, MATERIALS } from '../../src/cutting/materials.ts';
import type { Cutter } from '../../src/cutting/setup.ts';
import { slotDepth } from '../../src/cutting/slot-depth.ts';
import { slotLoad } from '../../src/cutting/slot-load.ts';
import { compliance, breakingForce } from '../../src/cutting/stiffness.ts';

const brass = MATERIALS['leaded-brass'];
const silver = MATERIALS['silver-steel'];
const degrees = (angle: number) => (angle * 180) / Math.PI;

function cutterOf(diameter: number, over: Partial<Cutter> = {}): Cutter {
  return {
    number: 1,
    diameter,
    nominal: diameter,
    flutes: 2,
    reach: 3.4 * diameter,
    flute: 3.4 * diameter,
    shank: 3,
    stickOut: 14,
    helix: 30,
    runout: 0.01,
    plunges: false,
    ...over,
  };
}

describe('engagement of a straight wall [cos phi = 1 - 2 ae/D; El-Hofy, Fundamentals of Machining Processes]', () => {
  it.each([
    [0.02, 16.26, 0.28, 0.1409],
    [0.05, 25.842, 0.4359, 0.2217],
    [0.1, 36.87, 0.6, 0.3108],
    [0.2, 53.13, 0.8, 0.4314],
    [0.25, 60, 0.866, 0.4775],
    [0.5, 90, 1, 0.6366],
    [0.75, 120, 1, 0.7162],
    [1, 180, 1, 0.6366],
  ])('ae/D %d', (share, angle, most, mean) => {
    expect(degrees(engagementAngle(share, 1))).toBeCloseTo(angle, 3);
    expect(thickestChip(share, 1)).toBeCloseTo(most, 4);
    expect(meanChip(share, 1)).toBeCloseTo(mean, 4);
  });
});

describe('engagement on curved walls [area swept a unit of path, checked by circle intersection]', () => {
  it.each([
    [0.5, 0.4, 0.05, 0.125, 0.03269],
    [0.5, 0.5, 0.05, 0.095, 0.035],
    [0.5, 1, 0.05, 0.065, 0.041],
    [1, 0.75, 0.1, 0.28, 0.064],
    [0.3, 0.2, 0.02, 0.076, 0.012],
  ])('D %d, R %d, ae %d', (d, wall, ae, inside, outside) => {
    expect(radialDepthInside(ae, wall, d / 2)).toBeCloseTo(inside, 5);
    expect(radialDepthOutside(ae, wall, d / 2)).toBeCloseTo(outside, 5);
  });
});

describe('Kienzle [kc = kc1.1 h^-mc, worked values]', () => {
  it.each([
    [0.001, 4520],
    [0.004, 3108],
    [0.01, 2427],
    [0.1, 1303],
  ])('leaded brass at %d mm', (chip, kc) => expect(specificForce(brass, chip)).toBeCloseTo(kc, -0.5));
  it('peaks of a slot and a wall', () => {
    expect(toothForce(brass, 0.1, 0.004)).toBeCloseTo(1.2434, 4);
    expect(toothForce(brass, 0.25, 0.008)).toBeCloseTo(5.1558, 3);
    expect(toothForce(silver, 0.1, 0.005)).toBeCloseTo(3.1653, 4);
    expect(toothForce(brass, 0.3, 0.0024)).toBeCloseTo(2.5691, 3);
  });
  it('power of a slot and a wall', () => {
    expect(cuttingPower(brass, 0.1, 0.5, 192, 0.004 * meanChip(0.5, 0.5))).toBeCloseTo(0.5618, 3);
    expect(cuttingPower(brass, 0.3, 0.05, 192, 0.004 * meanChip(0.05, 0.5))).toBeCloseTo(0.2046, 3);
    expect(cuttingPower(brass, 1, 3, 750, 0.025 * meanChip(3, 3))).toBeCloseTo(80.286, 1);
  });
  it('runout gives one tooth the work [geometry]', () => {
    expect(chipsWithRunout(0.004, 2, 0.01)).toEqual({ most: 0.008, least: 0 });
    expect(chipsWithRunout(0.008, 2, 0.005).most).toBeCloseTo(0.013, 12);
    expect(chipsWithRunout(0.008, 2, 0.005).least).toBeCloseTo(0.003, 12);
  });
});

describe('bending [F L^3 / 3 E I, worked by hand at E = 600 kN/mm2 and scaled to 590]', () => {
  const scale = 600 / 590;
  it('flutes only, 0.8 D', () => {
    const bare = cutterOf(0.5, { reach: 1.5, flute: 1.5, shank: 0.5, stickOut: 1.5 });
    expect(compliance(bare, 0) * 1000).toBeCloseTo(1.49208 * scale, 4);
    // a load 0.1 mm up the flutes bends them as a rod of 1.4 mm
    expect(compliance(bare, 0.1) * 1000).toBeCloseTo(1.49208 * scale * (1.4 / 1.5) ** 3, 4);
  });
  it('flutes, a cone of 15 degrees and 6 mm of 3 mm shank', () => {
    const whole = cutterOf(0.5, { reach: 1.5, flute: 1.5, shank: 3, stickOut: 1.5 + 4.66506 + 6 });
    expect(compliance(whole, 0) * 1000).toBeCloseTo(2.3933 * scale, 4);
  });
});

describe('breakage [32 F L / pi d^3 at 3 kN/mm2 and 0.7 D]', () => {
  it.each([
    [0.3, 3.03],
    [0.5, 8.42],
    [1, 33.67],
    [2, 134.7],
  ])('D %d, load at 3 D', (d, force) => {
    const bare = cutterOf(d, { reach: 3 * d, flute: 3 * d, shank: d, stickOut: 3 * d });
    expect(breakingForce(bare, 0)).toBeCloseTo(force, force > 100 ? 0 : 1);
  });
});

describe('full slot [independent rotation of two flutes, 30 degree helix, Kienzle 700/0.27]', () => {
  it.each([
    ['0.5 mm, 0.1 deep', 0.5, 1.7, 160, 0.1, 1.24, 2.06, 5.72, 3.45],
    ['0.4 mm, 0.079 deep', 0.4, 1.2, 120, 0.079, 0.79, 1.31, 6.54, 3.94],
    ['0.8 mm, 0.153 deep', 0.8, 2.7, 240, 0.153, 2.55, 4.23, 7.17, 4.32],
    ['1.0 mm, 0.191 deep', 1, 3, 320, 0.191, 3.93, 6.52, 8.21, 4.95],
  ])('%s', (_, d, neck, feed, depth, even, one, marginEven, marginOne) => {
    const cutter = cutterOf(d, { reach: neck, flute: neck });
    const cut = { material: brass, cutter, speed: 20_000, feed };
    const both = slotLoad({ ...cut, runout: 0 }, depth);
    const single = slotLoad({ ...cut, runout: 0.1 }, depth);
    // two digits printed: one per cent
    expect(both.force / even).toBeCloseTo(1, 1.7);
    expect(single.force / one).toBeCloseTo(1, 1.7);
    expect(both.margin / marginEven).toBeCloseTo(1, 1.7);
    expect(single.margin / marginOne).toBeCloseTo(1, 1.7);
  });
  it('keeps a margin of 3 at the depth the study found', () => {
    const cutter = cutterOf(0.5, { reach: 1.7, flute: 1.7 });
    const found = slotDepth(
      { material: brass, cutter, speed: 20_000, feed: 160, runout: 0.01 },
      { margin: 3, allowance: 1 },
    );
    expect(found.limitedBy).toBe('margin');
    expect(found.depth).toBeCloseTo(0.116, 2);
  });
});

describe('depth of a lap', () => {
  const cut = (cutter: Cutter) => ({ material: brass, cutter, speed: 20_000, feed: 160, runout: 0.01 });
  it('changes when only the stick-out of a straight cutter changes', () => {
    const straight = { shank: 0.5, reach: 2, flute: 1.7 };
    const short = slotDepth(cut(cutterOf(0.5, { ...straight, stickOut: 4 })), { margin: 3, allowance: 0.03 });
    const long = slotDepth(cut(cutterOf(0.5, { ...straight, stickOut: 7 })), { margin: 3, allowance: 0.03 });
    expect(long.depth).toBeLessThan(0.8 * short.depth);
  });
  it('takes what the job asks for where it is less', () => {
    const asked = slotDepth(cut(cutterOf(0.5)), { asked: 0.05, margin: 3, allowance: 0.03 });
    expect(asked).toMatchObject({ depth: 0.05, limitedBy: 'asked' });
  });
  it('never goes beyond a quarter of the diameter', () => {
    const stout = slotDepth(cut(cutterOf(2, { reach: 3, flute: 3 })), { margin: 3, allowance: 0.1 });
    expect(stout).toMatchObject({ depth: 0.5, limitedBy: 'diameter' });
  });
});

describe('speed and feed', () => {
  const limits = { feedLowest: 1, feedHighest: 1000, spindleLowest: 5000, spindleHighest: 24_000 };
  it('turns as the formula says where the spindle allows [n = 1000 vc / pi D: 100 m/min, 3 mm is 10610]', () => {
    const data = cutData({ material: brass, cutter: cutterOf(3), radialDepth: 'slot', limits, asked: {} });
    expect(data.speed).toBe(10_610);
    expect(data.feed).toBe(Math.round(10_610 * 2 * 0.025));
    expect(data.why.length).toBeGreaterThanOrEqual(3);
  });
  it('is held to the spindle and says so', () => {
    const data = cutData({ material: brass, cutter: cutterOf(0.5), radialDepth: 'slot', limits, asked: {} });
    expect(data.speed).toBe(24_000);
    expect(data.feed).toBe(192);
    expect(data.why.join()).toContain("the machine's highest");
  });
  it('does as the job asks', () => {
    const data = cutData({
      material: brass,
      cutter: cutterOf(0.5),
      radialDepth: 'slot',
      limits,
      asked: { speed: 20_000, feed: 150, plunge: 40 },
    });
    expect(data).toMatchObject({ speed: 20_000, feed: 150, plunge: 40 });
  });
  it('interpolates the chip load between listed diameters and scales beyond them', () => {
    expect(chipLoad(brass, 0.5)).toBeCloseTo(0.004, 12);
    expect(chipLoad(brass, 0.7)).toBeCloseTo(0.0055, 12);
    expect(chipLoad(brass, 0.15)).toBeCloseTo(0.00125, 12);
    expect(chipLoad(brass, 6)).toBeCloseTo(0.05, 12);
  });
});

describe('feed on inside arcs [Fc = F (hole - d) / hole]', () => {
  it.each([
    [3, 1, 200, 133.333],
    [2, 1, 150, 75],
    [1.2, 0.8, 100, 33.333],
    [10, 3, 600, 420],
  ])('hole %d, cutter %d, %d mm/min', (hole, d, feed, centre) => {
    const slow = insideArcFeed({
      feed,
      pathRadius: (hole - d) / 2,
      cutterDiameter: d,
      radialDepth: d,
      flutes: 2,
      speed: 5000,
      lowest: 1,
    });
    expect(slow).toBeCloseTo(centre, 2);
  });
  it.each([3, 3.2, 5, 9, 40, 900])(
    'in steps a path of radius %d is no faster, and hardly slower',
    (pathRadius) => {
      const arc = {
        feed: 384,
        pathRadius,
        cutterDiameter: 1,
        radialDepth: 0.5,
        flutes: 2,
        speed: 24_000,
        lowest: 1,
      };
      const [exact, steps] = [insideArcFeed(arc), steppedArcFeed(arc)];
      expect(steps).toBeLessThanOrEqual(exact);
      expect(steps).toBeGreaterThan(exact / 1.0201);
    },
  );
  it('never goes below the lowest feed of the machine, which its proof would refuse', () => {
    const arc = { feed: 150, pathRadius: 0.05, cutterDiameter: 1, radialDepth: 1, flutes: 2, speed: 5000 };
    expect(steppedArcFeed({ ...arc, lowest: 100 })).toBe(100);
    expect(steppedArcFeed({ ...arc, lowest: 200 })).toBe(150);
  });
  it('never goes below the feed at which the edge rubs', () => {
    const slow = insideArcFeed({
      feed: 150,
      pathRadius: 0.001,
      cutterDiameter: 0.5,
      radialDepth: 0.03,
      flutes: 2,
      speed: 20_000,
      lowest: 1,
    });
    expect(slow).toBeCloseTo(0.4 * 0.003 * 2 * 20_000, 6);
  });
});

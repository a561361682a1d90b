/** A counted cycle with its two ends; a half cycle has weight 0.5. */
export interface LiteralCycle {
  readonly from: number;
  readonly to: number;
  readonly weight: number;
}

/** Peaks and valleys of a series with its first and last value; equal neighbours are one. */
export function reversalsOf(series: readonly number[]): number[] {
  const moved = series.filter((value, i) => i === 0 || value !== series[i - 1]);
  return moved.filter((value, i) => {
    if (i === 0 || i === moved.length - 1) return true;
    return value > moved[i - 1] !== moved[i + 1] > value;
  });
}

/** ASTM E1049-85, 5.4.4, step by step as it is printed. */
export function literalRainflow(series: readonly number[]): LiteralCycle[] {
  const reversals = reversalsOf(series);
  const cycles: LiteralCycle[] = [];
  const points: number[] = []; // points[0] is always S
  for (const reversal of reversals) {
    points.push(reversal); // (1)
    while (points.length >= 3) {
      const [a, b, c] = points.slice(-3); // (2)
      if (Math.abs(c - b) < Math.abs(b - a)) break; // (3) X < Y
      if (points.length === 3) {
        cycles.push({ from: a, to: b, weight: 0.5 }); // (5) Y contains S
        points.shift();
      } else {
        cycles.push({ from: a, to: b, weight: 1 }); // (4)
        points.splice(-3, 2);
      }
    }
  }
  for (let i = 1; i < points.length; i++) {
    cycles.push({ from: points[i - 1], to: points[i], weight: 0.5 }); // (6)
  }
  return cycles;
}

/** ASTM E1049-85, 5.4.5: the history turned round to start and end at its largest peak, whole cycles only. */
export function literalRepeating(series: readonly number[]): LiteralCycle[] {
  const top = series.indexOf(Math.max(...series));
  const points: number[] = [];
  const cycles: LiteralCycle[] = [];
  for (const reversal of reversalsOf([...series.slice(top), ...series.slice(0, top + 1)])) {
    points.push(reversal);
    while (points.length >= 3) {
      const [a, b, c] = points.slice(-3);
      if (Math.abs(c - b) < Math.abs(b - a)) break;
      cycles.push({ from: a, to: b, weight: 1 });
      points.splice(-3, 2);
    }
  }
  return cycles;
}

/**
 * Reservoir method (EN 1993-1-9, Annex A): the graph of a closed history that starts and ends at its largest value
 * is filled with water and drained from its lowest point, then from the lowest of what is left; each depth is a range.
 */
export function reservoirRanges(series: readonly number[]): number[] {
  const ground = reversalsOf(series);
  const water = ground.map(() => Math.max(...ground));
  const ranges: number[] = [];
  while (true) {
    const depths = ground.map((height, i) => water[i] - height);
    const deepest = Math.max(...depths);
    if (!(deepest > 0)) return ranges;
    ranges.push(deepest);
    const drain = depths.indexOf(deepest);
    for (const way of [-1, 1]) {
      let sill = ground[drain];
      for (let i = drain; i >= 0 && i < ground.length; i += way) {
        sill = Math.max(sill, ground[i]);
        water[i] = Math.min(water[i], sill);
      }
    }
  }
}

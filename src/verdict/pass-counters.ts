import { createRainflow, type RainflowCounter } from '../counting/rainflow.ts';
import type { PassCounter } from '../mechanics/history.ts';

/** A rainflow counter for every fastener and every span of one run. Ranges are a connection's forces [N]. */
export interface PassCounters extends PassCounter {
  readonly fasteners: readonly RainflowCounter[];
  readonly spans: readonly RainflowCounter[];
}

/**
 * Counters for a run of `count` connections.
 *
 * @param count number of connections
 * @param compressionShare share of a span's compression that counts, 0 … 1
 */
export function createPassCounters(count: number, compressionShare: number): PassCounters {
  const fasteners = Array.from({ length: count }, () => createRainflow());
  const spans = Array.from({ length: count - 1 }, () => createRainflow({ compressionShare }));
  return {
    fasteners,
    spans,
    begin() {
      for (const counter of fasteners) counter.reset();
      for (const counter of spans) counter.reset();
    },
    take(shears, spanForces, rows) {
      for (let i = 0; i < count; i++) fasteners[i].push(shears, i, count, rows);
      for (let j = 0; j < count - 1; j++) spans[j].push(spanForces, j, count - 1, rows);
    },
  };
}

import { pointsCurve } from '../../src/damage/curve.ts';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import { minerDamage } from '../../src/damage/miner.ts';
import { createChain, moveTo } from '../../src/mechanics/chain.ts';
import type { Chain } from '../../src/mechanics/chain-state.ts';
import { RowSink } from '../../src/mechanics/row-sink.ts';
import { spanForces } from '../../src/mechanics/span-forces.ts';
import { type StrainPath, strainPath } from '../../src/mechanics/strain-path.ts';
import { createPassCounters } from '../../src/verdict/pass-counters.ts';
import { type BenchRow, inTurns } from './in-turns.ts';
import { noisyYear, seeded } from './seeded.ts';

/** An aluminium rail: EA [N], spacing [mm], fastener stiffness [N/mm], α [1/K]. */
const RAIL = { stiffness: 450 * 70_000, spacing: 600, fastener: 2000, expansion: 23e-6 };

/** Changes of mode an hour that the grips are set for: something slips, sticks or bears at nearly every hour. */
const EVENTS_AN_HOUR = 1.3;

/** A year of 5, 20 and 100 slipping fasteners against 8,760 bare tridiagonal solves in the same language. */
export function chainBench(): BenchRow[] {
  return [5, 20, 100].flatMap((count) => {
    const strain = noisyYear(7).map((t) => RAIL.expansion * (t - 12));
    const { chain, events } = busyChain(count, strain);
    return inTurns(
      () => bareSolves(count),
      [
        {
          name: `${count} slipping fasteners, exact path of a year (${events} events)`,
          goal: 2.5,
          run: () => followSamples(chain, strain),
        },
        {
          name: `${count} slipping fasteners, a counted pass with damage of all`,
          goal: 4,
          run: countedYear(chain, count, strainPath(strain)),
        },
      ],
    );
  });
}

/** The chain whose grips come nearest to the wanted number of events, found by halving. */
function busyChain(count: number, strain: Float64Array): { chain: Chain; events: number } {
  let [low, high] = [1, 1e5];
  for (let halving = 0; halving < 12; halving++) {
    const level = Math.sqrt(low * high);
    if (eventsOf(slippingChain(count, level), strain) > EVENTS_AN_HOUR * strain.length) low = level;
    else high = level;
  }
  const chain = slippingChain(count, high);
  const events = eventsOf(chain, strain);
  if (events < strain.length / 4) throw new Error(`only ${events} events in the year`);
  return { chain, events };
}

/** A rail whose joints have ample play and grips about `level` [N], each its own. */
function slippingChain(count: number, level: number): Chain {
  const random = seeded(count);
  const column = (of: (i: number) => number) =>
    Float64Array.from({ length: count }, (_, i) => of(i));
  return createChain({
    axialStiffness: RAIL.stiffness,
    positions: column((i) => i * RAIL.spacing),
    stiffness: column(() => RAIL.fastener),
    freePlay: column(() => 60),
    grip: column(() => level * (0.5 + random())),
  });
}

function followSamples(chain: Chain, strain: Float64Array): void {
  for (const e of strain) moveTo(chain, e);
}

/** Moments between samples at which a joint changed its mode. */
function eventsOf(chain: Chain, strain: Float64Array): number {
  let rows = 0;
  const sink = { take: () => rows++ };
  for (const e of strain) moveTo(chain, e, sink as never);
  return rows - strain.length;
}

/** A pass with the forces of all fasteners and spans at every event, their cycles counted, and their damage. */
function countedYear(chain: Chain, count: number, { strain, turns }: StrainPath): () => void {
  const curve = pointsCurve(
    { id: 'bench', of: 'force' },
    Float64Array.of(1e4, 1e6, 5e6),
    Float64Array.of(20_000, 5000, 1000),
  );
  if (typeof curve === 'string') throw new Error(curve);
  const table = createDamageTables().of(curve, 1.35, null);
  const counters = createPassCounters(count, 1);
  const sink = new RowSink(count, ({ values, rows, capacity, marks }) => {
    spans ??= new Float64Array(capacity * (count - 1));
    spanForces(values, spans, count, rows);
    counters.take(values, spans, rows, marks);
  });
  let spans: Float64Array | undefined;
  return () => {
    counters.begin();
    for (const turn of turns) moveTo(chain, strain[turn], sink);
    sink.flush();
    for (const counter of [...counters.fasteners, ...counters.spans]) {
      minerDamage(counter.finish('repeat'), { table, scale: 1, gate: 0 });
    }
  };
}

/** The least that any method would do: assemble and solve one tridiagonal system an hour. */
function bareSolves(count: number): void {
  const diagonal = new Float64Array(count);
  const load = new Float64Array(count);
  const span = RAIL.stiffness / RAIL.spacing;
  let check = 0;
  for (let hour = 0; hour < 8760; hour++) {
    diagonal.fill(RAIL.fastener + 2 * span);
    diagonal[0] = RAIL.fastener + span;
    diagonal[count - 1] = RAIL.fastener + span;
    load.fill(0);
    load[0] = -hour;
    load[count - 1] = hour;
    for (let i = 1; i < count; i++) {
      const factor = span / diagonal[i - 1];
      diagonal[i] -= factor * span;
      load[i] += factor * load[i - 1];
    }
    load[count - 1] /= diagonal[count - 1];
    for (let i = count - 2; i >= 0; i--) load[i] = (load[i] + span * load[i + 1]) / diagonal[i];
    check += load[0];
  }
  if (!Number.isFinite(check)) throw new Error('the bare solves went wrong');
}

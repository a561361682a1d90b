import fc from 'fast-check';
import type { ChainSpec } from '../../src/mechanics/chain.ts';

/** A number spread evenly over the decades between two positive bounds. */
function decades(min: number, max: number): fc.Arbitrary<number> {
  return fc
    .double({ min: Math.log10(min), max: Math.log10(max), noNaN: true })
    .map((exponent) => 10 ** exponent);
}

interface Joint {
  readonly stiffness: number;
  readonly freePlay: number;
  readonly grip: number;
}

/** Tight, clearance hole or slot, of any grip that counts: at least 1 N where there is free play. */
const joint: fc.Arbitrary<Joint> = fc.record({
  stiffness: decades(200, 50_000),
  freePlay: fc.oneof(fc.constant(0), decades(0.05, 3), fc.constant(1000)),
  grip: decades(1, 20_000),
});

const rigidJoint = joint.map((j) => ({ ...j, stiffness: Number.POSITIVE_INFINITY }));

interface Bounds {
  readonly maxCount: number;
  /** EA [N]. */
  readonly axialStiffness?: fc.Arbitrary<number>;
  /** Between neighbours [mm]. */
  readonly spacing?: fc.Arbitrary<number>;
}

function runOf(anyJoint: fc.Arbitrary<Joint>, bounds: Bounds): fc.Arbitrary<ChainSpec> {
  const { maxCount, axialStiffness = decades(1e6, 4e8), spacing = decades(50, 3000) } = bounds;
  const stations = fc.array(fc.tuple(anyJoint, spacing), { minLength: 2, maxLength: maxCount });
  return fc.tuple(axialStiffness, stations).map(([stiffness, list]) => {
    let at = 0; // in eighths of a millimetre, so that a mirrored run has the same spans to the last digit
    return {
      axialStiffness: stiffness,
      positions: Float64Array.from(list, ([, length]) => {
        at += Math.round(8 * length);
        return at / 8;
      }),
      stiffness: Float64Array.from(list, ([j]) => j.stiffness),
      freePlay: Float64Array.from(list, ([j]) => j.freePlay),
      grip: Float64Array.from(list, ([j]) => j.grip),
    };
  });
}

/** Runs whose joints grip, slip, bear and turn round within an ordinary path, of up to eight fasteners. */
export const livelyRun = runOf(
  fc.record({
    stiffness: decades(500, 20_000),
    freePlay: decades(0.05, 1.5),
    grip: decades(50, 5000),
  }),
  { maxCount: 8, axialStiffness: decades(2e7, 6e7), spacing: decades(200, 800) },
);

/** Runs of plain springs, spans uneven [N, mm]. */
export const elasticRun = runOf(
  joint.map((j) => ({ ...j, freePlay: 0 })),
  { maxCount: 40 },
);

/** Runs with grip, slip and bearing; of elastic fasteners only. */
export const slippingRun = (maxCount: number) => runOf(joint, { maxCount });

/** The same with rigid fasteners among them. */
export const anyRun = (maxCount: number) =>
  runOf(fc.oneof({ weight: 3, arbitrary: joint }, { weight: 1, arbitrary: rigidJoint }), {
    maxCount,
  });

/** A mismatch strain as of aluminium in the sun, in whole billionths. */
export const anyStrain = fc.integer({ min: -2_000_000, max: 2_000_000 }).map((n) => n * 1e-9);

/** Mismatch strains at some turning points of a path. */
export const strainPath = fc.array(anyStrain, { minLength: 1, maxLength: 8 });

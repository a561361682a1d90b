import {
  CHECKS,
  type Check,
  type CheckName,
  type CheckUnit,
  type Connection,
  type Curve,
  type Damage,
  type Fastener,
  type Job,
  type Member,
  type RangeBin,
  type RecordAxis,
  type Result,
  type Run,
  type RunResult,
  type Zone,
} from '../../src/model.ts';

/** What one invented run is made from. */
export interface RunRecipe {
  readonly id: string;
  readonly count: number;
  /** Allowed shear range of a fastener [N]; `null` is not given. */
  readonly shearRangeLimit?: number | null;
  readonly exempts?: boolean;
  readonly curves?: boolean;
  readonly slotted?: boolean;
  readonly walks?: boolean;
}

export interface ResultRecipe {
  readonly units?: 'SI' | 'US';
  readonly hours?: number;
  readonly runs?: readonly RunRecipe[];
}

/**
 * An invented, typed `Result` for tests of what is written about one: a rail along a near-constant
 * deck, with forces by the row formula of equal elastic fasteners and damage against made-up curves.
 */
export function makeResult(recipe: ResultRecipe = {}): Result {
  const hours = recipe.hours ?? 8760;
  const axis = makeAxis(hours);
  const zones = [makeZone('south', axis, 20, 12, 14), makeZone('deck', axis, 14, 5, 0.3)];
  const recipes = recipe.runs ?? [
    { id: 'R1', count: 4, shearRangeLimit: 16000, curves: true },
    { id: 'R2', count: 21, shearRangeLimit: 3000 },
    { id: 'R3', count: 9, shearRangeLimit: null, slotted: true, walks: true },
  ];
  const results = recipes.map((one) => makeRunResult(one, zones, axis));
  const utilisations = results.map((r) => r.connections[r.governing].governing?.utilisation ?? 0);
  const job: Job = {
    title: 'Made-up rails for a test',
    units: recipe.units ?? 'SI',
    axis,
    zones,
    recordFindings: [],
    recordReadAs: [],
    represents: null,
    weather: null,
    warming: null,
    extremes: [],
    limits: {
      designLife: 50,
      damage: 1,
      loadFactor: 1,
      memberFactor: 1.35,
      fastenerFactor: 1.35,
      staticFactor: 1.5,
    },
    counting: { residue: 'repeat', forceGate: 0, stressGate: 0, extremesCycle: 'no' },
    remedies: {
      longestTravel: 20,
      slotTravels: null,
      slotStep: 1,
      shortestPiece: 3000,
      widestGap: 30,
      gapStep: 1,
      closestSpacing: 150,
      slottedGripShare: 1,
      gripSpread: 0.5,
    },
    unevenFriction: false,
    curves: [FASTENER_CURVE, MEMBER_CURVE],
    runs: results.map((r) => r.run),
    inputs: [{ name: 'job.yaml', sha256: 'a'.repeat(64) }],
    derived: [],
    defaults: [
      { key: 'limits.damage', value: '1' },
      { key: 'record.gaps.fill_up_to', value: '3 h' },
    ],
    warnings: ['curves weld: scatter is given for a curve that is a characteristic one already'],
  };
  const governing = utilisations.indexOf(Math.max(...utilisations));
  return { job, runs: results, warmed: null, governing };
}

function makeAxis(hours: number): RecordAxis {
  const start = Date.UTC(2031, 0, 1);
  return {
    times: Float64Array.from({ length: hours }, (_, i) => start + i * 3_600_000),
    stepHours: 1,
    sampleHours: null,
    filledHoursBefore: new Float64Array(hours),
  };
}

/** Season, day, and weather of a few days, without a random source. */
function makeZone(name: string, axis: RecordAxis, ...shape: [number, number, number]): Zone {
  const [mean, season, day] = shape;
  const temperature = axis.times.map((_, i) => {
    const days = i / 24;
    const sky = 0.6 + 0.4 * Math.sin(days * 1.7) * Math.sin(days * 0.61);
    const daily = Math.max(-0.35, -Math.cos(2 * Math.PI * days));
    return (
      mean - season * Math.cos((2 * Math.PI * days) / 365) + day * sky * daily + 2 * Math.sin(days)
    );
  });
  const standing = new Uint8Array(temperature.length);
  return { name, temperature, standing, constant: false, sunlit: null };
}

const FASTENER_CURVE: Curve = {
  id: 'anchor M12',
  of: 'force',
  line: {
    kind: 'points',
    cycles: Float64Array.of(1e4, 1e5, 1e6, 5e6),
    ranges: Float64Array.of(16000, 10100, 6400, 4600),
    slopeBelow: 5,
    slopeAbove: 5,
  },
  below: 'cutoff',
  limitRange: 4600,
  on: 'net',
  compressionShare: 1,
  survivalDivisor: 1,
  thicknessEffect: null,
};

const MEMBER_CURVE: Curve = {
  ...FASTENER_CURVE,
  id: 'hole in rail',
  of: 'stress',
  line: {
    kind: 'points',
    cycles: Float64Array.of(1e4, 2e6, 5e6, 1e8),
    ranges: Float64Array.of(340, 58.1, 42.9, 23.5),
    slopeBelow: 5,
    slopeAbove: 3,
  },
  limitRange: 23.5,
};

function makeMember(curves: boolean): Member {
  return {
    id: 'rail',
    modulus: 70000,
    expansion: 23e-6,
    area: 450,
    netArea: 420,
    inertia: 36000,
    yield: 160,
    buckling: null,
    bucklingFactor: 1,
    stressFactor: 1,
    thickness: null,
    curve: curves ? MEMBER_CURVE : null,
  };
}

function makeFastener(recipe: RunRecipe): Fastener {
  return {
    id: recipe.slotted ? 'slotted bracket' : 'bracket',
    perConnection: 1,
    stiffness: 2000,
    freePlay: recipe.slotted ? 9 : 0,
    grip: recipe.slotted ? 250 : 0,
    shearArea: 84.3,
    shearResistance: 18000,
    tensionResistance: null,
    interaction: null,
    slottedGrip: null,
    maySlot: true,
    diameter: 12,
    shearRangeLimit: recipe.shearRangeLimit ?? null,
    shearRangeRule: recipe.exempts ? 'exempts' : 'required',
    curve: recipe.curves ? FASTENER_CURVE : null,
  };
}

function makeRunResult(recipe: RunRecipe, zones: readonly Zone[], axis: RecordAxis): RunResult {
  const fastener = makeFastener(recipe);
  const run: Run = {
    id: recipe.id,
    member: makeMember(recipe.curves ?? false),
    positions: Float64Array.from({ length: recipe.count }, (_, i) => i * 600),
    roles: Array.from({ length: recipe.count }, (_, i) =>
      recipe.slotted && i > 0 ? 'slotted' : 'fixed',
    ),
    fasteners: Array.from({ length: recipe.count }, () => fastener),
    fixedType: fastener,
    slottedType: recipe.slotted ? fastener : null,
    zone: zones[0],
    lockIn: 15,
    structure: { zone: zones[1], expansion: 10e-6, lockIn: 12 },
    overhangs: { left: 0, right: 0 },
    line: null,
    gap: null,
    joint: { cover: { kind: 'open' }, structureMovement: 0 },
    settingTolerance: 2,
    addedTension: 0,
    addedShear: 0,
  };
  const strain = strainOf(run);
  const peak = Math.max(...strain.map(Math.abs));
  const range = Math.max(...strain) - Math.min(...strain);
  const shear = Array.from({ length: recipe.count }, (_, i) => shearPerStrain(run, i));
  const connections = shear.map((k, i) =>
    makeConnection(recipe, run, i, { peak: k * peak, range: k * range }),
  );
  const of = (c: Connection) => c.governing?.utilisation ?? 0;
  const governing = connections.findIndex((c) => of(c) === Math.max(...connections.map(of)));
  const worst = connections[governing];
  return {
    run,
    passes: recipe.walks ? 50 : 2,
    walks: recipe.walks ?? false,
    driftPerYear: recipe.walks ? 0.8 : 0,
    years: axis.times.length < 8400 ? axis.times.length / 8766 : 1,
    coveredHours: axis.times.length,
    connections,
    ends: { left: END, right: END },
    governing,
    largestSpanForce: 30000,
    fastenerBins: makeBins(worst.shearRange, worst.fastenerDamage, fastener.curve),
    memberBins: makeBins(worst.stressRange, worst.memberDamage, run.member.curve),
    remedy: null,
    extremesCycle: null,
    yearByYear: () => [],
    filledShares: () => connections.map(() => ({ fastener: 0, member: 0 })),
    trace: () => ({
      shear: strain.map((e) => e * shear[governing]),
      spanForce: strain.map((e) => -e * shear[governing] * 1.7),
      slip: new Float64Array(strain.length),
    }),
  };
}

const END = { outward: { value: 3.2, when: '' }, inward: { value: 2.1, when: '' } };

function strainOf(run: Run): Float64Array {
  const { temperature } = run.zone;
  const { zone, expansion, lockIn } = run.structure!;
  return temperature.map(
    (t, i) => run.member.expansion * (t - run.lockIn) - expansion * (zone.temperature[i] - lockIn),
  );
}

/** Shear of fastener i per mismatch strain [N]: the difference of the span forces beside it. */
function shearPerStrain(run: Run, i: number): number {
  const n = run.positions.length;
  const axial = run.member.modulus * run.member.area;
  const phi = Math.acosh(1 + (2000 * 600) / axial / 2);
  const span = (j: number) =>
    j === 0 || j === n ? 0 : axial * (1 - Math.cosh((j - n / 2) * phi) / Math.cosh((n * phi) / 2));
  return Math.abs(span(i + 1) - span(i)) * (run.roles[i] === 'slotted' ? 0.2 : 1);
}

function makeConnection(
  recipe: RunRecipe,
  run: Run,
  i: number,
  shear: { readonly peak: number; readonly range: number },
): Connection {
  const curves = recipe.curves ?? false;
  const fastenerDamage = makeDamage(curves, shear.range, 0.004);
  const stressRange = (shear.range * 1.7) / run.member.netArea;
  const memberDamage = makeDamage(curves, stressRange, 0);
  const check = (
    name: CheckName,
    unit: CheckUnit,
    demand: number | null,
    limit: number | null,
  ): Check => {
    const utilisation = limit === null || demand === null ? null : demand / limit;
    const status = utilisation === null ? 'not given' : utilisation > 1 ? 'fail' : 'pass';
    return { check: name, demand, limit, unit, utilisation, status, when: '2031-07-12T15:00' };
  };
  const yearly = fastenerDamage.sum;
  const slotted = run.roles[i] === 'slotted';
  const all: Record<CheckName, Check> = {
    'member damage': check('member damage', '1', memberDamage.sum, 1),
    'fastener damage': check('fastener damage', '1', yearly === null ? null : yearly * 50, 1),
    'shear range': check('shear range', 'N', shear.range, recipe.shearRangeLimit ?? null),
    'peak shear': check('peak shear', 'N', shear.peak * 1.5, 18000),
    combined: check('combined', '1', null, 1),
    'yield range': check('yield range', 'MPa', stressRange, 240),
    'slot travel': check('slot travel', 'mm', 0.25 * i + 2, slotted ? 9 : null),
    buckling: check('buckling', 'N', shear.peak, null),
    'joint gap': check('joint gap', 'mm', null, null),
  };
  const checks = CHECKS.filter(
    (name) => name !== 'joint gap' && (slotted || name !== 'slot travel'),
  ).map((name) => all[name]);
  const governing = checks.reduce((a, b) =>
    (b.utilisation ?? -1) > (a.utilisation ?? -1) ? b : a,
  );
  return {
    run: run.id,
    number: i + 1,
    position: run.positions[i],
    fastener: run.fasteners[i],
    role: run.roles[i],
    shearPeak: shear.peak,
    shearRange: shear.range,
    fastenerDamage,
    stressRange,
    memberDamage,
    cyclesPerYear: 402,
    fastenerDamagePerYear: fastenerDamage.sum,
    memberDamagePerYear: memberDamage.sum,
    life: yearly === null ? null : 1 / yearly,
    slipPeak: slotted ? 0.25 * i : 0,
    slidingPerYear: slotted ? 120 : 0,
    bucklingUtilisation: null,
    checks,
    governing,
    verdict: checks.some((c) => c.status === 'fail') ? 'fails' : 'ok',
    change: null,
  };
}

function makeDamage(curves: boolean, range: number, sum: number): Damage {
  return {
    sum: curves ? sum : null,
    cycles: 402,
    damagingCycles: curves && sum > 0 ? 210 : 0,
    equivalentRange: curves && sum > 0 ? range * 0.55 : null,
    slope: curves && sum > 0 ? 5 : null,
    gatedCycles: 0,
    gatedDamage: 0,
  };
}

/** Twelve bins up to the largest range, fewer cycles the larger; damage by the curve's fifth power. */
function makeBins(largest: number, damage: Damage, curve: Curve | null): RangeBin[] {
  if (largest === 0) return [];
  const width = largest / 12;
  const count = (i: number) => Math.round(160 / (i + 1) ** 1.2) + (i === 11 ? 1 : 0);
  const weight = (i: number) => (i < 3 ? 0 : count(i) * (i + 0.5) ** 5);
  const total = Array.from({ length: 12 }, (_, i) => weight(i)).reduce((a, b) => a + b);
  return Array.from({ length: 12 }, (_, i) => {
    const share = damage.sum === null ? null : (damage.sum * weight(i)) / total;
    return {
      from: i * width,
      to: (i + 1) * width,
      count: count(i),
      cyclesToFailure:
        curve === null || share === null ? null : share > 0 ? count(i) / share : Infinity,
      damage: share,
    };
  });
}

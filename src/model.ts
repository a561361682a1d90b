/**
 * The plain types handed from stage to stage. Everything is in base units: N, mm, MPa (= N/mm²),
 * K for temperature differences, °C for temperatures, ms since 1970 for times on the record's own clock.
 * An optional quantity that the user did not give is `null`, never `NaN`.
 */
import type { Quantity } from './units.ts';

/** One sample's standing in one temperature history. */
export const VALID = 0;
/** Missing in the record, bridged by a straight line, and short enough to count as covered. */
export const FILLED = 1;
/** Missing in the record and bridged by a straight line, but not counted as covered. */
export const BRIDGED = 2;

/** Where and on which clock a record was taken: what the sun's place in the sky follows from. */
export interface Site {
  /** Degrees, north positive. */
  readonly latitude: number;
  /** Degrees, east positive. */
  readonly longitude: number;
  /** How far the record's own clock runs ahead of UTC [h], the same all year. */
  readonly utcOffset: number;
}

/**
 * What a sample of irradiance stands for: the mean over the step that ends at its time, over the step that starts
 * there, or the moment itself.
 */
export type Stamp = 'end' | 'start' | 'instant';

/** A weather file that the record was read from. */
export interface WeatherFile {
  /** The place as the file's header names it. */
  readonly place: string;
  /** First and last year that its rows name. */
  readonly years: readonly [number, number];
  /** The year that a typical year was set on, whose months come from several; `null` where the rows' own stand. */
  readonly setOn: number | null;
}

/** What the sun's light on a member was reckoned from: channels by name. */
export type LightBasis =
  | { readonly from: 'surface'; readonly channel: string; readonly stamp: Stamp }
  | {
      readonly from: 'sky';
      readonly global: string | null;
      readonly direct: string | null;
      readonly diffuse: string | null;
      readonly site: Site;
      readonly stamp: Stamp;
      /** Where the surface faces, degrees clockwise from north, and its tilt from level [degrees]. */
      readonly faces: number;
      readonly albedo: number;
      readonly sky: 'isotropic' | 'Hay-Davies';
      /** A ledge over the member: how far it stands out and how far above it is [mm]. */
      readonly overhang: { readonly depth: number; readonly above: number } | null;
      /** Altitudes of the horizon at azimuths [degrees]. */
      readonly horizon: readonly { readonly azimuth: number; readonly altitude: number }[];
    };

/** A member in sun and air: all that its temperature was reckoned from. */
export interface SunlitBasis {
  /** Channel of air temperature. */
  readonly air: string;
  readonly light: LightBasis;
  /** Degrees from level: 0 faces up, 90 stands upright. */
  readonly tilt: number;
  /** Share of the sun's light that it takes in, and the surface's name where the user named one. */
  readonly absorptance: number;
  readonly surface: string | null;
  readonly emissivity: number;
  /** What it loses to the sky beside what it takes in [W/m²]. */
  readonly skyLoss: number;
  /** Film coefficient [W/(m²·K)], or the channel of wind that it is reckoned from. */
  readonly film: number | { readonly wind: string };
  /** Time constant [h], or the heat store that it follows from. */
  readonly lag:
    | number
    | {
        /** [kg/m] */
        readonly mass: number;
        /** [J/(kg·K)] */
        readonly heatCapacity: number;
        /** [mm] */
        readonly exposedPerimeter: number;
      };
}

/** What a zone's temperature was reckoned from where nobody measured it, one value a sample. */
export interface Sunlit {
  readonly basis: SunlitBasis;
  /** [°C] */
  readonly air: Float64Array;
  /** On the member's surface [W/m²]. */
  readonly irradiance: Float64Array;
}

/** A part of the building with one temperature history. */
export interface Zone {
  readonly name: string;
  /** Temperature at each sample of the record [°C]. */
  readonly temperature: Float64Array;
  /** `VALID`, `FILLED` or `BRIDGED` at each sample. */
  readonly standing: Uint8Array;
  /** True where the job gives the zone one temperature for all time. */
  readonly constant: boolean;
  /** Given where the temperature was reckoned from sun and air. */
  readonly sunlit: Sunlit | null;
}

/** The time axis that all zones share. */
export interface RecordAxis {
  /** Time of each sample [ms since 1970 on the record's own clock], rising. */
  readonly times: Float64Array;
  /** Median step between samples [h]. */
  readonly stepHours: number;
  /** The step in force at each sample [h], where it changes in the record; else `null`. */
  readonly sampleHours: Float64Array | null;
  /** Rows missing between sample i−1 and i that were short enough to be filled, as hours [h]. */
  readonly filledHoursBefore: Float64Array;
}

/** What judging a record can find. */
export const RECORD_FINDINGS = [
  'gap',
  'repeat',
  'disorder',
  'out of band',
  'stuck',
  'spike',
  'jump',
  'jump between files',
  'channels apart',
  'step changes',
  'doubled hour once',
] as const;
export type RecordFindingKind = (typeof RECORD_FINDINGS)[number];

/** Something doubtful in the record, and what was done about it. */
export interface RecordFinding {
  readonly kind: RecordFindingKind;
  /** Where it begins [ms on the record's clock]. */
  readonly time: number;
  /** The channel; blank where it is all of them. */
  readonly channel: string;
  /** The doubtful value [°C]; `null` where there is none. */
  readonly value: number | null;
  /** How long it lasts [h]; `null` where it is one row. */
  readonly hours: number | null;
  readonly done: string;
}

/** A member's flexural-buckling rule. */
export type BucklingRule =
  | { readonly rule: 'EN'; readonly imperfection: number; readonly plateau: number }
  | { readonly rule: 'AISC' };

export interface Member {
  readonly id: string;
  /** Young's modulus E [MPa]. */
  readonly modulus: number;
  /** Coefficient of thermal expansion α [1/K]. */
  readonly expansion: number;
  /** Gross area A [mm²]. */
  readonly area: number;
  /** Net area at a fastener [mm²]; the gross area where the user gave none. */
  readonly netArea: number;
  /** Second moment of area about the weak axis [mm⁴]. */
  readonly inertia: number | null;
  /** Yield strength f_y [MPa]. */
  readonly yield: number | null;
  readonly buckling: BucklingRule | null;
  /** Multiplies the flexural resistance: φ or 1/γ_M1; 1 where the user gave none. */
  readonly bucklingFactor: number;
  /** Multiplies N/A: stress concentration or a share of secondary stress; 1 where the user gave none. */
  readonly stressFactor: number;
  /** Thickness for a curve's thickness factor [mm]. */
  readonly thickness: number | null;
  /** Stress curve of the connection detail in the member. */
  readonly curve: Curve | null;
}

export type ShearRangeRule = 'required' | 'exempts';

/** One type of fastener with its joint. Stiffness, grip, areas and resistances are each fastener's. */
export interface Fastener {
  readonly id: string;
  /** Fasteners side by side in one connection. */
  readonly perConnection: number;
  /** Shear stiffness k of one fastener [N/mm]; `null` is rigid. */
  readonly stiffness: number | null;
  /** Slip each way from the centre before the fastener bears, c [mm]. */
  readonly freePlay: number;
  /** Friction force before one fastener's joint slips, g [N]. */
  readonly grip: number;
  readonly shearArea: number | null;
  /** Design shear resistance V_Rd [N]. */
  readonly shearResistance: number | null;
  /** Design tension resistance T_Rd [N]. */
  readonly tensionResistance: number | null;
  /** Exponent p of the combined check. */
  readonly interaction: number | null;
  /** Allowed shear range [N]. */
  readonly shearRangeLimit: number | null;
  readonly shearRangeRule: ShearRangeRule;
  /** Grip of the same fastener in a slot that a remedy gives it [N]; a share of `grip` where not given. */
  readonly slottedGrip: number | null;
  /** Whether a remedy may put it into a slot. */
  readonly maySlot: boolean;
  /** Diameter of the bolt [mm]. */
  readonly diameter: number | null;
  /** Force curve, or stress curve on the shear area. */
  readonly curve: Curve | null;
}

/** What happens below a curve's last point. */
export type BelowLast = 'cutoff' | 'continue' | 'threshold';

/**
 * The line of an S-N curve as the numeric core sees it: cycles to failure over range, whole and unfactored.
 * Ranges in MPa for a stress curve and in N for a force curve.
 */
export type CurveLine =
  | {
      readonly kind: 'points';
      /** Cycles to failure at each point, rising. */
      readonly cycles: Float64Array;
      /** Range at each point, falling strictly. */
      readonly ranges: Float64Array;
      /** Slope m of N ∝ S^−m below the last point where the line goes on. */
      readonly slopeBelow: number;
      /** Slope m above the first point. */
      readonly slopeAbove: number;
    }
  | {
      readonly kind: 'formula';
      /** Cycles to failure at a range, real, positive and falling over [from, to]. */
      readonly cyclesAt: (range: number) => number;
      readonly from: number;
      readonly to: number;
    };

export interface Curve {
  readonly id: string;
  readonly of: 'stress' | 'force';
  readonly line: CurveLine;
  readonly below: BelowLast;
  /** Range under which `below` applies: the last point's, or the threshold. */
  readonly limitRange: number;
  /** The member area that the stress is reckoned on. */
  readonly on: 'net' | 'gross';
  /** Share of a cycle's compressive part that counts, 0 … 1. */
  readonly compressionShare: number;
  /** Divides the curve's cycles: 10^(z·s) of the stated scatter and survival; 1 where none. */
  readonly survivalDivisor: number;
  /** Ranges are multiplied by (t/t_ref)^exponent where the member is thicker than t_ref. */
  readonly thicknessEffect: { readonly reference: number; readonly exponent: number } | null;
}

export type Role = 'fixed' | 'slotted';

export interface Run {
  readonly id: string;
  readonly member: Member;
  /** From the member's left end to each fastener [mm], rising. */
  readonly positions: Float64Array;
  readonly roles: readonly Role[];
  /** The fastener type at each position. */
  readonly fasteners: readonly Fastener[];
  /** The type that stands where the run is fixed. */
  readonly fixedType: Fastener;
  /** The type that stands where it is slotted; `null` where the user named none. */
  readonly slottedType: Fastener | null;
  readonly zone: Zone;
  /** Member temperature at which the fasteners were tightened [°C]. */
  readonly lockIn: number;
  readonly structure: Structure | null;
  /** Free member beyond the first and beyond the last fastener [mm]. */
  readonly overhangs: Overhangs;
  /** Name of the line of runs that this one is part of. */
  readonly line: string | null;
  /** Joint gap at the run's right end, measured at lock-in [mm]. */
  readonly gap: number | null;
  readonly joint: Joint;
  /** How far off its centre a bolt may have been set in its slot [mm]. */
  readonly settingTolerance: number;
  /** Design tension of each fastener from other loads, already factored [N]. */
  readonly addedTension: number;
  /** Design shear of each fastener from other loads, already factored [N]. */
  readonly addedShear: number;
}

/** How the gap at a run's right end is covered, and what moves behind it. */
export interface Joint {
  readonly cover:
    | { readonly kind: 'open' }
    /** Holds until the joint opens further than `lap` [mm]. */
    | { readonly kind: 'lapped'; readonly lap: number }
    /** Takes this share of its installed width both ways. */
    | { readonly kind: 'sealed'; readonly movement: number };
  /** Movement each way of a structural joint behind [mm]. */
  readonly structureMovement: number;
}

/** Free member beyond the end fasteners of a run [mm]. */
export interface Overhangs {
  readonly left: number;
  readonly right: number;
}

/** The structure behind a run. */
export interface Structure {
  readonly zone: Zone;
  /** α_s [1/K]. */
  readonly expansion: number;
  /** Its temperature when the fasteners were tightened [°C]. */
  readonly lockIn: number;
}

export interface Limits {
  /** Design life [years of 8,766 h]. */
  readonly designLife: number;
  /** Allowed Miner sum. */
  readonly damage: number;
  /** γ on every range from the load side. */
  readonly loadFactor: number;
  /** γ on a member's ranges from the resistance side. */
  readonly memberFactor: number;
  /** γ on a fastener's ranges from the resistance side. */
  readonly fastenerFactor: number;
  /** On peak forces in the static checks. */
  readonly staticFactor: number;
}

export type Residue = 'repeat' | 'half';

export interface CountingSettings {
  readonly residue: Residue;
  /** Force ranges of a fastener under this are dropped [N]; 0 is none. */
  readonly forceGate: number;
  /** Stress ranges of a member under this are dropped [MPa]; 0 is none. */
  readonly stressGate: number;
  /** Whether one cycle a year between the hottest and the coldest extreme is added to the damage. */
  readonly extremesCycle: 'short' | 'yes' | 'no';
}

/** What remedies may propose, and how their slots and gaps are rounded up. */
export interface RemedySettings {
  /** Longest free play each way of a slot [mm]. */
  readonly longestTravel: number;
  /** Free plays each way that slots come in [mm], rising; `null` for any multiple of `slotStep`. */
  readonly slotTravels: readonly number[] | null;
  readonly slotStep: number;
  /** Shortest fastened length between joints [mm]. */
  readonly shortestPiece: number;
  readonly widestGap: number;
  readonly gapStep: number;
  readonly closestSpacing: number;
  /** Grip in a new slot as a share of the fastener's own, where its `slottedGrip` is not given. */
  readonly slottedGripShare: number;
  /** Share by which grips may lie above and below their value. */
  readonly gripSpread: number;
}

/** A pair of temperatures that the record need not hold, for static and movement checks only. */
export interface Extreme {
  readonly name: string;
  /** Temperature of each zone that it names [°C]. */
  readonly temperatures: ReadonlyMap<string, number>;
}

/** A what-if: warmer zones. Constant zones, lock-in temperatures and extremes stay as they are. */
export interface Warming {
  /** Added to every temperature [K]. */
  readonly add: number;
  /** Multiplies the swing about the mean of the 24 h around each sample. */
  readonly dailySwing: number;
}

export interface InputFile {
  /** As the user named it, relative to the job file. */
  readonly name: string;
  readonly sha256: string;
}

/** A value that was left out of the input and stands at its default. */
export interface DefaultUsed {
  /** Such as `limits.damage` or `fasteners bracket: free_play`. */
  readonly key: string;
  /** As a person would write it, with its unit. */
  readonly value: string;
}

/** A value that was worked out from others that the user gave. */
export interface DerivedValue {
  /** As in a default. */
  readonly key: string;
  /** In base units. */
  readonly value: number;
  readonly quantity: Quantity;
  /** How, such as `the area less 1 hole`. */
  readonly how: string;
}

export interface Job {
  readonly title: string;
  readonly units: 'SI' | 'US';
  readonly axis: RecordAxis;
  readonly zones: readonly Zone[];
  /** What judging the record found, in order of time. */
  readonly recordFindings: readonly RecordFinding[];
  /** How files of the record were read that are not in the plain form, a sentence a file. */
  readonly recordReadAs: readonly string[];
  /** Years that the record stands for, where the job says so. */
  readonly represents: number | null;
  /** The weather file that the record was read from; `null` for a CSV. */
  readonly weather: WeatherFile | null;
  readonly warming: Warming | null;
  readonly extremes: readonly Extreme[];
  readonly limits: Limits;
  readonly counting: CountingSettings;
  readonly remedies: RemedySettings;
  /** Whether fixed fasteners are checked for uneven friction: where the job gives the grips' spread itself. */
  readonly unevenFriction: boolean;
  readonly curves: readonly Curve[];
  readonly runs: readonly Run[];
  readonly inputs: readonly InputFile[];
  readonly defaults: readonly DefaultUsed[];
  readonly derived: readonly DerivedValue[];
  readonly warnings: readonly string[];
}

/** The part of a job that its temperatures hang on. */
export type ZonesJob = Pick<
  Job,
  | 'title'
  | 'units'
  | 'axis'
  | 'zones'
  | 'recordFindings'
  | 'recordReadAs'
  | 'represents'
  | 'weather'
  | 'inputs'
  | 'defaults'
  | 'warnings'
>;

/** The checks of a connection in the order that breaks ties for the governing one. */
export const CHECKS = [
  'member damage',
  'fastener damage',
  'shear range',
  'peak shear',
  'combined',
  'yield range',
  'slot travel',
  'buckling',
  'joint gap',
] as const;
export type CheckName = (typeof CHECKS)[number];

export type CheckStatus = 'pass' | 'fail' | 'not given' | 'exempt';
export type CheckUnit = 'N' | 'MPa' | 'mm' | '1';

/** One demand against one limit at one connection, in base units. */
export interface Check {
  readonly check: CheckName;
  readonly demand: number | null;
  readonly limit: number | null;
  readonly unit: CheckUnit;
  readonly utilisation: number | null;
  readonly status: CheckStatus;
  /** When the demand arose: a time of the record, `extreme NAME`, or blank. */
  readonly when: string;
}

/** Counted ranges of one series, unfactored. */
export interface Spectrum {
  /** Ranges of whole cycles [N or MPa], in no order. */
  readonly ranges: Float64Array;
  /** Ranges of half cycles, in no order; empty under residue `repeat`. */
  readonly halfRanges: Float64Array;
  /** Ranges that the record does not hold and that are added to it, each so many times. */
  readonly added?: { readonly ranges: Float64Array; readonly count: number };
}

/** Damage and cycles of one series against one curve. */
export interface Damage {
  /** Miner sum of the counted pass, factors applied; `null` without a curve. */
  readonly sum: number | null;
  /** Cycles counted, a half cycle as 0.5, after the gate. */
  readonly cycles: number;
  /** Cycles that do damage, n_d. */
  readonly damagingCycles: number;
  /** Unfactored range S with N(γS) = n_d/D [N of one fastener, or MPa of the member]; `null` where D is 0 or there is no curve. */
  readonly equivalentRange: number | null;
  /** Slope m of the curve at the factored equivalent range; `null` with it. */
  readonly slope: number | null;
  /** Cycles that the gate dropped, and the Miner sum that they would have added. */
  readonly gatedCycles: number;
  readonly gatedDamage: number;
}

/** One row of a cycles table. */
export interface RangeBin {
  readonly from: number;
  readonly to: number;
  readonly count: number;
  /** Cycles to failure at the factored mid-range; `null` without a curve, `Infinity` where it does none. */
  readonly cyclesToFailure: number | null;
  /** Damage of the bin in the counted pass, summed cycle by cycle; `null` without a curve. */
  readonly damage: number | null;
}

export interface Connection {
  readonly run: string;
  /** 1 … n from the left. */
  readonly number: number;
  readonly position: number;
  readonly fastener: Fastener;
  readonly role: Role;
  /** Largest |f| of one fastener from lock-in on and at the extremes, unfactored [N]. */
  readonly shearPeak: number;
  /** max − min of one fastener's f in the counted pass [N]. */
  readonly shearRange: number;
  readonly fastenerDamage: Damage;
  /** max − min of σ on the worse side in the counted pass [MPa]. */
  readonly stressRange: number;
  readonly memberDamage: Damage;
  readonly cyclesPerYear: number;
  readonly fastenerDamagePerYear: number | null;
  readonly memberDamagePerYear: number | null;
  /** Years; `Infinity` is unlimited, `null` where no curve was given. */
  readonly life: number | null;
  /** Largest |s| from lock-in on and at the extremes [mm]. */
  readonly slipPeak: number;
  /** Σ|Δs| a year [mm]. */
  readonly slidingPerYear: number;
  readonly bucklingUtilisation: number | null;
  readonly checks: readonly Check[];
  readonly governing: Check | null;
  readonly verdict: Verdict;
  /** What the run's remedy changes here; `null` for nothing. */
  readonly change: ConnectionChange | null;
}

/** Shares of a connection's damage that rest on gaps of the record, 0 … 1; `null` without a curve. */
export interface FilledShare {
  readonly fastener: number | null;
  readonly member: number | null;
}

/** What to do at a connection; `fails` where no remedy was looked for. */
export type Verdict = 'ok' | 'slot' | 'joint' | 'rework' | 'fails';

/** Forces of one run at every sample of the counted pass, for one connection: what a chart draws. */
export interface Trace {
  /** Shear of one fastener at each sample [N]. */
  readonly shear: Float64Array;
  /** Force of the worse span beside it at each sample, tension positive [N]. */
  readonly spanForce: Float64Array;
  /** The fastener's slip at each sample [mm]. */
  readonly slip: Float64Array;
}

/** How far one end of a run's member moves against the structure, both at least 0 [mm]. */
export interface EndMovement {
  /** Toward the neighbour: it closes the gap. */
  readonly outward: Demand;
  /** Away from it: it opens the gap. */
  readonly inward: Demand;
}

/** A demand and when it arose. */
export interface Demand {
  readonly value: number;
  readonly when: string;
}

export interface RunResult {
  readonly run: Run;
  /** Passes through the record until no slip changed. */
  readonly passes: number;
  /** True where it had not settled after the last allowed pass. */
  readonly walks: boolean;
  /** Drift of the fastest walking slip a year [mm]; 0 where settled. */
  readonly driftPerYear: number;
  /** Years that one pass of the record stands for, for this run. */
  readonly years: number;
  readonly coveredHours: number;
  readonly connections: readonly Connection[];
  /** Largest movements from lock-in on and at the extremes. */
  readonly ends: { readonly left: EndMovement; readonly right: EndMovement };
  /** Index into `connections` of the one whose governing check is largest. */
  readonly governing: number;
  /** Largest magnitude of a span force in the counted pass, over all spans [N]; zero without a span. */
  readonly largestSpanForce: number;
  /** Of the governing connection. */
  readonly fastenerBins: readonly RangeBin[];
  readonly memberBins: readonly RangeBin[];
  /** Reckoned when first asked for: the record is passed through once more. */
  readonly trace: () => Trace;
  /** The extremes between which a cycle a year was added to the damage; `null` where none was. */
  readonly extremesCycle: { readonly hot: string; readonly cold: string } | null;
  /**
   * Damage of each year of the record as if it stood alone, reckoned when first asked for: the record is passed through
   * once more. Empty for a record of one year or less.
   */
  readonly yearByYear: () => readonly YearDamage[];
  /** For each connection, reckoned when first asked for: the record is passed through once more where it has gaps. */
  readonly filledShares: () => readonly FilledShare[];
  /** `null` where the run passes, or where no remedy was looked for. */
  readonly remedy: Remedy | Rework | null;
}

/** One year of a longer record, from an anniversary of its first sample to the next, as if it stood alone. */
export interface YearDamage {
  /** Times of its first and last sample [ms since 1970 on the record's own clock]. */
  readonly from: number;
  readonly to: number;
  readonly coveredHours: number;
  /** Years that it stands for: 1, or the covered share of a year that is not whole. */
  readonly years: number;
  /** Miner sums a year at each connection; `null` without a curve. */
  readonly connections: readonly Pick<
    Connection,
    'memberDamagePerYear' | 'fastenerDamagePerYear' | 'life'
  >[];
}

/** What a run comes to in warmer zones. */
export type WarmedRun = Pick<
  RunResult,
  'run' | 'connections' | 'governing' | 'passes' | 'walks' | 'years'
>;

/** What a remedy changes at one connection as drawn. */
export interface ConnectionChange {
  /** Free play each way of the slot that it gets [mm]; `null` where it is fixed. */
  readonly slot: number | null;
  /** Whether a slotted fastener becomes a fixed one. */
  readonly fixed: boolean;
  /** Width of the joint to its right [mm]; `null` without a new or wider one. */
  readonly joint: number | null;
  /** The run's fasteners set anew; `null` where they stay in place. */
  readonly spacing: { readonly count: number; readonly widest: number } | null;
}

/** A changed run that was screened again and passes every check that was given. */
export interface Remedy {
  readonly kind: 'slots' | 'joints' | 'spacing';
  /** The pieces from the left; one where the run is not cut. */
  readonly pieces: readonly RemediedPiece[];
  readonly joints: number;
  /** Slotted fasteners in all pieces. */
  readonly slots: number;
  /** Fasteners more than before. */
  readonly added: number;
  /** Width of the new joints at lock-in [mm]; `null` without one. */
  readonly gap: number | null;
  /** Width that the gap at the run's right end is given [mm]; left out where it stays as drawn. */
  readonly endGap?: number;
  /** Largest utilisation of any check, before and after. */
  readonly utilisationBefore: number;
  readonly utilisation: number;
}

/** One piece of a remedied run, as it would be drawn. */
export interface RemediedPiece {
  readonly run: Run;
  readonly connections: readonly Connection[];
  readonly governing: number;
}

/** No remedy passes: what stays above its limit, and which single change of the run as drawn would pass. */
export interface Rework {
  readonly kind: 'rework';
  readonly check: Check;
  /** The connection where it does, such as `R11/1`. */
  readonly at: string;
  readonly changes: readonly SingleChange[];
}

/** One quantity of the run and the value from which, or up to which, it would pass alone. */
export interface SingleChange {
  readonly quantity: 'grip' | 'free play' | 'shear range limit' | 'member area' | 'stiffness';
  readonly bound: 'at least' | 'at most';
  /** [N, mm, mm² or N/mm]. */
  readonly value: number;
}

export interface Result {
  readonly job: Job;
  readonly runs: readonly RunResult[];
  /** The same runs in warmer zones; `null` where the job asks for none. */
  readonly warmed: readonly WarmedRun[] | null;
  /** Index into `runs` of the one whose governing utilisation is largest. */
  readonly governing: number;
}

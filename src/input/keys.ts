import type { Quantity } from '../units.ts';
import {
  BAND_KEYS,
  JUDGING_KEYS,
  JUMPS_KEYS,
  RECORD_FORM_KEYS,
  SPIKES_KEYS,
  STUCK_KEYS,
  TIME_KEYS,
} from './record-keys.ts';
import { OVERHANG_KEYS, SITE_KEYS, SUN_KEYS, SUNLIT_ZONE_KEYS, WARMING_KEYS } from './sun-keys.ts';

/** How a value is written and read. A quantity is a number with its unit. */
export type Kind =
  | Quantity
  | 'force or stress'
  | 'number'
  | 'whole number'
  | 'lengths'
  | 'texts'
  | 'text'
  | 'id'
  | 'name'
  | 'yes or no'
  | 'choice'
  | 'stiffness or rigid'
  | 'length at force'
  | 'temperature or time'
  | 'fixed'
  | 'points'
  | 'constant'
  | 'unit'
  | 'map'
  | 'list'
  | 'table';

/** One key of the job or column of a table: the source of the reading, its checks and the reference. */
export interface Key {
  readonly kind: Kind;
  /** Must be given; where this depends on other keys, `needs` says on which. */
  readonly required?: true;
  readonly needs?: string;
  /** As a person would write it; read like any other value. */
  readonly default?: string;
  /** Words that a `choice` takes. */
  readonly choices?: readonly string[];
  /** The value is over this, in base units. */
  readonly over?: number;
  /** The value is this or more, in base units. */
  readonly from?: number;
  /** The value is this or less, in base units; far beyond anything built, to catch a slip of the unit. */
  readonly to?: number;
  /** The value is under this. */
  readonly under?: number;
  /** Values outside these, in base units, are read and doubted aloud (common practice, no source). */
  readonly usual?: readonly [from: number, to: number];
  /** What is likely wrong with a value beyond its bounds, a whole sentence. */
  readonly slip?: string;
  readonly example: string;
  readonly meaning: string;
}

export type KeyTable = Readonly<Record<string, Key>>;

/** Temperatures beyond these [°C] are no building's, and mostly a logger's mark for a fault. */
export const COLDEST = -150;
export const HOTTEST = 500;

/** Nothing that this trade builds is beyond these [mm, mm², N, 1/K]: a slip of the unit is. */
const LENGTH = { kind: 'length', to: 1e8 } as const;
const AREA = {
  kind: 'area',
  over: 0,
  to: 1e8,
  usual: [0.5, 3e5],
  slip: 'Is it in mm^2?',
} as const;
const MODULUS = {
  kind: 'stress',
  from: 1e3,
  to: 1e6,
  usual: [1e4, 4.2e5],
  slip: 'Metals have 15 to 400 GPa: aluminium 70 GPa, 70000 MPa or 10000 ksi.',
} as const;
const INERTIA = { kind: 'second moment of area', over: 0, to: 1e12 } as const;
const FORCE = { kind: 'force', to: 1e12 } as const;
const TEMPERATURE = { kind: 'temperature', from: COLDEST, to: HOTTEST } as const;
const EXPANSION = {
  kind: 'expansion',
  from: 1e-7,
  to: 1e-3,
  usual: [3e-6, 4e-5],
  slip: 'Metals have 5e-6 to 35e-6 / K: for steel write 12e-6 / K, or 12 under a header [1e-6/K].',
} as const;
const FACTOR = { kind: 'number', over: 0, to: 100 } as const;

export const JOB_KEYS = {
  title: {
    kind: 'text',
    default: 'untitled',
    example: 'Skerry Landing',
    meaning: 'What the job is about.',
  },
  units: {
    kind: 'choice',
    choices: ['SI', 'US'],
    default: 'SI',
    example: 'US',
    meaning: 'How results are written: kN, mm, MPa and °C, or kip, in, ksi and °F.',
  },
  record: {
    kind: 'map',
    required: true,
    example: '{ file: record.csv }',
    meaning: 'The temperature history.',
  },
  zones: {
    kind: 'map',
    required: true,
    example: '{ deck: { column: deck } }',
    meaning: 'The zones, each under its name.',
  },
  warming: {
    kind: 'map',
    example: '{ add: 2 K }',
    meaning: 'A what-if: all runs are assessed for warmer zones too, and the results say both.',
  },
  extremes: {
    kind: 'list',
    example: '[{ name: hot, deck: 25 degC }]',
    meaning: 'Temperatures that the record need not hold, for static and movement checks only.',
  },
  limits: {
    kind: 'map',
    example: '{ design_life: 50 years }',
    meaning: 'Design life, allowed damage and factors.',
  },
  counting: { kind: 'map', example: '{ residue: half }', meaning: 'How cycles are counted.' },
  remedies: {
    kind: 'map',
    example: '{ longest_travel: 15 mm }',
    meaning: 'What may be proposed where a run fails.',
  },
  members: { kind: 'table', required: true, example: 'members.csv', meaning: 'The members.' },
  fasteners: {
    kind: 'table',
    required: true,
    example: 'fasteners.csv',
    meaning: 'The types of fastener.',
  },
  curves: {
    kind: 'table',
    example: 'curves.csv',
    meaning: 'The S-N curves; the list may hold curves and the names of CSV files.',
  },
  runs: { kind: 'table', required: true, example: 'runs.csv', meaning: 'The runs.' },
} as const satisfies KeyTable;

export const RECORD_KEYS = {
  file: {
    kind: 'text',
    needs: 'this or `files`',
    example: 'record.csv',
    meaning:
      'CSV with a column `time` (2031-01-01T00:00) and one column a channel with its unit in the header, such as `deck [degC]`; or an hourly weather file in the EPW layout, with the channels `air`, `global`, `direct`, `diffuse` and `wind`.',
  },
  files: {
    kind: 'texts',
    needs: 'this or `file`',
    example: '[spring.csv, summer.csv]',
    meaning: 'CSVs of one logger, one after another.',
  },
  layout: {
    kind: 'choice',
    choices: ['CSV', 'EPW'],
    needs: 'EPW where the name of the file ends in .epw, else CSV',
    example: 'EPW',
    meaning: 'How the file is laid out.',
  },
  site: {
    kind: 'map',
    needs: 'for the sun of a CSV; a weather file names its own',
    example: '{ latitude: 45.2 deg, longitude: -7.5 deg, utc_offset: 0 h }',
    meaning: 'Where and on which clock the record was taken.',
  },
  stamp: {
    kind: 'choice',
    choices: ['end', 'start', 'instant'],
    needs: 'for the sun of a CSV; hours of a weather file end at their times',
    example: 'end',
    meaning:
      'What a row of irradiance and wind is: the mean of the step that ends at its time, of the step that starts there, or a moment.',
  },
  gaps: {
    kind: 'map',
    example: '{ fill_up_to: 3 h }',
    meaning: 'What is done where values are missing.',
  },
  represents: {
    kind: 'years',
    over: 0,
    to: 1e4,
    needs: 'worked out from the covered hours where not given',
    example: '1 year',
    meaning: 'How long a time one pass of the record stands for.',
  },
  columns: {
    kind: 'map',
    example: '{ date: time, temp: { channel: air, unit: degC } }',
    meaning:
      'For a CSV with headers of its own: which column is the time and which are channels. Of a time in two columns one is `date` and one `time`. Columns left out are not read.',
  },
  ...RECORD_FORM_KEYS,
  ...JUDGING_KEYS,
} as const satisfies KeyTable;

export const GAPS_KEYS = {
  fill_up_to: {
    kind: 'hours',
    from: 0,
    to: 1e6,
    default: '3 h',
    example: '3 h',
    meaning:
      'A gap up to this long is bridged by a straight line and counts as covered; a longer one is bridged and does not.',
  },
} as const satisfies KeyTable;

export const COLUMN_KEYS = {
  channel: { kind: 'name', required: true, example: 'air', meaning: 'Name of the channel.' },
  unit: {
    kind: 'unit',
    needs: 'required unless the header has a unit in brackets',
    example: 'degC',
    meaning: 'Unit of the numbers in the column.',
  },
} as const satisfies KeyTable;

export const ZONE_KEYS = {
  column: {
    kind: 'name',
    needs: 'this, `constant` or `air`',
    example: 'rail_south',
    meaning: 'Channel of temperature in the record.',
  },
  constant: {
    ...TEMPERATURE,
    needs: 'this, `column` or `air`',
    example: '21 degC',
    meaning: 'One temperature for all time.',
  },
  ...SUNLIT_ZONE_KEYS,
} as const satisfies KeyTable;

export const EXTREME_KEYS = {
  name: {
    kind: 'name',
    required: true,
    example: 'hot',
    meaning:
      'What the extreme is called in the results. The other keys are names of zones, each with its temperature.',
  },
} as const satisfies KeyTable;

export const LIMITS_KEYS = {
  design_life: {
    kind: 'years',
    over: 0,
    to: 1e4,
    usual: [1, 200],
    default: '50 years',
    example: '50 years',
    meaning: 'Time that damage and drift are reckoned for.',
  },
  damage: {
    ...FACTOR,
    default: '1.0',
    example: '1.0',
    meaning: 'Allowed Miner sum over the design life.',
  },
  load_factor: {
    ...FACTOR,
    usual: [0.5, 3],
    default: '1.0',
    example: '1.0',
    meaning: 'Factor on every range, from the side of the load.',
  },
  member_factor: {
    ...FACTOR,
    default: '1.35',
    example: '1.35',
    meaning: 'Factor on the ranges of members, from the side of the resistance.',
  },
  fastener_factor: {
    ...FACTOR,
    default: '1.35',
    example: '1.35',
    meaning: 'Factor on the ranges of fasteners, from the side of the resistance.',
  },
  static_factor: {
    ...FACTOR,
    usual: [0.9, 4],
    default: '1.5',
    example: '1.5',
    meaning: 'Factor on peak forces in the static checks.',
  },
} as const satisfies KeyTable;

export const COUNTING_KEYS = {
  residue: {
    kind: 'choice',
    choices: ['repeat', 'half'],
    default: 'repeat',
    example: 'half',
    meaning:
      'What is left when the cycles are closed: `repeat` takes the record as repeating, whole cycles only; `half` counts half cycles.',
  },
  force_gate: {
    ...FORCE,
    from: 0,
    default: '0 N',
    example: '100 N',
    meaning:
      'Shear ranges of a fastener under this, its factors applied, are dropped, and said to be.',
  },
  stress_gate: {
    kind: 'stress',
    from: 0,
    to: 1e6,
    default: '0 MPa',
    example: '2 MPa',
    meaning:
      'Stress ranges of a member under this, its factors applied, are dropped, and said to be.',
  },
  extremes_cycle: {
    kind: 'choice',
    choices: ['short', 'yes', 'no'],
    default: 'short',
    example: 'yes',
    meaning:
      'Whether one cycle a year between the hottest and the coldest of `extremes` is added to the damage; `short` adds it where damage is scaled from less than a year, which does not hold its own.',
  },
} as const satisfies KeyTable;

export const MEMBER_KEYS = {
  id: { kind: 'id', required: true, example: 'rail', meaning: 'Name of the member.' },
  modulus: {
    ...MODULUS,
    required: true,
    example: '70 GPa',
    meaning: "Young's modulus E.",
  },
  expansion: {
    ...EXPANSION,
    required: true,
    example: '23e-6 / K',
    meaning: 'Coefficient of thermal expansion α.',
  },
  area: { ...AREA, required: true, example: '450 mm^2', meaning: 'Gross area A.' },
  net_area: {
    ...AREA,
    needs: 'by `hole`, or the gross area, where not given',
    example: '400 mm^2',
    meaning: 'Area left at a fastener.',
  },
  hole: {
    ...LENGTH,
    over: 0,
    usual: [2, 60],
    needs: 'with `thickness`, in place of `net_area`',
    example: '14 mm',
    meaning: 'Width of a hole: the net area is the area less holes × hole × thickness.',
  },
  holes: {
    kind: 'whole number',
    from: 1,
    to: 100,
    needs: '1 where not given; with `hole` only',
    example: '2',
    meaning: 'Holes side by side in one section.',
  },
  inertia: {
    ...INERTIA,
    needs: 'required with `buckling`',
    example: '16000 mm^4',
    meaning: 'Second moment of area about the weak axis.',
  },
  yield: {
    kind: 'stress',
    from: 1,
    to: 5e3,
    usual: [20, 2e3],
    slip: 'Metals yield at 30 to 1500 MPa, 5 to 200 ksi.',
    needs: 'required with `buckling`',
    example: '160 MPa',
    meaning: 'Yield strength f_y.',
  },
  buckling: {
    kind: 'choice',
    choices: ['EN', 'AISC'],
    example: 'EN',
    meaning: 'Flexural buckling by EN 1993-1-1, 6.3.1 or by AISC 360, E3.',
  },
  buckling_imperfection: {
    kind: 'number',
    over: 0,
    to: 2,
    needs: 'required with `buckling` EN',
    example: '0.34',
    meaning: 'Imperfection factor of the buckling curve.',
  },
  buckling_plateau: {
    kind: 'number',
    from: 0,
    to: 2,
    needs: 'required with `buckling` EN',
    example: '0.2',
    meaning: 'Slenderness up to which nothing is lost.',
  },
  buckling_factor: {
    ...FACTOR,
    default: '1',
    example: '0.9',
    meaning: 'Multiplies the flexural resistance: φ, or 1/γ_M1.',
  },
  stress_factor: {
    ...FACTOR,
    default: '1',
    example: '1.5',
    meaning: 'Multiplies N/A: stress concentration or secondary stress.',
  },
  thickness: {
    ...LENGTH,
    over: 0,
    usual: [0.3, 200],
    example: '25 mm',
    meaning: "Thickness, for the curve's thickness factor and the area of a hole.",
  },
  curve: {
    kind: 'name',
    example: 'steel 80',
    meaning: 'Stress curve of the detail at the fasteners.',
  },
} as const satisfies KeyTable;

export const FASTENER_KEYS = {
  id: {
    kind: 'id',
    required: true,
    example: 'bracket M12',
    meaning: 'Name of the type of fastener.',
  },
  per_connection: {
    kind: 'whole number',
    from: 1,
    to: 1000,
    default: '1',
    example: '2',
    meaning: 'Fasteners side by side in one connection; what follows is for each of them.',
  },
  stiffness: {
    kind: 'stiffness or rigid',
    over: 0,
    to: 1e15,
    usual: [10, 1e7],
    needs: 'this or `shear_displacement`',
    example: '2 kN/mm',
    meaning: 'Shear stiffness, or `rigid`.',
  },
  shear_displacement: {
    kind: 'length at force',
    needs: 'this or `stiffness`',
    example: '2.0 mm at 10 kN',
    meaning: 'Stiffness as a displacement at a shear force.',
  },
  bracket_stiffness: {
    kind: 'stiffness',
    over: 0,
    to: 1e15,
    usual: [10, 1e7],
    needs: 'this, the next three, or none',
    example: '5 kN/mm',
    meaning:
      'Stiffness of the bracket that the fasteners of a connection hold; it acts in series with them.',
  },
  bracket_length: {
    ...LENGTH,
    over: 0,
    usual: [5, 2000],
    needs: 'with `bracket_modulus` and `bracket_inertia`',
    example: '80 mm',
    meaning: 'Length l of the bracket as a cantilever of stiffness 3EI/l³.',
  },
  bracket_modulus: {
    ...MODULUS,
    needs: 'see `bracket_length`',
    example: '210 GPa',
    meaning: "The bracket's modulus E.",
  },
  bracket_inertia: {
    ...INERTIA,
    needs: 'see `bracket_length`',
    example: '4000 mm^4',
    meaning: "The bracket's second moment of area I, bent along the member.",
  },
  free_play: {
    ...LENGTH,
    from: 0,
    usual: [0, 200],
    default: '0 mm',
    example: '9 mm',
    meaning:
      'How far the joint slips each way from its centre before the fastener bears; 0 is a tight hole.',
  },
  grip: {
    ...FORCE,
    from: 0,
    usual: [0, 1e6],
    needs: 'by `tightening_torque`, or 0 N, where not given',
    example: '250 N',
    meaning: 'Friction force that the joint carries before it slips.',
  },
  tightening_torque: {
    kind: 'torque',
    over: 0,
    to: 1e9,
    usual: [100, 3e6],
    needs: 'with `diameter`, `friction` and `grip_share`, in place of `grip`',
    example: '40 N m',
    meaning:
      'Torque T that the bolt was tightened with: the grip is estimated as T/(torque_factor·diameter)·friction·grip_share.',
  },
  torque_factor: {
    kind: 'number',
    over: 0,
    to: 1,
    usual: [0.08, 0.4],
    needs: '0.2 where not given; with `tightening_torque` only',
    example: '0.18',
    meaning: 'Torque over preload and diameter.',
  },
  friction: {
    kind: 'number',
    over: 0,
    to: 1,
    usual: [0.05, 0.6],
    needs: 'with `tightening_torque` only',
    example: '0.2',
    meaning: 'Friction coefficient of the faces that slip.',
  },
  grip_share: {
    kind: 'number',
    over: 0,
    to: 1,
    needs: 'with `tightening_torque` only',
    example: '0.5',
    meaning: 'Share of the preload that is left after years.',
  },
  slotted_grip: {
    ...FORCE,
    from: 0,
    needs: 'a share of `grip` where not given: `remedies.slotted_grip_share`',
    example: '250 N',
    meaning: 'Grip that the same fastener would have in a slot, where a remedy puts it into one.',
  },
  may_slot: {
    kind: 'yes or no',
    default: 'true',
    example: 'false',
    meaning: 'Whether a remedy may put it into a slot.',
  },
  diameter: {
    ...LENGTH,
    over: 0,
    example: '12 mm',
    usual: [2, 60],
    meaning: "Diameter of the bolt, for a slot's length in full and a grip by its tightening.",
  },
  shear_area: {
    ...AREA,
    needs: 'required where a limit or the curve is a stress',
    example: '84.3 mm^2',
    meaning: 'Area that a shear stress is reckoned on.',
  },
  shear_resistance: {
    ...FORCE,
    over: 0,
    usual: [50, 1e7],
    slip: 'Is it in kN?',
    example: '20 kN',
    meaning: 'Design shear resistance V_Rd.',
  },
  tension_resistance: {
    ...FORCE,
    over: 0,
    usual: [50, 1e7],
    slip: 'Is it in kN?',
    example: '25 kN',
    meaning: 'Design tension resistance T_Rd.',
  },
  interaction: {
    kind: 'number',
    over: 0,
    to: 10,
    example: '1.5',
    meaning: 'Exponent p of the combined check (T/T_Rd)^p + (V/V_Rd)^p.',
  },
  shear_range_limit: {
    kind: 'force or stress',
    over: 0,
    to: 1e12,
    example: '60 MPa',
    meaning: 'Allowed shear range: a force, or a stress on the shear area.',
  },
  shear_range_rule: {
    kind: 'choice',
    choices: ['required', 'exempts'],
    default: 'required',
    example: 'exempts',
    meaning:
      'Whether the shear range must stay under its limit, or is exempt from the damage check where it does.',
  },
  curve: {
    kind: 'name',
    example: 'anchor',
    meaning: 'Curve of shear force, or of stress on the shear area.',
  },
} as const satisfies KeyTable;

export const CURVE_KEYS = {
  id: { kind: 'id', required: true, example: 'steel 80', meaning: 'Name of the curve.' },
  of: {
    kind: 'choice',
    choices: ['stress', 'force'],
    needs: 'taken from the unit of the ranges where not given',
    example: 'stress',
    meaning: 'What the ranges are.',
  },
  points: {
    kind: 'points',
    needs: 'exactly one of `points`, `shape`, `constant` and `formula`',
    example: '[[1e4, 526 MPa], [5e6, 66 MPa]]',
    meaning: 'Points of cycles and range, straight between them in log N over log S.',
  },
  shape: {
    kind: 'text',
    needs: 'see `points`',
    example: 'EN 1993-1-9 direct 80',
    meaning: "An open standard's curve and its class.",
  },
  constant: {
    kind: 'constant',
    needs: 'see `points`',
    example: '1.02e12 MPa^3',
    meaning: 'C of N = C/S^m, with the unit of S to the power m.',
  },
  slope: {
    kind: 'number',
    over: 0,
    to: 100,
    needs: 'required with `constant`',
    example: '3',
    meaning: 'm of N = C/S^m.',
  },
  threshold: {
    kind: 'force or stress',
    over: 0,
    to: 1e12,
    needs: 'with `constant` only',
    example: '69 MPa',
    meaning: 'Range under which `below` applies.',
  },
  formula: {
    kind: 'text',
    needs: 'see `points`',
    example: '1.02e12 / S^3',
    meaning: 'Cycles to failure as an expression in S.',
  },
  formula_unit: {
    kind: 'unit',
    needs: 'required with `formula`',
    example: 'MPa',
    meaning: 'Unit of S in the formula.',
  },
  formula_from: {
    kind: 'force or stress',
    over: 0,
    to: 1e12,
    needs: 'required with `formula`',
    example: '30 MPa',
    meaning: 'Smallest range that the formula holds for.',
  },
  formula_to: {
    kind: 'force or stress',
    over: 0,
    to: 1e12,
    needs: 'required with `formula`',
    example: '400 MPa',
    meaning: 'Largest range that the formula holds for.',
  },
  below: {
    kind: 'choice',
    choices: ['cutoff', 'continue', 'threshold'],
    needs: 'by the way that the curve is given where not given',
    example: 'continue',
    meaning:
      'Below the last point: no damage, the last slope goes on, or no damage only if every range of the series stays there.',
  },
  on: {
    kind: 'choice',
    choices: ['net', 'gross'],
    needs: 'net where not given; curves of stress only',
    example: 'gross',
    meaning: "The member's area that the stress is reckoned on.",
  },
  compression_share: {
    kind: 'number',
    from: 0,
    to: 1,
    needs: '1 where not given; curves of stress only',
    example: '60 %',
    meaning:
      "Share of a cycle's compressive part that counts; less than 1 never for as-welded details.",
  },
  log_n_sd: {
    kind: 'number',
    over: 0,
    to: 5,
    needs: 'together with `survival`',
    example: '0.2',
    meaning: 'Standard deviation of log₁₀ N about the curve.',
  },
  survival: {
    kind: 'number',
    over: 0,
    under: 1,
    needs: 'together with `log_n_sd`',
    example: '97.7 %',
    meaning: 'Probability of survival that the curve is lowered to.',
  },
  characteristic: {
    kind: 'yes or no',
    needs: "true for a standard's shape, else false",
    example: 'true',
    meaning: 'Whether the curve as entered is a characteristic one already.',
  },
  thickness_reference: {
    ...LENGTH,
    over: 0,
    needs: 'together with `thickness_exponent`',
    example: '25 mm',
    meaning: 'Thickness up to which ranges stand as they are.',
  },
  thickness_exponent: {
    kind: 'number',
    over: 0,
    to: 2,
    needs: 'together with `thickness_reference`',
    example: '0.2',
    meaning:
      'Ranges are multiplied by (thickness/reference) to this power where the member is thicker.',
  },
} as const satisfies KeyTable;

export const CURVE_POINT_KEYS = {
  id: {
    kind: 'id',
    required: true,
    example: 'anchor',
    meaning: 'Name of the curve; rows of one name are its points in turn.',
  },
  cycles: {
    kind: 'number',
    required: true,
    over: 0,
    to: 1e30,
    example: '1e5',
    meaning: 'Cycles to failure; they rise from row to row.',
  },
  range: {
    kind: 'force or stress',
    required: true,
    over: 0,
    to: 1e12,
    example: '10.1 kN',
    meaning: 'Range; they fall from row to row.',
  },
} as const satisfies KeyTable;

export const REMEDY_KEYS = {
  longest_travel: {
    ...LENGTH,
    over: 0,
    default: '20 mm',
    example: '15 mm',
    meaning: 'Longest free play each way that a slot may be given.',
  },
  slot_step: {
    ...LENGTH,
    over: 0,
    default: '1 mm',
    example: '0.5 mm',
    meaning: "A slot's free play each way is rounded up to a multiple of this.",
  },
  slot_travels: {
    kind: 'lengths',
    from: 0,
    to: 1e4,
    needs: '`slot_step` where not given',
    example: '[3 mm, 9 mm, 15 mm]',
    meaning: 'The only free plays each way that slots come in, rising.',
  },
  shortest_piece: {
    ...LENGTH,
    from: 0,
    default: '3 m',
    example: '6 m',
    meaning: 'Shortest fastened length between two joints.',
  },
  widest_gap: {
    ...LENGTH,
    over: 0,
    default: '30 mm',
    example: '25 mm',
    meaning: 'Widest gap that a new joint may have.',
  },
  gap_step: {
    ...LENGTH,
    over: 0,
    default: '1 mm',
    example: '5 mm',
    meaning: "A new joint's gap is rounded up to a multiple of this.",
  },
  closest_spacing: {
    ...LENGTH,
    over: 0,
    default: '150 mm',
    example: '100 mm',
    meaning: 'Closest spacing that may be proposed where buckling governs.',
  },
  slotted_grip_share: {
    kind: 'number',
    from: 0,
    to: 1,
    default: '1',
    example: '0.5',
    meaning:
      "Grip of a fastener in a new slot as a share of its grip in its own hole, where its `slotted_grip` isn't given.",
  },
  grip_spread: {
    kind: 'number',
    from: 0,
    under: 1,
    default: '0.5',
    example: '0.3',
    meaning:
      'How far grips may lie above and below their value: the fixed fasteners of a slotted run carry what the two sides then differ by. Remedies always do; a run as drawn is checked for it where this key is given.',
  },
} as const satisfies KeyTable;

export const RUN_KEYS = {
  id: { kind: 'id', required: true, example: 'R1', meaning: 'Name of the run.' },
  member: { kind: 'name', required: true, example: 'rail', meaning: 'Its member.' },
  zone: { kind: 'name', required: true, example: 'south', meaning: "The member's zone." },
  fastener: {
    kind: 'name',
    required: true,
    example: 'bracket M12',
    meaning: 'The fasteners, or the fixed ones where some are slotted.',
  },
  count: {
    kind: 'whole number',
    from: 1,
    to: 500,
    needs: '`count` and `spacing`, or `positions`',
    example: '11',
    meaning: 'How many fasteners; the first stands at 0.',
  },
  spacing: {
    ...LENGTH,
    over: 0,
    to: 2e5,
    usual: [15, 15e3],
    slip: 'Is it in mm?',
    needs: 'see `count`',
    example: '600 mm',
    meaning: 'From fastener to fastener.',
  },
  positions: {
    kind: 'lengths',
    from: 0,
    to: 1e8,
    needs: 'see `count`',
    example: '[0 mm, 500 mm, 1100 mm]',
    meaning:
      "From the member's left end to each fastener, rising; in a CSV cell separated by spaces.",
  },
  fixed: {
    kind: 'fixed',
    default: 'all',
    example: 'middle',
    meaning:
      'Which fasteners are not slotted: `all`, `middle` (nearest mid-run, the left one of two), `first`, `none`, or a list of their numbers from the left.',
  },
  slotted: {
    kind: 'name',
    needs: 'required unless all are fixed',
    example: 'bracket M12 slotted',
    meaning: 'The fastener that stands where not fixed.',
  },
  overhang: {
    ...LENGTH,
    from: 0,
    default: '0 mm',
    example: '150 mm',
    meaning:
      'Free member beyond the end fasteners; where positions start after 0, they give the left one.',
  },
  length: {
    ...LENGTH,
    over: 0,
    usual: [100, 2e5],
    example: '7 m',
    meaning:
      'Length of the member. Nothing is reckoned from it: fasteners that do not fit on it are refused.',
  },
  left_overhang: {
    ...LENGTH,
    from: 0,
    needs: '`overhang`, or the first of `positions`, where not given',
    example: '0 mm',
    meaning: 'Free member beyond the first fastener, where it is another than beyond the last.',
  },
  lock_in: {
    kind: 'temperature or time',
    from: COLDEST,
    to: HOTTEST,
    usual: [-40, 75],
    default: '5 degC to 25 degC',
    example: '15 degC',
    meaning:
      "The member's temperature when the fasteners were tightened; or the time, as in `at 2031-04-12T10:00`; or what it may have been, `5 degC to 25 degC`, of which the middle is taken.",
  },
  structure_zone: {
    kind: 'name',
    example: 'deck',
    meaning: 'Zone of the structure behind, where it moves too.',
  },
  structure_expansion: {
    ...EXPANSION,
    from: 0,
    usual: [0, 4e-5],
    needs: 'required with `structure_zone`',
    example: '10e-6 / K',
    meaning: 'Coefficient of thermal expansion α_s of the structure.',
  },
  structure_lock_in: {
    kind: 'temperature',
    from: COLDEST,
    to: HOTTEST,
    needs:
      'its own temperature at the time of `lock_in`, or its constant, where not given; else required',
    example: '18 degC',
    meaning: "The structure's temperature when the fasteners were tightened.",
  },
  line: {
    kind: 'name',
    example: 'south rail',
    meaning: 'Line of runs that this one is part of; runs of a line are neighbours in file order.',
  },
  gap: {
    ...LENGTH,
    from: 0,
    example: '20 mm',
    meaning: "Joint gap at the run's right end, measured at lock-in.",
  },
  joint: {
    kind: 'choice',
    choices: ['open', 'lapped', 'sealed'],
    default: 'open',
    example: 'sealed',
    meaning:
      'How the gap is covered. `open`: it must not close. `lapped`: nor open further than `lap`. `sealed`: nor move the sealant further than `sealant_movement`.',
  },
  lap: {
    ...LENGTH,
    over: 0,
    needs: 'required with a lapped joint',
    example: '40 mm',
    meaning: 'How far the joint may open before the cover lets go.',
  },
  sealant_movement: {
    kind: 'number',
    over: 0,
    to: 1,
    needs: 'required with a sealed joint',
    example: '0.25',
    meaning: 'Movement that the sealant takes both ways, as a share of its installed width.',
  },
  structure_movement: {
    ...LENGTH,
    from: 0,
    default: '0 mm',
    example: '5 mm',
    meaning: 'Movement each way of a structural joint behind the gap.',
  },
  setting_tolerance: {
    ...LENGTH,
    from: 0,
    default: '0 mm',
    example: '2 mm',
    meaning: 'How far off its centre a bolt may have been set in its slot.',
  },
  added_tension: {
    ...FORCE,
    from: 0,
    default: '0 N',
    example: '1.2 kN',
    meaning: 'Design tension of each fastener from other loads, factored.',
  },
  added_shear: {
    ...FORCE,
    from: 0,
    default: '0 N',
    example: '0.5 kN',
    meaning: 'Design shear of each fastener from other loads, factored.',
  },
} as const satisfies KeyTable;

/** The keys of an extreme in a job of these zones: its name, and each zone's temperature. */
export function extremeTable(zones: readonly string[]): KeyTable {
  const meaning = 'Temperature of the zone.';
  const keys = zones.map(
    (zone) => [zone, { ...TEMPERATURE, example: '25 degC', meaning }] as const,
  );
  return { ...Object.fromEntries(keys), ...EXTREME_KEYS };
}

/** Every table with its heading, in the order of the reference. */
export const KEY_TABLES: readonly { readonly title: string; readonly keys: KeyTable }[] = [
  { title: 'job', keys: JOB_KEYS },
  { title: 'record', keys: RECORD_KEYS },
  { title: 'record.time', keys: TIME_KEYS },
  { title: 'record.gaps', keys: GAPS_KEYS },
  { title: 'record.band', keys: BAND_KEYS },
  { title: 'record.stuck', keys: STUCK_KEYS },
  { title: 'record.spikes', keys: SPIKES_KEYS },
  { title: 'record.jumps', keys: JUMPS_KEYS },
  { title: 'record.columns, each column', keys: COLUMN_KEYS },
  { title: 'record.site', keys: SITE_KEYS },
  { title: 'zones, each zone', keys: ZONE_KEYS },
  { title: 'zones, the sun of a zone', keys: SUN_KEYS },
  { title: 'zones, the overhang of a zone', keys: OVERHANG_KEYS },
  { title: 'warming', keys: WARMING_KEYS },
  { title: 'extremes, each', keys: EXTREME_KEYS },
  { title: 'limits', keys: LIMITS_KEYS },
  { title: 'counting', keys: COUNTING_KEYS },
  { title: 'remedies', keys: REMEDY_KEYS },
  { title: 'members', keys: MEMBER_KEYS },
  { title: 'fasteners', keys: FASTENER_KEYS },
  { title: 'curves', keys: CURVE_KEYS },
  { title: 'curves in a CSV, one row a point', keys: CURVE_POINT_KEYS },
  { title: 'runs', keys: RUN_KEYS },
];

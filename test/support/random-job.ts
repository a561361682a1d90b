import { seeded } from '../bench/seeded.ts';
import { csvRecord } from './temporary-job.ts';

const START = Date.UTC(2031, 0, 1);
const HOURS = 600;

/** What a random job is made with. */
export interface RandomJobRecipe {
  /** Most fasteners of a run. */
  readonly most: number;
  readonly runs: number;
  /** Shortest piece that a remedy may cut [mm]. */
  readonly shortestPiece: number;
  readonly units?: 'SI' | 'US';
  /** Whether the runs are neighbours of one line with gaps, and buckle. */
  readonly lined?: boolean;
}

/** The files of an invented job, fixed by a seed: runs of a few fasteners of which many fail. */
export function randomJobFiles(seed: number, recipe: RandomJobRecipe): Record<string, string> {
  const random = seeded(seed);
  for (let i = 0; i < 5; i++) random();
  const between = (from: number, to: number) => from + (to - from) * random();
  const whole = (from: number, to: number) => Math.floor(between(from, to + 1));
  const swing = between(8, 18);
  const noise = Array.from({ length: HOURS }, () => between(-3, 3));
  const rail = (hour: number) =>
    14 +
    between(-0.01, 0.01) +
    20 * Math.sin((2 * Math.PI * hour) / HOURS) -
    swing * Math.cos((2 * Math.PI * hour) / 24) +
    noise[hour];
  const record = csvRecord(START, HOURS, { 'rail [degC]': rail });
  const { most, runs, shortestPiece, units = 'SI', lined = false } = recipe;
  const limit = between(2, 6).toFixed(2);
  // now and then so hard that a slot hardly helps
  const grip = (random() < 0.25 ? between(1.5, 3) : between(0.05, 0.6)).toFixed(3);
  const rows = Array.from({ length: runs }, (_, r) => {
    const count = whole(3, most);
    let at = whole(0, 2) * 100;
    const positions = Array.from({ length: count }, (_, i) => {
      if (i > 0) at += random() < 0.5 ? 600 : whole(300, 900);
      return `${at} mm`;
    });
    const slotted = random() < 0.3;
    const line = lined ? `, line: all, gap: ${whole(2, 12)} mm` : '';
    return `  - { id: R${r + 1}, member: rail, zone: rail, fastener: pin, positions: [${positions.join(', ')}], fixed: ${slotted ? '[1]' : 'all'}, slotted: slot, overhang: ${whole(0, 3) * 50} mm, lock_in: ${whole(5, 20)} degC, setting_tolerance: ${whole(0, 2)} mm, added_shear: 0.3 kN${line} }`;
  });
  const buckling = lined
    ? ', inertia: 4000 mm^4, yield: 160 MPa, buckling: EN, buckling_imperfection: 0.34, buckling_plateau: 0.2'
    : '';
  return {
    'record.csv': record,
    'job.yaml': `title: an invented job, seed ${seed}
units: ${units}
record: { file: record.csv, represents: 1 year, stuck: { rule: keep } }
zones: { rail: { column: rail } }
extremes: [{ name: hot, rail: 68 degC }]
remedies: { longest_travel: 12 mm, shortest_piece: ${shortestPiece} mm, widest_gap: 25 mm, closest_spacing: 200 mm }
members:
  - { id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2, curve: rail${buckling} }
fasteners:
  - { id: pin, diameter: 12 mm, stiffness: ${between(1, 6).toFixed(2)} kN/mm, slotted_grip: ${grip} kN, shear_resistance: 16 kN, shear_range_limit: ${limit} kN, curve: pin }
  - { id: slot, diameter: 12 mm, stiffness: 2 kN/mm, free_play: ${whole(1, 6)} mm, grip: ${grip} kN, shear_resistance: 16 kN, shear_range_limit: ${limit} kN, curve: pin }
curves:
  - { id: rail, constant: 1e12 MPa^3, slope: 3, below: continue }
  - { id: pin, constant: 1e20 N^4, slope: 4, below: continue }
runs:
${rows.join('\n')}
`,
  };
}

import { describe, expect, it } from 'vitest';
import { connection, screenText } from './screen-text.ts';

/**
 * Whole jobs small enough to work by hand. The temperatures are the sequence of ASTM E1049-85, Fig. 6, whose counts the
 * standard gives: open, range 3: 0.5, 4: 1.5, 6: 0.5, 8: 1, 9: 0.5; repeating (Fig. 7, from memory), 9, 7, 4, 3: 1 each.
 * With Eα = 1 MPa/K, rigid ends and 100 mm² they are member stresses in MPa and a hundredth of the shear in N.
 */
const SEQUENCE = [-2, 1, -3, 5, -1, 3, -4, 4, -2];
/** Rigid is a million times the span: N = −EAε/(1 + 2e-6). */
const RIGID = 1e-5;

const job = (changes: Record<string, string> = {}) => {
  const part = (key: string, otherwise: string) => changes[key] ?? otherwise;
  return `
title: by hand
record: { file: record.csv, represents: 1 year }
zones: { air: { column: t } }
counting: { residue: ${part('residue', 'repeat')}${part('gate', '')} }
limits: { design_life: 50 years, damage: 1, load_factor: 1, member_factor: ${part('factor', '1')}, fastener_factor: 1, static_factor: 1 }
members:
  - { id: bar, modulus: 100 GPa, expansion: 1e-5 / K, area: 100 mm^2, curve: cube${part('member', '')} }
fasteners:
  - { id: pin, stiffness: rigid${part('fastener', '')} }
curves:
  - { id: cube, of: stress, constant: 1e6 MPa^3, slope: 3${part('curve', '')} }
${part('curves', '')}
runs:
  - { id: R, member: bar, zone: air, fastener: pin, count: 2, spacing: 1 m, lock_in: 0 degC }
`;
};

const cubes = (counts: readonly (readonly [range: number, count: number])[]) =>
  counts.reduce((sum, [range, count]) => sum + (count * range ** 3) / 1e6, 0);

const OPEN = [
  [3, 0.5],
  [4, 1.5],
  [6, 0.5],
  [8, 1],
  [9, 0.5],
] as const;
const REPEATING = [
  [9, 1],
  [7, 1],
  [4, 1],
  [3, 1],
] as const;

describe('a restrained bar under the sequence of ASTM E1049', () => {
  it('counts and sums what stays open as half cycles', async () => {
    const result = await screenText(job({ residue: 'half' }), SEQUENCE);
    const { memberDamagePerYear, cyclesPerYear, stressRange } = connection(result, 1);
    expect(memberDamagePerYear! / cubes(OPEN)).toBeCloseTo(1, 4);
    expect(cyclesPerYear).toBe(4);
    expect(stressRange / 9).toBeCloseTo(1, 4);
  });

  it('counts and sums the repeating record in whole cycles', async () => {
    const result = await screenText(job(), SEQUENCE);
    const { memberDamagePerYear, memberDamage, cyclesPerYear, life } = connection(result, 2);
    const sum = cubes(REPEATING);
    expect(memberDamagePerYear! / sum).toBeCloseTo(1, 4);
    expect(cyclesPerYear).toBe(4);
    expect(life! * sum).toBeCloseTo(1, 4);
    // four cycles of the equivalent range do the same damage: (1163 / 4)^(1/3)
    expect(memberDamage.equivalentRange).toBeCloseTo(Math.cbrt((sum * 1e6) / 4), 3);
  });

  it('multiplies ranges by the factors, and reports them without', async () => {
    const result = await screenText(job({ factor: '1.35' }), SEQUENCE);
    const { memberDamagePerYear, stressRange } = connection(result, 1);
    expect(memberDamagePerYear! / (1.35 ** 3 * cubes(REPEATING))).toBeCloseTo(1, 4);
    expect(Math.abs(stressRange - 9)).toBeLessThan(9 * RIGID);
  });

  it('reckons stress on the net area times the stress factor, or on the gross one where the curve says so', async () => {
    const net = { member: ', net_area: 50 mm^2, stress_factor: 1.5' };
    const onNet = connection(await screenText(job(net), SEQUENCE), 1);
    expect(onNet.stressRange / (3 * 9)).toBeCloseTo(1, 4);
    const gross = connection(await screenText(job({ ...net, curve: ', on: gross' }), SEQUENCE), 1);
    expect(gross.stressRange / (1.5 * 9)).toBeCloseTo(1, 4);
    expect(gross.memberDamagePerYear! / (1.5 ** 3 * cubes(REPEATING))).toBeCloseTo(1, 4);
  });

  it('counts a share of compression only', async () => {
    const result = await screenText(job({ curve: ', compression_share: 0.6' }), SEQUENCE);
    // heating compresses, so temperature t > 0 is stress −t and counts as −0.6·t:
    // 2, −0.6, 3, −3, 1, −1.8, 4, −2.4, 2 repeats in cycles 7 (4 to −3), 5.4 (3 to −2.4), 2.8 (1 to −1.8) and
    // 2.6 (2 to −0.6)
    const counts = [7, 5.4, 2.8, 2.6].map((range) => [range, 1] as const);
    expect(connection(result, 1).memberDamagePerYear! / cubes(counts)).toBeCloseTo(1, 4);
    // the range that is reported is the stress itself
    expect(connection(result, 1).stressRange / 9).toBeCloseTo(1, 4);
  });

  it('drops what lies under the gate, and says what it would have done', async () => {
    const result = await screenText(job({ gate: ', stress_gate: 5 MPa' }), SEQUENCE);
    const { memberDamage } = connection(result, 1);
    expect(
      memberDamage.sum! /
        cubes([
          [9, 1],
          [7, 1],
        ]),
    ).toBeCloseTo(1, 4);
    expect(memberDamage.gatedCycles).toBe(2);
    expect(
      memberDamage.gatedDamage /
        cubes([
          [4, 1],
          [3, 1],
        ]),
    ).toBeCloseTo(1, 4);
  });

  it('shares a connection among its fasteners', async () => {
    const curves = '  - { id: line, of: stress, constant: 1e9 MPa^3, slope: 3 }';
    const fastener = ', per_connection: 2, shear_area: 25 mm^2, curve: line';
    const { shearRange, shearPeak, fastenerDamagePerYear } = connection(
      await screenText(job({ fastener, curves }), SEQUENCE),
      1,
    );
    expect(shearRange / 450).toBeCloseTo(1, 4);
    expect(shearPeak / 250).toBeCloseTo(1, 4);
    // each MPa of the bar is 100 N over two fasteners of 25 mm²: 2 MPa
    expect(fastenerDamagePerYear! / ((2 ** 3 * cubes(REPEATING)) / 1e3)).toBeCloseTo(1, 4);
  });
});

describe('a curve with a constant-amplitude threshold', () => {
  const threshold = (mpa: number) => job({ curve: `, threshold: ${mpa} MPa` });

  it('does no damage where every range stays under it', async () => {
    const { memberDamagePerYear, life } = connection(await screenText(threshold(9.5), SEQUENCE), 1);
    expect(memberDamagePerYear).toBe(0);
    expect(life).toBe(Number.POSITIVE_INFINITY);
  });

  it('spares no range once one is over it', async () => {
    const result = await screenText(threshold(8.5), SEQUENCE);
    expect(connection(result, 1).memberDamagePerYear! / cubes(REPEATING)).toBeCloseTo(1, 4);
  });
});

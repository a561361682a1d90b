import { describe, expect, it } from 'vitest';
import type { CheckName, Fastener, Limits, Member } from '../../src/model.ts';
import { type ConnectionDemands, checksOf, governingCheck } from '../../src/verdict/checks.ts';

/** Figures chosen so that every demand over its limit can be worked in the head; no outside source is needed. */
const LIMITS: Limits = {
  designLife: 50,
  damage: 0.5,
  loadFactor: 1,
  memberFactor: 1.35,
  fastenerFactor: 1.35,
  staticFactor: 1.5,
};

const FASTENER: Fastener = {
  id: 'bracket',
  perConnection: 1,
  stiffness: 2000,
  freePlay: 9,
  grip: 250,
  shearArea: 84.3,
  shearResistance: 20_000,
  tensionResistance: 10_000,
  interaction: 2,
  shearRangeLimit: 5000,
  shearRangeRule: 'required',
  slottedGrip: null,
  maySlot: true,
  diameter: 12,
  curve: null,
};

const MEMBER = { yield: 160 } as Member;

const DEMANDS: ConnectionDemands = {
  role: 'slotted',
  memberDamagePerYear: 0.002,
  fastenerDamagePerYear: 0.005,
  damageFrom: '',
  shearRange: { value: 4000, when: 'a to b' },
  shearPeak: { value: 6000, when: 'c' },
  stressRange: { value: 120, when: 'd to e' },
  slip: { value: 7, when: 'f' },
  compression: { value: 2000, when: 'extreme hot', resistance: 6000 },
  settingTolerance: 1,
  addedTension: 6000,
  addedShear: 1000,
};

const check = (
  name: CheckName,
  demands: Partial<ConnectionDemands> = {},
  fastener: Partial<Fastener> = {},
) =>
  checksOf({ ...DEMANDS, ...demands }, { ...FASTENER, ...fastener }, MEMBER, LIMITS).find(
    (one) => one.check === name,
  );

describe('checks of a connection', () => {
  it.each([
    ['member damage', 0.1, 0.5, ''],
    ['fastener damage', 0.25, 0.5, ''],
    ['shear range', 4000, 5000, 'a to b'],
    // 1.5 × 6000 + 1000
    ['peak shear', 10_000, 20_000, 'c'],
    // (6000 / 10000)² + (10000 / 20000)²
    ['combined', 0.61, 1, 'c'],
    ['yield range', 120, 240, 'd to e'],
    ['slot travel', 8, 9, 'f'],
    ['buckling', 3000, 6000, 'extreme hot'],
  ] as const)('%s: demand %d against %d', (name, demand, limit, when) => {
    const found = check(name);
    expect(found).toMatchObject({ demand: expect.closeTo(demand, 9), limit, when, status: 'pass' });
    expect(found?.utilisation).toBeCloseTo(demand / limit, 12);
  });

  it.each([
    ['member damage', { memberDamagePerYear: null }, {}],
    ['fastener damage', { fastenerDamagePerYear: null }, {}],
    ['shear range', {}, { shearRangeLimit: null }],
    ['peak shear', {}, { shearResistance: null }],
    ['combined', {}, { interaction: null }],
    ['combined', {}, { tensionResistance: null }],
    ['combined', {}, { shearResistance: null }],
    ['buckling', { compression: { value: 2000, when: '', resistance: null } }, {}],
  ] as const)(
    '%s without its limit is not given: neither passed nor failed',
    (name, demands, fastener) => {
      expect(check(name, demands, fastener)).toMatchObject({
        status: 'not given',
        utilisation: null,
      });
    },
  );

  it('asks slot travel of slotted connections and buckling beside a span only', () => {
    expect(check('slot travel', { role: 'fixed' })).toBeUndefined();
    expect(check('buckling', { compression: null })).toBeUndefined();
  });

  it('fails over the limit and passes at it', () => {
    expect(check('shear range', { shearRange: { value: 5000, when: '' } })?.status).toBe('pass');
    expect(check('shear range', { shearRange: { value: 5001, when: '' } })?.status).toBe('fail');
  });

  it('fails a bolt at the end of its slot, where slip can go no further', () => {
    const there = { slip: { value: 9, when: '' }, settingTolerance: 0 };
    expect(check('slot travel', there)).toMatchObject({ utilisation: 1, status: 'fail' });
  });

  it('governs by the largest utilisation, the earlier check on a tie, what is not given never', () => {
    const checks = checksOf(DEMANDS, FASTENER, MEMBER, LIMITS);
    expect(governingCheck(checks)?.check).toBe('slot travel');
    const tied = checks.map((one) => ({ ...one, utilisation: 0.7 }));
    expect(governingCheck(tied)?.check).toBe('member damage');
    const none = checks.map((one) => ({ ...one, status: 'not given' as const }));
    expect(governingCheck(none)).toBeNull();
  });
});

describe('a shear range that exempts from the damage check', () => {
  const rule = { shearRangeRule: 'exempts' } as const;
  const over = { shearRange: { value: 6000, when: '' } };

  it('under its limit owes none', () => {
    expect(check('shear range', {}, rule)?.status).toBe('pass');
    expect(check('fastener damage', {}, rule)?.status).toBe('exempt');
  });

  it('over its limit lets the damage decide', () => {
    expect(check('shear range', over, rule)?.status).toBe('exempt');
    expect(check('fastener damage', over, rule)?.status).toBe('pass');
    const heavy = { ...over, fastenerDamagePerYear: 0.011 };
    expect(check('fastener damage', heavy, rule)?.status).toBe('fail');
  });

  it('over its limit fails where no curve says what the damage is', () => {
    const blind = { ...over, fastenerDamagePerYear: null };
    expect(check('shear range', blind, rule)?.status).toBe('fail');
    expect(check('fastener damage', blind, rule)?.status).toBe('not given');
  });
});

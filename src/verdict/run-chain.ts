import { type Chain, createChain } from '../mechanics/chain.ts';
import { mismatchStrain } from '../mechanics/mismatch-strain.ts';
import type { Extreme, Run } from '../model.ts';

/** The chain of a run, per connection: what one fastener offers times the fasteners side by side. */
export function runChain(run: Run): Chain {
  const column = (of: (i: number) => number) => Float64Array.from(run.fasteners, (_, i) => of(i));
  const { fasteners } = run;
  return createChain({
    axialStiffness: run.member.modulus * run.member.area,
    positions: run.positions,
    stiffness: column(
      (i) => fasteners[i].perConnection * (fasteners[i].stiffness ?? Number.POSITIVE_INFINITY),
    ),
    freePlay: column((i) => fasteners[i].freePlay),
    grip: column((i) => fasteners[i].perConnection * fasteners[i].grip),
    overhangs: run.overhangs,
  });
}

/** Mismatch strain of a run at each sample of the record. */
export function runStrain(run: Run): Float64Array {
  return strainAt(run, run.zone.temperature, run.structure?.zone.temperature ?? null);
}

/** An extreme that a run feels, and its mismatch strain. */
export interface RunExtreme {
  readonly name: string;
  readonly strain: number;
}

/** The extremes that name the run's zone; a structure zone of constant temperature need not be named. */
export function runExtremes(run: Run, extremes: readonly Extreme[]): RunExtreme[] {
  return extremes.flatMap(({ name, temperatures }) => {
    const temperature = temperatures.get(run.zone.name);
    if (temperature === undefined) return [];
    const structureZone = run.structure?.zone;
    const behind = structureZone
      ? (temperatures.get(structureZone.name) ?? structureZone.temperature[0])
      : null;
    const one = (t: number) => Float64Array.of(t);
    const [strain] = strainAt(run, one(temperature), behind === null ? null : one(behind));
    return [{ name, strain }];
  });
}

function strainAt(run: Run, member: Float64Array, structure: Float64Array | null): Float64Array {
  const { expansion } = run.member;
  const thermal = { temperature: member, expansion, lockIn: run.lockIn };
  const behind =
    run.structure !== null && structure !== null
      ? { ...run.structure, temperature: structure }
      : null;
  return mismatchStrain(thermal, behind);
}

import type { Fastener, Run } from '../../model.ts';

/** The types of fastener that some runs stand on, each under a name of its own. */
export function fastenerIds(runs: readonly Run[]): ReadonlyMap<string, Fastener> {
  const types = new Map<string, Fastener>();
  for (const fastener of runs.flatMap(typesOf)) {
    const id = freeId(fastener, types);
    types.set(id, fastener);
  }
  return types;
}

/** The name of a type among those of `fastenerIds`. */
export function idAmong(fastener: Fastener, types: ReadonlyMap<string, Fastener>): string {
  return freeId(fastener, types);
}

function typesOf({ fixedType, slottedType, roles }: Run): Fastener[] {
  return slottedType !== null && roles.includes('slotted') ? [fixedType, slottedType] : [fixedType];
}

/** Its own id, or where another type goes by that the id with a number. */
function freeId(fastener: Fastener, types: ReadonlyMap<string, Fastener>): string {
  for (let number = 1; ; number++) {
    const id = number === 1 ? fastener.id : `${fastener.id}, ${number}`;
    const known = types.get(id);
    if (known === undefined || isSame(known, fastener)) return id;
  }
}

function isSame(one: Fastener, other: Fastener): boolean {
  const keys = Object.keys(one) as (keyof Fastener)[];
  return keys.every((key) => one[key] === other[key]);
}

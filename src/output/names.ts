import type { Connection } from '../model.ts';
import type { UnitSystem } from '../units.ts';
import { shortNumber } from './number-text.ts';
import { inUnits, unitOf, type Written } from './quantity.ts';

type Named = Pick<Connection, 'run' | 'number'>;

/** A connection's name, such as `R1/3`. */
export function connectionName({ run, number }: Named): string {
  return `${run}/${number}`;
}

/** Connections of one run, neighbours drawn together: `R1/1, R1/4 to R1/9`. */
export function connectionNames(connections: readonly Named[]): string {
  const groups: [Named, Named][] = [];
  for (const connection of connections) {
    const last = groups.at(-1);
    if (last !== undefined && connection.number === last[1].number + 1) last[1] = connection;
    else groups.push([connection, connection]);
  }
  return groups
    .map(([first, last]) => {
      if (first === last) return connectionName(first);
      const between = last.number === first.number + 1 ? ', ' : ' to ';
      return `${connectionName(first)}${between}${connectionName(last)}`;
    })
    .join(', ');
}

/** The run ids, or `all runs` where they are all of several. */
export function runNames(ids: readonly string[], runs: number): string {
  return ids.length === runs && runs > 1 ? 'all runs' : ids.join(', ');
}

/** A quantity for a person to read, such as `8.9 kN`, from base units. */
export function amount(value: number, quantity: Written, units: UnitSystem): string {
  return `${shortNumber(inUnits(value, quantity, units))} ${unitOf(quantity, units)}`.trimEnd();
}

/** The time as the record's own clock shows it, without seconds. */
export function stamp(time: number): string {
  return new Date(time).toISOString().slice(0, 16).replace('T', ' ');
}

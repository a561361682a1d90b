import {
  CHECKS,
  type Check,
  type CheckName,
  type CheckStatus,
  type Connection,
  type Result,
  type RunResult,
} from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { amount, connectionNames, runNames } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { quantityOf } from '../quantity.ts';
import { runFails } from '../run-fails.ts';
import { wrap } from './text-layout.ts';

/** Each failing check of each run: the worst demand, its limit, and the connections that fail. */
export function failures({ job, runs }: Result): string[] {
  return runs.filter(runFails).flatMap((run) =>
    CHECKS.flatMap((name) => {
      const failing = having(run, name, 'fail');
      return failing.length === 0 ? [] : [failure(failing, name, job.units)];
    }),
  );
}

/** For each check that somebody gave no limit or curve for: the runs that it stands open in. */
export function notGiven(result: Result): string[] {
  return byCheck(result, 'not given');
}

/** For each check that a shear range rule makes unnecessary: the runs that it is not owed in. */
export function exempt(result: Result): string[] {
  return byCheck(result, 'exempt');
}

function byCheck({ runs }: Result, status: CheckStatus): string[] {
  const width = Math.max(...CHECKS.map((name) => name.length));
  return CHECKS.flatMap((name) => {
    const ids = runs.filter((run) => having(run, name, status).length > 0).map(({ run }) => run.id);
    if (ids.length === 0) return [];
    return [wrap(runNames(ids, runs.length), `  ${name.padEnd(width)}  `)];
  });
}

function failure(failing: readonly Connection[], name: CheckName, units: UnitSystem): string {
  const worst = failing
    .map((connection) => checkOf(connection, name)!)
    .reduce((a, b) => (b.utilisation! > a.utilisation! ? b : a));
  const quantity = quantityOf(worst.unit);
  const demand = amount(worst.demand!, quantity, units);
  const limit = amount(worst.limit!, quantity, units);
  const times = `${shortNumber(worst.utilisation!)} times`;
  const when = worst.when === '' ? '' : ` (${worst.when})`;
  const open = damageIsOpen(failing[0], name) ? ', and no curve to judge the damage by' : '';
  const where = connectionNames(failing);
  const text = `${name} ${demand}, limit ${limit}, ${times}${when}${open}: ${where}`;
  return wrap(text, `  ${failing[0].run}  `);
}

/** Over the limit of a rule `exempts` a fastener's curve would decide. */
function damageIsOpen({ fastener }: Connection, name: CheckName): boolean {
  return name === 'shear range' && fastener.shearRangeRule === 'exempts' && fastener.curve === null;
}

function having({ connections }: RunResult, name: CheckName, status: CheckStatus): Connection[] {
  return connections.filter((connection) => checkOf(connection, name)?.status === status);
}

function checkOf(connection: Connection, name: CheckName): Check | undefined {
  return connection.checks.find(({ check }) => check === name);
}

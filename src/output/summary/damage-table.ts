import type { Connection, Damage, Result, RunResult } from '../../model.ts';
import { amount, connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import type { Written } from '../quantity.ts';
import { table } from './text-layout.ts';

/**
 * One line a run and part (fastener, member) at its most damaged connection. The range ratio is
 * D^(1/m), D being the damage in the design life over the allowed sum and m the curve's slope there: how
 * many times the allowed ranges these are. Blank where no curve was given at all.
 */
export function damageTable({ job, runs }: Result): string {
  const { designLife, damage: allowed } = job.limits;
  const header = [
    'run',
    'part',
    'at',
    'damage',
    'range ratio',
    'equivalent range',
    'cycles a year',
  ];
  const rows = runs.flatMap((run) =>
    PARTS.flatMap(({ part, quantity, of, perYear }) => {
      const worst = mostDamaged(run, perYear);
      if (worst === null) return [];
      const damage = of(worst);
      const use = (perYear(worst)! * designLife) / allowed;
      return [
        [
          run.run.id,
          part,
          connectionName(worst),
          shortNumber(use * allowed),
          damage.slope === null ? '' : shortNumber(use ** (1 / damage.slope)),
          damage.equivalentRange === null
            ? 'no cycle does damage'
            : amount(damage.equivalentRange, quantity, job.units),
          shortNumber(damage.cycles / run.years),
        ],
      ];
    }),
  );
  if (rows.length === 0) return '';
  const ratio =
    '  Range ratio: the damage as a factor on ranges, (damage / allowed)^(1 / slope of the curve).';
  return `${table([header, ...rows], [3, 4, 5, 6])}\n${ratio}`;
}

interface Part {
  readonly part: string;
  readonly quantity: Written;
  readonly of: (connection: Connection) => Damage;
  readonly perYear: (connection: Connection) => number | null;
}

const PARTS: readonly Part[] = [
  {
    part: 'member',
    quantity: 'stress',
    of: (c) => c.memberDamage,
    perYear: (c) => c.memberDamagePerYear,
  },
  {
    part: 'fastener',
    quantity: 'force',
    of: (c) => c.fastenerDamage,
    perYear: (c) => c.fastenerDamagePerYear,
  },
];

function mostDamaged({ connections }: RunResult, perYear: Part['perYear']): Connection | null {
  const known = connections.filter((connection) => perYear(connection) !== null);
  if (known.length === 0) return null;
  return known.reduce((a, b) => (perYear(b)! > perYear(a)! ? b : a));
}

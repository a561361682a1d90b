import type { UnitSystem } from '../../units.ts';
import { unlikeRows } from '../../verdict/spacing-answer.ts';
import type { SpacingRow } from '../../verdict/spacing-row.ts';
import type { SpacingCase } from '../../verdict/spacings.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import { caseText, lengthText } from '../spacings-words.ts';
import { edgeLabel } from './along.ts';
import type { Chart, Point } from './chart.ts';
import { caseName, countTicks, spacingOf, spacingReach, spacingScales } from './spacings-axis.ts';
import { axis, baseOptions, COLOUR, DASH, line, spacer } from './theme.ts';

const STACKED = {
  position: 'left',
  stack: 'panels',
  stackWeight: 5,
  min: 0,
  grace: '10%',
} as const;

/** The largest shear range of a fastener and the largest force in the member over the spacing. */
export function spacingsForceChart(of: SpacingCase, units: UnitSystem): Chart {
  const rows = unlikeRows(of.rows);
  const force = unitOf('force', units);
  const points = (value: (row: SpacingRow) => number): Point[] =>
    rows.map((row) => ({ x: spacingOf(row, units), y: inUnits(value(row), 'force', units) }));
  const range = points(({ shearRange }) => shearRange);
  const member = points(({ memberForce }) => memberForce);
  const limits = limitsOf(of);
  const { min, max } = spacingReach(rows, units);
  const limitY = (limit: number) => inUnits(limit, 'force', units);
  const base = baseOptions(title(of, rows, units), SUBTITLE, { right: 150 });
  return {
    name: `${caseName(of, units)}-forces`,
    configuration: {
      type: 'line',
      data: {
        datasets: [
          line(range, {
            label: 'shear range',
            yAxisID: 'range',
            pointRadius: 4.5,
            pointStyle: 'circle',
          }),
          line(member, {
            label: 'member force',
            yAxisID: 'member',
            borderColor: COLOUR.second,
            backgroundColor: COLOUR.second,
            pointRadius: 4.5,
            pointStyle: 'rect',
          }),
          ...limits.map(({ limit }) =>
            line(
              [
                { x: min, y: limitY(limit) },
                { x: max, y: limitY(limit) },
              ],
              {
                label: 'limit of the shear range',
                yAxisID: 'range',
                borderColor: COLOUR.limit,
                borderDash: DASH.dashed,
                borderWidth: 2,
              },
            ),
          ),
        ],
      },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: { axes: { count: countTicks(rows, units) } },
          directLabels: {
            labels: [
              edgeLabel('shear range', 'range', range[range.length - 1], COLOUR.demand),
              edgeLabel('member force', 'member', member[member.length - 1], COLOUR.second),
              ...limits.map(({ limit, text }) =>
                edgeLabel(text, 'range', { x: max, y: limitY(limit) }, COLOUR.limit),
              ),
            ],
          },
        },
        scales: {
          ...spacingScales(rows, units),
          member: axis(`Member force [${force}]`, STACKED),
          gap: spacer(0.4),
          range: axis(`Shear range [${force}]`, STACKED),
        },
      },
    },
  };
}

const SUBTITLE =
  'Largest in the run: shear range of a fastener through the record; member force from lock-in on and at the extremes. Unfactored.';

function title(of: SpacingCase, rows: readonly SpacingRow[], units: UnitSystem): string {
  const [many, few] = [rows[0], rows[rows.length - 1]];
  const name = caseText(of, units);
  const force = (value: number) => shortNumber(inUnits(value, 'force', units));
  const unit = unitOf('force', units);
  if (many === few)
    return `${name}: shear range ${force(few.shearRange)} ${unit} at ${lengthText(few.spacing, units)}`;
  return `${name}: shear range ${force(many.shearRange)} ${unit} at ${lengthText(many.spacing, units)}, ${force(few.shearRange)} ${unit} at ${lengthText(few.spacing, units)}`;
}

/** The allowed shear ranges of the run's fasteners, once where they are alike. */
function limitsOf({ run, arrangement }: SpacingCase): { limit: number; text: string }[] {
  const fixed = arrangement === 'none' ? null : run.fixedType.shearRangeLimit;
  const slotted = arrangement === 'all' ? null : (run.slottedType?.shearRangeLimit ?? null);
  if (fixed !== null && slotted !== null && fixed !== slotted) {
    return [
      { limit: fixed, text: 'limit, fixed' },
      { limit: slotted, text: 'limit, slotted' },
    ];
  }
  const limit = fixed ?? slotted;
  return limit === null ? [] : [{ limit, text: 'limit' }];
}

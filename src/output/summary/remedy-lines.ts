import { LEAST_GRIP } from '../../mechanics/chain-state.ts';
import type { Fastener, Remedy, Result, Rework, RunResult } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { ALL_SETS } from '../../verdict/role-sets.ts';
import { amount } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { changeWords, reworkWords, schemeWords } from '../remedies/remedy-words.ts';
import { bullet, wrap } from './text-layout.ts';

/** What to draw for each run that fails, or what stands in the way. */
export function remedyLines({ job, runs }: Result): string[] {
  return runs.flatMap((run) => {
    const text = remedyText(run, job.units);
    return text === '' ? [] : [wrap(text, `  ${run.run.id}: `)];
  });
}

/** The remedy of one run with the utilisation before and after; blank where it has none and needs none. */
function remedyText(run: RunResult, units: UnitSystem): string {
  const { remedy } = run;
  if (remedy === null) return '';
  if (remedy.kind === 'rework') return reworkText(remedy, units);
  const before = shortNumber(remedy.utilisationBefore);
  return `${schemeWords(run, remedy, units)}; utilisation ${before} → ${shortNumber(remedy.utilisation)}`;
}

function reworkText(rework: Rework, units: UnitSystem): string {
  const changes = rework.changes.map((change) => changeWords(change, units));
  const alone =
    changes.length === 0
      ? 'No single change of grip, free play, limit, area or stiffness would do.'
      : `As drawn it would pass with ${changes.length === 1 ? 'this alone' : 'any one of these'}: ${changes.join('; ')}.`;
  return `rework. No slots, joints or closer fasteners within the bounds of the job pass: ${reworkWords(rework, units)}. ${alone}`;
}

/** What the remedies take for granted; nothing where there is none. */
export function remedyAssumptions({ job, runs }: Result): string[] {
  const remedied = runs.filter((run): run is Remedied => isRemedied(run));
  if (runs.every(({ remedy }) => remedy === null)) return [];
  const { remedies, units } = job;
  const length = (value: number) => amount(value, 'length', units);
  const longest = runs.some(({ run }) => run.positions.length > ALL_SETS);
  const points = [
    `No slot longer than ±${length(remedies.longestTravel)}, no piece shorter than ${length(remedies.shortestPiece)}, no gap wider than ${length(remedies.widestGap)}, no spacing closer than ${length(remedies.closestSpacing)} was tried.`,
    'A slot covers the travel found and the setting tolerance, each way from its centre, and is rounded up as the job says.',
    `Grips may lie ${shortNumber(100 * remedies.gripSpread)} % above or below their value: the fixed fasteners of a slotted run carry what its two sides then differ by.`,
    ...gripPoints(remedied, units),
    "Left out: whether a slot fits beside the member's edges and its end, where the last fastener of a run is slotted.",
    ...(longest
      ? [
          `Runs of more than ${ALL_SETS} fasteners were tried with their fixed fasteners side by side only.`,
        ]
      : []),
  ];
  return points.map(bullet);
}

type Remedied = RunResult & { readonly remedy: Remedy };

function isRemedied({ remedy }: RunResult): boolean {
  return remedy !== null && remedy.kind !== 'rework';
}

/** The grip that each kind of fastener was given in a new slot. */
function gripPoints(runs: readonly Remedied[], units: UnitSystem): string[] {
  const grips = new Map(
    runs.flatMap(({ run, remedy }) => {
      const slotted = slottedOf(remedy);
      return slotted === undefined ? [] : [[(run.slottedType ?? run.fixedType).id, slotted.grip]];
    }),
  );
  const all = [...grips];
  const gripping = all.filter(([, grip]) => grip >= LEAST_GRIP);
  const free = all.filter(([, grip]) => grip < LEAST_GRIP).map(([id]) => id);
  const words = gripping.map(([id, grip]) => `${id} ${amount(grip, 'force', units)}`);
  return [
    ...(words.length === 0 ? [] : [`Grip of one fastener in a slot: ${words.join(', ')}.`]),
    ...(free.length === 0
      ? []
      : [
          `No grip in a slot was given for ${free.join(', ')}: such slots were taken as frictionless but for ${LEAST_GRIP} N. A clamped slot grips, so give slotted_grip.`,
        ]),
  ];
}

function slottedOf({ pieces }: Remedy): Fastener | undefined {
  return pieces
    .flatMap(({ run }) => run.fasteners.filter((_, i) => run.roles[i] === 'slotted'))
    .at(0);
}

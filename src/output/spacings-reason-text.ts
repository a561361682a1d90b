import type { UnitSystem } from '../units.ts';
import type { FastenerHelp, HelpReason } from '../verdict/fastener-help.ts';
import { amount } from './names.ts';
import { lengthText } from './spacings-words.ts';

/** Why more fasteners do not help more, as a sentence; blank where they do or no plain reason is known. */
export function reasonText(help: FastenerHelp, units: UnitSystem): string {
  const { reason } = help;
  switch (reason?.why) {
    case undefined:
      return '';
    case 'shear lag':
      return shearLag(reason, help, units);
    case 'rigid fasteners':
      return 'Rigid fasteners at the two ends hold the whole run, however many stand between.';
    case 'slips both ways':
      return slips(reason, help, units);
    case 'travel from the fixed point':
      return 'A slot travels by the mismatch of the length from the fixed point to it, whatever the spacing; a longer slot or a shorter piece helps.';
    case 'member held back':
      return 'The better a member is held, the more of EA·ε it carries; slots or a shorter piece help.';
    case 'more compression':
      return 'Shorter spans resist more, but the closer row holds the member back more, so that its compression grows too.';
  }
}

function shearLag(
  { closeLag, wideLag, halfLength }: Extract<HelpReason, { why: 'shear lag' }>,
  { many, few }: FastenerHelp,
  units: UnitSystem,
): string {
  const length = (value: number) => lengthText(value, units);
  const lags = `${length(wideLag)} at ${length(few.spacing)}, ${length(closeLag)} at ${length(many.spacing)}`;
  return halfLength <= closeLag
    ? `Half the ${many.pieces === 1 ? 'run' : 'piece'}, ${length(halfLength)}, is no longer than the lag length √(EA·s/k) (${lags}), so its ends make most of their free movement and the end fasteners take that up, however many stand between.`
    : `The end fastener takes up the mismatch of the lag length √(EA·s/k), over which the force builds up (${lags}): a quarter of the spacing at best halves that length, and with it the shear.`;
}

function slips(
  { grip, throughout }: Extract<HelpReason, { why: 'slips both ways' }>,
  { many }: FastenerHelp,
  units: UnitSystem,
): string {
  const twice = `twice their grip of ${amount(grip, 'force', units)}`;
  return throughout
    ? `The joints slip both ways, so their shear range is ${twice} at any spacing; less grip helps.`
    : `Where the joints slip both ways, as at ${lengthText(many.spacing, units)}, their shear range is ${twice}, and still closer fasteners hardly change it.`;
}

import type { PointStyle } from 'chart.js';
import type { CheckName } from '../../model.ts';
import { COLOUR, DASH } from './theme.ts';

export interface Look {
  readonly borderColor: string;
  readonly borderDash: number[];
  readonly pointStyle: PointStyle;
}

/** One look a check in all charts: shape and dash tell them apart without the colour. */
export const CHECK_LOOKS: Record<CheckName, Look> = {
  'member damage': look(COLOUR.third, 'solid', 'triangle'),
  'fastener damage': look(COLOUR.third, 'dotted', 'rectRot'),
  'shear range': look(COLOUR.demand, 'solid', 'circle'),
  'peak shear': look(COLOUR.demand, 'dashed', 'rect'),
  combined: look(COLOUR.demand, 'dotted', 'cross'),
  'yield range': look(COLOUR.second, 'solid', 'star'),
  'slot travel': look(COLOUR.second, 'dashed', 'crossRot'),
  buckling: look(COLOUR.ink, 'chain', 'rectRounded'),
  'joint gap': look(COLOUR.second, 'dotted', 'line'),
};

function look(borderColor: string, dash: keyof typeof DASH, pointStyle: PointStyle): Look {
  return { borderColor, borderDash: DASH[dash], pointStyle };
}

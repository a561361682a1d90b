import type { Plugin } from 'chart.js';

/** Where an axis has its ticks, and what stands at each. */
export type FixedTicks = readonly { readonly value: number; readonly label: string | string[] }[];

/** Sets the ticks of the axes that the configuration lists, so that a configuration is plain data. */
export const fixedTicks: Plugin = {
  id: 'fixedTicks',
  beforeInit(chart) {
    const axes = chart.config.options?.plugins?.fixedTicks?.axes ?? {};
    for (const [id, ticks] of Object.entries(axes as Record<string, FixedTicks>)) {
      const scale = chart.config.options?.scales?.[id];
      if (scale === undefined) continue;
      scale.ticks = { ...scale.ticks, autoSkip: false };
      scale.afterBuildTicks = (axis) => {
        axis.ticks = ticks.map(({ value }) => ({ value }));
      };
      scale.afterTickToLabelConversion = (axis) => {
        axis.ticks = ticks.map(({ value, label }) => ({ value, label }));
      };
    }
  },
};

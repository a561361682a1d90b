import type { Spectrum } from '../model.ts';

/** The spectrum with every range multiplied by `factor`. */
export function scaleSpectrum({ ranges, halfRanges }: Spectrum, factor: number): Spectrum {
  if (factor === 1) return { ranges, halfRanges };
  const scaled = (values: Float64Array) => values.map((range) => factor * range);
  return { ranges: scaled(ranges), halfRanges: scaled(halfRanges) };
}

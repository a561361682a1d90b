import type { Spectrum } from '../model.ts';

/** The spectrum with every range multiplied by `factor`. */
export function scaleSpectrum(spectrum: Spectrum, factor: number): Spectrum {
  if (factor === 1) return spectrum;
  const { ranges, halfRanges, added } = spectrum;
  const scaled = (values: Float64Array) => values.map((range) => factor * range);
  return {
    ranges: scaled(ranges),
    halfRanges: scaled(halfRanges),
    ...(added === undefined ? {} : { added: { ...added, ranges: scaled(added.ranges) } }),
  };
}

import type { Spectrum } from '../model.ts';

/** The spectrum with every range multiplied by `factor`. */
export function scaleSpectrum(spectrum: Spectrum, factor: number): Spectrum {
  if (factor === 1) return spectrum;
  const { ranges, halfRanges, added } = spectrum;
  const scaled = (values: Float64Array) => scaleValues(values, factor);
  return {
    ranges: scaled(ranges),
    halfRanges: scaled(halfRanges),
    ...(added === undefined ? {} : { added: { ...added, ranges: scaled(added.ranges) } }),
  };
}

/** A plain loop: typed arrays call back many times slower. */
function scaleValues(values: Float64Array, factor: number): Float64Array {
  const scaled = new Float64Array(values.length);
  for (let i = 0; i < values.length; i++) scaled[i] = factor * values[i];
  return scaled;
}

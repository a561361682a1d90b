import type { Spectrum } from '../model.ts';

/** A spectrum parted in two by the size of its ranges. */
export interface GatedSpectrum {
  readonly kept: Spectrum;
  readonly dropped: Spectrum;
}

/**
 * Parts a spectrum at the gate: ranges of the gate's size and over are kept, those under it dropped.
 *
 * @param spectrum ranges in any unit
 * @param gate in the same unit; 0 drops nothing
 */
export function gateSpectrum(spectrum: Spectrum, gate: number): GatedSpectrum {
  if (!(gate > 0)) return { kept: spectrum, dropped: EMPTY };
  const keeps = (range: number) => range >= gate;
  return {
    kept: filterSpectrum(spectrum, keeps),
    dropped: filterSpectrum(spectrum, (range) => !keeps(range)),
  };
}

/** The ranges of a spectrum that pass a test. */
export function filterSpectrum(
  { ranges, halfRanges, added }: Spectrum,
  test: (range: number) => boolean,
): Spectrum {
  return {
    ranges: ranges.filter(test),
    halfRanges: halfRanges.filter(test),
    ...(added === undefined ? {} : { added: { ...added, ranges: added.ranges.filter(test) } }),
  };
}

const EMPTY: Spectrum = { ranges: new Float64Array(0), halfRanges: new Float64Array(0) };

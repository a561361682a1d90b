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
  const { ranges, halfRanges } = spectrum;
  const keeps = (range: number) => range >= gate;
  const drops = (range: number) => range < gate;
  return {
    kept: { ranges: ranges.filter(keeps), halfRanges: halfRanges.filter(keeps) },
    dropped: { ranges: ranges.filter(drops), halfRanges: halfRanges.filter(drops) },
  };
}

const EMPTY: Spectrum = { ranges: new Float64Array(0), halfRanges: new Float64Array(0) };

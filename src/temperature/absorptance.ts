/** A surface whose solar absorptance may be named in place of a number. */
export interface NamedAbsorptance {
  /** Share of the sun's light that it takes in, 0 … 1. */
  readonly absorptance: number;
  readonly source: string;
}

const EN = 'EN 1991-1-5:2003, Table 5.2, relative absorptivity (from memory)';
const ASHRAE = 'ASHRAE Fundamentals, sol-air tables: a/h times h, 3.0 Btu/(h·ft²·°F)';
const COMMON = 'common practice, no source';

/** Solar absorptance of typical surfaces. Soiling and age raise the light ones. */
export const ABSORPTANCES: Readonly<Record<string, NamedAbsorptance>> = {
  'bright light surface': { absorptance: 0.5, source: EN },
  'light coloured surface': { absorptance: 0.7, source: EN },
  'dark surface': { absorptance: 0.9, source: EN },
  'light (ASHRAE)': { absorptance: 0.45, source: ASHRAE },
  'dark (ASHRAE)': { absorptance: 0.9, source: ASHRAE },
  'white paint, new': { absorptance: 0.25, source: COMMON },
  'black paint': { absorptance: 0.95, source: COMMON },
  'aluminium, mill finish': { absorptance: 0.4, source: COMMON },
  'aluminium, clear anodised': { absorptance: 0.5, source: COMMON },
  'aluminium, dark anodised': { absorptance: 0.9, source: COMMON },
  'stainless steel': { absorptance: 0.5, source: COMMON },
  'galvanised steel, new': { absorptance: 0.65, source: COMMON },
  'galvanised steel, weathered': { absorptance: 0.85, source: COMMON },
  'weathering steel, rusted': { absorptance: 0.9, source: COMMON },
};

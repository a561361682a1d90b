/** A temperature history and what it strains. */
export interface Thermal {
  /** Temperature at each sample [°C]. */
  readonly temperature: Float64Array;
  /** Coefficient of thermal expansion [1/K]. */
  readonly expansion: number;
  /** Temperature when the fasteners were tightened [°C]. */
  readonly lockIn: number;
}

/**
 * What member and structure would strain apart if nothing held them together, at each sample:
 * ε = α·(T − T_lock-in) − α_s·(T_s − T_s,lock-in).
 */
export function mismatchStrain(member: Thermal, structure: Thermal | null): Float64Array {
  const strain = thermalStrain(member);
  if (structure === null) return strain;
  const behind = thermalStrain(structure);
  for (let i = 0; i < strain.length; i++) strain[i] -= behind[i];
  return strain;
}

function thermalStrain({ temperature, expansion, lockIn }: Thermal): Float64Array {
  const strain = new Float64Array(temperature.length);
  for (let i = 0; i < strain.length; i++) strain[i] = expansion * (temperature[i] - lockIn);
  return strain;
}
